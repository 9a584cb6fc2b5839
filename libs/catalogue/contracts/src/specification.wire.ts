import * as z from 'zod';
import {
  AGEING_KINDS,
  BONE_STATES,
  CUT_LEVELS,
  DRAWING_KINDS,
  FINISHES,
  OUTPUT_KINDS,
  PACK_TYPES,
  PIECE_KINDS,
  SPECIES,
  STANDINGS,
  STATIONS,
  TEMPERATURE_STATES,
  VERSION_STATES,
} from '@seamwright/catalogue/domain';
import { gramsWire, id, instant, minor, ppmWire, rowVersion } from '@seamwright/shared/contracts';
import { uneceFieldsWire, versionUneceCode } from './unece.wire';

const millimetres = z.int().meta({ description: 'Whole millimetres' });
const seconds = z.int().meta({ description: 'Whole seconds' });
const days = z.int().nonnegative();

/** The choices that a caller made: choice key → value. */
export const chosenWire = z.record(z.string().max(40), z.string().max(40)).meta({
  description: 'Choice key → chosen value; what is left out takes its usual value',
});

const changes = z
  .strictObject({
    fatCoverMm: millimetres,
    boneState: z.enum(BONE_STATES),
    finish: z.enum(FINISHES),
    packType: z.enum(PACK_TYPES),
    piecesPerPack: z.int(),
    packsPerCase: z.int(),
    pieceNominalGrams: gramsWire,
    pieceMinGrams: gramsWire,
    pieceMaxGrams: gramsWire,
    lengthMm: millimetres,
    widthMm: millimetres,
    heightMm: millimetres,
  })
  .partial();

const offeredValue = {
  value: z.string(),
  label: z.string(),
  priceChangeMinorPerKg: minor,
  leadDays: days,
  changes: changes.optional(),
};

const choiceOf = <T extends z.ZodType>(value: T) =>
  z.strictObject({
    key: z.string(),
    label: z.string(),
    unit: z.string().optional(),
    values: z.array(value),
    defaultValue: z.string(),
  });

const choiceRule = z.strictObject({
  when: z.record(z.string(), z.string()),
  forbids: z.strictObject({ choice: z.string(), value: z.string() }),
  reason: z.string(),
});

const dimensions = { lengthMm: millimetres, widthMm: millimetres, heightMm: millimetres };
const pieceWeights = { pieceNominalGrams: gramsWire, pieceMinGrams: gramsWire, pieceMaxGrams: gramsWire };

const pathStep = z.strictObject({ id, level: z.enum(CUT_LEVELS), name: z.string() });

const ageing = z.strictObject({ kind: z.enum(AGEING_KINDS), minDays: days, maxDays: days });
const methodStep = z.strictObject({ text: z.string(), caution: z.string().optional() });

const publicFields = {
  specificationId: id,
  versionId: id,
  code: z.string(),
  version: z.int(),
  name: z.string(),
  summary: z.string(),
  species: z.enum(SPECIES),
  /** From the species down to the cut. */
  path: z.array(pathStep),
  uneceItem: z.string().nullable(),
  uneceItemSeen: z.boolean().meta({ description: 'False where the item number is from memory only' }),
  fatCode: z.string().nullable(),
  cuttingLines: z.string(),
  boneState: z.enum(BONE_STATES),
  fatCoverMm: millimetres,
  removed: z.array(z.string()),
  finish: z.enum(FINISHES),
  drawingKind: z.enum(DRAWING_KINDS),
  ribs: z.int().nullable(),
  pieceKind: z.enum(PIECE_KINDS),
  ...dimensions,
  toleranceMm: millimetres,
  ...pieceWeights,
  piecesPerPack: z.int(),
  packsPerCase: z.int(),
  packType: z.enum(PACK_TYPES),
  gtin: z.string().nullable(),
  temperatureState: z.enum(TEMPERATURE_STATES),
  storageMinC: z.int(),
  storageMaxC: z.int(),
  shelfLifeDays: days,
  minLifeAtDeliveryDays: days,
  ageing: ageing.nullable(),
  allergens: z.array(z.string()),
  mayContain: z.array(z.string()),
  cookingLossPpm: ppmWire,
  steps: z.array(methodStep),
  choiceRules: z.array(choiceRule),
};

/** The version in force as a buyer sees it: nothing of what it costs the plant. */
export const publicSpecification = z.strictObject({
  ...publicFields,
  choices: z.array(choiceOf(z.strictObject(offeredValue))),
});
export type PublicSpecification = z.infer<typeof publicSpecification>;

const versionEntry = z.strictObject({
  version: z.int(),
  state: z.enum(VERSION_STATES),
  standing: z.enum(STANDINGS).nullable(),
  since: instant.nullable(),
  reason: z.string().nullable(),
});

const staffChoice = choiceOf(
  z.strictObject({
    ...offeredValue,
    yieldFactorPpm: ppmWire,
    extraSecondsPerKg: seconds,
    extraSecondsPerPiece: seconds,
    station: z.enum(STATIONS).optional(),
  }),
);
const stationTime = z.strictObject({
  station: z.enum(STATIONS),
  setUpSeconds: seconds,
  secondsPerKg: seconds,
  secondsPerPiece: seconds,
});
const otherOutput = z.strictObject({
  name: z.string(),
  kind: z.enum(OUTPUT_KINDS),
  yieldPpm: ppmWire,
  valueMinorPerKg: minor,
  visualLean: z.int().optional(),
});

/** One version as staff see it: with yields, work and what else the cut gives. */
export const staffSpecification = z.strictObject({
  ...publicFields,
  rowVersion,
  state: z.enum(VERSION_STATES),
  standing: z.enum(STANDINGS).nullable(),
  sourceNodeId: id,
  sourceName: z.string(),
  uneceFields: uneceFieldsWire,
  unece: versionUneceCode,
  tareGrams: gramsWire,
  yieldPpm: ppmWire,
  choices: z.array(staffChoice),
  stations: z.array(stationTime),
  otherOutputs: z.array(otherOutput),
  authorId: id,
  authorName: z.string(),
  approverName: z.string().nullable(),
  approvedAt: instant.nullable(),
  /** Every version of the specification, newest first. */
  versions: z.array(versionEntry),
});
export type StaffSpecification = z.infer<typeof staffSpecification>;

const MOST_ENTRIES = 60;
const written = (max: number) => z.string().max(max);
const number = z.int();

/**
 * What an author wrote so far. Any field may be missing, and numbers may be out of bounds: what is wrong is told before
 * review, and what was typed is kept until then.
 */
export const draftContent = z
  .strictObject({
    name: written(120),
    summary: written(400),
    sourceNodeId: id,
    uneceItem: z
      .string()
      .regex(/^\d{4}$/)
      .nullable(),
    uneceItemSeen: z.boolean(),
    fatCode: written(10).nullable(),
    cuttingLines: written(2000),
    boneState: z.enum(BONE_STATES),
    fatCoverMm: number,
    removed: z.array(written(60)).max(MOST_ENTRIES),
    finish: z.enum(FINISHES),
    drawingKind: z.enum(DRAWING_KINDS),
    ribs: number.nullable(),
    pieceKind: z.enum(PIECE_KINDS),
    lengthMm: number,
    widthMm: number,
    heightMm: number,
    toleranceMm: number,
    pieceNominalGrams: number,
    pieceMinGrams: number,
    pieceMaxGrams: number,
    piecesPerPack: number,
    packsPerCase: number,
    packType: z.enum(PACK_TYPES),
    tareGrams: number,
    gtin: written(14).nullable(),
    temperatureState: z.enum(TEMPERATURE_STATES),
    storageMinC: number,
    storageMaxC: number,
    shelfLifeDays: number,
    minLifeAtDeliveryDays: number,
    ageing: z.strictObject({ kind: z.enum(AGEING_KINDS), minDays: number, maxDays: number }).nullable(),
    allergens: z.array(written(60)).max(MOST_ENTRIES),
    mayContain: z.array(written(60)).max(MOST_ENTRIES),
    yieldPpm: number,
    cookingLossPpm: number,
    steps: z.array(z.strictObject({ text: written(2000), caution: written(1000).optional() })).max(MOST_ENTRIES),
    stations: z.array(stationTime).max(MOST_ENTRIES),
    choices: z.array(staffChoice).max(MOST_ENTRIES),
    choiceRules: z.array(choiceRule).max(MOST_ENTRIES),
    otherOutputs: z.array(otherOutput).max(MOST_ENTRIES),
    uneceFields: uneceFieldsWire,
  })
  .partial();
export type DraftContentWire = z.infer<typeof draftContent>;

/** A row of the catalogue: enough to draw and describe it. */
export const specificationCard = z.strictObject({
  specificationId: id,
  versionId: id,
  code: z.string(),
  name: z.string(),
  summary: z.string(),
  species: z.enum(SPECIES),
  primalName: z.string().nullable(),
  boneState: z.enum(BONE_STATES),
  fatCoverMm: millimetres,
  finish: z.enum(FINISHES),
  drawingKind: z.enum(DRAWING_KINDS),
  ribs: z.int().nullable(),
  pieceKind: z.enum(PIECE_KINDS),
  ...dimensions,
  ...pieceWeights,
  piecesPerCase: z.int(),
  hasChoices: z.boolean(),
});
export type SpecificationCard = z.infer<typeof specificationCard>;

/** A row of the technical list: the newest version of each specification, wherever it stands. */
export const specificationRow = z.strictObject({
  specificationId: id,
  code: z.string(),
  name: z.string(),
  species: z.enum(SPECIES),
  primalName: z.string().nullable(),
  version: z.int(),
  state: z.enum(VERSION_STATES),
  standing: z.enum(STANDINGS).nullable(),
  since: instant.nullable(),
});
export type SpecificationRow = z.infer<typeof specificationRow>;

export const cutNodeWire = z.strictObject({
  id,
  parentId: id.nullable(),
  species: z.enum(SPECIES),
  level: z.enum(CUT_LEVELS),
  name: z.string(),
  uneceItem: z.string().nullable(),
  uneceItemSeen: z.boolean(),
  region: z.string().nullable(),
  sort: z.int(),
});
