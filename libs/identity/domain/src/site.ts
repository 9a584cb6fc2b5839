import type { Address } from './customer';

/** A place that a customer is delivered to. */
export interface Site {
  readonly id: string;
  readonly rowVersion: number;
  readonly customerId: string;
  readonly name: string;
  readonly address: Address;
  readonly postcode: string;
  readonly contactName: string | null;
  readonly phone: string | null;
  /** How the driver gets in. */
  readonly accessNotes: string | null;
  readonly active: boolean;
}
