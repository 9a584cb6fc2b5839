/**
 * Payment reference that banks check on the way (ISO 11649): "RF", two check digits and 1 to 21 letters or digits.
 * `reference` is our own number without spaces or marks; small letters become capitals. Throws RangeError otherwise.
 */
export function creditorReference(reference: string): string {
  const own = reference.toUpperCase();
  if (!/^[0-9A-Z]{1,21}$/.test(own)) {
    throw new RangeError(`A creditor reference holds 1 to 21 letters or digits, not ${reference}`);
  }
  const check = 98 - mod97(`${own}RF00`);
  return `RF${String(check).padStart(2, '0')}${own}`;
}

/** Whether the text, printed with or without spaces, is an ISO 11649 reference with the right check digits. */
export function isCreditorReference(text: string): boolean {
  const compact = text.replaceAll(' ', '').toUpperCase();
  return /^RF\d{2}[0-9A-Z]{1,21}$/.test(compact) && mod97(compact.slice(4) + compact.slice(0, 4)) === 1;
}

/** The reference as it is printed: blocks of four with spaces between. */
export function formatCreditorReference(reference: string): string {
  return reference.replaceAll(' ', '').replace(/.{4}(?=.)/g, '$& ');
}

/** Remainder by 97 of the number that the text spells with A = 10 … Z = 35, taken sign by sign to stay exact. */
function mod97(text: string): number {
  return [...text].reduce((remainder, sign) => {
    const value = parseInt(sign, 36);
    return (remainder * (value > 9 ? 100 : 10) + value) % 97;
  }, 0);
}
