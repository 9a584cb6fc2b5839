/** Numbers of this many digits carry a trade item's number with its check digit last. */
const GTIN = /^(?:\d{8}|\d{12,14})$/;

/**
 * Check digit of a GS1 key (GTIN, GLN, SSCC): from the right of the number without it, times 3, 1, 3, 1…; what the sum
 * lacks to the next ten. Source: GS1, manual check digit calculation. Throws RangeError unless given digits only.
 */
export function checkDigitMod10(digitsWithout: string): number {
  if (!/^\d+$/.test(digitsWithout)) {
    throw new RangeError(`A check digit needs a number of digits only, not ${digitsWithout}`);
  }
  const sum = [...digitsWithout]
    .reverse()
    .reduce((left, digit, index) => left + Number(digit) * (index % 2 === 0 ? 3 : 1), 0);
  return (10 - (sum % 10)) % 10;
}

/** Whether the text is a GTIN of 8, 12, 13 or 14 digits with the right check digit. */
export function isGtin(text: string): boolean {
  return GTIN.test(text) && checkDigitMod10(text.slice(0, -1)) === Number(text.slice(-1));
}

/**
 * GTIN-14 of a trade item whose weight varies: indicator 9, the item reference (company prefix and item number, twelve
 * digits) and the check digit. Throws RangeError unless given twelve digits.
 */
export function gtin14VariableMeasure(itemReference: string): string {
  if (!/^\d{12}$/.test(itemReference)) {
    throw new RangeError(`An item reference has twelve digits, not ${itemReference}`);
  }
  const withoutCheck = `9${itemReference}`;
  return `${withoutCheck}${checkDigitMod10(withoutCheck)}`;
}
