import type { LotState } from '@seamwright/stock/domain';
import type { LotWire } from '@seamwright/stock/contracts';
import type { ChipTone, SeamStage } from '@seamwright/shared/ui';

export const lotStateName = (state: LotState): string =>
  ({
    received: $localize`:@@lots.state.received:Received`,
    'on-hold': $localize`:@@lots.state.onHold:On hold`,
    released: $localize`:@@lots.state.released:Released`,
    'used-up': $localize`:@@lots.state.usedUp:Used up`,
    recalled: $localize`:@@lots.state.recalled:Recalled`,
  })[state];

export const lotTone = (state: LotState): ChipTone =>
  (({ received: 'info', 'on-hold': 'eye', released: 'ok', 'used-up': 'plain', recalled: 'bad' }) as const)[state];

/** The lot's way from the door to its last piece. A hold or a recall stands in the place of the release. */
export function lotStages({ state }: Pick<LotWire, 'state'>): SeamStage[] {
  const aside = state === 'on-hold' || state === 'recalled';
  const way: readonly LotState[] = ['received', aside ? state : 'released', 'used-up'];
  const now = way.indexOf(state);
  return way.map((each, index) => ({
    label: lotStateName(each),
    state: index < now ? 'passed' : index === now ? 'now' : 'ahead',
  }));
}
