import type { PlantDate } from '@seamwright/shared/util';

/** The money's side of the history: cards, the processor's clock, payouts and the bank. */
export interface Till {
  /** The processor's clock goes along with the desk's. */
  moveTo(instant: Date): Promise<void>;
  /** The id of the card that a customer keeps, adding one when there is none; null where nobody takes cards. */
  cardOf(customerKey: string): Promise<string | null>;
  /** Payouts, and the bank's statement at the end of a week. */
  endOfDay(day: PlantDate): Promise<void>;
}

/** A desk that takes no cards. */
export const noTill: Till = {
  moveTo: async () => undefined,
  cardOf: async () => null,
  endOfDay: async () => undefined,
};
