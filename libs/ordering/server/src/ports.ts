import type { Clock, Database, Log, Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

/** How a card stands for an order. */
export interface CardState {
  readonly state: string;
  readonly holdMinor: number;
  readonly capturedMinor: number;
  readonly declineCode: string | null;
}

/** What ordering asks of whoever keeps the cards. */
export interface CardPort {
  /** Writes down that a card is to be held; refuses a card that is not the customer's. Calls nobody. */
  start(
    tx: Tx,
    wanted: {
      readonly now: Date;
      readonly orderId: string;
      readonly customerId: string;
      readonly holdMinor: number;
      readonly currency: string;
      readonly cardId: string;
    },
  ): Promise<void>;
  /** Holds the card, after the commit. A repeat asks the processor the same thing again. */
  hold(
    context: { readonly database: Database; readonly clock: Clock; readonly log: Log },
    orderId: string,
  ): Promise<void>;
  /** How the cards of these orders stand; an order without a card is not among them. */
  stateOf(tx: Tx, orderIds: readonly string[]): Promise<ReadonlyMap<string, CardState>>;
}

/** What ordering asks of whoever closes the days. */
export interface DayPort {
  /** Whether a day takes no more orders. Holds a share lock on the day until the transaction ends, so that it can't be closed meanwhile. */
  isClosed(tx: Tx, day: PlantDate): Promise<boolean>;
  /** Which of these days take no more orders. Only looks: nothing is locked, so it may have changed a moment later. */
  closedDays(tx: Tx, days: readonly PlantDate[]): Promise<ReadonlySet<PlantDate>>;
  /** The plant was closed or opened for `day`, in this transaction. Refuses what would be cut then and can't be moved. */
  calendarChanged(tx: Tx, day: PlantDate, today: PlantDate): Promise<void>;
}

/** What the composition root plugs in. */
export interface OrderingParts {
  /** The plant's IANA time zone. */
  readonly timeZone: string;
  readonly cards: CardPort;
  readonly days: DayPort;
  readonly clock: Clock;
}
