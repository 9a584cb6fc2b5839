/** The days on which a price is in force: from the first day, until before the last; null stands for no end. */
export interface Validity {
  readonly validFrom: string;
  readonly validUntil: string | null;
}

/** Whether the day lies inside. Days are YYYY-MM-DD, which sort as text. */
export function inForce({ validFrom, validUntil }: Validity, day: string): boolean {
  return validFrom <= day && (validUntil === null || day < validUntil);
}

/** Whether two share a day. */
export function overlap(one: Validity, other: Validity): boolean {
  return startsBeforeEnd(one, other) && startsBeforeEnd(other, one);
}

/** What is left of `validity` once the days of `taken` are cut out of it: none, one or two parts, in order of time. */
export function withoutDays(validity: Validity, taken: Validity): Validity[] {
  if (!overlap(validity, taken)) return [validity];
  const left: Validity[] = [];
  if (validity.validFrom < taken.validFrom) left.push({ validFrom: validity.validFrom, validUntil: taken.validFrom });
  if (taken.validUntil !== null && (validity.validUntil === null || taken.validUntil < validity.validUntil))
    left.push({ validFrom: taken.validUntil, validUntil: validity.validUntil });
  return left;
}

const startsBeforeEnd = (one: Validity, other: Validity): boolean =>
  other.validUntil === null || one.validFrom < other.validUntil;
