import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { quotesEffects, quotesFeature } from '@seamwright/pricing/data-access';

/** The desk's quotes: the list, a new one, and one of them. */
export const quotesRoutes: Routes = [
  {
    path: '',
    providers: [provideState(quotesFeature), provideEffects(quotesEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@quotes.title:Quotes`,
        loadComponent: () => import('./quotes.page').then((m) => m.QuotesPage),
      },
      {
        path: 'new',
        title: $localize`:@@quotes.new.title:New quote`,
        loadComponent: () => import('./new-quote.page').then((m) => m.NewQuotePage),
      },
      {
        path: ':quoteId',
        title: $localize`:@@quotes.one.title:Quote`,
        loadComponent: () => import('./quote.page').then((m) => m.QuotePage),
      },
    ],
  },
];
