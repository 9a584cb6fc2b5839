import { ProblemError, type RequestContext } from '@seamwright/shared/server';

const LOOPBACK = new Set(['localhost', '127.0.0.1', '[::1]']);

/** The same place by whichever name of this machine. */
function placeOf(origin: string): string | null {
  if (!URL.canParse(origin)) return null;
  const { protocol, hostname, port } = new URL(origin);
  return `${protocol}//${LOOPBACK.has(hostname) ? 'loopback' : hostname}:${port}`;
}

/** Refuses a deed by cookie that a browser says came from another website; the same-site cookie should have kept it away. */
export function refuseOtherOrigin(context: RequestContext, publicOrigin: string): void {
  if (context.origin === null || placeOf(context.origin) === placeOf(publicOrigin)) return;
  throw new ProblemError(403, { code: 'wrong-origin', params: {} });
}
