import type { searchSpecifications } from '@seamwright/catalogue/contracts';
import type { BoneState, Species } from '@seamwright/catalogue/domain';
import type { Answer } from '@seamwright/shared/contracts';

/** What the catalogue is narrowed to. */
export interface CatalogueFilters {
  readonly q?: string | undefined;
  readonly species?: Species | undefined;
  /** The id of the primal. */
  readonly primal?: string | undefined;
  readonly boneState?: BoneState | undefined;
}

export type FoundPage = Answer<typeof searchSpecifications>;
export type CatalogueCounts = FoundPage['counts'];
