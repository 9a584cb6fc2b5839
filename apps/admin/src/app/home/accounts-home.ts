import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Card } from '@seamwright/shared/ui';
import { PLACES } from '../places';

/** What accounts begin with. */
@Component({
  selector: 'sw-accounts-home',
  imports: [Card, RouterLink],
  template: `
    <sw-card heading="Money" i18n-heading="@@admin.home.money">
      <ul>
        @for (place of places; track place.path) {
          <li>
            <a [routerLink]="['/', place.path]">{{ place.label }}</a>
            <span class="sw-muted sw-small">{{ place.about }}</span>
          </li>
        }
      </ul>
    </sw-card>
  `,
  styles: `
    ul {
      display: grid;
      gap: 12px;
      padding: 0;
      list-style: none;
    }

    li {
      display: grid;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountsHome {
  protected readonly places = [PLACES.reconciliation, PLACES.payments, PLACES.invoices, PLACES.ledger];
}
