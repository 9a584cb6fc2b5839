import { ChangeDetectionStrategy, Component, inject, input, LOCALE_ID } from '@angular/core';
import type { PayoutWire } from '@seamwright/accounts/contracts';
import type { PayoutState } from '@seamwright/accounts/domain';
import { Chip, Empty, type ChipTone } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { formatPlantDate, isPlantDate, type CurrencyCode } from '@seamwright/shared/util';

const STATES: Readonly<Record<PayoutState, { readonly tone: ChipTone; readonly word: string }>> = {
  pending: { tone: 'info', word: $localize`:@@reconciliation.payout.pending:Being sent` },
  'in-transit': { tone: 'info', word: $localize`:@@reconciliation.payout.inTransit:On its way` },
  paid: { tone: 'ok', word: $localize`:@@reconciliation.payout.paid:Sent` },
  failed: { tone: 'bad', word: $localize`:@@reconciliation.payout.failed:Sent back` },
  canceled: { tone: 'plain', word: $localize`:@@reconciliation.payout.canceled:Not sent` },
};

const MATCHED: Readonly<Record<'reference' | 'amount-and-date', string>> = {
  reference: $localize`:@@reconciliation.match.reference:by its reference`,
  'amount-and-date': $localize`:@@reconciliation.match.amount:by amount and day`,
};

/** The week's payouts, each with the bank line that it was matched with and by what. */
@Component({
  selector: 'sw-week-payouts',
  imports: [Chip, DataTable, Empty, TableCell],
  template: `
    <sw-data-table
      label="Payouts and bank lines"
      i18n-label="@@reconciliation.payouts.table"
      [columns]="columns"
      [rows]="payouts()"
      [rowId]="idOf"
      [currency]="currency()"
    >
      <ng-template swCell="state" let-payout
        ><sw-chip [tone]="stateOf(payout).tone">{{ stateOf(payout).word }}</sw-chip></ng-template
      >
      <ng-template swCell="match" let-payout>
        @if (matchOf(payout); as words) {
          <span>{{ words }}</span>
        } @else {
          <span class="sw-muted" i18n="@@reconciliation.match.none">no bank line yet</span>
        }
      </ng-template>
      <sw-empty
        swEmpty
        heading="No payouts in this week"
        i18n-heading="@@reconciliation.payouts.none"
        text="The processor pays out what became available; the days are its own."
        i18n-text="@@reconciliation.payouts.none.text"
      />
    </sw-data-table>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WeekPayouts {
  readonly payouts = input.required<readonly PayoutWire[]>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly idOf = ({ id }: PayoutWire): string => id;
  protected readonly stateOf = ({ state }: PayoutWire) => STATES[state];
  protected readonly columns: readonly TableColumn<PayoutWire>[] = [
    { key: 'createdOn', label: $localize`:@@reconciliation.payouts.sent:Sent`, kind: 'date', sortable: true },
    { key: 'arrivalOn', label: $localize`:@@reconciliation.payouts.due:Due at the bank`, kind: 'date' },
    { key: 'state', label: $localize`:@@reconciliation.payouts.state:State`, kind: 'template' },
    { key: 'charges', label: $localize`:@@reconciliation.payouts.charges:Charges`, kind: 'count' },
    { key: 'refunds', label: $localize`:@@reconciliation.payouts.refunds:Refunds`, kind: 'count' },
    { key: 'partsNetMinor', label: $localize`:@@reconciliation.payouts.parts:Its movements, net`, kind: 'money' },
    { key: 'amountMinor', label: $localize`:@@reconciliation.payouts.amount:Paid out`, kind: 'money', sortable: true },
    {
      key: 'booked',
      label: $localize`:@@reconciliation.payouts.booked:Booked by the bank`,
      kind: 'money',
      value: ({ bankLine }) => bankLine?.amountMinor,
    },
    { key: 'match', label: $localize`:@@reconciliation.payouts.match:Matched`, kind: 'template' },
  ];

  protected matchOf({ bankLine }: PayoutWire): string {
    if (bankLine === null) return '';
    const { bookedOn, matchedBy } = bankLine;
    const day = isPlantDate(bookedOn) ? formatPlantDate(bookedOn, 'short', this.locale) : bookedOn;
    return `${day}, ${MATCHED[matchedBy]}`;
  }
}
