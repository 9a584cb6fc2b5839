import type { OrderSource, OrderStage, WhenShort } from '@seamwright/ordering/domain';
import { formatKgWithUnit, grams } from '@seamwright/shared/util';

/** Where an order stands, in a word. */
export function stageWord(stage: OrderStage): string {
  switch (stage) {
    case 'waiting':
      return $localize`:@@order.stage.waiting:Waiting`;
    case 'confirmed':
      return $localize`:@@order.stage.confirmed:Confirmed`;
    case 'released':
      return $localize`:@@order.stage.released:To be cut`;
    case 'in-work':
      return $localize`:@@order.stage.inWork:In work`;
    case 'packed':
      return $localize`:@@order.stage.packed:Packed`;
    case 'done':
      return $localize`:@@order.stage.done:Done`;
    case 'cancelled':
      return $localize`:@@order.stage.cancelled:Cancelled`;
  }
}

/** What happens when a line falls short, as the buyer chose it. */
export function whenShortWord(whenShort: WhenShort): string {
  switch (whenShort) {
    case 'leave-off':
      return $localize`:@@order.short.leaveOff:Leave it off`;
    case 'send-what-there-is':
      return $localize`:@@order.short.send:Send what there is`;
    case 'ask-me':
      return $localize`:@@order.short.ask:Ask me`;
  }
}

export function sourceWord(source: OrderSource): string {
  switch (source) {
    case 'storefront':
      return $localize`:@@order.source.storefront:Storefront`;
    case 'desk':
      return $localize`:@@order.source.desk:Order desk`;
    case 'import':
      return $localize`:@@order.source.import:Workbook`;
  }
}

/** An ordered quantity. Weight is whole grams. */
export type ShownQuantity =
  | { readonly unit: 'piece' | 'case'; readonly count: number }
  | { readonly unit: 'kg'; readonly grams: number; readonly notLess?: boolean };

/** What was ordered, and the pieces that it comes to: "2 cases · 24 pieces". */
export function quantityWords(quantity: ShownQuantity, pieces: number, locale: string): string {
  const inAll =
    pieces === 1
      ? $localize`:@@order.quantity.onePiece:1 piece`
      : $localize`:@@order.quantity.pieces:${pieces}:pieces: pieces`;
  if (quantity.unit === 'kg') {
    const weight = formatKgWithUnit(grams(quantity.grams), locale);
    return quantity.notLess
      ? $localize`:@@order.quantity.atLeast:at least ${weight}:weight: · ${inAll}:pieces:`
      : $localize`:@@order.quantity.about:about ${weight}:weight: · ${inAll}:pieces:`;
  }
  if (quantity.unit === 'piece') return inAll;
  return quantity.count === 1
    ? $localize`:@@order.quantity.oneCase:1 case · ${inAll}:pieces:`
    : $localize`:@@order.quantity.cases:${quantity.count}:cases: cases · ${inAll}:pieces:`;
}
