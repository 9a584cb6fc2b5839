import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { Account, EntryKind } from '@seamwright/accounts/domain';
import { DatePipe, MoneyPipe } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';
import { accountWords, entryWord } from './ledger-words';

interface ShownEntryLine {
  readonly account: Account;
  readonly customerName: string | null;
  readonly invoiceNumber: number | null;
  readonly debitMinor: number;
  readonly creditMinor: number;
}

/** A journal entry; debits and credits in minor units. */
export interface ShownEntry {
  readonly id: string;
  readonly number: number;
  readonly postedOn: string;
  readonly kind: EntryKind;
  readonly text: string;
  readonly lines: readonly ShownEntryLine[];
}

/** Journal entries, each whole: its lines, and that both sides are the same. */
@Component({
  selector: 'sw-ledger-entries',
  imports: [DatePipe, MoneyPipe, RouterLink],
  templateUrl: './ledger-entries.html',
  styleUrl: './ledger-entries.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LedgerEntries {
  readonly entries = input.required<readonly ShownEntry[]>();
  readonly currency = input.required<CurrencyCode>();

  protected readonly kindOf = (entry: ShownEntry): string => entryWord(entry.kind);
  protected readonly nameOf = (account: Account): string => accountWords(account).name;

  protected forWhom({ customerName, invoiceNumber }: ShownEntryLine): string {
    const invoice =
      invoiceNumber === null ? '' : $localize`:@@accounts.entries.invoice:invoice ${String(invoiceNumber)}:number:`;
    return [customerName ?? '', invoice].filter((word) => word !== '').join(', ');
  }

  protected debits({ lines }: ShownEntry): number {
    return lines.reduce((sum, { debitMinor }) => sum + debitMinor, 0);
  }

  protected credits({ lines }: ShownEntry): number {
    return lines.reduce((sum, { creditMinor }) => sum + creditMinor, 0);
  }
}
