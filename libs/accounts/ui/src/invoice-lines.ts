import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { InvoiceBasis } from '@seamwright/accounts/domain';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';
import { formatMoney, formatPercent, minorUnits, ppm, type CurrencyCode } from '@seamwright/shared/util';
import { basisWord } from './invoice-words';

/** A line of an invoice: what left in packs, or the delivery. Money in minor units without tax, weight in grams. */
export interface ShownInvoiceLine {
  readonly position: number;
  readonly description: string;
  readonly packs: number;
  readonly pieces: number;
  readonly netGrams: number;
  readonly basis: InvoiceBasis;
  readonly priceMinor: number;
  readonly taxPpm: number;
  readonly netMinor: number;
}

/** The lines of an invoice with their real weights. */
@Component({
  selector: 'sw-invoice-lines',
  imports: [DataTable],
  template: `<sw-data-table
    label="Lines of the invoice"
    i18n-label="@@accounts.lines.label"
    [columns]="columns()"
    [rows]="lines()"
    [rowId]="idOf"
    [currency]="currency()"
    [totals]="totals()"
  />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvoiceLines {
  readonly lines = input.required<readonly ShownInvoiceLine[]>();
  readonly netMinor = input.required<number>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly idOf = ({ position }: ShownInvoiceLine): number => position;
  protected readonly totals = computed(() => ({
    description: $localize`:@@accounts.lines.net:Net`,
    netMinor: this.netMinor(),
  }));
  protected readonly columns = computed<readonly TableColumn<ShownInvoiceLine>[]>(() => [
    {
      key: 'description',
      label: $localize`:@@accounts.lines.description:What`,
      kind: 'text',
      // A number keeps its unit: "8 mm fat" breaks after "mm".
      value: ({ description }) => description.replace(/(\d) (?=(?:mm|g|kg)\b)/g, '$1\u00a0'),
    },
    {
      key: 'packs',
      label: $localize`:@@accounts.lines.packs:Packs`,
      kind: 'count',
      value: ({ packs }) => packs || null,
    },
    {
      key: 'pieces',
      label: $localize`:@@accounts.lines.pieces:Pieces`,
      kind: 'count',
      value: ({ pieces }) => pieces || null,
    },
    {
      key: 'netGrams',
      label: $localize`:@@accounts.lines.weight:Weight, kg`,
      kind: 'kg',
      value: ({ netGrams }) => netGrams || null,
    },
    {
      key: 'price',
      label: $localize`:@@accounts.lines.price:Price`,
      kind: 'text',
      align: 'end',
      value: ({ priceMinor, basis }) => {
        const price = formatMoney(minorUnits(priceMinor), this.currency(), this.locale);
        return basis === 'delivery' ? price : `${price}/${basisWord(basis)}`;
      },
    },
    {
      key: 'taxPpm',
      label: $localize`:@@accounts.lines.tax:VAT rate`,
      kind: 'text',
      align: 'end',
      value: ({ taxPpm }) => formatPercent(ppm(taxPpm), this.locale),
    },
    { key: 'netMinor', label: $localize`:@@accounts.lines.amount:Amount`, kind: 'money' },
  ]);
}
