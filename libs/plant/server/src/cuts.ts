import { resolveChoices, type ResolvedSpecification } from '@seamwright/catalogue/domain';
import { cutNodes, versionsByIds } from '@seamwright/catalogue/server';
import type { OrderLine } from '@seamwright/ordering/domain';
import type { Cut } from '@seamwright/plant/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';

export interface ResolvedCut {
  readonly cut: Cut;
  readonly resolved: ResolvedSpecification;
}

/** What is cut for each of these lines, by line id: the version that was agreed, with its choices applied. */
export async function cutsOfLines(tx: Tx, lines: readonly OrderLine[]): Promise<Map<string, ResolvedCut>> {
  const versions = await versionsByIds(tx, [...new Set(lines.map(({ versionId }) => versionId))]);
  const nodes = await cutNodes(tx);
  return new Map(
    lines.map((line) => {
      const version = versions.get(line.versionId);
      const node = version && nodes.get(version.sourceNodeId);
      if (!version || !node) throw notFound();
      const resolved = unwrap(resolveChoices(version, line.chosen));
      return [line.id, { resolved, cut: cutOf(line, resolved, node) }];
    }),
  );
}

const cutOf = (line: OrderLine, resolved: ResolvedSpecification, { id, name, species }: Cut['primal']): Cut => ({
  versionId: line.versionId,
  choiceKey: line.choiceKey,
  code: line.code,
  name: line.name,
  summary: line.choiceSummary,
  primal: { id, name, species },
  pieceNominalGrams: resolved.piece.nominalGrams,
  piecesPerCase: resolved.piecesPerCase,
  yieldPpm: resolved.yieldPpm,
  stations: resolved.stations,
});
