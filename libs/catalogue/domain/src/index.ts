export {
  type Choice,
  type ChoiceRule,
  type ChoiceValue,
  type ChosenValues,
  type OfferedValue,
  type VersionChanges,
} from './choices';
export { faultsOfVersion, type UneceLists } from './check-version';
export { choiceKey } from './choice-key';
export { whyForbidden, withDefaults } from './choice-rules';
export { CUT_LEVELS, pathTo, primalOf, type CutLevel, type CutNode } from './cut-node';
export {
  AGEING_KINDS,
  BONE_STATES,
  DRAWING_KINDS,
  FINISHES,
  OUTPUT_KINDS,
  PACK_TYPES,
  PIECE_KINDS,
  SPECIES,
  STATIONS,
  TEMPERATURE_STATES,
  type AgeingKind,
  type BoneState,
  type DrawingKind,
  type Finish,
  type OutputKind,
  type PackType,
  type PieceKind,
  type Species,
  type Station,
  type TemperatureState,
} from './cut-words';
export { carcaseMap, regionsOf } from './carcase/carcase-map';
export type { Curve, MapRegion, PlanarMap } from './carcase/planar-map';
export type { StepChange } from './difference/step-difference';
export {
  versionDifference,
  type Stated,
  type VersionChange,
  type VersionDifference,
} from './difference/version-difference';
export { completeDraft, faultsOfDraft, type DraftContent } from './draft';
export { lineWeights, type LineWeights } from './line-weights';
export { primalName, speciesName } from './primal-name';
export { resolveChoices, type ResolvedSpecification } from './resolve-choices';
export { resolveOffer, type PieceWeights, type ResolvedOffer } from './resolve-offer';
export {
  mayApprove,
  specificationStates,
  stageOf,
  STANDINGS,
  VERSION_STATES,
  type Standing,
  type VersionMove,
  type VersionStage,
  type VersionState,
} from './specification.states';
export type {
  Ageing,
  Dimensions,
  MethodStep,
  OfferedNumbers,
  OtherOutput,
  SpecificationVersion,
  StationTime,
  VersionContent,
} from './specification-version';
export { blendLean, leanWithin, type BlendLean } from './schemes/blend-lean';
export { faultsOfScheme } from './schemes/check-scheme';
export {
  cutOut,
  cutOutGrams,
  cutOutTotals,
  shareInPpm,
  type CutOut,
  type CutOutLine,
  type CutOutTotals,
} from './schemes/cut-out';
export {
  addedPpm,
  SCHEME_KINDS,
  schemeLossPpm,
  stepOfScheme,
  type AddedIngredient,
  type Blend,
  type BlendPart,
  type CuttingStep,
  type SchemeContent,
  type SchemeKind,
  type SchemeOutput,
} from './schemes/cutting-scheme';
export { recipeShares, type RecipeShares } from './schemes/recipe-shares';
export { cycleThrough } from './schemes/scheme-cycle';
export { CUT_KEY, schemeOfVersion } from './schemes/scheme-of-version';
export { cutCost, type CutCost } from './yields/butchers-test';
export {
  cuttingLoss,
  faultsOfTest,
  subjectOf,
  type CuttingTestContent,
  type TestInput,
  type TestSubject,
  type WeighedOutput,
} from './yields/cutting-test';
export { outliersAmong } from './yields/outliers';
export {
  awaitingVerdict,
  TEST_VERDICTS,
  testsToAdopt,
  yieldsOf,
  yieldsToAdopt,
  type GroupYield,
  type OutputYield,
  type RecordedTest,
  type TestVerdict,
  type YieldPoint,
} from './yields/yields-of-subject';
export {
  estimateYield,
  yieldOfTest,
  type StudentT,
  type YieldEstimate,
  type YieldObservation,
} from './yields/yield-estimate';
export { drawnNumbers, type DrawnNumbers } from './drawing/drawn-numbers';
export type { Point } from './drawing/geometry';
export { impliedDifferencePercent, impliedGrams } from './drawing/implied-weight';
export { specDrawing, type Drawing, type Frame, type Measure } from './drawing/spec-drawing';
export type { Part, Shape, ViewName } from './drawing/view';
export { type UneceFieldValue } from './unece/field-values';
export { gs1MeatCut } from './unece/gs1-meat-cut';
export {
  CHOSEN_UNECE_FIELDS,
  fillsUneceField,
  UNECE_FIELDS,
  UNECE_LAYOUT,
  type ChosenUneceField,
  type UneceField,
  type UneceFieldLayout,
} from './unece/layout';
export { readUneceCode, type UneceFieldReading, type UneceReading } from './unece/read-code';
export { uneceCodeOf, type UneceFields } from './unece/version-code';
export {
  FAT_BANDS,
  fatBandOf,
  PORTION_BANDS,
  portionBandGrams,
  portionBandOf,
  type FatBand,
  type PortionBand,
} from './search/bands';
export { findable, type Findable } from './search/findable';
export { plainWords } from './search/plain-words';
