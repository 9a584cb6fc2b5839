/** Where the running stack answers. Addresses end in a slash. */
export interface Addresses {
  readonly storefront: string;
  readonly admin: string;
  /** The card processor's stand-in. */
  readonly cards: string;
  /** The mail server's stand-in. */
  readonly mail: string;
  /** Of the role that runs jobs; it may move the demo's clock. */
  readonly workerDatabase: string;
}

/** The day that the demo is made for; its clock stands at ten in the morning. */
export const TODAY = '2026-12-01';

const VARIABLE = 'SEAMWRIGHT_E2E_STACK';

/** Hands the addresses to the tests' own processes. */
export function publishAddresses(addresses: Addresses): void {
  process.env[VARIABLE] = JSON.stringify(addresses);
}

/** The addresses of the stack, when one is known already. */
export function knownAddresses(): Addresses | undefined {
  const text = process.env[VARIABLE];
  return text ? (JSON.parse(text) as Addresses) : undefined;
}

/** The addresses of the running stack. */
export function addresses(): Addresses {
  const known = knownAddresses();
  if (!known) throw new Error('The stack has not been started: run these tests by npm test -- --only browser');
  return known;
}
