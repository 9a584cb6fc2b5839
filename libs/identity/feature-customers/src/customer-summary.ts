import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CustomerView } from '@seamwright/identity/contracts';
import { termsFromName } from '@seamwright/identity/ui';
import { Card } from '@seamwright/shared/ui';

/** A customer's facts for those who may read but not change them. */
@Component({
  selector: 'sw-customer-summary',
  imports: [Card],
  template: `
    <sw-card heading="Account and terms" i18n-heading="@@identity.customer.facts">
      <dl>
        @for (fact of facts(); track fact.label) {
          <div>
            <dt>{{ fact.label }}</dt>
            <dd>{{ fact.value }}</dd>
          </div>
        }
      </dl>
    </sw-card>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(240px, 100%), 1fr));
      gap: 16px 24px;
    }

    dt {
      color: var(--sw-ink-2);
      font-size: 14px;
      line-height: 20px;
    }

    dd {
      white-space: pre-line;
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerSummary {
  readonly customer = input.required<CustomerView>();

  protected readonly facts = computed(() => {
    const { billingAddress, invoiceEmail, vatNumber, groupName, termsDays, termsFrom } = this.customer();
    return [
      { label: $localize`:@@identity.customer.billing:Billing address`, value: billingAddress },
      { label: $localize`:@@identity.customer.invoiceEmail:Invoices go to`, value: invoiceEmail },
      { label: $localize`:@@identity.customer.vat:VAT number`, value: vatNumber ?? '–' },
      { label: $localize`:@@identity.customer.group:Group`, value: groupName ?? '–' },
      {
        label: $localize`:@@identity.customer.terms:Pays within`,
        value: $localize`:@@identity.customer.termsWords:${termsDays}:days: days ${termsFromName(termsFrom)}:from:`,
      },
    ];
  });
}
