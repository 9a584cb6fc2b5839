/** Where to go after signing in: what was asked for, if it lies inside this application. */
export function returnAddress(asked: unknown): string {
  return typeof asked === 'string' && /^\/(?![/\\])/.test(asked) && !asked.startsWith('/sign-in') ? asked : '/';
}
