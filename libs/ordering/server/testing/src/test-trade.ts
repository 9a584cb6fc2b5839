import type { SpecificationVersion } from '@seamwright/catalogue/domain';
import { aChoice, aValue } from '@seamwright/catalogue/domain/testing';
import { addTestPeople, addTestSpecification, addTestTree } from '@seamwright/catalogue/server/testing';
import { inTransaction, system, type Caller, type Database } from '@seamwright/shared/server';
import { grams, newId } from '@seamwright/shared/util';

export interface TestCustomer {
  readonly id: string;
  readonly name: string;
  /** The customer's first site; its zone is delivered to on weekdays. */
  readonly siteId: string;
  readonly buyer: Caller;
}

/** Two customers with sites in a zone, a rep, and two specifications with a base price. */
export interface TestTrade {
  readonly zoneId: string;
  readonly rep: Caller;
  readonly admin: Caller;
  /** Has a second site, "Annexe", in the same zone. */
  readonly heron: TestCustomer & { readonly annexeId: string; readonly annexeBuyer: Caller };
  readonly quayside: TestCustomer;
  /** 280 g (266 to 294), £24.00 per kg, 12 to a case; trim 6 (default) or 3 (+ £1.00 per kg), hung needs 3 days more. */
  readonly steak: SpecificationVersion;
  /** 1.8 kg (1.5 to 2.1), £13.50 per kg, 4 to a case. */
  readonly shoulder: SpecificationVersion;
  /** Approved, without any price. */
  readonly unpriced: SpecificationVersion;
}

async function addCustomer(database: Database, now: Date, zoneId: string, name: string, sites: readonly string[]) {
  const id: string = newId();
  const personId: string = newId();
  const siteIds = sites.map((): string => newId());
  await inTransaction(database, system('seed'), async (tx) => {
    await tx
      .insertInto('customers')
      .values({
        id,
        name,
        kind: 'restaurant',
        invoiceEmail: 'papers@example.test',
        billingAddress: '1 Quay Street',
        createdAt: now,
      })
      .execute();
    await tx
      .insertInto('sites')
      .values(
        sites.map((site, at) => ({
          id: siteIds[at] ?? '',
          customerId: id,
          name: site,
          address: `${at + 1} Quay Street`,
          postcode: 'ZZ1 1AA',
        })),
      )
      .execute();
    await tx
      .insertInto('siteZones')
      .values(siteIds.map((siteId) => ({ siteId, customerId: id, zoneId })))
      .execute();
    await tx
      .insertInto('people')
      .values({
        id: personId,
        email: `${personId}@example.test`,
        name: `Buyer of ${name}`,
        roles: ['buyer'],
        customerId: id,
        createdAt: now,
      })
      .execute();
  });
  const buyer: Caller = { kind: 'user', personId, roles: ['buyer'], customerId: id, sites: '*' };
  return { id, name, siteId: siteIds[0] ?? '', buyer, siteIds };
}

async function addStaff(database: Database, now: Date, role: 'rep' | 'admin'): Promise<Caller> {
  const personId: string = newId();
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('people')
      .values({ id: personId, email: `${personId}@example.test`, name: `The ${role}`, roles: [role], createdAt: now })
      .execute(),
  );
  return { kind: 'staff', personId, roles: [role], customers: '*' };
}

async function addBasePrices(database: Database, prices: readonly (readonly [SpecificationVersion, number])[]) {
  const priceListId = newId();
  await inTransaction(database, system('seed'), async (tx) => {
    await tx.insertInto('priceLists').values({ id: priceListId, level: 'base', name: 'Base list' }).execute();
    await tx
      .insertInto('priceLines')
      .values(
        prices.map(([{ specificationId }, priceMinor]) => ({
          id: newId(),
          priceListId,
          specificationId,
          basis: 'kg',
          priceMinor,
          valid: '[2026-01-01,)',
        })),
      )
      .execute();
  });
}

/** Furnishes a fresh database with what orders need. `now` is when the customers and specifications were made. */
export async function addTestTrade(database: Database, now: Date): Promise<TestTrade> {
  const zoneId: string = newId();
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('deliveryZones')
      .values({
        id: zoneId,
        name: 'Harbour',
        weekdays: [1, 2, 3, 4, 5],
        cutOffTime: '14:00',
        leadDays: 1,
        deliveryChargeMinor: 650,
      })
      .execute(),
  );
  const { siteIds: heronSites, ...heron } = await addCustomer(database, now, zoneId, 'The Heron Rooms', [
    'Heron kitchen',
    'Annexe',
  ]);
  const { siteIds: _quaySites, ...quayside } = await addCustomer(database, now, zoneId, 'Quayside Canteen', [
    'Canteen',
  ]);
  const annexeId = heronSites[1] ?? '';
  const people = await addTestPeople(database, now);
  const tree = await addTestTree(database);
  const steakPlace = { now, people, cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
  const steak = await addTestSpecification(database, {
    ...steakPlace,
    code: 'BF-901',
    content: {
      name: 'Striploin steak',
      pieceNominalGrams: grams(280),
      pieceMinGrams: grams(266),
      pieceMaxGrams: grams(294),
      piecesPerPack: 2,
      packsPerCase: 6,
      choices: [
        aChoice('trim', [aValue('6'), aValue('3', { priceChangeMinorPerKg: 100 })], 'mm fat'),
        aChoice('ageing', [aValue('fresh'), aValue('hung', { leadDays: 3 })]),
      ],
      choiceRules: [],
    },
  });
  const shoulder = await addTestSpecification(database, {
    now,
    people,
    cutNodeId: tree.rolledShoulderId,
    sourceNodeId: tree.shoulderId,
    code: 'LM-204',
    content: {
      name: 'Rolled shoulder',
      pieceNominalGrams: grams(1800),
      pieceMinGrams: grams(1500),
      pieceMaxGrams: grams(2100),
      piecesPerPack: 1,
      packsPerCase: 4,
      choices: [],
      choiceRules: [],
    },
  });
  const unpriced = await addTestSpecification(database, {
    ...steakPlace,
    code: 'BF-999',
    content: { name: 'Striploin tail', choices: [], choiceRules: [] },
  });
  await addBasePrices(database, [
    [steak, 2400],
    [shoulder, 1350],
  ]);
  const annexePerson = await addSiteBuyer(database, now, heron.id, annexeId);
  return {
    zoneId,
    rep: await addStaff(database, now, 'rep'),
    admin: await addStaff(database, now, 'admin'),
    heron: { ...heron, annexeId, annexeBuyer: annexePerson },
    quayside,
    steak,
    shoulder,
    unpriced,
  };
}

async function addSiteBuyer(database: Database, now: Date, customerId: string, siteId: string): Promise<Caller> {
  const personId: string = newId();
  await inTransaction(database, system('seed'), async (tx) => {
    await tx
      .insertInto('people')
      .values({
        id: personId,
        email: `${personId}@example.test`,
        name: 'Buyer of the annexe',
        roles: ['buyer'],
        customerId,
        allSites: false,
        createdAt: now,
      })
      .execute();
    await tx.insertInto('personSites').values({ personId, customerId, siteId }).execute();
  });
  return { kind: 'user', personId, roles: ['buyer'], customerId, sites: [siteId] };
}
