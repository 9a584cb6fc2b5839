import type { SpecificationVersion } from '@seamwright/catalogue/domain';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { addPriceList } from '@seamwright/pricing/server';
import { isBuyerRole, ROLES, type AnyEndpoint, type Role } from '@seamwright/shared/contracts';
import { inTransaction, system, type Caller, type Tx } from '@seamwright/shared/server';
import { TEST_NOW, type Called } from '@seamwright/shared/server/testing';
import { addDays, newId, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import { openWholeHouse, type WholeHouse } from './whole-house';
import type { Input } from '../row';
import { addParty, type Party } from './party';
import { addCaller } from './people';

/** Two customers and everybody who works for the plant, in a house with every endpoint. */
export interface World {
  readonly house: WholeHouse;
  /** Staff who serve every customer, by role; buyers are the parties' own. */
  readonly staff: Readonly<Record<Role, Caller>>;
  readonly own: Party;
  readonly other: Party;
  readonly zoneId: string;
  readonly tree: TestTree;
  readonly authors: TestPeople;
  /** In the catalogue, with a base price. */
  readonly steak: SpecificationVersion;
  /** A number that was not given before. */
  next(): number;
  /** A working day that nothing was ordered for yet. */
  nextDay(): PlantDate;
  /** Does a deed that has to be right; throws what was refused. */
  deed<E extends AnyEndpoint>(caller: Caller, endpoint: E, input: Input<E>): Promise<Called<E>['body']>;
  asSystem<T>(work: (tx: Tx) => Promise<T>): Promise<T>;
}

const FIRST_DAY = '2026-12-14' as PlantDate;
const FRIDAY = 5;

export async function openWorld(): Promise<World> {
  const house = await openWholeHouse();
  const { database } = house;
  const asSystem = <T>(work: (tx: Tx) => Promise<T>): Promise<T> => inTransaction(database, system('seed'), work);
  const authors = await addTestPeople(database, TEST_NOW);
  const tree = await addTestTree(database);
  const place = { now: TEST_NOW, people: authors, cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
  const steak = await addTestSpecification(database, { ...place, code: 'BF-901' });
  const { specificationId } = steak;
  const zoneId: string = newId();
  await asSystem(async (tx) => {
    const zone = { name: 'Harbour', weekdays: [1, 2, 3, 4, 5], cutOffTime: '14:00', leadDays: 1 };
    await tx
      .insertInto('deliveryZones')
      .values({ id: zoneId, ...zone, deliveryChargeMinor: 650 })
      .execute();
    const line = { specificationId, choiceKey: null, basis: 'kg' as const, priceMinor: 2_400, breaks: [] };
    const list = { level: 'base' as const, groupId: null, customerId: null, name: 'Base list' };
    await addPriceList(tx, { ...list, lines: [{ ...line, validFrom: '2026-01-01', validUntil: null }] });
  });
  const own = await addParty(database, { name: 'The Heron Rooms', zoneId, specificationId });
  const other = await addParty(database, { name: 'Quayside Canteen', zoneId, specificationId });
  const staff = {} as Record<Role, Caller>;
  for (const role of ROLES.filter((each) => !isBuyerRole(each))) staff[role] = await addCaller(database, role, own.id);
  let count = 0;
  let day = FIRST_DAY;
  return {
    house,
    staff,
    own,
    other,
    zoneId,
    tree,
    authors,
    steak,
    asSystem,
    next: () => ++count,
    nextDay() {
      day = addDays(day, weekdayOf(day) >= FRIDAY ? 3 : 1);
      return day;
    },
    async deed(caller, endpoint, input) {
      const called = await house.call(caller, endpoint, input);
      if (called.status >= 400) throw new Error(`${endpoint.id} was refused: ${JSON.stringify(called.problem)}`);
      return called.body;
    },
  };
}
