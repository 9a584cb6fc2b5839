import type { CuttingStep } from '@seamwright/catalogue/domain';
import { addDays, grams, multiplyPpm, ppm, type PlantDate } from '@seamwright/shared/util';
import type { CuttingTestContent } from '@seamwright/catalogue/domain';
import { Chance } from '../chance';
import { WEEKLY } from '../scenario/lots';

/** How many tests each subject has: every cutting scheme, and the first specification of each species. */
export const TESTS_EACH = 5;
export const TESTED_SPECIFICATIONS = ['LM-101', 'BF-201', 'PK-301'] as const;

/** The test whose scale stuck: it stands out, and nobody has looked at it yet. */
const STUCK = { code: 'CS-107', at: 3 };

/** Suppliers and the grades that they send; none of them exists. */
const SUPPLIERS: Readonly<Record<string, readonly (readonly [supplier: string, grade: string])[]>> = {
  lamb: [
    ['High Shieling Lamb', 'R3L'],
    ['High Shieling Lamb', 'U3L'],
    ['Cold Edge Hill Farms', 'R3H'],
  ],
  beef: [
    ['Garrow Cattle Company', 'R4L'],
    ['Garrow Cattle Company', 'U+3'],
    ['Marl Pit Beef', 'R4L'],
  ],
  pork: [
    ['Withy Lane Pigs', 'E'],
    ['Oxter Moor Pigs', 'U'],
  ],
};

/** What a carcase, and a primal that does not come in by itself, weighs. */
const PIECE_GRAMS: Readonly<Record<string, number>> = {
  lamb: 20_400,
  'lamb-breast': 4_260,
  beef: 158_000,
  'beef-short-loin': 15_700,
  'beef-round': 34_600,
  'beef-plate': 14_100,
  'beef-shin': 4_600,
  pork: 83_500,
};

const pieceGrams = (key: string): number =>
  PIECE_GRAMS[key] ?? WEEKLY.find(({ node }) => node === key)?.pieceGrams ?? 5_000;

/** Tests of one subject, `inputKey` being the key of the piece that goes in; the same on every machine. */
export function testsOf(
  step: CuttingStep,
  inputKey: string,
  { chance, before }: { readonly chance: Chance; readonly before: PlantDate },
): CuttingTestContent[] {
  const farms = SUPPLIERS[inputKey.split('-')[0] ?? ''] ?? [];
  return Array.from({ length: TESTS_EACH }, (_, at) => {
    const [supplier = '', grade = ''] = farms[at % farms.length] ?? [];
    const testedOn = addDays(before, -(7 + 11 * at + chance.whole(0, 6)));
    const pieces = chance.whole(2, 4);
    const input = pieces * pieceGrams(inputKey) + chance.whole(-300, 300);
    const isStuck = step.code === STUCK.code && at === STUCK.at;
    return {
      input: {
        lotCode: `${inputKey.toUpperCase().slice(0, 12)}-${testedOn.slice(5, 7)}${testedOn.slice(8, 10)}`,
        supplier,
        grade,
        pieces,
        grams: grams(input),
        addedGrams: grams(0),
      },
      outputs: weighed(step, input, chance, isStuck),
      testedOn,
      note: isStuck ? 'The scale stuck at the second tray.' : '',
    };
  });
}

/** Each output near its yield; the first takes what chance gave or took of the others, so that the loss stays small. */
function weighed({ outputs }: CuttingStep, input: number, chance: Chance, isStuck: boolean) {
  const [first, ...others] = outputs;
  const rest = others.map(({ key, yieldPpm }) => ({
    key,
    grams: multiplyPpm(
      multiplyPpm(input, ppm(yieldPpm), 'down'),
      ppm(1_000_000 + chance.whole(-45, 45) * 1_000),
      'down',
    ),
  }));
  const stated = outputs.reduce((sum, { yieldPpm }) => sum + yieldPpm, 0);
  const out = multiplyPpm(input, ppm(Math.min(stated + chance.whole(-2_000, 2_000), 999_000)), 'down');
  const left = out - rest.reduce((sum, each) => sum + each.grams, 0);
  const all = [{ key: first?.key ?? '', grams: isStuck ? multiplyPpm(left, ppm(700_000), 'down') : left }, ...rest];
  return all.map((each) => ({ key: each.key, grams: grams(each.grams) }));
}
