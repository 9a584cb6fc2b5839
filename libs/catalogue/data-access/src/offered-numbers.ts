import type { OfferedNumbers } from '@seamwright/catalogue/domain';
import { grams } from '@seamwright/shared/util';

type OnTheWire = {
  readonly [Name in keyof OfferedNumbers]: Name extends `piece${string}Grams` ? number : OfferedNumbers[Name];
};

/** What came over the wire, as the domain's functions take it. */
export function offeredNumbers<Wire extends OnTheWire>(wire: Wire): Wire & OfferedNumbers {
  return {
    ...wire,
    pieceNominalGrams: grams(wire.pieceNominalGrams),
    pieceMinGrams: grams(wire.pieceMinGrams),
    pieceMaxGrams: grams(wire.pieceMaxGrams),
  };
}
