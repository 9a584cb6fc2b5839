import * as z from 'zod';
import { defineEndpoint, id, line, ownCustomer } from '@seamwright/shared/contracts';

const keepers = ownCustomer('buyer', 'buyer_owner', 'rep', 'admin');

/** A card that a customer keeps; its number is known to the processor only. */
export const cardWire = z.strictObject({
  id,
  brand: z.string(),
  last4: z.string(),
  /** "08/29" */
  expires: z.string(),
});
export type CardWire = z.infer<typeof cardWire>;

export const cardSettings = defineEndpoint({
  id: 'cards.settings',
  summary: 'How cards are entered: by the documented test methods, or on the form of the processor',
  method: 'GET',
  path: '/card-settings',
  access: keepers,
  response: z.strictObject({ mode: z.enum(['demo', 'live']), publishableKey: z.string().nullable() }),
});

export const listCards = defineEndpoint({
  id: 'cards.list',
  summary: 'The cards that a customer keeps, newest first',
  method: 'GET',
  path: '/cards',
  access: keepers,
  /** Staff say whose. */
  query: { customerId: id.optional() },
  response: z.strictObject({ items: z.array(cardWire) }),
});

export const addCard = defineEndpoint({
  id: 'cards.add',
  summary: 'Keeps a card, by the id of the method that the card form gave',
  method: 'POST',
  path: '/cards',
  access: ownCustomer('buyer', 'buyer_owner'),
  body: z.strictObject({ methodId: line(200).regex(/^pm_\w+$/) }),
  response: cardWire,
  status: 201,
  idempotent: true,
});

export const removeCard = defineEndpoint({
  id: 'cards.remove',
  summary: 'Forgets a card; what is held on it stays held',
  method: 'DELETE',
  path: '/cards/:cardId',
  access: ownCustomer('buyer', 'buyer_owner'),
  params: { cardId: id },
});
