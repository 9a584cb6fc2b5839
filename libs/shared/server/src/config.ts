import * as z from 'zod';

const port = z.coerce.number().int().min(0).max(65535);

/** Every setting, read once from the environment at start; the README lists them. */
const settings = z.object({
  SEAMWRIGHT_MODE: z.enum(['production', 'demo', 'test']).default('production'),
  HOST: z.string().default('127.0.0.1'),
  PORT: port.default(4300),
  PUBLIC_ORIGIN: z.url().default('http://127.0.0.1:4300'),
  APP_DATABASE_URL: z.string().min(1),
  WORKER_DATABASE_URL: z.string().min(1),
  JWT_SECRET: z.string().min(32),
  JWT_PREVIOUS_SECRET: z.string().min(32).optional(),
  STRIPE_SECRET_KEY: z.string().min(1),
  STRIPE_WEBHOOK_SECRET: z.string().min(1),
  STRIPE_WEBHOOK_PREVIOUS_SECRET: z.string().min(1).optional(),
  STRIPE_PUBLISHABLE_KEY: z.string().optional(),
  STRIPE_HOST: z.string().optional(),
  STRIPE_PORT: port.optional(),
  STRIPE_PROTOCOL: z.enum(['http', 'https']).default('https'),
  /** The processor's tariff, to check its fees by. */
  CARD_FEE_PPM: z.coerce.number().int().nonnegative().optional(),
  CARD_FEE_FIXED_MINOR: z.coerce.number().int().nonnegative().default(0),
  /** Who writes the invoices; lines of an address are parted by a bar. */
  SELLER_NAME: z.string().min(1),
  SELLER_ADDRESS: z.string().min(1),
  SELLER_VAT_NUMBER: z.string().default(''),
  SELLER_BANK_DETAILS: z.string().min(1),
  SMTP_URL: z.string().min(1),
  MAIL_FROM: z.string().default('Seamwright <desk@seamwright.example>'),
  PLANT_TIME_ZONE: z.string().default('Europe/London'),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
  STATIC_STOREFRONT: z.string().optional(),
  STATIC_ADMIN: z.string().optional(),
  REQUESTS_PER_MINUTE: z.coerce.number().int().positive().default(3000),
  ARGON2_MEMORY_KIB: z.coerce.number().int().min(8).default(19456),
});
export type Config = z.infer<typeof settings>;

/** Reads and checks the settings; throws one message that names every one that is missing or wrong. */
export function readConfig(environment: Readonly<Record<string, string | undefined>>): Config {
  const result = settings.safeParse(environment);
  if (result.success) return result.data;
  const faults = result.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`These settings are missing or wrong:\n${faults.join('\n')}`);
}
