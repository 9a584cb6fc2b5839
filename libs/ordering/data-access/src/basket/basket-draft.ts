import { choiceKey } from '@seamwright/catalogue/domain/choice-key';
import type { BasketDraft, BasketLine } from './basket-draft.shape';

export type { BasketDetails, BasketDraft, BasketLine } from './basket-draft.shape';

export const emptyDraft = (key: string): BasketDraft => ({
  key,
  lines: [],
  siteId: null,
  deliveryDay: null,
  settlement: 'account',
  cardId: null,
  customerReference: '',
  note: '',
});

/** Puts a line into the basket; the same thing in the same unit is added to what is there. */
export function withLine(lines: readonly BasketLine[], added: BasketLine): BasketLine[] {
  const same = lines.find(
    (line) =>
      line.specificationId === added.specificationId &&
      choiceKey(line.chosen) === choiceKey(added.chosen) &&
      line.quantity.unit === added.quantity.unit &&
      line.note === added.note,
  );
  if (!same) return [...lines, added];
  return lines.map((line) => (line === same ? { ...line, quantity: sum(line.quantity, added.quantity) } : line));
}

function sum(one: BasketLine['quantity'], other: BasketLine['quantity']): BasketLine['quantity'] {
  if (one.unit === 'kg' && other.unit === 'kg')
    return { unit: 'kg', grams: one.grams + other.grams, notLess: one.notLess || other.notLess };
  if (one.unit !== 'kg' && other.unit !== 'kg') return { unit: one.unit, count: one.count + other.count };
  return one;
}
