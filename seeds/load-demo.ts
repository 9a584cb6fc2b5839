import { cutNodes } from '@seamwright/catalogue/server';
import type { CutNode } from '@seamwright/catalogue/domain';
import { inTransaction, SetClock, system, type Config, type Database, type Log } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import { buildHouse } from '../apps/api/src/house';
import { callersOf } from './callers';
import { seedCatalogue } from './catalogue';
import { Chance } from './chance';
import { seedCutting } from './cutting/seed-cutting';
import { Desk } from './desk';
import { at, startOfHistory } from './history/history-days';
import { makeHistory } from './history/make-history';
import { seedCalendar } from './history/seed-calendar';
import { openCardTill } from './money/card-till';
import { seedPeople } from './people/seed-people';
import { seedPricing } from './pricing';

interface Loading {
  readonly config: Config;
  /** The worker's role: jobs run in this process while the history is made. */
  readonly database: Database;
  readonly log: Log;
  /** The plant's today in the demo. */
  readonly anchor: PlantDate;
  readonly say: (line: string) => void;
}

/** Fills an empty database with the demo: people, catalogue, prices, and weeks of history made through the use cases. */
export async function loadDemo({ config, database, log, anchor, say }: Loading): Promise<void> {
  const start = startOfHistory(anchor);
  const now = at(start, '05:00');
  const clock = new SetClock(now);
  const jobs = { database, clock, log };
  const house = buildHouse({ config, database, clock, log });
  const desk = new Desk({ ...house, jobs, clock });

  const people = await inTransaction(database, system('seed'), (tx) => seedPeople(tx, now, config.ARGON2_MEMORY_KIB));
  const callers = callersOf(people);
  const who = (key: string) => callers.get(key) ?? system('seed');
  say(`${people.people.size} people at ${people.customers.size} customers`);
  const specificationIds = await seedCatalogue(database, { now, author: who('tamsin'), approver: who('idris') });
  const tests = await seedCutting(database, {
    now,
    timeZone: config.PLANT_TIME_ZONE,
    author: who('tamsin'),
    approver: who('idris'),
  });
  await seedPricing(database, { validFrom: start, specificationIds, ...people });
  await seedCalendar(desk, who('ada'), people);
  say(`${specificationIds.size} specifications with their prices, and ${tests} cutting tests`);
  await makeHistory({
    desk,
    chance: new Chance(20_261_201),
    people,
    callers,
    nodes: await primalsByKey(database),
    specificationIds,
    till: await openCardTill({ origin: processorOf(config), desk, callers }, now),
    anchor,
    say,
  });
  house.close();
}

/** The primals by the keys that the seeds use: species and name. */
async function primalsByKey(database: Database): Promise<ReadonlyMap<string, CutNode>> {
  const nodes = await inTransaction(database, system('seed'), cutNodes);
  return new Map(
    [...nodes.values()].flatMap((node) =>
      node.level === 'primal' ? [[`${node.species}-${node.region}`, node] as const] : [],
    ),
  );
}

/** Where the card processor's stand-in is reached. */
const processorOf = ({ STRIPE_PROTOCOL, STRIPE_HOST, STRIPE_PORT }: Config): string =>
  `${STRIPE_PROTOCOL}://${STRIPE_HOST}:${STRIPE_PORT}`;
