import { grams, ppm } from '@seamwright/shared/util';
import fc from 'fast-check';
import { aChoice, aValue } from '../../testing/src/a-choice';
import { aContent } from '../../testing/src/a-version';
import type { MethodStep } from '../specification-version';
import { changedSteps } from './step-difference';
import { versionDifference } from './version-difference';

describe('the difference between two versions', () => {
  it('is nothing between a version and itself', () => {
    expect(versionDifference(aContent(), aContent())).toEqual({ changes: [], steps: [] });
  });

  it('names each number and word that changed', () => {
    const after = aContent({ fatCoverMm: 9, pieceMaxGrams: grams(300), yieldPpm: ppm(790_000), finish: 'tied' });
    expect(versionDifference(aContent(), after).changes).toEqual([
      { path: ['fatCoverMm'], before: 6, after: 9 },
      { path: ['finish'], before: 'plain', after: 'tied' },
      { path: ['pieceMaxGrams'], before: 294, after: 300 },
      { path: ['yieldPpm'], before: 784_000, after: 790_000 },
    ]);
  });

  it('tells what came and what went, whatever its place in a list', () => {
    const before = aContent({ allergens: ['celery', 'mustard'], removed: ['silverskin', 'gristle'] });
    const after = aContent({ allergens: ['sulphites', 'celery'], removed: ['gristle', 'silverskin'] });
    expect(versionDifference(before, after).changes).toEqual([
      { path: ['allergens', 'mustard'], before: true, after: undefined },
      { path: ['allergens', 'sulphites'], before: undefined, after: true },
    ]);
  });

  it('tells ageing that is new, part by part', () => {
    const after = aContent({ ageing: { kind: 'dry-aged', minDays: 28, maxDays: 42 } });
    expect(versionDifference(aContent(), after).changes).toEqual([
      { path: ['ageing', 'kind'], before: undefined, after: 'dry-aged' },
      { path: ['ageing', 'minDays'], before: undefined, after: 28 },
      { path: ['ageing', 'maxDays'], before: undefined, after: 42 },
    ]);
  });

  it('goes down to the single value of a choice, the work of a station and a by-product', () => {
    const choice = aChoice('trim', [aValue('6'), aValue('9')]);
    const before = aContent({
      choices: [choice],
      otherOutputs: [{ name: 'Fat', kind: 'by-product', yieldPpm: 90_000, valueMinorPerKg: -10 }],
    });
    const after = aContent({
      choices: [{ ...choice, values: choice.values.map((value) => ({ ...value, priceChangeMinorPerKg: 25 })) }],
      stations: [{ station: 'portioning', setUpSeconds: 300, secondsPerKg: 45, secondsPerPiece: 12 }],
      otherOutputs: [{ name: 'Fat', kind: 'by-product', yieldPpm: 90_000, valueMinorPerKg: -12 }],
    });
    expect(versionDifference(before, after).changes.map(({ path, after: now }) => [path.join('/'), now])).toEqual([
      ['stations/portioning/secondsPerKg', 45],
      ['choices/trim/values/6/priceChangeMinorPerKg', 25],
      ['choices/trim/values/9/priceChangeMinorPerKg', 25],
      ['otherOutputs/Fat/valueMinorPerKg', -12],
    ]);
  });
});

describe('changed steps', () => {
  const steps = (...texts: string[]): MethodStep[] => texts.map((text) => ({ text }));

  it('keep the rest where one is put in', () => {
    expect(changedSteps(steps('bone', 'trim', 'tie'), steps('chill', 'bone', 'trim', 'tie'))).toEqual([
      { kind: 'added', number: 1, step: { text: 'chill' } },
    ]);
  });

  it('tell a reworded step as one out and one in, and a new caution as a change', () => {
    expect(changedSteps(steps('bone', 'trim'), [{ text: 'bone', caution: 'Glove' }, { text: 'trim' }])).toEqual([
      { kind: 'removed', number: 1, step: { text: 'bone' } },
      { kind: 'added', number: 1, step: { text: 'bone', caution: 'Glove' } },
    ]);
  });

  it('lead from the old method to the new one, and name no step that both keep', () => {
    const methods = fc.array(fc.constantFrom('bone', 'trim', 'tie', 'score', 'roll'), { maxLength: 7 });
    fc.assert(
      fc.property(methods, methods, (was, is) => {
        const changes = changedSteps(steps(...was), steps(...is));
        const out = new Set(changes.filter(({ kind }) => kind === 'removed').map(({ number }) => number - 1));
        const put = new Set(changes.filter(({ kind }) => kind === 'added').map(({ number }) => number - 1));
        expect(was.filter((_, at) => !out.has(at))).toEqual(is.filter((_, at) => !put.has(at)));
        if (was.join() === is.join()) expect(changes).toEqual([]);
      }),
    );
  });
});
