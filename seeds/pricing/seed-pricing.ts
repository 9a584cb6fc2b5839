import { addPriceList, type NewPriceLine } from '@seamwright/pricing/server';
import { inTransaction, system, type Database } from '@seamwright/shared/server';
import { BASE_PRICES, OWN_LISTS, type DemoPrices } from './price-data';

interface PricingSeed {
  /** The first day of the prices, before the demo's history begins: YYYY-MM-DD. */
  readonly validFrom: string;
  readonly specificationIds: ReadonlyMap<string, string>;
  /** Ids by the scenario's keys. */
  readonly customers: ReadonlyMap<string, string>;
  /** Ids by name. */
  readonly groups: ReadonlyMap<string, string>;
}

/** Loads the demo's price lists. */
export async function seedPricing(database: Database, seed: PricingSeed): Promise<void> {
  const lines = (prices: DemoPrices): NewPriceLine[] =>
    Object.entries(prices).map(([code, { priceMinor, basis = 'kg', breaks = [] }]) => ({
      specificationId: found(seed.specificationIds, code),
      choiceKey: null,
      basis,
      priceMinor,
      breaks,
      validFrom: seed.validFrom,
      validUntil: null,
    }));
  await inTransaction(database, system('seed'), async (tx) => {
    const owner = { groupId: null, customerId: null };
    await addPriceList(tx, { ...owner, level: 'base', name: 'Base list', lines: lines(BASE_PRICES) });
    for (const { name, group, customer, prices } of OWN_LISTS)
      await addPriceList(tx, {
        level: group === undefined ? 'customer' : 'group',
        groupId: group === undefined ? null : found(seed.groups, group),
        customerId: customer === undefined ? null : found(seed.customers, customer),
        name,
        lines: lines(prices),
      });
  });
}

function found(ids: ReadonlyMap<string, string>, key: string): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`The demo's prices name "${key}", which the scenario does not have`);
  return id;
}
