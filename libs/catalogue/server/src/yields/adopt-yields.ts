import {
  awaitingVerdict,
  CUT_KEY,
  schemeOfVersion,
  subjectOf,
  yieldsOf,
  yieldsToAdopt,
  type SchemeContent,
  type SpecificationVersion,
} from '@seamwright/catalogue/domain';
import { conflict, notFound, type Tx } from '@seamwright/shared/server';
import { newId, ppm } from '@seamwright/shared/util';
import { refuseAll, schemeFaults } from '../schemes/scheme-faults';
import { lockScheme, schemeVersions } from '../schemes/schemes.repository';
import { insertNext, type Acting } from '../schemes/write-scheme';
import { versionEntries, versionsByIds } from '../specifications.repository';
import { actingPerson, createVersion, submitVersion } from '../write-version';
import { testsOf } from './cutting-tests.repository';
import { studentT } from './student-t';
import { subjectByCode, type Subject } from './subjects';

/**
 * Makes a new version in review of what was tested, with the yields of the tests that count; another person approves
 * it. Gives the version's id. Refuses `adopt-without-tests`, `adopt-unjudged` (count), `adopt-version-open` (version),
 * `adopt-nothing-came-out` (name), and the faults that the new version would have.
 */
export async function adoptYields(tx: Tx, acting: Acting, code: string): Promise<string> {
  const subject = await subjectByCode(tx, code);
  const tests = await testsOf(tx, subject);
  const of = subjectOf(subject.step);
  const waiting = awaitingVerdict(yieldsOf(of, tests, studentT), tests).length;
  if (waiting > 0) throw conflict('adopt-unjudged', { count: waiting });
  const yields = yieldsToAdopt(of, tests);
  if (yields.size === 0) throw conflict('adopt-without-tests');
  const nothing = subject.step.outputs.find(({ key }) => yields.get(key) === 0);
  if (nothing) throw conflict('adopt-nothing-came-out', { name: nothing.name });
  return subject.kind === 'scheme'
    ? adoptInScheme(tx, acting, subject, yields)
    : adoptInSpecification(tx, acting, subject, yields);
}

async function adoptInScheme(
  tx: Tx,
  { caller }: Acting,
  { code, versionId }: Subject,
  yields: ReadonlyMap<string, number>,
): Promise<string> {
  await lockScheme(tx, code);
  const versions = await schemeVersions(tx, code);
  const [newest] = versions;
  const base = versions.find(({ id }) => id === versionId);
  if (!newest || !base) throw notFound();
  if (newest.state !== 'approved') throw conflict('adopt-version-open', { version: newest.version });
  const content: SchemeContent = {
    ...base.content,
    outputs: base.content.outputs.map((output) => ({ ...output, yieldPpm: yields.get(output.key) ?? output.yieldPpm })),
  };
  refuseAll(await schemeFaults(tx, code, content));
  const id = newId();
  await insertNext(tx, newest, { id, content, state: 'in-review', authoredBy: actingPerson(caller) });
  return id;
}

async function adoptInSpecification(
  tx: Tx,
  { caller }: Acting,
  { id: specificationId, versionId }: Subject,
  yields: ReadonlyMap<string, number>,
): Promise<string> {
  const [newest] = await versionEntries(tx, specificationId);
  const base = (await versionsByIds(tx, [versionId])).get(versionId);
  if (!newest || !base) throw notFound();
  if (newest.state !== 'approved') throw conflict('adopt-version-open', { version: newest.version });
  const id = await createVersion(tx, { caller, specificationId, content: contentWith(base, yields) });
  await submitVersion(tx, id);
  return id;
}

/** What its author wrote, with other yields. */
function contentWith(version: SpecificationVersion, yields: ReadonlyMap<string, number>) {
  const {
    id: _id,
    rowVersion: _rowVersion,
    specificationId: _specificationId,
    code: _code,
    species: _species,
    cutNodeId: _cutNodeId,
    version: _version,
    state: _state,
    standing: _standing,
    authoredBy: _authoredBy,
    approvedBy: _approvedBy,
    approvedAt: _approvedAt,
    ...content
  } = version;
  const keys = schemeOfVersion(version).outputs.slice(1);
  return {
    ...content,
    yieldPpm: ppm(yields.get(CUT_KEY) ?? version.yieldPpm),
    otherOutputs: version.otherOutputs.map((output, at) => ({
      ...output,
      yieldPpm: yields.get(keys[at]?.key ?? '') ?? output.yieldPpm,
    })),
  };
}
