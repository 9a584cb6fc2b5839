import { ppm, type Ppm } from '@seamwright/shared/util';

/** Raw meat for people is zero-rated (VAT Notice 701/14). Every line of the catalogue is raw meat. */
export const GOODS_TAX: Ppm = ppm(0);

/**
 * The contract is for delivered goods, so that the delivery charge is part of one supply and takes the goods' rate
 * (VAT Notice 700/24, from memory).
 */
export const DELIVERY_TAX: Ppm = GOODS_TAX;
