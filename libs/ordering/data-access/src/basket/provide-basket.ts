import { makeEnvironmentProviders, type EnvironmentProviders } from '@angular/core';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { basketEffects } from './basket.effects';
import { basketFeature } from './basket.feature';

/** Gives an application its basket: that of whoever is signed in. Comes after `provideIdentity`. */
export const provideBasket = (): EnvironmentProviders =>
  makeEnvironmentProviders([provideState(basketFeature), provideEffects(basketEffects)]);
