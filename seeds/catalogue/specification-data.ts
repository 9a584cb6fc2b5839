import type { VersionContent } from '@seamwright/catalogue/domain';

/** A specification of the demo: its code, its place in the cut tree and the primal it is cut from, by their keys. */
export interface SpecificationData extends Omit<VersionContent, 'sourceNodeId'> {
  readonly code: string;
  readonly cut: string;
  readonly source: string;
}
