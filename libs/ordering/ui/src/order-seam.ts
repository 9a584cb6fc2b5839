import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { OrderStage } from '@seamwright/ordering/domain';
import { SeamLine, type SeamStage } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';
import { stageWord } from './order-words';

/** What the seam tells of an order. Instants are ISO 8601, the day YYYY-MM-DD. */
export interface OrderLife {
  readonly stage: OrderStage;
  readonly placedAt: string;
  readonly releasedAt: string | null;
  readonly packedAt: string | null;
  readonly cancelledAt: string | null;
  readonly deliveryDay: string;
}

const ORDER: readonly OrderStage[] = ['waiting', 'confirmed', 'released', 'in-work', 'packed', 'done'];

/** An order's stages as knots: placed, confirmed, released to the floor, packed, delivered; or where it was cancelled. */
export function orderStages(order: OrderLife, locale: string): SeamStage[] {
  const time = (instant: string | null): string =>
    instant === null
      ? ''
      : new Intl.DateTimeFormat(locale, {
          day: 'numeric',
          month: 'short',
          hour: '2-digit',
          minute: '2-digit',
          timeZone: 'Europe/London',
        }).format(new Date(instant));
  const placed: SeamStage = {
    label: $localize`:@@order.seam.placed:Placed`,
    note: time(order.placedAt),
    state: 'passed',
  };
  if (order.stage === 'cancelled')
    return [placed, { label: stageWord('cancelled'), note: time(order.cancelledAt), state: 'now' }];
  const at = ORDER.indexOf(order.stage);
  const knot = (label: string, from: OrderStage, to: OrderStage, note = ''): SeamStage => ({
    label,
    note,
    state: at > ORDER.indexOf(to) ? 'passed' : at >= ORDER.indexOf(from) ? 'now' : 'ahead',
  });
  const day = isPlantDate(order.deliveryDay) ? formatPlantDate(order.deliveryDay, 'short', locale) : '';
  return [
    placed,
    order.stage === 'waiting'
      ? { label: $localize`:@@order.seam.waiting:Waiting for payment`, state: 'now' }
      : knot(stageWord('confirmed'), 'confirmed', 'confirmed'),
    knot($localize`:@@order.seam.cutting:Cutting`, 'released', 'in-work', time(order.releasedAt)),
    knot(stageWord('packed'), 'packed', 'packed', time(order.packedAt)),
    {
      label: $localize`:@@order.seam.delivery:Delivery`,
      note: day,
      state: order.stage === 'done' ? 'passed' : 'ahead',
    },
  ];
}

/** Where an order stands between being placed and its delivery. */
@Component({
  selector: 'sw-order-seam',
  imports: [SeamLine],
  template: `<sw-seam-line [stages]="stages()" [label]="label" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderSeam {
  readonly order = input.required<OrderLife>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly stages = computed(() => orderStages(this.order(), this.locale));
  protected readonly label = $localize`:@@order.seam.label:Stages of the order`;
}
