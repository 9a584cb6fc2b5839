/** A whole number of smallest units with its point, no zeros kept behind it: (125, 1) → "12.5", (120, 1) → "12". */
export function withPoint(units: number, decimals: number): string {
  const digits = String(units).padStart(decimals + 1, '0');
  const whole = digits.slice(0, digits.length - decimals);
  const rest = digits.slice(digits.length - decimals).replace(/0+$/, '');
  return rest === '' ? whole : `${whole}.${rest}`;
}

/** Reads "12.5" or "12,5" as whole smallest units; null when it is not such a number or has more decimals. */
export function readUnits(text: string, decimals: number): number | null {
  const match = /^(\d{1,9})(?:[.,](\d*))?$/.exec(text.trim());
  const rest = match?.[2] ?? '';
  return match === null || rest.length > decimals ? null : Number(`${match[1]}${rest.padEnd(decimals, '0')}`);
}
