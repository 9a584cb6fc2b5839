import {
  lineWeights,
  resolveChoices,
  type LineWeights,
  type ResolvedSpecification,
  type SpecificationVersion,
} from '@seamwright/catalogue/domain';
import {
  checkDeliveryDay,
  checkLineWeight,
  DELIVERY_TAX,
  GOODS_TAX,
  orderTotals,
  type Closures,
  type OrderTotals,
  type WhenShort,
} from '@seamwright/ordering/domain';
import { lineAmounts, type PriceAnswer } from '@seamwright/pricing/domain';
import { priceFor } from '@seamwright/pricing/server';
import { notFound, type Caller, type Tx } from '@seamwright/shared/server';
import {
  ok,
  plantToday,
  quantity,
  refuse,
  type PlantDate,
  type Quantity,
  type QuantityInput,
  type Refusal,
  type Result,
} from '@seamwright/shared/util';
import { closuresFor, sitesInZones, type SiteInZone } from './calendar.repository';
import { keepDaysOpen } from './lock-days';
import { offeredVersions } from './offered-versions';
import type { OrderingParts } from './ports';

export interface WantedLine {
  readonly specificationId?: string | undefined;
  readonly code?: string | undefined;
  readonly chosen: Readonly<Record<string, string>>;
  readonly quantity: QuantityInput;
  readonly whenShort: WhenShort;
  readonly note: string;
}

export interface WantedOrder {
  readonly customerId: string;
  readonly siteId: string;
  readonly deliveryDay: PlantDate;
  readonly lines: readonly WantedLine[];
}

/** A line with its version, weights and price as they will be stored. */
export interface ReadyLine {
  /** Where it stood among the wanted lines, from 0. */
  readonly index: number;
  /** How the specification was named. */
  readonly named: 'code' | 'specificationId';
  readonly specificationId: string;
  readonly resolved: ResolvedSpecification;
  readonly quantity: Quantity;
  readonly deliveryDay: PlantDate;
  readonly whenShort: WhenShort;
  readonly note: string;
  readonly weights: LineWeights;
  readonly price: PriceAnswer;
  readonly taxPpm: number;
  readonly minMinor: number;
  readonly estimateMinor: number;
  readonly maxMinor: number;
}

/** What is wrong with a wanted order; `line` from 0, null for the whole of it. Pointers start at the line or the order. */
export interface OrderFault {
  readonly line: number | null;
  readonly refusal: Refusal;
}

/** An order that was looked at: what of it can be placed, and what can't. */
export interface PreparedOrder {
  readonly faults: readonly OrderFault[];
  readonly site: SiteInZone | null;
  readonly deliveryChargeMinor: number;
  readonly deliveryTaxPpm: number;
  readonly lines: readonly ReadyLine[];
  readonly totals: OrderTotals;
}

export interface Preparing {
  readonly now: Date;
  readonly caller: Caller;
}

/**
 * Looks at orders as the desk would before taking them: site, day, specifications, choices, quantities and prices, each
 * asked for once for all orders. Days stay locked against closing until the transaction ends. Changes nothing.
 */
export async function prepareOrders(
  tx: Tx,
  { now, caller }: Preparing,
  { timeZone, days }: Pick<OrderingParts, 'timeZone' | 'days'>,
  wanted: readonly WantedOrder[],
): Promise<PreparedOrder[]> {
  const closedDays = new Set<PlantDate>();
  // Always in the order of the calendar, so that two of these can't wait for each other.
  const wantedDays = [...new Set(wanted.map(({ deliveryDay }) => deliveryDay))].sort();
  await keepDaysOpen(tx, wantedDays);
  for (const day of wantedDays) if (await days.isClosed(tx, day)) closedDays.add(day);
  const sites = await sitesInZones(
    tx,
    wanted.map(({ customerId }) => customerId),
  );
  const closures = await closuresFor(tx, plantToday(now, timeZone));
  const versionOf = await offeredVersions(
    tx,
    wanted.flatMap(({ lines }) => lines),
  );
  const by = caller.kind === 'user' ? 'buyer' : 'desk';
  const looked = wanted.map((order) => {
    const site = sites.find(({ siteId, customerId }) => siteId === order.siteId && customerId === order.customerId);
    if (!site) throw notFound();
    const day = (extraLeadDays: number): DayAsked => ({ site, closures, closedDays, now, timeZone, by, extraLeadDays });
    return { order, site, ...lookAt(order, day, versionOf) };
  });
  const prices = await pricesOf(tx, looked);
  return looked.map(({ site, faults, lines }, index) => {
    const priced = lines.map((line, at) => withPrice(line, prices[index]?.[at] ?? refuse('price-on-request')));
    const ready = priced.flatMap((each) => (each.ok ? [each.value] : []));
    const deliveryChargeMinor = site.zone?.deliveryChargeMinor ?? 0;
    return {
      site,
      faults: [...faults, ...priced.flatMap((each, at) => (each.ok ? [] : faultOf(lines[at], each.refusal)))],
      deliveryChargeMinor,
      deliveryTaxPpm: DELIVERY_TAX,
      lines: ready,
      totals: orderTotals(ready, deliveryChargeMinor, DELIVERY_TAX),
    };
  });
}

interface DayAsked {
  readonly site: SiteInZone;
  readonly closures: Closures;
  readonly closedDays: ReadonlySet<PlantDate>;
  readonly now: Date;
  readonly timeZone: string;
  readonly by: 'buyer' | 'desk';
  readonly extraLeadDays: number;
}

type UnpricedLine = Omit<ReadyLine, 'price' | 'taxPpm' | 'minMinor' | 'estimateMinor' | 'maxMinor'>;

const faultOf = (line: UnpricedLine | undefined, refusal: Refusal): OrderFault[] =>
  line ? [{ line: line.index, refusal }] : [];

function lookAt(
  order: WantedOrder,
  day: (extraLeadDays: number) => DayAsked,
  versionOf: (line: WantedLine) => SpecificationVersion | null,
): { faults: OrderFault[]; lines: UnpricedLine[] } {
  const faults: OrderFault[] = [];
  const whole = checkDay(order.deliveryDay, day(0));
  if (!whole.ok) faults.push({ line: null, refusal: whole.refusal });
  const lines: UnpricedLine[] = [];
  order.lines.forEach((line, index) => {
    const looked = lookAtLine(line, index, order.deliveryDay, versionOf(line));
    const slow = looked.ok && whole.ok ? checkDay(order.deliveryDay, day(looked.value.resolved.leadDays)) : ok(true);
    if (!looked.ok) faults.push({ line: index, refusal: looked.refusal });
    else if (!slow.ok) faults.push({ line: index, refusal: { ...slow.refusal, pointer: '/chosen' } });
    else lines.push(looked.value);
  });
  return { faults, lines };
}

function checkDay(day: PlantDate, asked: DayAsked): Result<unknown> {
  const { site, closedDays } = asked;
  if (!site.customerActive) return refuse('customer-not-active', { customer: site.customerName }, '/customerId');
  if (!site.siteActive) return refuse('site-not-active', { site: site.siteName }, '/siteId');
  if (!site.zone) return refuse('site-without-zone', { site: site.siteName }, '/siteId');
  const checked = checkDeliveryDay({ ...asked, zone: site.zone, day });
  if (!checked.ok) return checked;
  return closedDays.has(day) ? refuse('day-closed', { day }, '/deliveryDay') : ok(true);
}

function lookAtLine(
  line: WantedLine,
  index: number,
  deliveryDay: PlantDate,
  version: SpecificationVersion | null,
): Result<UnpricedLine> {
  const named = line.specificationId === undefined ? 'code' : 'specificationId';
  if (!version) return refuse('specification-not-offered', {}, `/${named}`);
  const resolved = resolveChoices(version, line.chosen);
  if (!resolved.ok) {
    const pointer = (resolved.refusal.pointer ?? '').replace('/choices', '/chosen');
    return { ok: false, refusal: { ...resolved.refusal, pointer } };
  }
  const amount = quantity(line.quantity);
  if (!amount.ok)
    return { ok: false, refusal: { ...amount.refusal, pointer: `/quantity${amount.refusal.pointer ?? ''}` } };
  const weights = lineWeights(resolved.value, amount.value);
  const carried = checkLineWeight(weights.maxGrams);
  if (!carried.ok) return carried;
  return ok({
    index,
    named,
    specificationId: version.specificationId,
    resolved: resolved.value,
    quantity: amount.value,
    deliveryDay,
    weights,
    whenShort: line.whenShort,
    note: line.note,
  });
}

/** Prices of all lines, asked once per customer; in the order of the orders and their lines. */
async function pricesOf(
  tx: Tx,
  looked: readonly { readonly order: WantedOrder; readonly lines: readonly UnpricedLine[] }[],
): Promise<Result<PriceAnswer>[][]> {
  const answers = new Map<UnpricedLine, Result<PriceAnswer>>();
  for (const customerId of new Set(looked.map(({ order }) => order.customerId))) {
    const lines = looked.filter(({ order }) => order.customerId === customerId).flatMap((each) => each.lines);
    (await priceFor(tx, customerId, lines)).forEach((answer, at) => {
      const line = lines[at];
      if (line) answers.set(line, answer);
    });
  }
  return looked.map(({ lines }) => lines.map((line) => answers.get(line) ?? refuse('price-on-request')));
}

function withPrice(line: UnpricedLine, answer: Result<PriceAnswer>): Result<ReadyLine> {
  if (!answer.ok) return { ok: false, refusal: { ...answer.refusal, pointer: `/${line.named}` } };
  const amounts = lineAmounts(answer.value.basis, answer.value.priceMinor, line.weights);
  if (!amounts.ok) return { ok: false, refusal: { ...amounts.refusal, pointer: '/quantity' } };
  return ok({ ...line, price: answer.value, taxPpm: GOODS_TAX, ...amounts.value });
}
