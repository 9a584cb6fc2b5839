import { createStripeMock } from './index';
import { readSettings } from './settings';
import { listenOnLoopback, stopOnSignal } from '../stand-in/loopback-server';

async function main(): Promise<void> {
  const { port, ...options } = readSettings(process.env);
  const mock = createStripeMock(options);
  const server = await listenOnLoopback(mock.app, port);
  stopOnSignal(async () => {
    await server.close();
    await mock.stop();
  });
  console.log(`Stand-in for the card processor: ${server.url}`);
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
