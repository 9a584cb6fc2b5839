import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { CardWire } from '@seamwright/accounts/contracts';
import { CardsApiActions, cardsFeature, CardsPageActions } from '@seamwright/accounts/data-access';
import { DemoCardPicker } from '@seamwright/accounts/ui';
import { Card, Confirm, Empty, ErrorState, Icon, Loading, PageHead, Toast } from '@seamwright/shared/ui';
import { newId } from '@seamwright/shared/util';
import { ProcessorCardForm } from './processor-card-form';

/** The cards that the customer keeps for orders: seen, added and removed. */
@Component({
  selector: 'sw-cards-page',
  imports: [Card, DemoCardPicker, Empty, ErrorState, Icon, Loading, MatButton, PageHead, ProcessorCardForm],
  templateUrl: './cards.page.html',
  styleUrl: './cards.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CardsPage {
  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly toast = inject(Toast);

  protected readonly cards = this.store.selectSignal(cardsFeature.selectCards);
  protected readonly entry = this.store.selectSignal(cardsFeature.selectEntry);
  protected readonly adding = this.store.selectSignal(cardsFeature.selectAdding);
  protected readonly removing = this.store.selectSignal(cardsFeature.selectRemoving);
  protected readonly kept = computed(() => this.cards().data ?? []);
  protected readonly open = signal(false);
  protected readonly methodId = signal<string | null>(null);
  protected readonly crumbs = [{ label: $localize`:@@cards.crumb:Invoices`, path: '/invoices' }];

  /** One key for one card, so that pressing again after a lost answer keeps it once. */
  private sent = { methodId: '', key: '' };

  constructor() {
    this.load();
    inject(Actions)
      .pipe(ofType(CardsApiActions.kept), takeUntilDestroyed())
      .subscribe(({ card }) => {
        this.open.set(false);
        this.sent = { methodId: '', key: '' };
        void this.toast.show({ text: $localize`:@@cards.kept:${nameOf(card)}:card: is kept.` });
      });
  }

  protected readonly nameOf = nameOf;

  protected load(): void {
    this.store.dispatch(CardsPageActions.opened());
  }

  protected begin(): void {
    this.methodId.set(null);
    this.sent = { methodId: '', key: '' };
    this.open.set(true);
    this.store.dispatch(CardsPageActions.addOpened());
  }

  protected keep(methodId: string | null): void {
    if (methodId === null) return;
    if (this.sent.methodId !== methodId || this.adding().problem?.status === 422)
      this.sent = { methodId, key: newId() };
    this.store.dispatch(CardsPageActions.added({ methodId, idempotencyKey: this.sent.key }));
  }

  protected async remove(card: CardWire): Promise<void> {
    const agreed = await this.confirm.ask({
      heading: $localize`:@@cards.remove.heading:Remove ${nameOf(card)}:card:?`,
      text: $localize`:@@cards.remove.text:It can't be chosen for new orders any more. What is held on it for orders already placed stays held.`,
      act: $localize`:@@cards.remove.act:Remove the card`,
      back: $localize`:@@cards.remove.back:Keep it`,
      destructive: true,
    });
    if (agreed) this.store.dispatch(CardsPageActions.removed({ cardId: card.id }));
  }
}

/** "Visa ···· 4242" */
function nameOf({ brand, last4 }: CardWire): string {
  return `${brand.slice(0, 1).toUpperCase()}${brand.slice(1)} ···· ${last4}`;
}
