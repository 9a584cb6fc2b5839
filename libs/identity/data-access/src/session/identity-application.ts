import { InjectionToken } from '@angular/core';

/** Which of the two applications this is. */
export const IDENTITY_APPLICATION = new InjectionToken<'storefront' | 'admin'>('the application somebody signs in to');
