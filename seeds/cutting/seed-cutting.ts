import type { CutNode, SchemeContent } from '@seamwright/catalogue/domain';
import {
  cutNodes,
  createScheme,
  moveScheme,
  recordTests,
  subjectByCode,
  type WantedTest,
} from '@seamwright/catalogue/server';
import { inTransaction, type Caller, type Database, type Tx } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { CUT_TREE } from '../catalogue/cut-tree';
import { SPECIFICATIONS } from '../catalogue';
import { Chance } from '../chance';
import { contentOf, SCHEMES } from './schemes';
import { TESTED_SPECIFICATIONS, testsOf } from './tests';

interface CuttingSeed {
  readonly now: Date;
  readonly timeZone: string;
  /** Two different technical people: one writes schemes and the other approves them; both record tests. */
  readonly author: Caller;
  readonly approver: Caller;
}

/** Loads schemes and cutting tests through the use cases; gives how many tests there are. */
export async function seedCutting(
  database: Database,
  { now, timeZone, author, approver }: CuttingSeed,
): Promise<number> {
  const nodeId = placesOf(await inTransaction(database, author, cutNodes));
  await inTransaction(database, author, async (tx) => {
    for (const data of SCHEMES) await submitted(tx, { now, caller: author }, data.code, contentOf(data, nodeId));
  });
  await inTransaction(database, approver, async (tx) => {
    for (const { code } of SCHEMES)
      await moveScheme(tx, { now, caller: approver }, { code, move: 'approve', rowVersion: SUBMITTED });
  });
  const tests = await inTransaction(database, author, (tx) => testsWanted(tx, now, timeZone));
  const half = Math.ceil(tests.length / 2);
  for (const [caller, share] of [
    [author, tests.slice(0, half)],
    [approver, tests.slice(half)],
  ] as const)
    await inTransaction(database, caller, (tx) => recordTests(tx, { now, caller }, timeZone, share));
  return tests.length;
}

/** Row versions of a scheme's first version: as written, and once submitted. */
const WRITTEN = 1;
const SUBMITTED = 2;

async function submitted(
  tx: Tx,
  by: { now: Date; caller: Caller },
  code: string,
  content: SchemeContent,
): Promise<void> {
  await createScheme(tx, by, { code, content });
  await moveScheme(tx, by, { code, move: 'submit', rowVersion: WRITTEN });
}

async function testsWanted(tx: Tx, now: Date, timeZone: string): Promise<WantedTest[]> {
  const [chance, before] = [new Chance(20_261_010), plantToday(now, timeZone)];
  const subjects = [
    ...SCHEMES.filter(({ kind }) => kind === undefined).map(({ code, input }) => ({ code, input })),
    ...SPECIFICATIONS.filter(({ code }) => TESTED_SPECIFICATIONS.some((tested) => tested === code)).map(
      ({ code, source }) => ({ code, input: source }),
    ),
  ];
  const wanted: WantedTest[] = [];
  for (const { code, input } of subjects) {
    const subject = await subjectByCode(tx, code);
    wanted.push(...testsOf(subject.step, input, { chance, before }).map((content) => ({ subject, content })));
  }
  return wanted;
}

/** The loaded tree by the keys of the seeds: each node under its parent by its name. */
function placesOf(nodes: ReadonlyMap<string, CutNode>): (key: string) => string {
  const ids = new Map<string, string>();
  for (const { key, parent, name } of CUT_TREE) {
    const parentId = parent === null ? null : (ids.get(parent) ?? '');
    const node = [...nodes.values()].find((each) => each.parentId === parentId && each.name === name);
    if (node) ids.set(key, node.id);
  }
  return (key) => {
    const id = ids.get(key);
    if (id === undefined) throw new Error(`There is no cut "${key}" in the tree`);
    return id;
  };
}
