import type { DeliveryDaysAnswer } from '@seamwright/ordering/contracts';
import { deliveryDays, DELIVERY_TAX } from '@seamwright/ordering/domain';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { notFound, type Caller, type Tx } from '@seamwright/shared/server';
import { plantToday, RefusalError } from '@seamwright/shared/util';
import { closuresFor, sitesInZones, type SiteInZone } from './calendar.repository';
import type { OrderingParts } from './ports';

export interface DaysWanted {
  readonly customerId?: string | undefined;
  readonly siteId?: string | undefined;
  readonly leadDays: number;
  readonly count: number;
}

/** The customer that a caller speaks for: a buyer's own, or the one that staff name. Another customer's is not found. */
export function customerSpokenFor(caller: Caller, named: string | undefined): string {
  if (caller.kind === 'user') {
    if (named !== undefined && named !== caller.customerId) throw notFound();
    return caller.customerId;
  }
  if (named === undefined) throw new RefusalError({ code: 'customer-missing', params: {}, pointer: '/customerId' });
  return named;
}

/** The next days that a site is delivered to. */
export async function listDeliveryDaysOf(
  tx: Tx,
  { now, caller }: { readonly now: Date; readonly caller: Caller },
  { timeZone, days }: Pick<OrderingParts, 'timeZone' | 'days'>,
  wanted: DaysWanted,
): Promise<DeliveryDaysAnswer> {
  const customerId = customerSpokenFor(caller, wanted.customerId);
  const sites = (await sitesInZones(tx, [customerId])).filter((site) => site.siteActive);
  const site = wanted.siteId
    ? sites.find(({ siteId }) => siteId === wanted.siteId)
    : (sites.find(({ zone }) => zone !== null) ?? sites[0]);
  // Nothing is told of a site, or of a customer, that the caller does not serve.
  if (!site && (wanted.siteId || caller.kind !== 'user')) throw notFound();
  const zone = site?.zone ?? null;
  const next = zone
    ? deliveryDays(zone, await closuresFor(tx, plantToday(now, timeZone)), now, timeZone, wanted.count, wanted.leadDays)
    : [];
  const closed = await days.closedDays(
    tx,
    next.map(({ day }) => day),
  );
  return {
    serverTime: now.toISOString(),
    timeZone,
    siteId: site?.siteId ?? null,
    zoneName: zone?.name ?? null,
    currency: HOUSE_CURRENCY,
    deliveryChargeMinor: zone?.deliveryChargeMinor ?? 0,
    deliveryTaxPpm: DELIVERY_TAX,
    days: next.map(({ day, cutOffAt }) => ({ day, cutOffAt: cutOffAt.toISOString(), closed: closed.has(day) })),
    sites: sites.map(presentSite),
  };
}

const presentSite = ({ siteId, siteName, address, postcode, zone }: SiteInZone) => ({
  id: siteId,
  name: siteName,
  address: `${address}, ${postcode}`,
  zoneName: zone?.name ?? null,
});
