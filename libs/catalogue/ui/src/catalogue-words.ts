import type {
  BoneState,
  Finish,
  OutputKind,
  PackType,
  PieceKind,
  Station,
  TemperatureState,
  VersionStage,
} from '@seamwright/catalogue/domain';

const BONES: Readonly<Record<BoneState, string>> = {
  'bone-in': $localize`:@@catalogue.bone.in:Bone-in`,
  boneless: $localize`:@@catalogue.bone.out:Boneless`,
};
const PACKS: Readonly<Record<PackType, string>> = {
  vacuum: $localize`:@@catalogue.pack.vacuum:vacuum pack`,
  'modified-atmosphere': $localize`:@@catalogue.pack.map:modified-atmosphere pack`,
  tray: $localize`:@@catalogue.pack.tray:tray`,
  paper: $localize`:@@catalogue.pack.paper:paper wrap`,
};
const TEMPERATURES: Readonly<Record<TemperatureState, string>> = {
  chilled: $localize`:@@catalogue.temperature.chilled:Chilled`,
  frozen: $localize`:@@catalogue.temperature.frozen:Frozen`,
  defrosted: $localize`:@@catalogue.temperature.defrosted:Defrosted`,
};
const FINISHES: Readonly<Record<Finish, string>> = {
  plain: $localize`:@@catalogue.finish.plain:plain`,
  scored: $localize`:@@catalogue.finish.scored:scored`,
  rolled: $localize`:@@catalogue.finish.rolled:rolled`,
  tied: $localize`:@@catalogue.finish.tied:tied`,
  squared: $localize`:@@catalogue.finish.squared:squared`,
  'french-trimmed': $localize`:@@catalogue.finish.french:French-trimmed`,
  diced: $localize`:@@catalogue.finish.diced:diced`,
  minced: $localize`:@@catalogue.finish.minced:minced`,
};
const STATIONS: Readonly<Record<Station, string>> = {
  'band-saw': $localize`:@@catalogue.station.saw:Band saw`,
  boning: $localize`:@@catalogue.station.boning:Boning`,
  trimming: $localize`:@@catalogue.station.trimming:Trimming`,
  portioning: $localize`:@@catalogue.station.portioning:Portioning`,
  tying: $localize`:@@catalogue.station.tying:Tying`,
  packing: $localize`:@@catalogue.station.packing:Packing`,
};
const OUTPUTS: Readonly<Record<OutputKind, string>> = {
  'joint-product': $localize`:@@catalogue.output.joint:Joint product`,
  'co-product': $localize`:@@catalogue.output.co:Co-product`,
  'by-product': $localize`:@@catalogue.output.by:By-product`,
};
const STAGES: Readonly<Record<VersionStage, string>> = {
  draft: $localize`:@@catalogue.stage.draft:Draft`,
  'in-review': $localize`:@@catalogue.stage.inReview:In review`,
  current: $localize`:@@catalogue.stage.current:In force`,
  superseded: $localize`:@@catalogue.stage.superseded:Superseded`,
  withdrawn: $localize`:@@catalogue.stage.withdrawn:Withdrawn`,
};
const ONE: Readonly<Record<PieceKind, string>> = {
  piece: $localize`:@@catalogue.piece.piece:piece`,
  steak: $localize`:@@catalogue.piece.steak:steak`,
  joint: $localize`:@@catalogue.piece.joint:joint`,
  rack: $localize`:@@catalogue.piece.rack:rack`,
  leg: $localize`:@@catalogue.piece.leg:leg`,
  chop: $localize`:@@catalogue.piece.chop:chop`,
  shank: $localize`:@@catalogue.piece.shank:shank`,
  bag: $localize`:@@catalogue.piece.bag:bag`,
};
const MANY: Readonly<Record<PieceKind, string>> = {
  piece: $localize`:@@catalogue.pieces.piece:pieces`,
  steak: $localize`:@@catalogue.pieces.steak:steaks`,
  joint: $localize`:@@catalogue.pieces.joint:joints`,
  rack: $localize`:@@catalogue.pieces.rack:racks`,
  leg: $localize`:@@catalogue.pieces.leg:legs`,
  chop: $localize`:@@catalogue.pieces.chop:chops`,
  shank: $localize`:@@catalogue.pieces.shank:shanks`,
  bag: $localize`:@@catalogue.pieces.bag:bags`,
};

/** The words of the trade for what the domain keeps as codes. */
export const boneStateName = (boneState: BoneState): string => BONES[boneState];
export const packTypeName = (packType: PackType): string => PACKS[packType];
export const temperatureName = (state: TemperatureState): string => TEMPERATURES[state];
export const finishName = (finish: Finish): string => FINISHES[finish];
export const stationName = (station: Station): string => STATIONS[station];
export const outputKindName = (kind: OutputKind): string => OUTPUTS[kind];
export const stageName = (stage: VersionStage): string => STAGES[stage];
/** "steak" for one, "steaks" for any other number. */
export const pieceName = (kind: PieceKind, count: number): string => (count === 1 ? ONE : MANY)[kind];
