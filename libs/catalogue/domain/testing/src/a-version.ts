import { grams, ppm } from '@seamwright/shared/util';
import type { SpecificationVersion, VersionContent } from '../../src';

/** What an author writes of a boneless striploin steak; a test states only what it is about. */
export function aContent(stated: Partial<VersionContent> = {}): VersionContent {
  return {
    name: 'Striploin steak',
    summary: 'Boneless striploin cut across the grain.',
    sourceNodeId: '00000000-0000-7000-8000-0000000000c1',
    uneceItem: '2140',
    uneceItemSeen: true,
    fatCode: null,
    uneceFields: {},
    cuttingLines: 'Between the last rib and the last lumbar joint.',
    boneState: 'boneless',
    fatCoverMm: 6,
    removed: ['silverskin'],
    finish: 'plain',
    drawingKind: 'steak',
    ribs: null,
    pieceKind: 'steak',
    lengthMm: 148,
    widthMm: 78,
    heightMm: 28,
    toleranceMm: 3,
    pieceNominalGrams: grams(280),
    pieceMinGrams: grams(266),
    pieceMaxGrams: grams(294),
    piecesPerPack: 2,
    packsPerCase: 6,
    packType: 'vacuum',
    tareGrams: grams(18),
    gtin: null,
    temperatureState: 'chilled',
    storageMinC: 0,
    storageMaxC: 4,
    shelfLifeDays: 21,
    minLifeAtDeliveryDays: 14,
    ageing: null,
    allergens: [],
    mayContain: [],
    yieldPpm: ppm(784_000),
    cookingLossPpm: ppm(250_000),
    steps: [{ text: 'Cut across the grain.' }],
    stations: [{ station: 'portioning', setUpSeconds: 300, secondsPerKg: 40, secondsPerPiece: 12 }],
    choices: [],
    choiceRules: [],
    otherOutputs: [],
    ...stated,
  };
}

/** A valid version in force with that content. */
export function aVersion(stated: Partial<SpecificationVersion> = {}): SpecificationVersion {
  return {
    ...aContent(),
    id: '00000000-0000-7000-8000-0000000000a1',
    rowVersion: 1,
    specificationId: '00000000-0000-7000-8000-0000000000a0',
    code: 'BF-901',
    species: 'beef',
    cutNodeId: '00000000-0000-7000-8000-0000000000c2',
    version: 1,
    state: 'approved',
    standing: 'current',
    authoredBy: '00000000-0000-7000-8000-0000000000b1',
    approvedBy: '00000000-0000-7000-8000-0000000000b2',
    approvedAt: new Date('2026-11-01T09:00:00Z'),
    ...stated,
  };
}
