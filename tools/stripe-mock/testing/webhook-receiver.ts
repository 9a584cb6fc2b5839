import express from 'express';
import { listenOnLoopback } from '../../stand-in/loopback-server';

/** What a receiver got: the body byte for byte and the signature that came with it. */
export interface Received {
  payload: string;
  signature: string;
}

/** An endpoint that notes what it gets and answers with the statuses given, then with 200. */
export async function startReceiver(
  statuses: number[] = [],
): Promise<{ url: string; received: Received[]; close(): Promise<void> }> {
  const received: Received[] = [];
  const app = express();
  app.post('/webhooks', express.text({ type: () => true, limit: '1mb' }), (request, response) => {
    received.push({ payload: String(request.body), signature: request.get('Stripe-Signature') ?? '' });
    response.sendStatus(statuses.shift() ?? 200);
  });
  const server = await listenOnLoopback(app, 0);
  return { url: `${server.url}/webhooks`, received, close: server.close };
}
