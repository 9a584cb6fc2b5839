import * as z from 'zod';
import { defaultFees, type FeeSchedule } from './fees';
import { defaultTiming, type Timing } from './processor';

const whole = (fallback: number, most: number) => z.coerce.number().int().min(0).max(most).default(fallback);

const environment = z
  .object({
    STRIPE_MOCK_PORT: whole(12111, 65_535),
    STRIPE_MOCK_KEY: z.string().min(8).default('sk_test_seamwright'),
    STRIPE_MOCK_WEBHOOK_URL: z.url({ protocol: /^https?$/ }).optional(),
    STRIPE_MOCK_WEBHOOK_SECRET: z.string().min(8).optional(),
    STRIPE_MOCK_SNAPSHOT: z.string().min(1).optional(),
    STRIPE_MOCK_FEE_RATE_PPM: whole(defaultFees.ratePpm, 1_000_000),
    STRIPE_MOCK_FEE_FIXED_MINOR: whole(defaultFees.fixedMinor, 100_000),
    STRIPE_MOCK_AVAILABLE_AFTER_DAYS: whole(defaultTiming.availableAfterDays, 30),
    STRIPE_MOCK_PAYOUT_ARRIVES_AFTER_DAYS: whole(defaultTiming.payoutArrivesAfterDays, 30),
  })
  .refine((env) => (env.STRIPE_MOCK_WEBHOOK_URL === undefined) === (env.STRIPE_MOCK_WEBHOOK_SECRET === undefined), {
    message: 'STRIPE_MOCK_WEBHOOK_URL and STRIPE_MOCK_WEBHOOK_SECRET go together',
  });

/** How the stand-in is set up when it runs by itself. */
export interface Settings {
  port: number;
  key: string;
  webhook: { url: string; secret: string } | undefined;
  snapshotFile: string | undefined;
  fees: FeeSchedule;
  timing: Timing;
}

/** Reads the settings from the environment; empty values count as not set. @throws Error that names what is wrong */
export function readSettings(env: Record<string, string | undefined>): Settings {
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== undefined && value !== ''));
  const read = environment.safeParse(given);
  if (!read.success) {
    const problems = read.error.issues.map(({ path, message }) => `  ${path.join('.')} ${message}`.trimEnd());
    throw new Error(`The settings of the card processor's stand-in are wrong:\n${problems.join('\n')}`);
  }
  const { STRIPE_MOCK_WEBHOOK_URL: url, STRIPE_MOCK_WEBHOOK_SECRET: secret, ...rest } = read.data;
  return {
    port: rest.STRIPE_MOCK_PORT,
    key: rest.STRIPE_MOCK_KEY,
    webhook: url !== undefined && secret !== undefined ? { url, secret } : undefined,
    snapshotFile: rest.STRIPE_MOCK_SNAPSHOT,
    fees: { ratePpm: rest.STRIPE_MOCK_FEE_RATE_PPM, fixedMinor: rest.STRIPE_MOCK_FEE_FIXED_MINOR },
    timing: {
      availableAfterDays: rest.STRIPE_MOCK_AVAILABLE_AFTER_DAYS,
      payoutArrivesAfterDays: rest.STRIPE_MOCK_PAYOUT_ARRIVES_AFTER_DAYS,
    },
  };
}
