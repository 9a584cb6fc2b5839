import type { Clock } from './clock';
import type { EventType } from './events';
import type { Faults } from './faults';
import type { FeeSchedule } from './fees';
import type { State } from './state';

/** How long money takes on its way, in whole days of the stand-in's clock. */
export interface Timing {
  /** From capture until the charge's money counts as available. */
  availableAfterDays: number;
  /** From a payout's creation until it reaches the bank. */
  payoutArrivesAfterDays: number;
}

export const defaultTiming: Timing = { availableAfterDays: 2, payoutArrivesAfterDays: 1 };

/** What all resources share: memory, clock, prices, arranged faults, and the way to tell what happened. */
export interface Processor {
  readonly state: State;
  readonly clock: Clock;
  readonly fees: FeeSchedule;
  readonly timing: Timing;
  readonly faults: Faults;
  /** Records an event about an object as it is now, and queues it for every endpoint that listens. */
  emit(type: EventType, object: object): void;
}
