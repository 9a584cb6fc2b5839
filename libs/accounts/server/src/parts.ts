import type { FeeSchedule } from '@seamwright/accounts/domain';
import type { Clock } from '@seamwright/shared/server';
import type { Processor } from './processor';

/** Who writes the invoices. */
export interface Seller {
  readonly name: string;
  /** Several lines, as on an envelope. */
  readonly address: string;
  readonly vatNumber: string;
  /** Where a balance is paid to, in words: bank, account, code. */
  readonly bankDetails: string;
}

/** What the composition root plugs in. */
export interface AccountsParts {
  readonly processor: Processor;
  readonly clock: Clock;
  /** The plant's IANA time zone. */
  readonly timeZone: string;
  /** Where the storefront is reached from outside. */
  readonly publicOrigin: string;
  /** With it, cards are entered on the processor's own form; without it, by documented test methods. */
  readonly publishableKey: string | null;
  readonly seller: Seller;
  /** The processor's tariff, to check its fees by; null when it is not known. */
  readonly tariff: FeeSchedule | null;
}
