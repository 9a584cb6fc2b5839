import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';

/** A kept card as it is shown; its number is known to the processor only. */
export interface ShownCard {
  readonly id: string;
  readonly brand: string;
  readonly last4: string;
  /** "08/29" */
  readonly expires: string;
}

/** "Visa ···· 4242" */
export const cardName = ({ brand, last4 }: Pick<ShownCard, 'brand' | 'last4'>): string =>
  `${brand.slice(0, 1).toUpperCase()}${brand.slice(1)} ···· ${last4}`;

/** Chooses one of the cards that the customer keeps, and leads to where one is added. */
@Component({
  selector: 'sw-card-picker',
  imports: [Choice, RouterLink],
  template: `
    @if (cards().length > 0) {
      <sw-choice [label]="label()" [options]="options()" [(value)]="cardId" />
    } @else {
      <p class="sw-muted" i18n="@@accounts.cardPicker.none">No card is kept for you yet.</p>
    }
    <a routerLink="/cards" [queryParams]="{ back: back() }" i18n="@@accounts.cardPicker.add">Add a card</a>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      justify-items: start;
      --sw-choice-least: 160px;
    }

    sw-choice {
      inline-size: 100%;
    }

    a {
      display: inline-flex;
      align-items: center;
      min-block-size: 44px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CardPicker {
  readonly cards = input.required<readonly ShownCard[]>();
  /** Where to come back to once a card was added: "/basket". */
  readonly back = input.required<string>();
  readonly label = input($localize`:@@accounts.cardPicker.label:Card`);
  readonly cardId = model<string | null>(null);

  protected readonly options = computed<ChoiceOption[]>(() =>
    this.cards().map((card) => ({
      value: card.id,
      label: cardName(card),
      note: $localize`:@@accounts.cardPicker.expires:until ${card.expires}:month:`,
    })),
  );
}
