/** The processor's price for a charge: a rate in millionths of the amount, plus a fixed part in minor units. */
export interface FeeSchedule {
  ratePpm: number;
  fixedMinor: number;
}

/** 1.5 % + 20 minor units. */
export const defaultFees: FeeSchedule = { ratePpm: 15_000, fixedMinor: 20 };

const MILLION = 1_000_000n;

/** Fee in whole minor units for an amount in whole minor units: amount × rate, half up, plus the fixed part. */
export function feeFor(amountMinor: number, fees: FeeSchedule): number {
  const share = (BigInt(amountMinor) * BigInt(fees.ratePpm) + MILLION / 2n) / MILLION;
  return Number(share) + fees.fixedMinor;
}
