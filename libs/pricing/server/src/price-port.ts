import type { PricePort } from '@seamwright/catalogue/server';
import { pricePerKg, resolvePrice } from '@seamwright/pricing/domain';
import { quantity, unwrap } from '@seamwright/shared/util';
import { candidatesFor } from './price-candidates.repository';

const ONE_PIECE = unwrap(quantity({ unit: 'piece', count: 1 }));

/** What the catalogue asks of pricing: the price of one piece, resolved as for an order, in one query for all. */
export const pricePort: PricePort = {
  async pricesPerKg(tx, customerId, day, offers) {
    const specificationIds = offers.map(({ specificationId }) => specificationId);
    const candidates = await candidatesFor(tx, { customerId, specificationIds, firstDay: day });
    const prices = new Map<string, number>();
    for (const offer of offers) {
      const piece = { nominalGrams: offer.pieceGrams, piecesPerCase: offer.piecesPerCase };
      const price = resolvePrice({
        candidates: candidates.get(offer.specificationId) ?? [],
        deliveryDay: day,
        choiceKey: offer.usualChoiceKey,
        quantity: ONE_PIECE,
        priceChangeMinorPerKg: offer.usualPriceChangeMinorPerKg,
        piece,
      });
      if (price.ok) prices.set(offer.specificationId, pricePerKg(price.value.basis, price.value.priceMinor, piece));
    }
    return prices;
  },
};
