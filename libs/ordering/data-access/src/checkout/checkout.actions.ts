import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import type { PriceCheckAnswer } from '@seamwright/pricing/data-access';
import type { Problem } from '@seamwright/shared/contracts';
import type { DeliveryDaysNow } from '../delivery-days';

export const BasketPageActions = createActionGroup({
  source: 'Basket Page',
  events: {
    Opened: emptyProps(),
    'Try Again Pressed': emptyProps(),
    'Place Pressed': emptyProps(),
  },
});

export const CheckoutApiActions = createActionGroup({
  source: 'Checkout API',
  events: {
    'Days Loaded': props<{ days: DeliveryDaysNow }>(),
    'Days Failed': props<{ problem: Problem }>(),
    'Prices Asked': emptyProps(),
    'Prices Loaded': props<{ prices: PriceCheckAnswer; lineIds: readonly string[] }>(),
    'Prices Failed': props<{ problem: Problem }>(),
    Placed: props<{ order: OrderDetail }>(),
    'Place Failed': props<{ problem: Problem }>(),
  },
});
