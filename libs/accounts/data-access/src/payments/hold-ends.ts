import type { PaymentWire } from '@seamwright/accounts/contracts';

const HOUR_MS = 3_600_000;

/** A hold that ends within two days is worth a look: it must be packed and taken before. */
const SOON_HOURS = 48;

/** Whether what is held on the card goes by itself soon, or has gone while it was still wanted. */
export function holdEndsSoon({ state, holdEndsAt }: Pick<PaymentWire, 'state' | 'holdEndsAt'>, now: Date): boolean {
  const held = state === 'pre-authorised' || state === 'capturing';
  return held && holdEndsAt !== null && Date.parse(holdEndsAt) - now.getTime() <= SOON_HOURS * HOUR_MS;
}
