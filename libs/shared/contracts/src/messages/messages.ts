import type { MessageParams, MessageTable } from './message-table';
import { accountsMessages } from './accounts.messages';
import { catalogueMessages } from './catalogue.messages';
import { cuttingMessages } from './cutting.messages';
import { identityMessages } from './identity.messages';
import { orderingMessages } from './ordering.messages';
import { plantMessages } from './plant.messages';
import { pricingMessages } from './pricing.messages';
import { sharedMessages } from './shared.messages';
import { stockMessages } from './stock.messages';

/** The one catalogue of refusals in words, for screens, problem documents, mail and papers. */
const messages: MessageTable = {
  ...sharedMessages,
  ...identityMessages,
  ...catalogueMessages,
  ...cuttingMessages,
  ...pricingMessages,
  ...stockMessages,
  ...orderingMessages,
  ...plantMessages,
  ...accountsMessages,
};

/** The words for a refusal; a code without words is a fault of the program and is said as such. */
export function sayRefusal(refusal: { readonly code: string; readonly params: MessageParams }): string {
  const words = messages[refusal.code];
  return words ? words(refusal.params) : sharedMessages.unexpected();
}

export const hasWords = (code: string): boolean => code in messages;
