import type { CurrencyCode } from '@seamwright/shared/util';

/** The one currency in which the house keeps its price lists and quotes. */
export const HOUSE_CURRENCY: CurrencyCode = 'GBP';
