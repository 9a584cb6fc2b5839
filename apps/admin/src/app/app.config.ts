import { registerLocaleData } from '@angular/common';
import { provideHttpClient } from '@angular/common/http';
import localeEnGb from '@angular/common/locales/en-GB';
import {
  type ApplicationConfig,
  LOCALE_ID,
  provideBrowserGlobalErrorListeners,
  provideZonelessChangeDetection,
} from '@angular/core';
import { provideRouter, withComponentInputBinding, withInMemoryScrolling } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideStore } from '@ngrx/store';
import { provideIdentity } from '@seamwright/identity/data-access/session';
import { provideHeadingFocus, providePageTitle } from '@seamwright/shared/ui/frame';
import { routes } from './app.routes';

registerLocaleData(localeEnGb);

export const appConfig: ApplicationConfig = {
  providers: [
    provideZonelessChangeDetection(),
    provideBrowserGlobalErrorListeners(),
    { provide: LOCALE_ID, useValue: 'en-GB' },
    provideRouter(
      routes,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'enabled' }),
    ),
    provideHeadingFocus(),
    providePageTitle($localize`:@@admin.name:Seamwright desk`),
    // Not by fetch: uploads tell their progress.
    provideHttpClient(),
    provideStore(),
    provideEffects(),
    provideIdentity('admin'),
  ],
};
