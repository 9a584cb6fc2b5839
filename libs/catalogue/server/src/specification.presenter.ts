import {
  pathTo,
  type CutNode,
  type OfferedValue,
  type SpecificationVersion,
  type UneceFieldValue,
} from '@seamwright/catalogue/domain';
import type { PublicSpecification, SpecificationCard, StaffSpecification } from '@seamwright/catalogue/contracts';
import type { VersionEntry } from './specifications.repository';
import { presentVersionCode } from './unece.presenter';

type Nodes = ReadonlyMap<string, CutNode>;

/** What a buyer may see of a version: no yield, no work, nothing of what by-products bring. */
export function presentPublic(version: SpecificationVersion, nodes: Nodes): PublicSpecification {
  return {
    ...publicFields(version, nodes),
    choices: version.choices.map((choice) => ({ ...choice, values: choice.values.map(offeredOnly) })),
  };
}

export interface StaffParts {
  readonly nodes: Nodes;
  readonly entries: readonly VersionEntry[];
  readonly names: ReadonlyMap<string, string>;
  /** What the fields of the UNECE code can hold. */
  readonly uneceValues: readonly UneceFieldValue[];
}

export function presentStaff(version: SpecificationVersion, parts: StaffParts): StaffSpecification {
  const { nodes, entries, names, uneceValues } = parts;
  const own = entries.find(({ versionId }) => versionId === version.id);
  return {
    ...publicFields(version, nodes),
    // An approved version never changes, but where it stands does.
    rowVersion: own?.standingRowVersion ?? version.rowVersion,
    state: version.state,
    standing: version.standing,
    sourceNodeId: version.sourceNodeId,
    sourceName: nodes.get(version.sourceNodeId)?.name ?? '',
    uneceFields: version.uneceFields,
    unece: presentVersionCode(version, uneceValues),
    tareGrams: version.tareGrams,
    yieldPpm: version.yieldPpm,
    choices: version.choices.map((choice) => ({ ...choice, values: [...choice.values] })),
    stations: [...version.stations],
    otherOutputs: [...version.otherOutputs],
    authorId: version.authoredBy,
    authorName: names.get(version.authoredBy) ?? '',
    approverName: version.approvedBy === null ? null : (names.get(version.approvedBy) ?? ''),
    approvedAt: version.approvedAt?.toISOString() ?? null,
    versions: entries.map(({ version: number, state, standing, since, reason }) => ({
      version: number,
      state: state as StaffSpecification['state'],
      standing: standing as StaffSpecification['standing'],
      since: since?.toISOString() ?? null,
      reason,
    })),
  };
}

export function presentCard(version: SpecificationVersion, nodes: Nodes): SpecificationCard {
  return {
    specificationId: version.specificationId,
    versionId: version.id,
    code: version.code,
    name: version.name,
    summary: version.summary,
    species: version.species,
    primalName: pathTo(nodes, version.cutNodeId).find(({ level }) => level === 'primal')?.name ?? null,
    boneState: version.boneState,
    fatCoverMm: version.fatCoverMm,
    finish: version.finish,
    drawingKind: version.drawingKind,
    ribs: version.ribs,
    pieceKind: version.pieceKind,
    lengthMm: version.lengthMm,
    widthMm: version.widthMm,
    heightMm: version.heightMm,
    pieceNominalGrams: version.pieceNominalGrams,
    pieceMinGrams: version.pieceMinGrams,
    pieceMaxGrams: version.pieceMaxGrams,
    piecesPerCase: version.piecesPerPack * version.packsPerCase,
    hasChoices: version.choices.some(({ values }) => values.length > 1),
  };
}

function offeredOnly({ value, label, priceChangeMinorPerKg, leadDays, changes }: OfferedValue) {
  return { value, label, priceChangeMinorPerKg, leadDays, ...(changes ? { changes } : {}) };
}

function publicFields(version: SpecificationVersion, nodes: Nodes): Omit<PublicSpecification, 'choices'> {
  return {
    specificationId: version.specificationId,
    versionId: version.id,
    code: version.code,
    version: version.version,
    name: version.name,
    summary: version.summary,
    species: version.species,
    path: pathTo(nodes, version.cutNodeId).map(({ id, level, name }) => ({ id, level, name })),
    uneceItem: version.uneceItem,
    uneceItemSeen: version.uneceItemSeen,
    fatCode: version.fatCode,
    cuttingLines: version.cuttingLines,
    boneState: version.boneState,
    fatCoverMm: version.fatCoverMm,
    removed: [...version.removed],
    finish: version.finish,
    drawingKind: version.drawingKind,
    ribs: version.ribs,
    pieceKind: version.pieceKind,
    lengthMm: version.lengthMm,
    widthMm: version.widthMm,
    heightMm: version.heightMm,
    toleranceMm: version.toleranceMm,
    pieceNominalGrams: version.pieceNominalGrams,
    pieceMinGrams: version.pieceMinGrams,
    pieceMaxGrams: version.pieceMaxGrams,
    piecesPerPack: version.piecesPerPack,
    packsPerCase: version.packsPerCase,
    packType: version.packType,
    gtin: version.gtin,
    temperatureState: version.temperatureState,
    storageMinC: version.storageMinC,
    storageMaxC: version.storageMaxC,
    shelfLifeDays: version.shelfLifeDays,
    minLifeAtDeliveryDays: version.minLifeAtDeliveryDays,
    ageing: version.ageing,
    allergens: [...version.allergens],
    mayContain: [...version.mayContain],
    cookingLossPpm: version.cookingLossPpm,
    steps: [...version.steps],
    choiceRules: version.choiceRules.map(({ when, forbids, reason }) => ({ when: { ...when }, forbids, reason })),
  };
}
