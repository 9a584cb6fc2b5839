import { schemeOfVersion, stepOfScheme, type CuttingStep } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { schemeVersions } from '../schemes/schemes.repository';
import { currentVersions, specificationByCode, versionOf } from '../specifications.repository';

/** What tests are of: a scheme or a specification, by its version in force, else its newest. */
export interface Subject {
  readonly code: string;
  readonly kind: 'scheme' | 'specification';
  /** The scheme's or the specification's own id. */
  readonly id: string;
  readonly versionId: string;
  readonly version: number;
  readonly step: CuttingStep;
}

/** The subject of a code. Refuses `test-subject-unknown` (code) at `/subject`. */
export async function subjectByCode(tx: Tx, code: string): Promise<Subject> {
  const subject = (await schemeSubject(tx, code)) ?? (await specificationSubject(tx, code));
  if (!subject) throw new RefusalError({ code: 'test-subject-unknown', params: { code }, pointer: '/subject' });
  return subject;
}

async function schemeSubject(tx: Tx, code: string): Promise<Subject | null> {
  const versions = await schemeVersions(tx, code);
  const version = versions.find(({ standing }) => standing === 'current') ?? versions[0];
  if (!version) return null;
  return {
    code,
    kind: 'scheme',
    id: version.schemeId,
    versionId: version.id,
    version: version.version,
    step: stepOfScheme(code, version.content),
  };
}

async function specificationSubject(tx: Tx, code: string): Promise<Subject | null> {
  const specification = await specificationByCode(tx, code);
  if (!specification) return null;
  const { id } = specification;
  const version = (await currentVersions(tx, [id])).get(id) ?? (await versionOf(tx, id));
  if (!version) return null;
  return {
    code,
    kind: 'specification',
    id,
    versionId: version.id,
    version: version.version,
    step: schemeOfVersion(version),
  };
}
