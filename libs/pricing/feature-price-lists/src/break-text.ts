import { type PriceBasis } from '@seamwright/pricing/domain';
import { basisWord } from '@seamwright/pricing/ui';
import { formatKgWithUnit, grams } from '@seamwright/shared/util';

/** From which quantity on a break holds: "10.000 kg", "3 × case". */
export const breakText = (basis: PriceBasis, fromQuantity: number): string =>
  basis === 'kg' ? formatKgWithUnit(grams(fromQuantity)) : `${fromQuantity} × ${basisWord(basis)}`;
