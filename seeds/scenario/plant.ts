/**
 * The invented scenario of the demo. Withenbeck, its firms and its people do not exist; `.example` addresses can't
 * either (RFC 2606).
 */
export const PLANT = {
  name: 'Withenbeck Meats',
  address: 'Lower Tannery, Withenbeck, WB1 4MW',
  timeZone: 'Europe/London',
} as const;

/** The same for every demo sign-in; the loader refuses to run in production. */
export const DEMO_PASSWORD = 'cut along the seam';

export const staffEmail = (name: string): string => `${name}@withenbeck.example`;
