import type { ExceptionWire, LegWire } from '@seamwright/accounts/contracts';
import { flowOfWeek } from './flow-of-week';

const week = {
  capturedMinor: 1_841_260,
  refundedMinor: 14_210,
  feesMinor: 30_119,
  paidOutMinor: 1_669_317,
  returnedMinor: 0,
  otherMinor: 0,
  bankMinor: 1_665_117,
  openingMinor: 0,
  closingMinor: 127_614,
};
const bank: LegWire = {
  leg: 'bank',
  oursMinor: 1_669_317,
  theirsMinor: 1_665_117,
  matchedMinor: 1_669_317,
  waitingMinor: 0,
  exceptions: 1,
};
const exception = (leg: ExceptionWire['leg'], differenceMinor: number) => ({ leg, differenceMinor }) as ExceptionWire;

describe('the week as the seam draws it', () => {
  it('tells apart what the bank has, what is on its way and what is missing', () => {
    const flow = flowOfWeek({ week, legs: [bank], exceptions: [exception('bank', -4_200)] });
    expect(flow).toMatchObject({ inBankMinor: 1_665_117, bankLessMinor: 4_200, bankMoreMinor: 0, onItsWayMinor: 0 });
    expect(flow.inBankMinor + flow.onItsWayMinor + flow.bankLessMinor - flow.bankMoreMinor).toBe(bank.oursMinor);
  });

  it('does not let differences of opposite sign hide each other', () => {
    const exceptions = [
      exception('bank', -500),
      exception('bank', 500),
      exception('charges', 300),
      exception('charges', -300),
    ];
    expect(flowOfWeek({ week, legs: [bank], exceptions })).toMatchObject({
      bankLessMinor: 500,
      bankMoreMinor: 500,
      cardsDifferMinor: 600,
    });
  });
});
