import { aPackingLine } from '@seamwright/plant/data-access/testing';
import { nextLine, weighingOf } from './weighing';

const weigh = (over: object = {}) =>
  weighingOf({ line: aPackingLine(), pieces: 2, grossGrams: 578, tareGrams: 18, reason: null, ...over });

it('judges a pack by the limits of its pieces', () => {
  expect(weigh()).toEqual({
    netGrams: 560,
    limits: { minGrams: 532, maxGrams: 588 },
    nominalGrams: 560,
    verdict: 'within',
    offGrams: 0,
    ready: true,
  });
});

it('says by how much a pack is out of its limits, and is ready only with a reason', () => {
  expect(weigh({ grossGrams: 618 })).toMatchObject({ verdict: 'heavy', offGrams: 12, ready: false });
  expect(weigh({ grossGrams: 518 })).toMatchObject({ verdict: 'light', offGrams: 32, ready: false });
  expect(weigh({ grossGrams: 618, reason: 'Shape' })).toMatchObject({ verdict: 'heavy', ready: true });
});

it('waits while nothing is on the scale', () => {
  expect(weigh({ grossGrams: 18 })).toMatchObject({ netGrams: null, verdict: 'none', ready: false });
});

it('goes on with the first line that waits for pieces', () => {
  const [done, waits] = [
    aPackingLine({ id: 'a', packedPieces: 5, shortPieces: 1 }),
    aPackingLine({ id: 'b', packedPieces: 5 }),
  ];
  expect(nextLine([done, waits])?.id).toBe('b');
  expect(nextLine([done])?.id).toBe('a');
  expect(nextLine([])).toBeNull();
});
