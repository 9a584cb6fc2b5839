import { addSite, createCustomer } from '@seamwright/identity/server';
import { addPriceList } from '@seamwright/pricing/server';
import { inTransaction, system, type Caller, type Database } from '@seamwright/shared/server';
import { TEST_NOW } from '@seamwright/shared/server/testing';
import { addCaller } from './people';

/** A customer with a site that is delivered to, who buys for it, and a price list of its own. */
export interface Party {
  readonly id: string;
  readonly name: string;
  readonly siteId: string;
  readonly siteName: string;
  readonly buyer: Caller;
  readonly owner: Caller;
  readonly priceListId: string;
}

interface Wanted {
  readonly name: string;
  readonly zoneId: string;
  readonly specificationId: string;
}

/** The first day of the price in the customer's own list. */
export const OWN_PRICE_FROM = '2027-06-01';

export async function addParty(database: Database, { name, zoneId, specificationId }: Wanted): Promise<Party> {
  const party = await inTransaction(database, system('seed'), async (tx) => {
    const id = await createCustomer(tx, TEST_NOW, { ...customerFacts, name });
    const siteName = `Kitchen of ${name}`;
    const siteId = await addSite(tx, id, siteFacts(siteName));
    await tx.insertInto('siteZones').values({ siteId, customerId: id, zoneId }).execute();
    const line = { specificationId, choiceKey: null, basis: 'kg' as const, priceMinor: 2_300, breaks: [] };
    const priceListId = await addPriceList(tx, {
      level: 'customer',
      groupId: null,
      customerId: id,
      name: `List of ${name}`,
      lines: [{ ...line, validFrom: OWN_PRICE_FROM, validUntil: null }],
    });
    return { id, name, siteId, siteName, priceListId };
  });
  const buyer = await addCaller(database, 'buyer', party.id);
  const owner = await addCaller(database, 'buyer_owner', party.id);
  return { ...party, buyer, owner };
}

export const customerFacts = {
  name: 'A customer',
  kind: 'pub' as const,
  groupId: null,
  invoiceEmail: 'papers@example.test',
  billingAddress: '1 Quay Street',
  vatNumber: null,
  termsDays: 14,
  termsFrom: 'invoice' as const,
};

export const siteFacts = (name: string) => ({
  name,
  address: '1 Quay Street',
  postcode: 'ZZ1 1AA',
  contactName: null,
  phone: null,
  accessNotes: null,
});
