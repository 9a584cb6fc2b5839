import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { LegWire, ReconciliationWire } from '@seamwright/accounts/contracts';
import { legWords } from '@seamwright/accounts/ui';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';
import type { CurrencyCode } from '@seamwright/shared/util';

interface Moved {
  readonly key: string;
  readonly word: string;
  readonly inMinor: number | null;
  readonly outMinor: number | null;
}

/** The week's money as tables: what came to the processor and left it, and the four comparisons. */
@Component({
  selector: 'sw-week-tables',
  imports: [DataTable],
  template: `
    <sw-data-table
      label="Money at the processor in this week"
      i18n-label="@@reconciliation.moved.table"
      [columns]="movedColumns"
      [rows]="moved()"
      [rowId]="keyOf"
      [currency]="currency()"
      [totals]="totals()"
    />
    <sw-data-table
      label="The four comparisons"
      i18n-label="@@reconciliation.legs.table"
      [columns]="legColumns"
      [rows]="week().legs"
      [rowId]="legOf"
      [currency]="currency()"
    />
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 24px;
      margin-inline: -24px;
    }

    @media (max-width: 599.98px) {
      :host {
        margin-inline: -16px;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WeekTables {
  readonly week = input.required<ReconciliationWire>();
  readonly currency = input.required<CurrencyCode>();

  protected readonly moved = computed<readonly Moved[]>(() => {
    const { week } = this.week();
    const into = (key: string, word: string, minor: number): Moved => ({
      key,
      word,
      inMinor: minor >= 0 ? minor : null,
      outMinor: minor < 0 ? -minor : null,
    });
    const out = (key: string, word: string, minor: number): Moved => into(key, word, 0 - minor);
    const all = [
      into('opening', $localize`:@@reconciliation.moved.opening:At the processor before`, week.openingMinor),
      into('captured', $localize`:@@reconciliation.moved.captured:Captured from cards`, week.capturedMinor),
      into('returned', $localize`:@@reconciliation.moved.returned:Payouts sent back`, week.returnedMinor),
      into('other', $localize`:@@reconciliation.moved.other:Other movements`, week.otherMinor),
      out('refunded', $localize`:@@reconciliation.moved.refunded:Refunded to cards`, week.refundedMinor),
      out('fees', $localize`:@@reconciliation.moved.fees:Fees`, week.feesMinor),
      out('paid-out', $localize`:@@reconciliation.moved.paidOut:Paid out to the bank`, week.paidOutMinor),
      out('closing', $localize`:@@reconciliation.moved.closing:Still at the processor`, week.closingMinor),
    ];
    return all.filter(({ inMinor, outMinor }) => inMinor !== 0 || outMinor !== null);
  });
  protected readonly totals = computed(() => ({
    inMinor: this.moved().reduce((sum, { inMinor }) => sum + (inMinor ?? 0), 0),
    outMinor: this.moved().reduce((sum, { outMinor }) => sum + (outMinor ?? 0), 0),
  }));
  protected readonly keyOf = ({ key }: Moved): string => key;
  protected readonly legOf = ({ leg }: LegWire): string => leg;
  protected readonly movedColumns: readonly TableColumn<Moved>[] = [
    { key: 'word', label: $localize`:@@reconciliation.moved.what:What`, kind: 'text' },
    { key: 'inMinor', label: $localize`:@@reconciliation.moved.in:Came`, kind: 'money' },
    { key: 'outMinor', label: $localize`:@@reconciliation.moved.out:Went`, kind: 'money' },
  ];
  protected readonly legColumns: readonly TableColumn<LegWire>[] = [
    {
      key: 'leg',
      label: $localize`:@@reconciliation.legs.what:Compared`,
      kind: 'text',
      value: ({ leg }) => legWords(leg),
    },
    { key: 'oursMinor', label: $localize`:@@reconciliation.legs.ours:First`, kind: 'money' },
    { key: 'theirsMinor', label: $localize`:@@reconciliation.legs.theirs:Second`, kind: 'money' },
    { key: 'matchedMinor', label: $localize`:@@reconciliation.legs.matched:Matched`, kind: 'money' },
    { key: 'waitingMinor', label: $localize`:@@reconciliation.legs.waiting:Not due yet`, kind: 'money' },
    { key: 'exceptions', label: $localize`:@@reconciliation.legs.exceptions:Not explained`, kind: 'count' },
  ];
}
