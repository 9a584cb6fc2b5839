import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { LineAmounts, PriceBasis, PricedWeights } from '@seamwright/pricing/domain';
import { Kg, KgPipe, Money, MoneyPipe } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import type { CurrencyCode } from '@seamwright/shared/util';
import { basisWord } from './price-words';

/** A quoted price with what a whole case of it will weigh and cost. */
export interface ShownQuoteLine {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly summary: string;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  readonly caseWeights: PricedWeights;
  readonly caseAmounts: Readonly<Record<keyof LineAmounts, number>>;
}

/** The prices of a quote, as both sides see them. */
@Component({
  selector: 'sw-quote-lines',
  imports: [DataTable, Kg, KgPipe, Money, MoneyPipe, TableCell],
  templateUrl: './quote-lines.html',
  styles: `
    span {
      display: block;
    }

    .name {
      font-weight: 600;
    }

    .sw-muted {
      font-weight: 400;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuoteLines {
  readonly lines = input.required<readonly ShownQuoteLine[]>();
  readonly currency = input<CurrencyCode>('GBP');

  protected readonly label = $localize`:@@pricing.quoteLines.label:Quoted prices`;
  protected readonly columns: readonly TableColumn<ShownQuoteLine>[] = [
    { key: 'what', label: $localize`:@@pricing.quoteLines.what:Specification`, kind: 'template' },
    { key: 'price', label: $localize`:@@pricing.quoteLines.price:Price`, kind: 'template', align: 'end' },
    { key: 'weight', label: $localize`:@@pricing.quoteLines.weight:A case weighs`, kind: 'template', align: 'end' },
    { key: 'amount', label: $localize`:@@pricing.quoteLines.amount:A case costs`, kind: 'template', align: 'end' },
  ];

  protected readonly idOf = (line: ShownQuoteLine): string => line.id;
  protected readonly perOf = (line: ShownQuoteLine): string => basisWord(line.basis);
}
