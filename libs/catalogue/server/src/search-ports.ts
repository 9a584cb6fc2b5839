import type { Findable } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

/** What the search asks of stock. */
export interface StockPort {
  /** The nodes of the cut tree of which there are released grams that may be used on that day. */
  nodesInStock(tx: Tx, day: PlantDate): Promise<readonly string[]>;
}

/** A specification as it is offered when nothing is chosen: what its price depends on. */
export interface UsualOffer extends Pick<
  Findable,
  'usualChoiceKey' | 'usualPriceChangeMinorPerKg' | 'pieceGrams' | 'piecesPerCase'
> {
  readonly specificationId: string;
}

/** What the search asks of pricing. */
export interface PricePort {
  /** A customer's prices for one piece by specification, in minor units per kg; what is on request is missing. */
  pricesPerKg(
    tx: Tx,
    customerId: string,
    day: PlantDate,
    offers: readonly UsualOffer[],
  ): Promise<ReadonlyMap<string, number>>;
}
