import type { SpecificationVersion } from '@seamwright/catalogue/domain';
import { currentVersions, specificationsByCodes } from '@seamwright/catalogue/server';
import type { Tx } from '@seamwright/shared/server';

export interface AskedSpecification {
  readonly specificationId?: string | undefined;
  readonly code?: string | undefined;
}

/** Finds the version in force of each specification asked for; null for one that is withdrawn, or was never there. */
export async function offeredVersions(
  tx: Tx,
  asked: readonly AskedSpecification[],
): Promise<(one: AskedSpecification) => SpecificationVersion | null> {
  const codes = [...new Set(asked.flatMap(({ code }) => (code === undefined ? [] : [code.toUpperCase()])))];
  const ids = asked.flatMap(({ specificationId }) => (specificationId === undefined ? [] : [specificationId]));
  const byCode = await specificationsByCodes(tx, codes);
  const byId = await currentVersions(tx, [...new Set(ids)]);
  return ({ specificationId, code = '' }) =>
    (specificationId === undefined ? byCode.get(code.toUpperCase()) : byId.get(specificationId)) ?? null;
}
