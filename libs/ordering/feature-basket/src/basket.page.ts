import { ChangeDetectionStrategy, Component, computed, inject, LOCALE_ID } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { catchError, of } from 'rxjs';
import { PaymentCards } from '@seamwright/accounts/data-access';
import { CardPicker } from '@seamwright/accounts/ui';
import {
  BasketActions,
  basketFeature,
  BasketPageActions,
  CheckoutApiActions,
  checkoutFeature,
  type BasketDetails,
  type CheckedLine,
} from '@seamwright/ordering/data-access';
import { DeliveryDayPicker, OrderTotalsBox } from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Empty, ErrorState, Loading, Money, PageHead, Toast } from '@seamwright/shared/ui';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';
import { BasketLineRow } from './basket-line-row';

/** The basket and its checkout on one page: what, when, where, how it is paid, and what it will come to. */
@Component({
  selector: 'sw-basket-page',
  imports: [
    BasketLineRow,
    Card,
    CardPicker,
    Choice,
    DeliveryDayPicker,
    Empty,
    ErrorState,
    Loading,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    Money,
    OrderTotalsBox,
    PageHead,
    RouterLink,
  ],
  templateUrl: './basket.page.html',
  styleUrl: './basket.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BasketPage {
  private readonly store = inject(Store);
  private readonly router = inject(Router);
  private readonly toast = inject(Toast);
  private readonly locale = inject(LOCALE_ID);

  protected readonly draft = this.store.selectSignal(basketFeature.selectDraft);
  protected readonly lines = this.store.selectSignal(checkoutFeature.selectLines);
  protected readonly days = this.store.selectSignal(checkoutFeature.selectDays);
  protected readonly prices = this.store.selectSignal(checkoutFeature.selectPrices);
  protected readonly siteId = this.store.selectSignal(checkoutFeature.selectSiteId);
  protected readonly day = this.store.selectSignal(checkoutFeature.selectDeliveryDay);
  protected readonly totals = this.store.selectSignal(checkoutFeature.selectTotals);
  protected readonly mayPlace = this.store.selectSignal(checkoutFeature.selectMayPlace);
  protected readonly placing = this.store.selectSignal(checkoutFeature.selectPlacing);

  protected readonly cards = toSignal(
    // Cards that can't be fetched leave the account as the way to pay.
    inject(PaymentCards)
      .list()
      .pipe(catchError(() => of([]))),
    { initialValue: [] },
  );
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly kept = $localize`:@@basket.kept:Your basket is kept on this device.`;
  protected readonly settlements: readonly ChoiceOption[] = [
    {
      value: 'account',
      label: $localize`:@@basket.settlement.account:On account`,
      note: $localize`:@@basket.settlement.account.note:invoice for the real weight`,
    },
    {
      value: 'card',
      label: $localize`:@@basket.settlement.card:By card`,
      note: $localize`:@@basket.settlement.card.note:the most is held, the real weight is charged`,
    },
  ];
  /** The day that the order would be for: "for Fri 4 Dec". */
  protected readonly dayWords = computed(() => {
    const day = this.day();
    return day && isPlantDate(day)
      ? $localize`:@@basket.forDay:for ${formatPlantDate(day, 'short', this.locale)}:day:`
      : '';
  });
  /** What is asked of the placing's answer at its fields, beside what is wrong as a whole. */
  protected readonly refusals = computed(() => {
    const problem = this.placing().problem;
    if (!problem) return null;
    const lines = this.lines();
    return {
      ...problem,
      errors: problem.errors.map(({ pointer, message }) => {
        const line = lines[Number(/^\/lines\/(\d+)/.exec(pointer)?.[1] ?? NaN)];
        return { pointer, message: line ? `${line.name}: ${message}` : message };
      }),
    };
  });

  constructor() {
    this.store.dispatch(BasketPageActions.opened());
    inject(Actions)
      .pipe(ofType(CheckoutApiActions.placed), takeUntilDestroyed())
      .subscribe(({ order }) => void this.router.navigate(['/basket/placed', order.id]));
  }

  protected change(line: CheckedLine, change: Parameters<typeof BasketActions.lineChanged>[1]): void {
    this.store.dispatch(BasketActions.lineChanged(line.id, change));
  }

  protected async remove(line: CheckedLine): Promise<void> {
    const at = this.lines().findIndex(({ id }) => id === line.id);
    const { priced: _priced, ...taken } = line;
    this.store.dispatch(BasketActions.lineRemoved(line.id));
    const undone = await this.toast.show({
      text: $localize`:@@basket.removed:${line.name}:name: was taken out.`,
      act: $localize`:@@basket.undo:Put it back`,
    });
    if (undone) this.store.dispatch(BasketActions.linePutBack(taken, at));
  }

  protected decide(details: Partial<BasketDetails>): void {
    this.store.dispatch(BasketActions.detailsChanged(details));
  }

  protected settle(value: string | null): void {
    if (value === 'account' || value === 'card') this.decide({ settlement: value });
  }

  protected tryAgain(): void {
    this.store.dispatch(BasketPageActions.tryAgainPressed());
  }

  protected place(): void {
    this.store.dispatch(BasketPageActions.placePressed());
  }
}
