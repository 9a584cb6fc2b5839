import fc from 'fast-check';
import { grams, plantDate, unwrap } from '@seamwright/shared/util';
import { cuttingLoss, faultsOfTest, type CuttingTestContent, type TestSubject } from './cutting-test';

const TODAY = unwrap(plantDate('2026-12-01'));
const SUBJECT: TestSubject = {
  kind: 'cutting',
  outputs: [
    { key: 'square', name: 'Square-cut shoulder', kind: 'joint-product' },
    { key: 'bone', name: 'Bone', kind: 'by-product' },
  ],
};
const INPUT = { lotCode: '', supplier: '', grade: '', pieces: 4, grams: grams(12_000), addedGrams: grams(0) };

const test = (outputs: readonly [string, number][], stated: Partial<CuttingTestContent> = {}): CuttingTestContent => ({
  input: INPUT,
  outputs: outputs.map(([key, weight]) => ({ key, grams: grams(weight) })),
  testedOn: TODAY,
  note: '',
  ...stated,
});
const faults = (content: CuttingTestContent, subject = SUBJECT) =>
  faultsOfTest(content, subject, TODAY).map(({ code, pointer }) => `${code} ${pointer}`);

describe('a cutting test', () => {
  const right = test([
    ['square', 10_800],
    ['bone', 1_150],
  ]);

  it('reconciles to the gram: what went in is what came out and what was lost', () => {
    expect(faults(right)).toEqual([]);
    expect(cuttingLoss(right)).toEqual({ ok: true, value: 50 });
    fc.assert(
      fc.property(fc.nat(50_000), fc.nat(20_000), fc.nat(20_000), (input, a, b) => {
        const loss = cuttingLoss({
          input: { grams: grams(input), addedGrams: grams(0) },
          outputs: [
            { key: 'a', grams: grams(a) },
            { key: 'b', grams: grams(b) },
          ],
        });
        expect(loss.ok ? a + b + loss.value : null).toBe(input >= a + b ? input : null);
      }),
    );
  });

  it('is refused by the gram that came out too much', () => {
    const over = test([
      ['square', 10_800],
      ['bone', 1_201],
    ]);
    expect(faultsOfTest(over, SUBJECT, TODAY)).toEqual([
      { code: 'test-outputs-over-input', params: { over: 1 }, pointer: '/outputs' },
    ]);
  });

  it('may weigh more than its input by what a recipe really added, and only a recipe adds', () => {
    const added = test([['square', 13_000]], { input: { ...INPUT, addedGrams: grams(1_100) } });
    const recipe: TestSubject = { kind: 'recipe', outputs: SUBJECT.outputs.slice(0, 1) };
    expect(faults(added, recipe)).toEqual([]);
    expect(cuttingLoss(added)).toEqual({ ok: true, value: 100 });
    expect(faults(added, { ...recipe, kind: 'cutting' })).toEqual(['test-only-recipes-add /input/addedGrams']);
  });

  it('weighs every output of its subject once, at nothing where nothing came out', () => {
    expect(
      faults(
        test([
          ['square', 11_000],
          ['bone', 0],
        ]),
      ),
    ).toEqual([]);
    expect(faults(test([['square', 11_000]]))).toEqual(['test-output-missing /outputs']);
    expect(
      faults(
        test([
          ['square', 1_000],
          ['square', 1_000],
          ['bone', -1],
          ['fin', 1],
        ]),
      ),
    ).toEqual([
      'test-output-twice /outputs/1/key',
      'test-output-weight /outputs/2/grams',
      'test-output-unknown /outputs/3/key',
    ]);
    expect(
      faults(
        test([
          ['square', 0],
          ['bone', 0],
        ]),
      ),
    ).toEqual(['test-nothing-came-out /outputs']);
  });

  it('names what is wrong with its input and its day', () => {
    const nothing = { ...INPUT, pieces: 0, grams: grams(0), addedGrams: grams(-1) };
    const wrong = test(
      [
        ['square', 0],
        ['bone', 0],
      ],
      { input: nothing, testedOn: unwrap(plantDate('2026-12-02')) },
    );
    expect(faults(wrong)).toEqual([
      'test-input-weight /input/grams',
      'test-pieces /input/pieces',
      'test-added-weight /input/addedGrams',
      'test-in-the-future /testedOn',
      'test-nothing-came-out /outputs',
      'test-outputs-over-input /outputs',
    ]);
  });
});
