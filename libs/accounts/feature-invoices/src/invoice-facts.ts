import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { InvoiceDetail } from '@seamwright/accounts/contracts';
import { formatCreditorReference, formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** Whose invoice it is, for what, and by when and how it is paid. */
@Component({
  selector: 'sw-invoice-facts',
  imports: [RouterLink],
  templateUrl: './invoice-facts.html',
  styleUrl: './invoice-facts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvoiceFacts {
  readonly invoice = input.required<InvoiceDetail>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly reference = computed(() => formatCreditorReference(this.invoice().reference));

  protected day(day: string): string {
    return isPlantDate(day) ? formatPlantDate(day, 'long', this.locale) : day;
  }
}
