import { ChangeDetectionStrategy, Component, computed, inject, LOCALE_ID } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { packingFeature, ScaleOrdersPageActions } from '@seamwright/plant/data-access';
import { Empty, ErrorState, Icon, Loading, PageHead } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';
import { TouchChoice } from './touch-choice';
import { openOf } from './weighing';

/** What is to be packed: the days on the floor and their orders, those that wait first. */
@Component({
  imports: [Empty, ErrorState, Icon, Loading, PageHead, RouterLink, TouchChoice],
  templateUrl: './scale-orders.page.html',
  styleUrl: './scale-orders.page.scss',
  host: { class: 'sw-floor sw-dark' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ScaleOrdersPage {
  private readonly store = inject(Store);
  private readonly locale = inject(LOCALE_ID);

  protected readonly orders = this.store.selectSignal(packingFeature.selectOrders);
  protected readonly deliveryDay = this.store.selectSignal(packingFeature.selectDeliveryDay);
  private readonly days = this.store.selectSignal(packingFeature.selectDays);

  protected readonly dayOptions = computed(() =>
    this.days().map(({ deliveryDay }) => ({ value: deliveryDay, label: this.inWords(deliveryDay) })),
  );
  protected readonly sub = computed(() => {
    const day = this.deliveryDay();
    return day === null ? '' : $localize`:@@scale.orders.sub:For delivery on ${this.inWords(day)}:day:`;
  });
  /** Orders that wait come first; numbers go up within each. */
  protected readonly rows = computed(() =>
    (this.orders().data ?? [])
      .map((order) => ({
        order,
        done: order.packedAt !== null,
        pieces: order.lines.reduce((sum, line) => sum + line.pieces, 0),
        open: order.lines.reduce((sum, line) => sum + openOf(line), 0),
      }))
      .sort((a, b) => Number(a.done) - Number(b.done) || a.order.number - b.order.number),
  );

  constructor() {
    this.load();
  }

  protected load(): void {
    this.store.dispatch(ScaleOrdersPageActions.opened());
  }

  protected choose(deliveryDay: string | null): void {
    if (deliveryDay !== null) this.store.dispatch(ScaleOrdersPageActions.dayChosen({ deliveryDay }));
  }

  private inWords(day: string): string {
    return isPlantDate(day) ? formatPlantDate(day, 'short', this.locale) : day;
  }
}
