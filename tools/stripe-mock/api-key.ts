import { ApiError } from './errors';

function presented(authorization: string): string {
  const [scheme = '', credentials = ''] = authorization.split(' ');
  if (scheme.toLowerCase() === 'bearer') return credentials;
  if (scheme.toLowerCase() !== 'basic') return '';
  const [name = ''] = Buffer.from(credentials, 'base64').toString('utf8').split(':');
  return name;
}

/** Checks the secret key, sent as a bearer token or as the name of basic sign-in. @throws ApiError 401 */
export function assertKey(authorization: string | undefined, key: string): void {
  const given = presented(authorization ?? '');
  if (given === key) return;
  const shown = given === '' ? 'none' : `${given.slice(0, 8)}…${given.slice(-4)}`;
  throw new ApiError(401, 'invalid_request_error', `Invalid API Key provided: ${shown}`);
}
