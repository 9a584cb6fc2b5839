import type { MessageTable } from './message-table';

/** Refusals of plant, put into words. */
export const plantMessages = {} satisfies MessageTable;
