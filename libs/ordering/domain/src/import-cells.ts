import { ok, parseKg, quantity, refuse, type Quantity, type Result } from '@seamwright/shared/util';
import { WHEN_SHORT, type WhenShort } from './when-short';

const UNITS: Readonly<Record<string, Quantity['unit']>> = {
  piece: 'piece',
  pieces: 'piece',
  case: 'case',
  cases: 'case',
  kg: 'kg',
};

/** "trim=6; portion=280" → `{trim: '6', portion: '280'}`; an empty text leaves all as they are. Refuses `choices-unreadable` (part). */
export function parseChoices(text: string): Result<Readonly<Record<string, string>>> {
  const chosen: Record<string, string> = {};
  for (const part of text.split(';').map((each) => each.trim())) {
    if (part === '') continue;
    const [, key, value] = /^([A-Za-z][\w-]{0,39})\s*=\s*(\S(?:.{0,58}\S)?)$/.exec(part) ?? [];
    if (!key || !value || Object.hasOwn(chosen, key)) return refuse('choices-unreadable', { part: part.slice(0, 60) });
    chosen[key] = value;
  }
  return ok(chosen);
}

/** The unit a cell names: piece(s), case(s) or kg. Refuses `unit-unknown` (text). */
export function parseUnit(text: string): Result<Quantity['unit']> {
  const unit = UNITS[text.toLowerCase()];
  return unit ? ok(unit) : refuse('unit-unknown', { text: text.slice(0, 40) });
}

/** So many pieces or cases, or a weight in kilograms. Refuses `quantity-unreadable` (text), and as `quantity` does. */
export function parseQuantity(text: string, unit: Quantity['unit']): Result<Quantity> {
  if (unit === 'kg') {
    const weight = parseKg(text);
    if (weight.ok) return quantity({ unit, grams: weight.value });
    return weight.refusal.code === 'weight-negative'
      ? refuse('quantity-not-positive')
      : refuse('quantity-unreadable', { text: text.slice(0, 40) });
  }
  if (!/^[-\u2212]?\d{1,9}([.,]\d+)?$/.test(text)) return refuse('quantity-unreadable', { text: text.slice(0, 40) });
  return quantity({ unit, count: Number(text.replace('\u2212', '-').replace(',', '.')) });
}

/** What to do when a line falls short; an empty cell sends what there is. Refuses `when-short-unknown` (text). */
export function parseWhenShort(text: string): Result<WhenShort> {
  const wanted = text.toLowerCase().replaceAll(' ', '-');
  const found = WHEN_SHORT.find((each) => each === wanted);
  if (wanted === '') return ok('send-what-there-is');
  return found ? ok(found) : refuse('when-short-unknown', { text: text.slice(0, 40) });
}
