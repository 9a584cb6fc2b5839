/** Currencies without a smaller unit, of those the processor takes. Source: ISO 4217. */
const withoutMinorUnit = new Set(['clp', 'isk', 'jpy', 'krw', 'pyg', 'ugx', 'vnd', 'xaf', 'xof', 'xpf']);

/** `123456, 'gbp'` → `1,234.56 GBP`; whole arithmetic only. */
export function minorUnits(amount: number, currency: string): string {
  const places = withoutMinorUnit.has(currency) ? 0 : 2;
  const digits = String(Math.abs(amount)).padStart(places + 1, '0');
  const whole = digits.slice(0, digits.length - places).replace(/\B(?=(\d{3})+$)/g, ',');
  const rest = places === 0 ? '' : `.${digits.slice(-places)}`;
  return `${amount < 0 ? '−' : ''}${whole}${rest} ${currency.toUpperCase()}`;
}
