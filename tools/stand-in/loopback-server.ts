import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A listening server: its port, its address and how to end it. */
export interface LoopbackServer {
  port: number;
  url: string;
  close(): Promise<void>;
}

/** Listens on 127.0.0.1 only; port 0 takes a free one. Rejects when the port is taken. */
export function listenOnLoopback(app: RequestListener, port: number): Promise<LoopbackServer> {
  const server = createServer(app);
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      server.off('error', reject);
      const taken = (server.address() as AddressInfo).port;
      resolve({
        port: taken,
        url: `http://127.0.0.1:${taken}`,
        close: () =>
          new Promise((closed) => {
            server.close(() => closed());
            server.closeAllConnections();
          }),
      });
    });
  });
}

/** Runs `stop` once on the first SIGTERM or SIGINT, then lets the process end with code 0. */
export function stopOnSignal(stop: () => Promise<void>): void {
  let stopping = false;
  const end = () => {
    if (stopping) return;
    stopping = true;
    stop().then(
      () => process.exit(0),
      (error: unknown) => {
        console.error(error);
        process.exit(1);
      },
    );
  };
  process.once('SIGTERM', end);
  process.once('SIGINT', end);
}
