import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { NewOrderWire } from '@seamwright/ordering/contracts';
import { DELIVERY_TAX, GOODS_TAX, orderTotals } from '@seamwright/ordering/domain';
import type { PricedLine } from '@seamwright/pricing/data-access';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import type { BasketDraft, BasketLine } from '../basket/basket-draft';
import { basketFeature } from '../basket/basket.feature';
import type { DeliveryDaysNow } from '../delivery-days';
import { BasketPageActions, CheckoutApiActions } from './checkout.actions';

export interface CheckoutState {
  readonly days: Remote<DeliveryDaysNow>;
  /** Prices by the id of the basket's line; old ones stay while newer are fetched. */
  readonly prices: Remote<Readonly<Record<string, PricedLine>>>;
  readonly placing: { readonly running: boolean; readonly problem: Problem | null };
}

/** A line of the basket with what the desk says of it; null until it has answered. */
export interface CheckedLine extends BasketLine {
  readonly priced: PricedLine | null;
}

const initial: CheckoutState = { days: idle(), prices: idle(), placing: { running: false, problem: null } };

/** Delivery days, prices and placing, for the basket as it is now. */
export const checkoutFeature = createFeature({
  name: 'checkout',
  reducer: createReducer(
    initial,
    on(BasketPageActions.opened, (state): CheckoutState => ({
      ...state,
      days: loading(state.days),
      placing: initial.placing,
    })),
    on(BasketPageActions.tryAgainPressed, (state): CheckoutState => ({ ...state, days: loading(state.days) })),
    on(CheckoutApiActions.daysLoaded, (state, { days }): CheckoutState => ({ ...state, days: loaded(days) })),
    on(CheckoutApiActions.daysFailed, (state, { problem }): CheckoutState => ({
      ...state,
      days: failed(state.days, problem),
    })),
    on(CheckoutApiActions.pricesAsked, (state): CheckoutState => ({ ...state, prices: loading(state.prices) })),
    on(CheckoutApiActions.pricesLoaded, (state, { prices, lineIds }): CheckoutState => ({
      ...state,
      prices: loaded(
        Object.fromEntries(
          lineIds.flatMap((id, at) => {
            const line = prices.lines[at];
            return line ? [[id, line]] : [];
          }),
        ),
      ),
    })),
    on(CheckoutApiActions.pricesFailed, (state, { problem }): CheckoutState => ({
      ...state,
      prices: failed(state.prices, problem),
    })),
    on(BasketPageActions.placePressed, (state): CheckoutState => ({
      ...state,
      placing: { running: true, problem: null },
    })),
    on(CheckoutApiActions.placed, (state): CheckoutState => ({ ...state, placing: initial.placing, prices: idle() })),
    on(CheckoutApiActions.placeFailed, (state, { problem }): CheckoutState => ({
      ...state,
      placing: { running: false, problem },
    })),
  ),
  extraSelectors: ({ selectDays, selectPrices, selectPlacing }) => {
    const { selectDraft } = basketFeature;
    const selectLines = createSelector(selectDraft, selectPrices, ({ lines }, prices): CheckedLine[] =>
      lines.map((line) => ({ ...line, priced: prices.data?.[line.id] ?? null })),
    );
    /** The site and day in force: what was chosen while it is still offered, else the first that can be. */
    const selectSiteId = createSelector(selectDraft, selectDays, ({ siteId }, days) =>
      days.data?.sites.some(({ id }) => id === siteId) ? siteId : (days.data?.siteId ?? null),
    );
    const selectDeliveryDay = createSelector(selectDraft, selectDays, ({ deliveryDay }, days) => {
      const open = days.data?.days.filter(({ closed }) => !closed) ?? [];
      return (open.find(({ day }) => day === deliveryDay) ?? open[0])?.day ?? null;
    });
    /** Working days that the slowest line needs beyond the zone's own. */
    const selectLeadDays = createSelector(selectLines, (lines) =>
      Math.max(0, ...lines.map(({ priced }) => (priced?.ok ? priced.leadDays : 0))),
    );
    const selectTotals = createSelector(selectLines, selectDays, (lines, days) => {
      const priced = lines.flatMap(({ priced: answer }) => (answer?.ok ? [answer] : []));
      if (priced.length === 0 || priced.length < lines.length || !days.data) return null;
      return orderTotals(
        priced.map(({ amounts }) => ({ ...amounts, taxPpm: GOODS_TAX })),
        days.data.deliveryChargeMinor,
        DELIVERY_TAX,
      );
    });
    const selectMayPlace = createSelector(
      selectTotals,
      selectSiteId,
      selectDeliveryDay,
      selectDraft,
      selectPlacing,
      selectPrices,
      (totals, siteId, day, { settlement, cardId }, placing, prices) =>
        totals !== null &&
        siteId !== null &&
        day !== null &&
        (settlement === 'account' || cardId !== null) &&
        !placing.running &&
        prices.status === 'loaded',
    );
    const selectOrder = createSelector(
      selectDraft,
      selectSiteId,
      selectDeliveryDay,
      selectTotals,
      (draft, siteId, day, totals): NewOrderWire | null =>
        siteId === null || day === null || totals === null ? null : orderOf(draft, siteId, day, totals.max.totalMinor),
    );
    return { selectLines, selectLeadDays, selectSiteId, selectDeliveryDay, selectTotals, selectMayPlace, selectOrder };
  },
});

/** The basket as it is sent: with the upper bound that was shown, so that it can't become dearer unseen. */
function orderOf(draft: BasketDraft, siteId: string, deliveryDay: string, agreedMaxMinor: number): NewOrderWire {
  const { settlement, cardId, customerReference, note, lines } = draft;
  return {
    siteId,
    deliveryDay,
    settlement,
    ...(settlement === 'card' && cardId !== null ? { cardId } : {}),
    customerReference,
    note,
    agreedMaxMinor,
    lines: lines.map(({ specificationId, chosen, quantity, whenShort, note: lineNote }) => ({
      specificationId,
      chosen,
      quantity,
      whenShort,
      note: lineNote,
    })),
  };
}
