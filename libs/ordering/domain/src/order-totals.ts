import { addMoney, minorUnits, ppm, sumMoney, taxOn, type MinorUnits, type Ppm } from '@seamwright/shared/util';

/** An amount with the rate of tax that lies on it. */
export interface TaxedAmount {
  readonly minor: number;
  readonly taxPpm: number;
}

export interface TaxAtRate {
  readonly taxPpm: Ppm;
  readonly netMinor: MinorUnits;
  readonly taxMinor: MinorUnits;
}

export interface Total {
  readonly netMinor: MinorUnits;
  readonly taxMinor: MinorUnits;
  readonly totalMinor: MinorUnits;
  /** Lowest rate first. */
  readonly taxes: readonly TaxAtRate[];
}

/** Net, tax and total in minor units. Tax is taken per rate on the sum of its amounts, half up (domain: "Invoice"). */
export function totalOf(amounts: readonly TaxedAmount[]): Total {
  const rates = [...new Set(amounts.map(({ taxPpm }) => taxPpm))].sort((a, b) => a - b);
  const taxes = rates.map((rate) => {
    const netMinor = sumMoney(amounts.filter(({ taxPpm }) => taxPpm === rate).map(({ minor }) => minorUnits(minor)));
    return { taxPpm: ppm(rate), netMinor, taxMinor: taxOn(netMinor, ppm(rate)) };
  });
  const netMinor = sumMoney(taxes.map((tax) => tax.netMinor));
  const taxMinor = sumMoney(taxes.map((tax) => tax.taxMinor));
  return { netMinor, taxMinor, totalMinor: addMoney(netMinor, taxMinor), taxes };
}

export interface LineAmounts {
  readonly taxPpm: number;
  readonly minMinor: number;
  readonly estimateMinor: number;
  readonly maxMinor: number;
}

/** What an order will cost at least, most likely, and at most; the last is what a card is held for. */
export interface OrderTotals {
  readonly min: Total;
  readonly estimate: Total;
  readonly max: Total;
}

/**
 * Totals of an order in minor units, with delivery and tax: from the lines at their least, expected and greatest weight
 * (domain: "Estimate", "Card pre-authorisation").
 */
export function orderTotals(
  lines: readonly LineAmounts[],
  deliveryChargeMinor: number,
  deliveryTaxPpm: number,
): OrderTotals {
  const delivery: TaxedAmount = { minor: deliveryChargeMinor, taxPpm: deliveryTaxPpm };
  const at = (amount: 'minMinor' | 'estimateMinor' | 'maxMinor') =>
    totalOf([...lines.map((line) => ({ minor: line[amount], taxPpm: line.taxPpm })), delivery]);
  return { min: at('minMinor'), estimate: at('estimateMinor'), max: at('maxMinor') };
}
