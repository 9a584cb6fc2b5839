import { cycleThrough, faultsOfScheme, stepOfScheme, type SchemeContent } from '@seamwright/catalogue/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import { ProblemError, type Tx } from '@seamwright/shared/server';
import type { Refusal } from '@seamwright/shared/util';
import { cutNodes } from '../cut-nodes.repository';
import { placesCut } from '../specifications.repository';
import { currentSchemes } from './schemes.repository';

/** What is wrong with a scheme, a circle with what is in force included; its own version in force doesn't count. */
export async function schemeFaults(tx: Tx, code: string, content: SchemeContent): Promise<Refusal[]> {
  const faults = faultsOfScheme(content, await cutNodes(tx));
  const others = [...(await otherSchemes(tx, code)), ...(await specificationSteps(tx))];
  const at = content.outputs.findIndex(
    (output) => cycleThrough({ inputNodeId: content.inputNodeId, outputs: [output] }, others) !== null,
  );
  const isOwnInput = content.outputs[at]?.nodeId === content.inputNodeId;
  return at < 0 || isOwnInput
    ? faults
    : [...faults, { code: 'scheme-cycle', params: { code }, pointer: `/outputs/${at}/nodeId` }];
}

const otherSchemes = async (tx: Tx, code: string) =>
  (await currentSchemes(tx)).filter((each) => each.code !== code).map((each) => stepOfScheme(each.code, each.content));

/** As far as a circle needs them: from which piece to which place. */
const specificationSteps = async (tx: Tx) =>
  (await placesCut(tx)).map(({ sourceNodeId, cutNodeId }) => ({
    inputNodeId: sourceNodeId,
    outputs: [{ nodeId: cutNodeId }],
  }));

/** Refuses all faults at once, each at its field (422). */
export function refuseAll(faults: readonly Refusal[]): void {
  if (faults.length === 0) return;
  const errors = faults.map((fault) => ({ pointer: fault.pointer ?? '', message: sayRefusal(fault) }));
  throw new ProblemError(422, { code: 'invalid', params: {} }, errors);
}
