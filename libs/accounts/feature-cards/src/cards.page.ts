import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { CardWire } from '@seamwright/accounts/contracts';
import { CardsApiActions, cardsFeature, CardsPageActions } from '@seamwright/accounts/data-access';
import { cardName, DemoCardPicker } from '@seamwright/accounts/ui';
import { Card, Confirm, Empty, ErrorState, Icon, Loading, PageHead, Toast } from '@seamwright/shared/ui';
import { newId } from '@seamwright/shared/util';

const INVOICES = { label: $localize`:@@cards.crumb:Invoices`, path: '/invoices' };
const PLACES = [
  { at: /^\/basket$/, label: $localize`:@@cards.back.basket:Back to the basket` },
  { at: /^\/(orders|basket\/placed)\/[\w-]+$/, label: $localize`:@@cards.back.order:Back to the order` },
];

/** Only to pages that are paid on: an address can be written by anyone. */
function wayBack(path: string): { readonly label: string; readonly path: string } | null {
  const place = PLACES.find(({ at }) => at.test(path));
  return place ? { label: place.label, path } : null;
}
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
  /** From the address: the page that sent the buyer here to add a card. */
  readonly back = input<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly toast = inject(Toast);
  private readonly router = inject(Router);

  protected readonly cards = this.store.selectSignal(cardsFeature.selectCards);
  protected readonly entry = this.store.selectSignal(cardsFeature.selectEntry);
  protected readonly adding = this.store.selectSignal(cardsFeature.selectAdding);
  protected readonly removing = this.store.selectSignal(cardsFeature.selectRemoving);
  protected readonly kept = computed(() => this.cards().data ?? []);
  protected readonly open = signal(false);
  protected readonly methodId = signal<string | null>(null);
  /** The way back, for whoever was sent here by a basket or an order; null for anybody else. */
  protected readonly wayBack = computed(() => wayBack(this.back() ?? ''));
  protected readonly crumbs = computed(() => [this.wayBack() ?? INVOICES]);

  /** One key for one card, so that pressing again after a lost answer keeps it once. */
  private sent = { methodId: '', key: '' };

  constructor() {
    this.load();
    inject(Actions)
      .pipe(ofType(CardsApiActions.kept), takeUntilDestroyed())
      .subscribe(({ card }) => {
        this.open.set(false);
        this.sent = { methodId: '', key: '' };
        void this.toast.show({ text: $localize`:@@cards.kept:${cardName(card)}:card: is kept.` });
        const back = this.wayBack();
        if (back) void this.router.navigateByUrl(back.path);
      });
  }

  protected readonly nameOf = cardName;

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
      heading: $localize`:@@cards.remove.heading:Remove ${cardName(card)}:card:?`,
      text: $localize`:@@cards.remove.text:It can't be chosen for new orders any more. What is held on it for orders already placed stays held.`,
      act: $localize`:@@cards.remove.act:Remove the card`,
      back: $localize`:@@cards.remove.back:Keep it`,
      destructive: true,
    });
    if (agreed) this.store.dispatch(CardsPageActions.removed({ cardId: card.id }));
  }
}
