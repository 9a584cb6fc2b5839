export const CUSTOMER_KINDS = [
  'restaurant',
  'hotel',
  'pub',
  'caterer',
  'butcher',
  'farm-shop',
  'school',
  'care-home',
] as const;
export type CustomerKind = (typeof CUSTOMER_KINDS)[number];

/** From when the days of the payment terms are counted. */
export const TERMS_FROM = ['invoice', 'end-of-week', 'end-of-month'] as const;
export type TermsFrom = (typeof TERMS_FROM)[number];

/** Several lines, as on an envelope. */
export type Address = string;

/** A business that buys. */
export interface Customer {
  readonly id: string;
  readonly rowVersion: number;
  /** Its number on papers. */
  readonly number: number;
  readonly name: string;
  readonly kind: CustomerKind;
  /** The head office that it belongs to and that is billed, if any. */
  readonly groupId: string | null;
  readonly invoiceEmail: string;
  readonly billingAddress: Address;
  readonly vatNumber: string | null;
  readonly termsDays: number;
  readonly termsFrom: TermsFrom;
  /** Whether it may still sign in and order. */
  readonly active: boolean;
}
