export {
  type Choice,
  type ChoiceRule,
  type ChoiceValue,
  type ChosenValues,
  type OfferedValue,
  type VersionChanges,
} from './choices';
export { faultsOfVersion } from './check-version';
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
export { drawnNumbers, type DrawnNumbers } from './drawing/drawn-numbers';
export type { Point } from './drawing/geometry';
export { impliedDifferencePercent, impliedGrams } from './drawing/implied-weight';
export { specDrawing, type Drawing, type Frame, type Measure } from './drawing/spec-drawing';
export type { Part, Shape, ViewName } from './drawing/view';
