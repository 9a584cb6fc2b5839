import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';

it('runs by itself, catches mail and ends well on SIGTERM', async () => {
  const child = spawn(process.execPath, ['--import', 'tsx', join(__dirname, 'main.ts')], {
    env: { ...process.env, MAIL_CATCHER_SMTP_PORT: '0', MAIL_CATCHER_HTTP_PORT: '0' },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  try {
    const [line] = (await once(child.stdout, 'data')) as [Buffer];
    const [, url = '', port = ''] = /(http:\/\/127\.0\.0\.1:\d+), SMTP on 127\.0\.0\.1:(\d+)/.exec(String(line)) ?? [];
    const transport = createTransport({ host: '127.0.0.1', port: Number(port), secure: false });
    await transport.sendMail({ from: 'a@fold.example', to: 'b@fold.example', subject: 'Hello', text: 'x' });
    transport.close();
    const answer = await fetch(`${url}/api/messages?to=b@fold.example`);
    expect(await answer.json()).toMatchObject({ messages: [{ subject: 'Hello' }] });
    const ended = once(child, 'exit');
    child.kill('SIGTERM');
    expect(await ended).toEqual([0, null]);
  } finally {
    child.kill('SIGKILL');
  }
}, 30_000);
