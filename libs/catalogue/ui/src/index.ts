export { speciesName } from '@seamwright/catalogue/domain';
export { CarcaseChart, type ChartRegion } from './carcase/carcase-chart';
export { regionName } from './carcase/region-names';
export {
  boneStateName,
  finishName,
  outputKindName,
  packTypeName,
  pieceName,
  stageName,
  stationName,
  temperatureName,
} from './catalogue-words';
export { SpecChoices, type ValueChosen } from './choices/spec-choices';
export { SpecDrawing } from './drawing/spec-drawing';
export { SpecThumb } from './drawing/spec-thumb';
export { weightText } from './weight-words';
