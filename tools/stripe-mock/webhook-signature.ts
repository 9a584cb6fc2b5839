import { createHmac } from 'node:crypto';

/**
 * The `Stripe-Signature` header of a payload: `t=<unix>,v1=<hex HMAC-SHA-256 of "t.payload">`.
 * Source: the processor's public webhook documentation (scheme v1).
 */
export function signatureHeader(payload: string, secret: string, unixSeconds: number): string {
  const digest = createHmac('sha256', secret).update(`${unixSeconds}.${payload}`, 'utf8').digest('hex');
  return `t=${unixSeconds},v1=${digest}`;
}
