import { customersByNames } from '@seamwright/identity/server';
import {
  faultAt,
  groupRows,
  nameKey,
  type ImportColumn,
  type ImportedOrder,
  type ImportFault,
} from '@seamwright/ordering/domain';
import type { Tx } from '@seamwright/shared/server';
import { ok, refuse, type Refusal, type Result } from '@seamwright/shared/util';
import { sitesInZones, type SiteInZone } from './calendar.repository';
import type { OrderingParts } from './ports';
import { prepareOrders, type OrderFault, type PreparedOrder, type Preparing } from './prepare-orders';
import type { ReadWorkbook } from './read-order-workbook';

/** An order of a workbook that can be placed as it is. */
export interface ImportableOrder {
  readonly imported: ImportedOrder;
  readonly site: SiteInZone;
  readonly prepared: PreparedOrder;
}

export interface ImportPreview {
  readonly orders: readonly ImportableOrder[];
  /** By row, then column. */
  readonly faults: readonly ImportFault[];
}

/** What would become of a workbook's rows now: the orders that can be placed, and every faulty cell of the others. */
export async function previewImport(
  tx: Tx,
  by: Preparing,
  parts: Pick<OrderingParts, 'timeZone' | 'days'>,
  read: ReadWorkbook,
): Promise<ImportPreview> {
  const grouped = groupRows(read.rows);
  const faults: ImportFault[] = [...read.faults, ...grouped.faults];
  const siteOf = await sitesNamed(tx, grouped.orders);
  const placed = grouped.orders.flatMap((imported) => {
    const site = siteOf(imported);
    if (site.ok) return [{ imported, site: site.value }];
    faults.push(...faultsOf(imported, [{ line: null, refusal: site.refusal }]));
    return [];
  });
  const prepared = await prepareOrders(
    tx,
    by,
    parts,
    placed.map(({ imported, site }) => ({
      customerId: site.customerId,
      siteId: site.siteId,
      deliveryDay: imported.day,
      lines: imported.lines,
    })),
  );
  const orders: ImportableOrder[] = [];
  placed.forEach((order, at) => {
    const looked = prepared[at];
    if (!looked) return;
    faults.push(...faultsOf(order.imported, looked.faults));
    const whole = looked.faults.every(({ line }) => line !== null);
    if (whole && looked.lines.length > 0) orders.push({ ...order, prepared: looked });
  });
  return { orders, faults: faults.sort((a, b) => a.row - b.row || (a.column < b.column ? -1 : 1)) };
}

/** Finds the site that an order names; customers and sites are asked for once for all orders. */
async function sitesNamed(
  tx: Tx,
  orders: readonly ImportedOrder[],
): Promise<(order: ImportedOrder) => Result<SiteInZone>> {
  const customers = await customersByNames(tx, [...new Set(orders.map(({ customer }) => nameKey(customer)))]);
  const sites = await sitesInZones(
    tx,
    [...customers.values()].flatMap((found) => found.map(({ id }) => id)),
  );
  return ({ customer, site }) => {
    const [found, another] = customers.get(nameKey(customer)) ?? [];
    if (!found) return refuse('customer-unknown', { name: customer }, '/customerId');
    if (another) return refuse('customer-ambiguous', { name: customer }, '/customerId');
    const own = sites.filter(({ customerId, siteActive }) => customerId === found.id && siteActive);
    const named = site === '' ? own : own.filter(({ siteName }) => nameKey(siteName) === nameKey(site));
    const [only] = named;
    if (!only) return refuse('site-unknown', { name: site }, '/siteId');
    return named.length > 1 ? refuse('site-needed', {}, '/siteId') : ok(only);
  };
}

/** A fault of the whole order stands in each of its rows, since none of them can be placed. */
function faultsOf(order: ImportedOrder, faults: readonly OrderFault[]): ImportFault[] {
  return faults.flatMap(({ line, refusal }) => {
    const rows = line === null ? order.lines : order.lines.slice(line, line + 1);
    return rows.map(({ row }) => faultAt(row, columnOf(refusal), refusal.code, refusal.params));
  });
}

function columnOf({ pointer = '' }: Refusal): ImportColumn {
  const [, field] = pointer.split('/');
  switch (field) {
    case 'customerId':
      return 'customer';
    case 'siteId':
      return 'site';
    case 'deliveryDay':
      return 'day';
    case 'chosen':
      return 'choices';
    case 'quantity':
      return 'quantity';
    default:
      return 'code';
  }
}
