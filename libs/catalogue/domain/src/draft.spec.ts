import { grams, ppm } from '@seamwright/shared/util';
import { aContent } from '../testing/src/a-version';
import { completeDraft, faultsOfDraft, type DraftContent } from './draft';

const pointers = (draft: DraftContent) => faultsOfDraft(draft).map(({ pointer }) => pointer);

describe('a draft', () => {
  it('of nothing names every field that must be said, in the order of writing, and nothing else', () => {
    const faults = faultsOfDraft({});
    expect(new Set(faults.map(({ code }) => code))).toEqual(new Set(['version-missing']));
    expect(pointers({}).slice(0, 3)).toEqual(['/name', '/sourceNodeId', '/cuttingLines']);
    expect(pointers({})).toHaveLength(23);
    expect(pointers({})).not.toContain('/summary');
  });

  it('that says everything is a version', () => {
    const complete = completeDraft(aContent());
    expect(complete).toEqual({ ok: true, value: aContent() });
  });

  it('is filled where a field may be left open', () => {
    const { summary: _s, allergens: _a, ageing: _g, ...said } = aContent();
    expect(completeDraft(said)).toMatchObject({ ok: true, value: { summary: '', allergens: [], ageing: null } });
  });

  it('tells what is wrong while other fields are still missing', () => {
    const wrong: DraftContent = {
      fatCoverMm: -1,
      pieceNominalGrams: grams(280),
      pieceMinGrams: grams(300),
      storageMaxC: 4,
      minLifeAtDeliveryDays: 20,
      cookingLossPpm: ppm(1_000_000),
      piecesPerPack: 0,
      steps: [{ text: ' ' }],
      stations: [{ station: 'boning', setUpSeconds: 0, secondsPerKg: -3, secondsPerPiece: 0 }],
      ageing: { kind: 'hung', minDays: 9, maxDays: 7 },
    };
    const told = faultsOfDraft(wrong).filter(({ code }) => code !== 'version-missing');
    expect(told.map(({ code, pointer }) => [pointer, code])).toEqual([
      ['/piecesPerPack', 'version-at-least'],
      ['/cookingLossPpm', 'version-at-most'],
      ['/stations/0', 'version-time-negative'],
      ['/ageing', 'version-ageing'],
      ['/fatCoverMm', 'version-fat-cover'],
      ['/steps/0', 'version-step-empty'],
      ['/pieceNominalGrams', 'version-weights-order'],
    ]);
  });

  it('is refused with yields that add up to more than what goes in', () => {
    const over = aContent({
      yieldPpm: ppm(900_000),
      otherOutputs: [{ name: 'Fat', kind: 'by-product', yieldPpm: 100_001, valueMinorPerKg: 0 }],
    });
    expect(completeDraft(over)).toMatchObject({
      ok: false,
      refusal: [{ code: 'version-yields-over-one', pointer: '/yieldPpm' }],
    });
  });
});
