// The secrets of a demo: random, made once, readable by their owner alone.
import { randomBytes } from 'node:crypto';
import { readFileSync, renameSync, writeFileSync } from 'node:fs';

const makers = {
  jwtSecret: () => randomBytes(32).toString('hex'),
  stripeKey: () => `sk_test_${randomBytes(16).toString('hex')}`,
  stripeWebhookSecret: () => `whsec_${randomBytes(24).toString('hex')}`,
};

/**
 * The secrets in a file; missing ones are made and kept.
 * @param {string} path
 * @returns {Record<keyof typeof makers, string>}
 */
export function ensureSecrets(path) {
  const kept = readKept(path);
  const missing = Object.keys(makers).filter((name) => typeof kept[name] !== 'string');
  if (missing.length === 0) return kept;
  const secrets = { ...kept, ...Object.fromEntries(missing.map((name) => [name, makers[name]()])) };
  writeFileSync(`${path}.new`, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  renameSync(`${path}.new`, path);
  return secrets;
}

function readKept(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return {};
  }
}
