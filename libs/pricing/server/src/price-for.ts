import type { ResolvedOffer } from '@seamwright/catalogue/domain';
import { resolvePrice, type PriceAnswer } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate, Quantity, Result } from '@seamwright/shared/util';
import { candidatesFor } from './price-candidates.repository';

export interface PriceRequest {
  readonly specificationId: string;
  readonly resolved: Pick<ResolvedOffer, 'choiceKey' | 'priceChangeMinorPerKg' | 'piece' | 'piecesPerCase'>;
  readonly quantity: Quantity;
  readonly deliveryDay: PlantDate;
}

/** The customer's price of each request, in the order asked. One query for all of them. */
export async function priceFor(
  tx: Tx,
  customerId: string,
  requests: readonly PriceRequest[],
): Promise<Result<PriceAnswer>[]> {
  const [firstDay] = requests.map(({ deliveryDay }) => deliveryDay).sort();
  if (firstDay === undefined) return [];
  const specificationIds = [...new Set(requests.map(({ specificationId }) => specificationId))];
  const candidates = await candidatesFor(tx, { customerId, specificationIds, firstDay });
  return requests.map(({ specificationId, resolved, quantity, deliveryDay }) =>
    resolvePrice({
      candidates: candidates.get(specificationId) ?? [],
      deliveryDay,
      choiceKey: resolved.choiceKey,
      quantity,
      priceChangeMinorPerKg: resolved.priceChangeMinorPerKg,
      piece: { nominalGrams: resolved.piece.nominalGrams, piecesPerCase: resolved.piecesPerCase },
    }),
  );
}
