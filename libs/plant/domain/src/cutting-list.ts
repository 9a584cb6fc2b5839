import { SPECIES } from '@seamwright/catalogue/domain';
import type { Grams } from '@seamwright/shared/util';
import { gramsIn } from '@seamwright/stock/domain';
import { addQuantities, lineQuantity, type CutQuantity } from './cut-quantity';
import { cutKey, type Cut, type CutFor, type CuttingLine, type Primal } from './cutting-line';
import { addLoads, secondsAt, totalSeconds, type StationLoad } from './station-time';

/** What one customer gets of a cut. */
export interface CustomerShare extends CutQuantity {
  readonly customer: CutFor;
  readonly orderNumbers: readonly number[];
}

/** Everything of one cut that the day asks for. */
export interface CuttingListRow extends CutQuantity {
  readonly cut: Cut;
  /** Primal that must go in, by simple yield. */
  readonly inGrams: Grams;
  readonly stations: readonly StationLoad[];
  readonly seconds: number;
  readonly customers: readonly CustomerShare[];
}

/** Rows with their sums. */
export interface CuttingTotals extends CutQuantity {
  readonly inGrams: Grams;
  readonly seconds: number;
}

/**
 * Adds order lines up to the cutting list: one row for each version and set of choices, per primal in the order of
 * species, primal and name. The order of the lines does not matter, and lines of two lists add up to the list of both;
 * only set-up is spent once for each row. A line with nothing left to cut is left out.
 */
export function cuttingList(lines: readonly CuttingLine[]): CuttingListRow[] {
  const cuts = groupBy(
    lines.filter(({ pieces }) => pieces > 0),
    ({ cut }) => cutKey(cut),
  );
  return cuts.map(rowOf).sort(byPlace);
}

function rowOf(lines: readonly [CuttingLine, ...CuttingLine[]]): CuttingListRow {
  const [{ cut }] = lines;
  const quantity = addQuantities(lines.map(lineQuantity));
  const stations = addLoads(
    cut.stations.map((time) => ({
      station: time.station,
      seconds: secondsAt(time, { ...quantity, yieldPpm: cut.yieldPpm }),
    })),
  );
  return {
    cut,
    ...quantity,
    inGrams: gramsIn(quantity.outGrams, cut.yieldPpm),
    stations,
    seconds: totalSeconds(stations),
    customers: groupBy(lines, ({ customer }) => customer.id)
      .map(shareOf)
      .sort((a, b) => compare(a.customer.name, b.customer.name) || compare(a.customer.id, b.customer.id)),
  };
}

function shareOf(lines: readonly [CuttingLine, ...CuttingLine[]]): CustomerShare {
  return {
    customer: lines[0].customer,
    ...addQuantities(lines.map(lineQuantity)),
    orderNumbers: [...new Set(lines.map(({ orderNumber }) => orderNumber))].sort((a, b) => a - b),
  };
}

/** Sums over rows of the list; what stands in the rows adds up to it. */
export function cuttingTotals(rows: readonly CuttingListRow[]): CuttingTotals {
  return {
    ...addQuantities(rows),
    inGrams: rows.reduce((total, { inGrams }) => (total + inGrams) as Grams, 0 as Grams),
    seconds: rows.reduce((total, { seconds }) => total + seconds, 0),
  };
}

export interface PrimalRows {
  readonly primal: Primal;
  readonly rows: readonly CuttingListRow[];
  readonly totals: CuttingTotals;
}

/** The rows by the primal that they are cut from, in the list's order. */
export function byPrimal(rows: readonly CuttingListRow[]): PrimalRows[] {
  return groupBy(rows, ({ cut }) => cut.primal.id).map((group) => ({
    primal: group[0].cut.primal,
    rows: group,
    totals: cuttingTotals(group),
  }));
}

export interface CustomerCut extends CutQuantity {
  readonly cut: Cut;
  readonly orderNumbers: readonly number[];
}

export interface CustomerCuts {
  readonly customer: CutFor;
  readonly cuts: readonly CustomerCut[];
  readonly totals: CutQuantity;
}

/** The same list turned round: what each customer gets, customers by name, cuts in the list's order. */
export function byCustomer(rows: readonly CuttingListRow[]): CustomerCuts[] {
  const shares = rows.flatMap(({ cut, customers }) => customers.map((share) => ({ cut, ...share })));
  return groupBy(shares, ({ customer }) => customer.id)
    .map((group) => ({
      customer: group[0].customer,
      cuts: group.map(({ cut, orderNumbers, pieces, cases, loosePieces, outGrams }) => ({
        cut,
        orderNumbers,
        pieces,
        cases,
        loosePieces,
        outGrams,
      })),
      totals: addQuantities(group),
    }))
    .sort((a, b) => compare(a.customer.name, b.customer.name) || compare(a.customer.id, b.customer.id));
}

/** Work of the whole list by station. */
export const stationLoads = (rows: readonly CuttingListRow[]): StationLoad[] =>
  addLoads(rows.flatMap(({ stations }) => stations));

function byPlace({ cut: a }: CuttingListRow, { cut: b }: CuttingListRow): number {
  return (
    SPECIES.indexOf(a.primal.species) - SPECIES.indexOf(b.primal.species) ||
    compare(a.primal.name, b.primal.name) ||
    compare(a.primal.id, b.primal.id) ||
    compare(a.name, b.name) ||
    compare(a.choiceKey, b.choiceKey) ||
    compare(a.versionId, b.versionId)
  );
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

/** Groups in the order in which their first member comes. */
function groupBy<T>(items: readonly T[], keyOf: (item: T) => string): [T, ...T[]][] {
  const groups = new Map<string, [T, ...T[]]>();
  for (const item of items) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return [...groups.values()];
}
