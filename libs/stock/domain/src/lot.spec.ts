import fc from 'fast-check';
import type { PlantDate } from '@seamwright/shared/util';
import { firstExpiredFirst, lotFit, lotStates, LOT_STATES, type Lot } from './index';

const day = (text: string) => text as PlantDate;
const onDay = { cuttingDay: day('2026-12-03'), deliveryDay: day('2026-12-04') };
const aLot = (over: Partial<Lot> = {}) => ({
  code: 'L-1',
  state: 'released' as const,
  receivedOn: day('2026-12-01'),
  useBy: day('2026-12-04'),
  ...over,
});

describe('the states of a lot', () => {
  it('waits for its release, can be held before and after it, and is used up once', () => {
    expect(LOT_STATES.map((state) => [state, lotStates.allowedMoves(state)])).toEqual([
      ['received', ['hold', 'release', 'recall']],
      ['on-hold', ['release', 'recall']],
      ['released', ['hold', 'use-up', 'recall']],
      ['used-up', ['recall']],
      ['recalled', []],
    ]);
  });

  it('can be recalled at any time, and never comes back from it', () => {
    for (const state of LOT_STATES.filter((each) => each !== 'recalled')) {
      expect(lotStates.next(state, 'recall')).toEqual({ ok: true, value: 'recalled' });
    }
    expect(lotStates.next('recalled', 'release')).toMatchObject({ refusal: { code: 'move-not-allowed' } });
  });
});

describe('whether a lot fits a day', () => {
  it('takes a released lot on the last day of its life', () => {
    expect(lotFit(aLot(), onDay).ok).toBe(true);
    expect(lotFit(aLot({ useBy: null }), onDay).ok).toBe(true);
    expect(lotFit(aLot({ receivedOn: day('2026-12-03') }), onDay).ok).toBe(true);
  });

  it('says why another does not fit', () => {
    expect(lotFit(aLot({ state: 'on-hold' }), onDay)).toMatchObject({
      refusal: { code: 'lot-not-released', params: { lot: 'L-1', state: 'on-hold' } },
    });
    expect(lotFit(aLot({ useBy: day('2026-12-03') }), onDay)).toMatchObject({ refusal: { code: 'lot-past-use-by' } });
    expect(lotFit(aLot({ receivedOn: day('2026-12-04') }), onDay)).toMatchObject({
      refusal: { code: 'lot-not-received-yet' },
    });
  });
});

it('takes first what expires first; a lot without a use-by last', () => {
  const lots = [
    aLot({ code: 'C', useBy: null }),
    aLot({ code: 'B' }),
    aLot({ code: 'D', useBy: day('2026-12-03') }),
    aLot({ code: 'A' }),
    aLot({ code: 'E', receivedOn: day('2026-11-30') }),
  ];
  const expected = ['D', 'E', 'A', 'B', 'C'];
  fc.assert(
    fc.property(fc.shuffledSubarray(lots, { minLength: lots.length }), (shuffled) => {
      expect([...shuffled].sort(firstExpiredFirst).map(({ code }) => code)).toEqual(expected);
    }),
  );
});
