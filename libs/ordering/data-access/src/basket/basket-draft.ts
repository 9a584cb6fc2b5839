import * as z from 'zod';
import { choiceKey } from '@seamwright/catalogue/domain';

const quantity = z.discriminatedUnion('unit', [
  z.object({ unit: z.enum(['piece', 'case']), count: z.int().positive() }),
  z.object({ unit: z.literal('kg'), grams: z.int().positive(), notLess: z.boolean() }),
]);

const basketLine = z.object({
  id: z.string(),
  specificationId: z.string(),
  code: z.string(),
  name: z.string(),
  /** The choices in words. */
  summary: z.string(),
  chosen: z.record(z.string(), z.string()),
  quantity,
  whenShort: z.enum(['leave-off', 'send-what-there-is', 'ask-me']),
  note: z.string(),
});
/** A line that is going to be ordered. */
export type BasketLine = z.infer<typeof basketLine>;

/** A basket as it is kept on the device: its shape is checked when it is read back, since anybody may have written there. */
export const basketDraft = z.object({
  /** Sent with the order: the same basket sent again is the same deed. Any change makes it another one. */
  key: z.string().min(8),
  lines: z.array(basketLine),
  siteId: z.string().nullable(),
  deliveryDay: z.string().nullable(),
  settlement: z.enum(['card', 'account']),
  cardId: z.string().nullable(),
  customerReference: z.string(),
  note: z.string(),
});
export type BasketDraft = z.infer<typeof basketDraft>;

/** What is decided for the whole basket. */
export type BasketDetails = Omit<BasketDraft, 'key' | 'lines'>;

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
