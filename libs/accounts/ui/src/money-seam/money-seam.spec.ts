import { TestBed } from '@angular/core/testing';
import type { MoneyFlow } from './money-flow';
import { MoneySeam } from './money-seam';

const week: MoneyFlow = {
  capturedMinor: 1_841_260,
  refundedMinor: 14_210,
  feesMinor: 30_119,
  paidOutMinor: 1_669_317,
  returnedMinor: 0,
  otherMinor: 0,
  openingMinor: 0,
  closingMinor: 127_614,
  inBankMinor: 1_665_117,
  onItsWayMinor: 0,
  bankLessMinor: 4_200,
  bankMoreMinor: 0,
  cardsDifferMinor: 0,
};

async function drawn(flow: MoneyFlow): Promise<HTMLElement> {
  const fixture = TestBed.createComponent(MoneySeam);
  fixture.componentRef.setInput('flow', flow);
  fixture.componentRef.setInput('currency', 'GBP');
  await fixture.whenStable();
  return fixture.nativeElement as HTMLElement;
}

describe('the drawing of the money seam', () => {
  it('tells the whole week to those who do not see it', async () => {
    const told = (await drawn(week)).querySelector('svg')?.getAttribute('aria-label') ?? '';
    expect(told).toContain('captured £18,412.60');
    expect(told).toContain('fees £301.19');
    expect(told).toContain('in the bank £16,651.17, unexplained, less £42.00');
  });

  it('names every amount it draws, and marks the break with words as well', async () => {
    const page = await drawn(week);
    const labels = [...page.querySelectorAll('text')].map((text) =>
      [...text.children].map(({ textContent }) => textContent).join(' '),
    );
    expect(labels).toEqual(expect.arrayContaining(['paid out £16,693.17', 'unexplained, less £42.00']));
    expect(page.querySelectorAll('.break')).toHaveLength(1);
  });
});
