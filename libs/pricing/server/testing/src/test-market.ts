import type { SpecificationVersion } from '@seamwright/catalogue/domain';
import { aChoice, aValue } from '@seamwright/catalogue/domain/testing';
import { addTestPeople, addTestSpecification, addTestTree } from '@seamwright/catalogue/server/testing';
import { addPriceList } from '../../src/index';
import { inTransaction, system, type Caller, type Database } from '@seamwright/shared/server';
import { grams, newId } from '@seamwright/shared/util';

export interface TestMarket {
  /** A hotel in a group, with a list of its own. */
  readonly hotelId: string;
  readonly hotelBuyer: Caller;
  /** A pub without group or list. */
  readonly pubId: string;
  readonly pubBuyer: Caller;
  readonly rep: Caller;
  /** Serves the pub only. */
  readonly pubRep: Caller;
  /** A boneless shoulder of 2 kg (1.9 to 2.1), four to a case; a closer trim costs 45p more per kg. */
  readonly shoulder: SpecificationVersion;
  /** A steak of 280 g (266 to 294), twelve to a case. */
  readonly steak: SpecificationVersion;
  readonly lists: { readonly base: string; readonly group: string; readonly hotel: string };
}

/**
 * Two customers, who serves and buys for them, two specifications, and prices per kg from the start of 2026.
 * Base list: shoulder £10.00, steak £20.00 (£19.00 from 10 kg). Group's: shoulder £9.50. Hotel's: steak £18.50.
 */
export async function addTestMarket(database: Database, now: Date): Promise<TestMarket> {
  const [hotelId, pubId, groupId] = [newId(), newId(), newId()];
  const [hotelBuyerId, pubBuyerId, repId, pubRepId] = [newId(), newId(), newId(), newId()];
  const person = (id: string, name: string, role: string, customerId: string | null) => ({
    id,
    name,
    email: `${id}@example.test`,
    roles: [role],
    customerId,
    createdAt: now,
  });
  await inTransaction(database, system('seed'), async (tx) => {
    await tx.insertInto('customerGroups').values({ id: groupId, name: 'Test inns' }).execute();
    await tx
      .insertInto('customers')
      .values([
        { ...aCustomer('Test hotel', now), id: hotelId, kind: 'hotel', groupId },
        { ...aCustomer('Test pub', now), id: pubId, kind: 'pub' },
      ])
      .execute();
    await tx
      .insertInto('people')
      .values([
        person(hotelBuyerId, 'Hattie Hotel', 'buyer', hotelId),
        person(pubBuyerId, 'Paul Pub', 'buyer_owner', pubId),
        person(repId, 'Rae Rep', 'rep', null),
        { ...person(pubRepId, 'Robin Rep', 'rep', null), allCustomers: false },
      ])
      .execute();
  });
  const { shoulder, steak } = await addSpecifications(database, now);
  const perKg = (version: SpecificationVersion, priceMinor: number) => ({
    specificationId: version.specificationId,
    choiceKey: null,
    basis: 'kg' as const,
    priceMinor,
    validFrom: '2026-01-01',
    validUntil: null,
    breaks: [],
  });
  const lists = await inTransaction(database, system('seed'), async (tx) => ({
    base: await addPriceList(tx, {
      level: 'base',
      groupId: null,
      customerId: null,
      name: 'Base list',
      lines: [
        perKg(shoulder, 1_000),
        { ...perKg(steak, 2_000), breaks: [{ fromQuantity: 10_000, priceMinor: 1_900 }] },
      ],
    }),
    group: await addPriceList(tx, {
      level: 'group',
      groupId,
      customerId: null,
      name: 'Inns list',
      lines: [perKg(shoulder, 950)],
    }),
    hotel: await addPriceList(tx, {
      level: 'customer',
      groupId: null,
      customerId: hotelId,
      name: 'Hotel list',
      lines: [perKg(steak, 1_850)],
    }),
  }));
  const buyer = (personId: string, customerId: string, role: 'buyer' | 'buyer_owner'): Caller => ({
    kind: 'user',
    personId,
    roles: [role],
    customerId,
    sites: '*',
  });
  return {
    hotelId,
    hotelBuyer: buyer(hotelBuyerId, hotelId, 'buyer'),
    pubId,
    pubBuyer: buyer(pubBuyerId, pubId, 'buyer_owner'),
    rep: { kind: 'staff', personId: repId, roles: ['rep'], customers: '*' },
    pubRep: { kind: 'staff', personId: pubRepId, roles: ['rep'], customers: [pubId] },
    shoulder,
    steak,
    lists,
  };
}

const aCustomer = (name: string, createdAt: Date) => ({
  name,
  createdAt,
  invoiceEmail: `${name.replace(' ', '.').toLowerCase()}@example.test`,
  billingAddress: '1 Test Street',
});

async function addSpecifications(database: Database, now: Date) {
  const people = await addTestPeople(database, now);
  const tree = await addTestTree(database);
  const shoulder = await addTestSpecification(database, {
    now,
    people,
    code: 'LM-901',
    cutNodeId: tree.rolledShoulderId,
    sourceNodeId: tree.shoulderId,
    content: {
      name: 'Boneless shoulder',
      pieceNominalGrams: grams(2_000),
      pieceMinGrams: grams(1_900),
      pieceMaxGrams: grams(2_100),
      piecesPerPack: 1,
      packsPerCase: 4,
      choices: [aChoice('trim', [aValue('6'), aValue('3', { priceChangeMinorPerKg: 45, leadDays: 1 })], 'mm fat')],
    },
  });
  const steak = await addTestSpecification(database, {
    now,
    people,
    code: 'BF-901',
    cutNodeId: tree.steakId,
    sourceNodeId: tree.striploinId,
  });
  return { shoulder, steak };
}
