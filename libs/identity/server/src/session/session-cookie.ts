import type { Application } from '@seamwright/identity/domain';
import type { RequestContext } from '@seamwright/shared/server';
import type { IssuedToken } from './sessions.repository';

/** Only calls below this address carry the cookie. */
const PATH = '/api/v1/session';

const nameOf = (application: Application): string => `seamwright_${application}`;

export const readRefreshToken = (context: RequestContext, application: Application): string | null =>
  context.cookie(nameOf(application)) || null;

export function keepRefreshToken(
  context: RequestContext,
  application: Application,
  now: Date,
  { token, expiresAt }: IssuedToken,
): void {
  const maxAgeSeconds = Math.floor((expiresAt.getTime() - now.getTime()) / 1000);
  context.setCookie(nameOf(application), token, { path: PATH, maxAgeSeconds });
}

export function dropRefreshToken(context: RequestContext, application: Application): void {
  context.setCookie(nameOf(application), '', { path: PATH, maxAgeSeconds: 0 });
}
