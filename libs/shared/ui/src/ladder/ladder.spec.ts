import { TestBed } from '@angular/core/testing';
import { Ladder, type LadderStep } from './ladder';

interface Steps {
  atLeast: LadderStep;
  mostLikely: LadderStep;
  atMost: LadderStep;
  real?: LadderStep;
}

const steaks: Steps = {
  atLeast: { grams: 6_384, minor: 15_066 },
  mostLikely: { grams: 6_720, minor: 15_859 },
  atMost: { grams: 7_056, minor: 16_652 },
};

async function draw(steps: Steps): Promise<HTMLElement> {
  const ladder = TestBed.createComponent(Ladder);
  for (const [name, step] of Object.entries(steps)) {
    ladder.componentRef.setInput(name, step);
  }
  ladder.componentRef.setInput('currency', 'GBP');
  await ladder.whenStable();
  return ladder.nativeElement;
}

const words = (rung: Element): (string | null)[] => [...rung.children].map((part) => part.textContent);
const placeOf = (mark: HTMLElement | null): number => parseFloat(mark?.style.insetInlineStart ?? '');

describe('Ladder', () => {
  it('says weight and price at least, most likely and at most', async () => {
    const ladder = await draw(steaks);

    expect([...ladder.querySelectorAll('.rung')].map(words)).toEqual([
      ['at least', '£150.66', '6.384\u00a0kg'],
      ['most likely', '£158.59', '6.720\u00a0kg'],
      ['at most', '£166.52', '7.056\u00a0kg'],
    ]);
    expect(ladder.querySelector('.real')).toBeNull();
  });

  it('says one exact value when the weight is fixed', async () => {
    const fixed = { grams: 10_000, minor: 9_800 };
    const ladder = await draw({ atLeast: fixed, mostLikely: fixed, atMost: fixed });

    expect([...ladder.querySelectorAll('.rung')].map(words)).toEqual([['exactly', '£98.00', '10.000\u00a0kg']]);
  });

  it('shows what was packed where it lies between the outer knots', async () => {
    const ladder = await draw({ ...steaks, real: { grams: 7_056, minor: 16_652 } });
    const last = [...ladder.querySelectorAll<HTMLElement>('.knot')][1] ?? null;

    expect(ladder.querySelector('.real')?.textContent).toContain('7.056\u00a0kg');
    expect(placeOf(ladder.querySelector('.pointer'))).toBeCloseTo(placeOf(last));
    expect(ladder.querySelector('.real')?.classList).not.toContain('outside');
  });

  it('marks what was packed outside of the promise', async () => {
    const ladder = await draw({ ...steaks, real: { grams: 7_057, minor: 16_655 } });

    expect(ladder.querySelector('.real')?.classList).toContain('outside');
  });
});
