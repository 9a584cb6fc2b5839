import { makeEnvironmentProviders, type EnvironmentProviders } from '@angular/core';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import * as effects from './customers.effects';
import { customersFeature } from './customers.reducer';

/** The store's customers, for the routes that show them. */
export const provideCustomers = (): EnvironmentProviders =>
  makeEnvironmentProviders([provideState(customersFeature), provideEffects(effects)]);
