import * as z from 'zod';
import { stopOnSignal } from '../stand-in/loopback-server';
import { createMailCatcher } from './index';

const port = (fallback: number) =>
  z.preprocess(
    (value) => (value === '' ? undefined : value),
    z.coerce.number().int().min(0).max(65_535).default(fallback),
  );
const environment = z.object({ MAIL_CATCHER_SMTP_PORT: port(1025), MAIL_CATCHER_HTTP_PORT: port(1080) });

async function main(): Promise<void> {
  const settings = environment.safeParse(process.env);
  if (!settings.success) throw new Error(`Wrong settings of the mail catcher:\n${z.prettifyError(settings.error)}`);
  const { MAIL_CATCHER_SMTP_PORT: smtpPort, MAIL_CATCHER_HTTP_PORT: httpPort } = settings.data;
  const listening = await createMailCatcher().listen({ smtpPort, httpPort });
  stopOnSignal(listening.close);
  console.log(`Mail catcher: ${listening.url}, SMTP on 127.0.0.1:${listening.smtpPort}`);
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
