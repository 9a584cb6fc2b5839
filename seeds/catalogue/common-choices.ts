import type { Choice, ChoiceRule, ChoiceValue, Finish } from '@seamwright/catalogue/domain';

/** A value that changes nothing but what is stated. */
function value(name: string, label: string, stated: Partial<ChoiceValue> = {}): ChoiceValue {
  return {
    value: name,
    label,
    priceChangeMinorPerKg: 0,
    leadDays: 0,
    yieldFactorPpm: 1_000_000,
    extraSecondsPerKg: 0,
    extraSecondsPerPiece: 0,
    ...stated,
  };
}

interface TrimLevel {
  readonly mm: number;
  /** Minor units per kg against the usual trim. */
  readonly price: number;
  /** Against the usual trim, over 1,000,000. */
  readonly yieldFactor: number;
  readonly secondsPerKg: number;
}

/** How much fat is left on, in millimetres. */
export function trimChoice(usualMm: number, levels: readonly TrimLevel[]): Choice {
  return {
    key: 'trim',
    label: 'Trim level',
    unit: 'mm fat',
    defaultValue: `${usualMm}`,
    values: levels.map(({ mm, price, yieldFactor, secondsPerKg }) =>
      value(`${mm}`, `${mm}`, {
        priceChangeMinorPerKg: price,
        yieldFactorPpm: yieldFactor,
        extraSecondsPerKg: secondsPerKg,
        station: 'trimming',
        changes: { fatCoverMm: mm },
      }),
    ),
  };
}

interface Portion {
  readonly grams: number;
  /** A weight off by more than this many grams is out of specification. */
  readonly within: number;
  readonly thicknessMm: number;
  readonly price?: number;
  readonly secondsPerPiece?: number;
}

/** What one portion weighs; a heavier one is cut thicker. */
export function portionChoice(usualGrams: number, portions: readonly Portion[]): Choice {
  return {
    key: 'portion',
    label: 'Portion',
    unit: 'g',
    defaultValue: `${usualGrams}`,
    values: portions.map(({ grams, within, thicknessMm, price = 0, secondsPerPiece = 0 }) =>
      value(`${grams}`, `${grams}`, {
        priceChangeMinorPerKg: price,
        extraSecondsPerPiece: secondsPerPiece,
        station: 'portioning',
        changes: {
          pieceNominalGrams: grams,
          pieceMinGrams: grams - within,
          pieceMaxGrams: grams + within,
          heightMm: thicknessMm,
        },
      }),
    ),
  };
}

interface JointSize {
  readonly grams: number;
  readonly within: number;
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

/** What one joint weighs, with the size that goes with it. */
export function portionJoint(usualGrams: number, sizes: readonly JointSize[]): Choice {
  return {
    key: 'portion',
    label: 'Joint weight',
    unit: 'g',
    defaultValue: `${usualGrams}`,
    values: sizes.map(({ grams, within, ...size }) =>
      value(`${grams}`, `${grams}`, {
        changes: { pieceNominalGrams: grams, pieceMinGrams: grams - within, pieceMaxGrams: grams + within, ...size },
      }),
    ),
  };
}

/** The edge of a cube; smaller dice take longer. */
export const diceChoice = (usualMm: number, edges: readonly number[]): Choice =>
  sizeChoice({ key: 'dice', label: 'Dice', unit: 'mm dice' }, usualMm, edges);

/** The holes of the last plate that mince goes through; a finer plate takes longer. */
export const plateChoice = (usualMm: number, holes: readonly number[]): Choice =>
  sizeChoice({ key: 'plate', label: 'Plate', unit: 'mm plate' }, usualMm, holes);

function sizeChoice(named: Pick<Choice, 'key' | 'label' | 'unit'>, usualMm: number, sizes: readonly number[]): Choice {
  return {
    ...named,
    defaultValue: `${usualMm}`,
    values: sizes.map((mm) =>
      value(`${mm}`, `${mm}`, {
        priceChangeMinorPerKg: mm < usualMm ? 30 : 0,
        extraSecondsPerKg: mm < usualMm ? 15 : 0,
        station: 'portioning',
        changes: { lengthMm: mm, widthMm: mm, heightMm: mm },
      }),
    ),
  };
}

const FINISH_LABELS: Readonly<Record<Finish, string>> = {
  plain: 'plain',
  scored: 'scored',
  rolled: 'rolled',
  tied: 'tied',
  squared: 'squared',
  'french-trimmed': 'French-trimmed',
  diced: 'diced',
  minced: 'minced',
};

interface FinishOffer {
  readonly finish: Finish;
  readonly price?: number;
  readonly secondsPerPiece?: number;
  readonly yieldFactor?: number;
}

/** What is done after trimming; the first is usual. */
export function finishChoice(offers: readonly [FinishOffer, ...FinishOffer[]]): Choice {
  return {
    key: 'finish',
    label: 'Finish',
    defaultValue: offers[0].finish,
    values: offers.map(({ finish, price = 0, secondsPerPiece = 0, yieldFactor = 1_000_000 }) =>
      value(finish, FINISH_LABELS[finish], {
        priceChangeMinorPerKg: price,
        extraSecondsPerPiece: secondsPerPiece,
        yieldFactorPpm: yieldFactor,
        station: finish === 'tied' || finish === 'rolled' ? 'tying' : 'trimming',
        changes: { finish },
      }),
    ),
  };
}

/** Bone in or out of a joint that is usually boned. */
export function boneChoice(boneInPrice: number, boneInYieldFactor: number): Choice {
  return {
    key: 'bone',
    label: 'Bone',
    defaultValue: 'out',
    values: [
      value('out', 'boneless', { changes: { boneState: 'boneless' } }),
      value('in', 'bone-in', {
        priceChangeMinorPerKg: boneInPrice,
        yieldFactorPpm: boneInYieldFactor,
        extraSecondsPerKg: -40,
        station: 'boning',
        changes: { boneState: 'bone-in' },
      }),
    ],
  };
}

/** How many pieces share a pack; cases hold the same number of pieces. */
export function packChoice(usual: number, other: number, piecesPerCase: number, extraPrice: number): Choice {
  const offer = (pieces: number, price: number): ChoiceValue =>
    value(`${pieces}`, pieces === 1 ? '1 a pack' : `${pieces} a pack`, {
      priceChangeMinorPerKg: price,
      extraSecondsPerPiece: price > 0 ? 6 : 0,
      station: 'packing',
      changes: { piecesPerPack: pieces, packsPerCase: piecesPerCase / pieces },
    });
  return { key: 'pack', label: 'Pack', defaultValue: `${usual}`, values: [offer(usual, 0), offer(other, extraPrice)] };
}

/** A joint can be rolled only once its bone is out. */
export const ROLLED_IS_BONELESS: ChoiceRule = {
  when: { bone: 'in' },
  forbids: { choice: 'finish', value: 'rolled' },
  reason: 'a joint can be rolled only without its bone',
};

/** Nothing is left to tie in place when a thin steak has no fat. */
export const DENUDED_IS_NOT_TIED: ChoiceRule = {
  when: { trim: '0' },
  forbids: { choice: 'finish', value: 'tied' },
  reason: 'a denuded steak has no fat to hold with string',
};
