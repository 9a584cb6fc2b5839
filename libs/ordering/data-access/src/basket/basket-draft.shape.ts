import * as z from 'zod';

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
