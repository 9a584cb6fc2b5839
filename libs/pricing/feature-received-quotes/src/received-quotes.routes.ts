import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { quotesEffects, quotesFeature } from '@seamwright/pricing/data-access';

/** The quotes that a customer received: the list, and one of them. */
export const receivedQuotesRoutes: Routes = [
  {
    path: '',
    providers: [provideState(quotesFeature), provideEffects(quotesEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@received.title:Quotes`,
        loadComponent: () => import('./received-quotes.page').then((m) => m.ReceivedQuotesPage),
      },
      {
        path: ':quoteId',
        title: $localize`:@@received.one.title:Quote`,
        loadComponent: () => import('./received-quote.page').then((m) => m.ReceivedQuotePage),
      },
    ],
  },
];
