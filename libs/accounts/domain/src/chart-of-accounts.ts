/** The accounts of the book. Receivables carry the customer and the invoice. */
export const ACCOUNTS = [
  'receivables',
  'sales',
  'tax',
  'card-clearing',
  'card-fees',
  'card-adjustments',
  'cash-in-transit',
  'bank',
  'bank-differences',
] as const;
export type Account = (typeof ACCOUNTS)[number];
