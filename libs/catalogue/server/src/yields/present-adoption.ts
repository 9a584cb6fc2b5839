import type { AdoptionAnswer } from '@seamwright/catalogue/contracts';
import {
  schemeOfVersion,
  stepOfScheme,
  subjectOf,
  testsToAdopt,
  type CuttingStep,
  type SchemeContent,
  type VersionState,
} from '@seamwright/catalogue/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { currentSchemes, schemeCodeOfVersion, schemeVersions } from '../schemes/schemes.repository';
import {
  specificationsCutFrom,
  versionEntries,
  versionsByIds,
  type NamedSpecification,
} from '../specifications.repository';
import { testsOf } from './cutting-tests.repository';
import type { YieldParts } from './ports';

interface Adopted {
  readonly kind: 'scheme' | 'specification';
  readonly subjectId: string;
  readonly version: number;
  readonly state: VersionState;
  readonly step: CuttingStep;
  /** The approved version before it. */
  readonly before: CuttingStep | null;
  readonly readers: readonly NamedSpecification[];
}

/** A version that was made by adopting yields: what changed in it, and what reads it. */
export async function presentAdoption(
  tx: Tx,
  { timeZone, readers: port }: YieldParts,
  now: Date,
  versionId: string,
): Promise<AdoptionAnswer> {
  const adopted = (await schemeAdopted(tx, versionId)) ?? (await specificationAdopted(tx, versionId));
  if (!adopted) throw notFound();
  const { step, before, readers } = adopted;
  const tests = testsToAdopt(subjectOf(step), await testsOf(tx, { kind: adopted.kind, id: adopted.subjectId }));
  const ids = readers.map(({ specificationId }) => specificationId);
  const today = plantToday(now, timeZone);
  const earlier = new Map(before?.outputs.map(({ key, yieldPpm }) => [key, yieldPpm]));
  return {
    subject: step.code,
    version: adopted.version,
    versionId,
    state: adopted.state,
    tests: tests.length,
    outputs: step.outputs.map(({ key, name, yieldPpm }) => ({
      key,
      name,
      beforePpm: earlier.get(key) ?? null,
      afterPpm: yieldPpm,
    })),
    readBy: {
      specifications: readers.map(({ code, name }) => ({ code, name })),
      priceLines: await port.countPriceLines(tx, ids, today),
      openOrderLines: await port.countOpenOrderLines(tx, ids, today),
    },
  };
}

async function schemeAdopted(tx: Tx, versionId: string): Promise<Adopted | null> {
  const code = await schemeCodeOfVersion(tx, versionId);
  if (code === undefined) return null;
  const versions = await schemeVersions(tx, code);
  const version = versions.find(({ id }) => id === versionId);
  if (!version) return null;
  const before = versions.find((each) => each.version < version.version && each.state === 'approved');
  return {
    kind: 'scheme',
    subjectId: version.schemeId,
    version: version.version,
    state: version.state,
    step: stepOfScheme(code, version.content),
    before: before ? stepOfScheme(code, before.content) : null,
    readers: await specificationsCutFrom(tx, await piecesFrom(tx, version.content)),
  };
}

/** Every piece that comes of a scheme, through the schemes in force that break its pieces further. */
async function piecesFrom(tx: Tx, { outputs }: SchemeContent): Promise<string[]> {
  const schemes = await currentSchemes(tx);
  const places = (of: SchemeContent['outputs']) => of.flatMap(({ nodeId }) => (nodeId === null ? [] : [nodeId]));
  const found = new Set(places(outputs));
  for (const nodeId of found)
    for (const { content } of schemes)
      if (content.inputNodeId === nodeId) places(content.outputs).forEach((next) => found.add(next));
  return [...found];
}

async function specificationAdopted(tx: Tx, versionId: string): Promise<Adopted | null> {
  const version = (await versionsByIds(tx, [versionId])).get(versionId);
  if (!version) return null;
  const { specificationId, code, name } = version;
  const earlier = (await versionEntries(tx, specificationId)).find(
    (entry) => entry.version < version.version && entry.state === 'approved',
  );
  const before = earlier && (await versionsByIds(tx, [earlier.versionId])).get(earlier.versionId);
  return {
    kind: 'specification',
    subjectId: specificationId,
    version: version.version,
    state: version.state,
    step: schemeOfVersion(version),
    before: before ? schemeOfVersion(before) : null,
    readers: [{ specificationId, code, name }],
  };
}
