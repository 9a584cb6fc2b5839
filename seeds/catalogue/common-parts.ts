import type { OtherOutput, StationTime, VersionContent } from '@seamwright/catalogue/domain';
import { gtin14VariableMeasure, grams, ppm } from '@seamwright/shared/util';

/** Chilled between 0 and 4 °C. Life is a demo value, in a real plant entered by a qualified person. */
export const chilled = (shelfLifeDays: number, minLifeAtDeliveryDays: number) =>
  ({
    temperatureState: 'chilled',
    storageMinC: 0,
    storageMaxC: 4,
    shelfLifeDays,
    minLifeAtDeliveryDays,
  }) as const;

/** Nothing in plain meat is a declared allergen; the house cuts no other food on the same tables. */
export const noAllergens = { allergens: [], mayContain: [] } as const;

/** GTIN-14 with indicator 9 for variable weight, on GS1's example prefix 952, from the code's number. */
export const gtinOf = (code: string): string => gtin14VariableMeasure(`952000000${code.slice(-3)}`);

/** Nominal weight with the least and the most that is in specification. */
export const pieceOf = (nominal: number, least: number, most: number) => ({
  pieceNominalGrams: grams(nominal),
  pieceMinGrams: grams(least),
  pieceMaxGrams: grams(most),
});

export const sizeOf = (lengthMm: number, widthMm: number, heightMm: number, toleranceMm: number) => ({
  lengthMm,
  widthMm,
  heightMm,
  toleranceMm,
});

/** With the packing field of the UNECE code, whose digit is from memory. */
export const vacuum = (piecesPerPack: number, packsPerCase: number, tareGrams: number) =>
  ({
    packType: 'vacuum',
    piecesPerPack,
    packsPerCase,
    tareGrams: grams(tareGrams),
    uneceFields: { packing: '5' },
  }) as const;

/** Per cent of the primal that becomes the cut; per cent lost in cooking, as commonly met. */
export const yields = (yieldPercent: number, cookingLossPercent: number) => ({
  yieldPpm: ppm(yieldPercent * 10_000),
  cookingLossPpm: ppm(cookingLossPercent * 10_000),
});

export const trimmings = (percent: number, visualLean: number, valueMinorPerKg: number): OtherOutput => ({
  name: `Trim ${visualLean}VL`,
  kind: 'co-product',
  yieldPpm: percent * 10_000,
  valueMinorPerKg,
  visualLean,
});
export const fat = (percent: number): OtherOutput => ({
  name: 'Fat',
  kind: 'by-product',
  yieldPpm: percent * 10_000,
  valueMinorPerKg: 12,
});
export const bone = (percent: number): OtherOutput => ({
  name: 'Bone',
  kind: 'by-product',
  yieldPpm: percent * 10_000,
  valueMinorPerKg: -8,
});

const at =
  (station: StationTime['station']) =>
  (setUpSeconds: number, secondsPerKg: number, secondsPerPiece: number): StationTime => ({
    station,
    setUpSeconds,
    secondsPerKg,
    secondsPerPiece,
  });
export const saw = at('band-saw');
export const boning = at('boning');
export const trimming = at('trimming');
export const portioning = at('portioning');
export const tying = at('tying');
export const packing = at('packing');

/** Nothing about a version is left open that these don't state. */
export const plainCut = {
  ageing: null,
  ribs: null,
  choiceRules: [],
  uneceFields: {},
  ...noAllergens,
} satisfies Partial<VersionContent>;
