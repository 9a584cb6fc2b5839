import type { Type } from '@angular/core';
import type { Role } from '@seamwright/shared/contracts';
import { AccountsBoard } from './accounts.board';
import { ClosuresBoard } from './closures.board';
import { CuttingDaysBoard } from './cutting-days.board';
import { ExpiringLotsBoard } from './expiring-lots.board';
import { InvitedBoard } from './invited.board';
import { OverdueInvoicesBoard } from './overdue-invoices.board';
import { PackingBoard } from './packing.board';
import { QuotesBoard } from './quotes.board';
import { UndecidedLotsBoard } from './undecided-lots.board';
import { VersionsBoard } from './versions.board';
import { WaitingOrdersBoard } from './waiting-orders.board';

interface Board {
  readonly board: Type<unknown>;
  readonly roles: readonly Role[];
}

/** What each role does first, in the order of the day's work. */
const BOARDS: readonly Board[] = [
  { board: PackingBoard, roles: ['floor'] },
  { board: CuttingDaysBoard, roles: ['planner'] },
  { board: QuotesBoard, roles: ['rep'] },
  { board: WaitingOrdersBoard, roles: ['planner', 'rep'] },
  { board: ExpiringLotsBoard, roles: ['planner'] },
  { board: VersionsBoard, roles: ['technical'] },
  { board: UndecidedLotsBoard, roles: ['technical'] },
  { board: AccountsBoard, roles: ['accounts'] },
  { board: OverdueInvoicesBoard, roles: ['accounts'] },
  { board: InvitedBoard, roles: ['admin'] },
  { board: ClosuresBoard, roles: ['admin'] },
];

/** The boards of somebody with these roles, each once. */
export const boardsOf = (roles: readonly Role[]): readonly Type<unknown>[] =>
  BOARDS.filter((each) => each.roles.some((role) => roles.includes(role))).map(({ board }) => board);
