import {
  drawnNumbers,
  faultsOfVersion,
  impliedDifferencePercent,
  resolveChoices,
  type SpecificationVersion,
} from '@seamwright/catalogue/domain';
import { aVersion } from '@seamwright/catalogue/domain/testing';
import { unwrap } from '@seamwright/shared/util';
import { CUT_TREE } from './cut-tree';
import type { SpecificationData } from './specification-data';
import { SPECIFICATIONS } from './specifications';

const versionOf = ({ cut: _cut, source: _source, ...content }: SpecificationData): SpecificationVersion =>
  aVersion(content);

describe('the demo catalogue', () => {
  it('has nine lamb, nine beef and six pork specifications, each with a code of its own', () => {
    const prefixes = SPECIFICATIONS.map(({ code }) => code.slice(0, 2));
    expect(['LM', 'BF', 'PK'].map((prefix) => prefixes.filter((each) => each === prefix).length)).toEqual([9, 9, 6]);
    expect(new Set(SPECIFICATIONS.map(({ code }) => code)).size).toBe(24);
    expect(new Set(SPECIFICATIONS.map(({ gtin }) => gtin)).size).toBe(24);
  });

  it('names parents before their children, once each', () => {
    const keys = CUT_TREE.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    for (const { key, parent } of CUT_TREE) {
      if (parent !== null) expect(keys.indexOf(parent)).toBeLessThan(keys.indexOf(key));
    }
  });

  describe.each(SPECIFICATIONS.map((data) => [data.code, data] as const))('%s', (_, data) => {
    const version = versionOf(data);

    it('stands in the tree under the primal it is cut from', () => {
      expect(CUT_TREE.find(({ key }) => key === data.cut)?.parent).toBe(data.source);
      expect(CUT_TREE.find(({ key }) => key === data.source)?.level).toBe('primal');
    });

    it('has no fault', () => {
      expect(faultsOfVersion({ ...data, sourceNodeId: 'any' })).toEqual([]);
      expect(data.removed.length).toBeGreaterThan(0);
      expect(data.steps.some(({ caution }) => caution)).toBe(true);
    });

    it('takes its own usual choices and agrees with them', () => {
      const { piece, fatCoverMm, dims, finish, boneState, piecesPerPack } = unwrap(resolveChoices(version, {}));
      expect(piece).toEqual({
        nominalGrams: data.pieceNominalGrams,
        minGrams: data.pieceMinGrams,
        maxGrams: data.pieceMaxGrams,
      });
      expect({ fatCoverMm, finish, boneState, piecesPerPack, ...dims }).toEqual({
        fatCoverMm: data.fatCoverMm,
        finish: data.finish,
        boneState: data.boneState,
        piecesPerPack: data.piecesPerPack,
        lengthMm: data.lengthMm,
        widthMm: data.widthMm,
        heightMm: data.heightMm,
      });
    });

    it('implies about the weight that it states, whatever portion is chosen', () => {
      const sizes = version.choices.find(({ key }) => key === 'portion')?.values.map(({ value }) => value) ?? [];
      for (const chosen of [{}, ...sizes.map((portion) => ({ portion }))]) {
        const off = impliedDifferencePercent(drawnNumbers(unwrap(resolveChoices(version, chosen))));
        expect(Math.abs(off ?? 0)).toBeLessThanOrEqual(25);
      }
    });
  });
});
