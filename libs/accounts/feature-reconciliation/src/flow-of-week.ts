import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import type { MoneyFlow } from '@seamwright/accounts/ui/money-seam';

type Week = Pick<ReconciliationWire, 'week' | 'legs' | 'exceptions'>;

/**
 * The week's money as the seam draws it. At the bank: what it has + what is on its way + what it has less − what it has
 * more = what was paid out.
 */
export function flowOfWeek({ week, legs, exceptions }: Week): MoneyFlow {
  const bank = legs.find(({ leg }) => leg === 'bank');
  const differences = (leg: string): number[] =>
    exceptions.filter((each) => each.leg === leg).map(({ differenceMinor }) => differenceMinor);
  const atBank = differences('bank');
  const { bankMinor: _matchedOnly, ...moved } = week;
  return {
    ...moved,
    inBankMinor: bank?.theirsMinor ?? 0,
    onItsWayMinor: bank?.waitingMinor ?? 0,
    bankLessMinor: atBank.reduce((sum, minor) => sum + Math.max(0, -minor), 0),
    bankMoreMinor: atBank.reduce((sum, minor) => sum + Math.max(0, minor), 0),
    cardsDifferMinor: differences('charges').reduce((sum, minor) => sum + Math.abs(minor), 0),
  };
}
