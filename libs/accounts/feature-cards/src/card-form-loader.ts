import { InjectionToken } from '@angular/core';
import type { Stripe } from '@stripe/stripe-js';

/** Fetches the processor's own form, which it wants to serve itself; null where there is no window. */
export type CardFormLoader = (publishableKey: string) => Promise<Stripe | null>;

/** Fetched only when a real card is entered: nothing of the processor's runs on any other page. */
export const CARD_FORM_LOADER = new InjectionToken<CardFormLoader>('CARD_FORM_LOADER', {
  providedIn: 'root',
  factory: () => async (publishableKey) => {
    const { loadStripe } = await import('@stripe/stripe-js/pure');
    return loadStripe(publishableKey);
  },
});
