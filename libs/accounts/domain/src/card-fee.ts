import { addMoney, minorUnits, multiplyPpm, ppm, type MinorUnits } from '@seamwright/shared/util';

/** The processor's published price: a share of the amount over 1,000,000, and a fixed part in minor units. */
export interface FeeSchedule {
  readonly ratePpm: number;
  readonly fixedMinor: number;
}

/** `fee = round_half_up(amount × share) + fixed`, in minor units (published "percentage + fixed" tariffs). */
export function cardFee(amountMinor: number, { ratePpm, fixedMinor }: FeeSchedule): MinorUnits {
  return addMoney(minorUnits(multiplyPpm(amountMinor, ppm(ratePpm), 'half-up')), minorUnits(fixedMinor));
}
