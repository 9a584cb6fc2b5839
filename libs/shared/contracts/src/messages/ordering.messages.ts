import type { MessageTable } from './message-table';

/** Refusals of ordering, put into words. */
export const orderingMessages = {} satisfies MessageTable;
