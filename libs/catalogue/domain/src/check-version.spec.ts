import { grams, ppm } from '@seamwright/shared/util';
import { aChoice, aContent, aValue } from '@seamwright/catalogue/domain/testing';
import { faultsOfVersion } from './check-version';
import type { VersionContent } from './specification-version';

const faults = (stated: Partial<VersionContent>) =>
  faultsOfVersion(aContent(stated)).map(({ code, pointer }) => `${code} at ${pointer}`);
const trim = aChoice('trim', [aValue('6'), aValue('3')]);

describe('the check of what an author wrote', () => {
  it('finds nothing wrong with a sound version', () => {
    expect(faults({ choices: [trim] })).toEqual([]);
  });

  it.each<[string, Partial<VersionContent>]>([
    ['version-fat-cover at /fatCoverMm', { fatCoverMm: -1 }],
    ['version-fat-cover at /fatCoverMm', { fatCoverMm: 61 }],
    ['version-at-least at /heightMm', { heightMm: 0 }],
    ['version-weights-order at /pieceNominalGrams', { pieceMinGrams: grams(281) }],
    ['version-weights-order at /pieceNominalGrams', { pieceMaxGrams: grams(279) }],
    ['version-life at /minLifeAtDeliveryDays', { minLifeAtDeliveryDays: 22 }],
    ['version-storage at /storageMinC', { storageMinC: 5 }],
    ['version-step-empty at /steps/1', { steps: [{ text: 'Cut.' }, { text: '  ' }] }],
    ['version-gtin at /gtin', { gtin: '99520000001010' }],
    ['version-choice-form at /choices/0', { choices: [aChoice('Trim=level', [aValue('6')])] }],
    ['version-choice-twice at /choices/0', { choices: [aChoice('trim', [aValue('6'), aValue('6')])] }],
    ['version-default-unknown at /choices/0', { choices: [{ ...trim, defaultValue: '9' }] }],
  ])('finds %s', (fault, stated) => {
    expect(faults(stated)).toContain(fault);
  });

  it('lets the outputs of a cut add up to the whole primal and no further', () => {
    const bone = { name: 'Bone', kind: 'by-product', valueMinorPerKg: -8 } as const;
    const of = (yieldPpm: number) => ({ yieldPpm: ppm(800_000), otherOutputs: [{ ...bone, yieldPpm }] });
    expect(faults(of(200_000))).toEqual([]);
    expect(faults(of(200_001))).toEqual(['version-yields-over-one at /yieldPpm']);
  });

  it('finds a portion whose own weights are out of order', () => {
    const portion = aChoice('portion', [aValue('280'), aValue('170', { changes: { pieceNominalGrams: 170 } })]);
    expect(faults({ choices: [portion] })).toEqual(['version-weights-order at /choices/0/values/1/changes']);
  });

  it('finds rules about what is not offered, and usual values that exclude each other', () => {
    const rule = (trimValue: string) => ({
      when: { trim: trimValue },
      forbids: { choice: 'pack', value: '2' },
      reason: 'no',
    });
    const pack = aChoice('pack', [aValue('2'), aValue('1')]);
    expect(faults({ choices: [trim, pack], choiceRules: [rule('12')] })).toEqual([
      'version-rule-unknown at /choiceRules/0',
    ]);
    expect(faults({ choices: [trim, pack], choiceRules: [rule('6')] })).toEqual([
      'version-defaults-impossible at /choices',
    ]);
  });
});
