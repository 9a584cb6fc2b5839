import request from 'supertest';
import { hasWords, PROBLEM_MEDIA_TYPE, type AnyEndpoint } from '@seamwright/shared/contracts';
import type { Caller } from '@seamwright/shared/server';

/** A request as no client of ours would send it: everything is taken as it is. */
export interface Knock {
  readonly params: Readonly<Record<string, string>>;
  readonly query: Readonly<Record<string, unknown>>;
  readonly body: unknown;
  readonly ifMatch: string | undefined;
  readonly idempotencyKey: string | undefined;
}

export interface Heard {
  readonly status: number;
  readonly mediaType: string;
  readonly text: string;
}

const methodOf = ({ method }: AnyEndpoint) => method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';

/** How the test house knows a caller again that called before. */
export const tokenOf = (caller: Caller): string => `Test ${JSON.stringify(caller)}`;

/** Half a character can't stand in an address, and an empty part of it would lead elsewhere. */
const inAddress = (text: string): string => encodeURIComponent(Buffer.from(text || ' ').toString());

export const pathOf = ({ path }: AnyEndpoint, params: Readonly<Record<string, string>>): string =>
  `/api/v1${path.replace(/:(\w+)/g, (_, name: string) => inAddress(params[name] ?? ''))}`;

/** Sends it; `origin` is where the house listens. */
export async function knock(origin: string, endpoint: AnyEndpoint, caller: Caller, sent: Knock): Promise<Heard> {
  let sending = request(origin)
    [methodOf(endpoint)](pathOf(endpoint, sent.params))
    .set('authorization', tokenOf(caller));
  if (sent.ifMatch !== undefined) sending = sending.set('if-match', sent.ifMatch);
  if (sent.idempotencyKey !== undefined) sending = sending.set('idempotency-key', sent.idempotencyKey);
  sending = sending.query(sent.query).buffer(true);
  const { status, headers, text } = await (endpoint.body
    ? sending.set('content-type', 'application/json').send(JSON.stringify(sent.body) ?? 'undefined')
    : sending);
  return { status, mediaType: headers['content-type'] ?? '', text: text ?? '' };
}

interface ProblemSeen {
  readonly status: number;
  readonly code: string;
  readonly detail: string;
  readonly errors: readonly { readonly pointer: string; readonly message: string }[];
}

/** What is wrong with an answer, in words; null when it was done, or refused so that a person can act on it. */
export function faultOf({ status, mediaType, text }: Heard): string | null {
  if (status < 400) return null;
  if (status >= 500) return `answered ${status}`;
  if (!mediaType.startsWith(PROBLEM_MEDIA_TYPE)) return `answered ${status} as ${mediaType}`;
  const problem = JSON.parse(text) as ProblemSeen;
  if (problem.status !== status) return `says ${problem.status} in a ${status}`;
  if (!hasWords(problem.code) || problem.code === 'unexpected') return `has no words for ${problem.code}`;
  if (!/\w{2,}.*\s\w+/.test(problem.detail)) return `says only "${problem.detail}"`;
  const mute = problem.errors.find(({ message }) => message.trim() === '');
  return mute ? `says nothing at ${mute.pointer}` : null;
}
