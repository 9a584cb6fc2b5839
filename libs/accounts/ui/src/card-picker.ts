import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';
import type { CardWire } from '@seamwright/accounts/contracts';

/** Chooses one of the cards that the customer keeps. */
@Component({
  selector: 'sw-card-picker',
  imports: [Choice],
  template: `
    @if (cards().length > 0) {
      <sw-choice [label]="label" [options]="options()" [(value)]="cardId" />
    } @else {
      <p class="sw-note" i18n="@@basket.cards.none">
        No card is kept for your account yet. Add one under Invoices and cards, or order on account.
      </p>
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CardPicker {
  readonly cards = input.required<readonly CardWire[]>();
  readonly cardId = model<string | null>(null);

  protected readonly label = $localize`:@@basket.cards.label:Card`;
  protected readonly options = computed<ChoiceOption[]>(() =>
    this.cards().map(({ id, brand, last4, expires }) => ({
      value: id,
      label: `${brand} ···· ${last4}`,
      note: $localize`:@@basket.cards.expires:until ${expires}:month:`,
    })),
  );
}
