import { stateTable } from '@seamwright/shared/util';

export const CUTTING_DAY_STATES = ['open', 'closed', 'planned', 'released', 'finished', 'locked'] as const;
export type CuttingDayState = (typeof CUTTING_DAY_STATES)[number];
export type CuttingDayMove = 'close' | 'plan' | 'release' | 'finish' | 'lock';

/** Open → closed to orders → planned → released to the floor → finished → locked. There is no way back. */
export const cuttingDayStates = stateTable<CuttingDayState, CuttingDayMove>({
  open: { close: 'closed' },
  closed: { plan: 'planned' },
  planned: { release: 'released' },
  released: { finish: 'finished' },
  finished: { lock: 'locked' },
  locked: {},
});

/** Whether orders for the day are no longer taken. */
export const isClosedToOrders = (state: CuttingDayState): boolean => state !== 'open';

/** Whether the list is fixed and its cutting is not over yet. */
export const isBeingCut = (state: CuttingDayState): boolean =>
  state === 'closed' || state === 'planned' || state === 'released';
