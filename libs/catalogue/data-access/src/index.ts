export { CatalogueListPageActions } from './catalogue-list.actions';
export * as catalogueListEffects from './catalogue-list.effects';
export { catalogueListFeature } from './catalogue-list.feature';
export type { CatalogueCounts, CatalogueFilters } from './catalogue-list.state';
export { offeredNumbers } from './offered-numbers';
export { SpecificationPageActions } from './specification.actions';
export * as specificationEffects from './specification.effects';
export { specificationFeature } from './specification.feature';
export { TechnicalApi } from './technical-api';
