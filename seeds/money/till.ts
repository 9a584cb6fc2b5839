import type { PlantDate } from '@seamwright/shared/util';

/** The money's side of the history: cards, the processor's clock, payouts and the bank. */
export interface Till {
  /** The processor's clock goes along with the desk's. */
  moveTo(instant: Date): Promise<void>;
  /** The id of the card that a customer keeps, adding one when there is none. */
  cardOf(customerKey: string): Promise<string>;
  /** What the processor and our books do overnight. */
  endOfDay(day: PlantDate, newest: boolean): Promise<void>;
}
