import type { MessageTable } from './message-table';

/** Refusals of accounts, put into words. */
export const accountsMessages = {} satisfies MessageTable;
