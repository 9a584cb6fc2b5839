import { stateTable } from '@seamwright/shared/util';

export const LOT_STATES = ['received', 'on-hold', 'released', 'used-up', 'recalled'] as const;
export type LotState = (typeof LOT_STATES)[number];
export type LotMove = 'hold' | 'release' | 'use-up' | 'recall';

/** Received → on hold | released → used up. A recall comes at any time and ends the lot. */
export const lotStates = stateTable<LotState, LotMove>({
  received: { hold: 'on-hold', release: 'released', recall: 'recalled' },
  'on-hold': { release: 'released', recall: 'recalled' },
  released: { hold: 'on-hold', 'use-up': 'used-up', recall: 'recalled' },
  'used-up': { recall: 'recalled' },
  recalled: {},
});
