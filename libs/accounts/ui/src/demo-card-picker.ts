import { ChangeDetectionStrategy, Component, computed, model } from '@angular/core';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';

/** The processor's documented test methods, and what each of them does when an order is paid with it. */
const TEST_METHODS: readonly { readonly methodId: string; readonly label: string; readonly does: string }[] = [
  {
    methodId: 'pm_card_visa',
    label: $localize`:@@accounts.demoCard.visa:Visa`,
    does: $localize`:@@accounts.demoCard.accepted:accepted`,
  },
  {
    methodId: 'pm_card_mastercard',
    label: $localize`:@@accounts.demoCard.mastercard:Mastercard`,
    does: $localize`:@@accounts.demoCard.accepted:accepted`,
  },
  {
    methodId: 'pm_card_visa_chargeDeclined',
    label: $localize`:@@accounts.demoCard.declined:Visa, declined`,
    does: $localize`:@@accounts.demoCard.declined.does:the bank declines`,
  },
  {
    methodId: 'pm_card_visa_chargeDeclinedInsufficientFunds',
    label: $localize`:@@accounts.demoCard.funds:Visa, no funds`,
    does: $localize`:@@accounts.demoCard.funds.does:declined: not enough money`,
  },
  {
    methodId: 'pm_card_chargeCustomerFail',
    label: $localize`:@@accounts.demoCard.later:Visa, declined later`,
    does: $localize`:@@accounts.demoCard.later.does:kept, but orders are declined`,
  },
  {
    methodId: 'pm_card_authenticationRequired',
    label: $localize`:@@accounts.demoCard.confirm:Visa, to confirm`,
    does: $localize`:@@accounts.demoCard.confirm.does:the bank asks its holder`,
  },
];

/** Chooses one of the processor's test cards. Marked as a demo: no real card can be entered here. */
@Component({
  selector: 'sw-demo-card-picker',
  imports: [Choice],
  template: `
    <p class="sw-note" i18n="@@accounts.demoCard.note">
      This is a demo: no real card is asked for. These are the test cards of the card processor; each says what its bank
      does.
    </p>
    <sw-choice
      label="Test card"
      i18n-label="@@accounts.demoCard.label"
      hint="what its bank does"
      i18n-hint="@@accounts.demoCard.hint"
      [options]="options()"
      [(value)]="methodId"
    />
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
      --sw-choice-least: 150px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DemoCardPicker {
  readonly methodId = model<string | null>(null);

  protected readonly options = computed<ChoiceOption[]>(() =>
    TEST_METHODS.map(({ methodId, label, does }) => ({ value: methodId, label, note: does })),
  );
}
