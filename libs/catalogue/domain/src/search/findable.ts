import type { BoneState, PackType } from '../cut-words';
import { resolveOffer, type ResolvedOffer } from '../resolve-offer';
import type { OfferedNumbers } from '../specification-version';
import { FAT_BANDS, fatBandOf, PORTION_BANDS, portionBandOf, type FatBand, type PortionBand } from './bands';

/** What a version is found by: as it is when nothing is chosen, and everything that one choice makes of it. */
export interface Findable {
  readonly usualChoiceKey: string;
  readonly usualPriceChangeMinorPerKg: number;
  readonly pieceGrams: number;
  readonly piecesPerCase: number;
  readonly boneStates: readonly BoneState[];
  readonly fatBands: readonly FatBand[];
  /** Nominal weights in grams, the lightest first. */
  readonly portions: readonly number[];
  readonly portionBands: readonly PortionBand[];
  readonly packTypes: readonly PackType[];
}

/** Works out what a version is found by. A value that can't stand beside the usual others counts for nothing. */
export function findable(version: OfferedNumbers): Findable {
  const offers = everyOffer(version);
  const [usual] = offers;
  if (!usual) throw new Error('The usual values of a version in force stand together');
  const portions = [...new Set(offers.map(({ piece }) => Number(piece.nominalGrams)))].sort((a, b) => a - b);
  const fats = new Set(offers.map(({ fatCoverMm }) => fatBandOf(fatCoverMm)));
  const bands = new Set(portions.map(portionBandOf));
  return {
    usualChoiceKey: usual.choiceKey,
    usualPriceChangeMinorPerKg: usual.priceChangeMinorPerKg,
    pieceGrams: usual.piece.nominalGrams,
    piecesPerCase: usual.piecesPerCase,
    boneStates: [...new Set(offers.map(({ boneState }) => boneState))].sort(),
    fatBands: FAT_BANDS.filter((band) => fats.has(band)),
    portions,
    portionBands: PORTION_BANDS.filter((band) => bands.has(band)),
    packTypes: [...new Set(offers.map(({ packType }) => packType))].sort(),
  };
}

/** The usual offer first, then those that differ from it in one choice. */
function everyOffer(version: OfferedNumbers): ResolvedOffer[] {
  const single = version.choices.flatMap(({ key, values }) => values.map(({ value }) => ({ [key]: value })));
  return [{}, ...single].flatMap((chosen) => {
    const offer = resolveOffer(version, chosen);
    return offer.ok ? [offer.value] : [];
  });
}
