import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import { aContent } from '@seamwright/catalogue/domain/testing';

type OfferedValue = PublicSpecification['choices'][number]['values'][number];

const value = (name: string, priceChangeMinorPerKg: number, changes: OfferedValue['changes']): OfferedValue => ({
  value: name,
  label: name,
  priceChangeMinorPerKg,
  leadDays: 0,
  changes,
});

/** A striploin steak as the API gives it to a buyer: a trim level and a finish to choose, one pair impossible. */
export function aPublicSpecification(stated: Partial<PublicSpecification> = {}): PublicSpecification {
  const content = aContent();
  return {
    specificationId: '0190a000-0000-7000-8000-0000000000a0',
    versionId: '0190a000-0000-7000-8000-0000000000a1',
    code: 'BF-901',
    version: 4,
    name: content.name,
    summary: content.summary,
    species: 'beef',
    path: [
      { id: '0190a000-0000-7000-8000-0000000000c0', level: 'species', name: 'Beef' },
      { id: '0190a000-0000-7000-8000-0000000000c1', level: 'primal', name: 'Striploin' },
    ],
    uneceItem: content.uneceItem,
    uneceItemSeen: content.uneceItemSeen,
    fatCode: null,
    cuttingLines: content.cuttingLines,
    boneState: 'boneless',
    fatCoverMm: 6,
    removed: [...content.removed],
    finish: 'plain',
    drawingKind: 'steak',
    ribs: null,
    pieceKind: 'steak',
    lengthMm: 148,
    widthMm: 78,
    heightMm: 26,
    toleranceMm: 3,
    pieceNominalGrams: 280,
    pieceMinGrams: 266,
    pieceMaxGrams: 294,
    piecesPerPack: 2,
    packsPerCase: 12,
    packType: 'vacuum',
    gtin: null,
    temperatureState: 'chilled',
    storageMinC: 0,
    storageMaxC: 4,
    shelfLifeDays: 21,
    minLifeAtDeliveryDays: 14,
    ageing: null,
    allergens: [],
    mayContain: [],
    cookingLossPpm: 250_000,
    steps: [{ text: 'Cut across the grain.', caution: 'Chain-mail glove on.' }],
    choices: [
      {
        key: 'trim',
        label: 'Trim level',
        unit: 'mm fat',
        defaultValue: '6',
        values: [value('6', 0, { fatCoverMm: 6 }), value('0', 280, { fatCoverMm: 0 })],
      },
      {
        key: 'finish',
        label: 'Finish',
        defaultValue: 'plain',
        values: [value('plain', 0, { finish: 'plain' }), value('tied', 40, { finish: 'tied' })],
      },
    ],
    choiceRules: [
      { when: { trim: '0' }, forbids: { choice: 'finish', value: 'tied' }, reason: 'nothing is left to tie' },
    ],
    ...stated,
  };
}
