// Item numbers, names and field values of the UNECE standards for meat (ECE/TRADE/308 ovine, /326 bovine, /369 porcine),
// which the United Nations publish for free use by the trade. Only numbers and short names are kept, none of the text.
// A value with a source was read in the document named. One without is from memory: it may be wrong, is shown as such,
// tests nothing, and stays so until an administrator corrects it with a source. What was unsure was left out, so that
// fields 5 to 7, 9, 11 and 12, and the ovine fat thickness, begin without a list.

/** A value of a field of the UNECE code, as a house begins with it. */
export interface UneceStartValue {
  readonly field: string;
  readonly value: string;
  readonly meaning: string;
  /** Null for all species; of the field `species`, the house's species that it stands for. */
  readonly species: 'lamb' | 'beef' | 'pork' | null;
  readonly seen: boolean;
  readonly source: string | null;
}

const LLAMA = 'UNECE standard for llama and alpaca meat (2006, in Russian), section 4.1';
const REVISION = 'ECE/TRADE/C/WP.7/2012/7 (bovine revision), excerpt shown by the UN document search';
const WORKING_PAPER =
  'ECE/TRADE/C/WP.7/GE.2/2012/INF.4 (7 September 2012), current codes; names and numbers paired by position';
const GOST = 'GOST 32605-2013, identical to ECE/TRADE/308:2006, clause 5.4.2';

type Listed = readonly [value: string, meaning: string, source?: string];

const listOf = (field: string, species: UneceStartValue['species'], values: readonly Listed[]): UneceStartValue[] =>
  values.map(([value, meaning, source = null]) => ({ field, species, value, meaning, seen: source !== null, source }));

const SPECIES: readonly UneceStartValue[] = [
  { field: 'species', species: 'beef', value: '10', meaning: 'Bovine (beef)', seen: false, source: null },
  { field: 'species', species: null, value: '11', meaning: 'Bovine (veal)', seen: false, source: null },
  { field: 'species', species: 'pork', value: '30', meaning: 'Porcine (pork)', seen: false, source: null },
  { field: 'species', species: 'lamb', value: '40', meaning: 'Ovine (sheep)', seen: false, source: null },
  { field: 'species', species: null, value: '50', meaning: 'Caprine (goat)', seen: false, source: null },
  { field: 'species', species: null, value: '60', meaning: 'Llama', seen: true, source: LLAMA },
  { field: 'species', species: null, value: '61', meaning: 'Alpaca', seen: true, source: LLAMA },
  { field: 'species', species: null, value: '70', meaning: 'Chicken', seen: false, source: null },
  { field: 'species', species: null, value: '71', meaning: 'Turkey', seen: false, source: null },
  { field: 'species', species: null, value: '72', meaning: 'Duck', seen: false, source: null },
  { field: 'species', species: null, value: '73', meaning: 'Goose', seen: false, source: null },
  { field: 'species', species: null, value: '90', meaning: 'Edible meat co-products', seen: false, source: null },
];

export const UNECE_START_VALUES: readonly UneceStartValue[] = [
  ...SPECIES,
  ...listOf('item', 'beef', [
    ['1000', 'Side'],
    ['1500', 'Butt (leg)'],
    ['1550', 'Short loin (T-bone and porterhouse steaks are cut from it)', WORKING_PAPER],
    ['1604', 'Rib, bone-in (rib eye roast/steak bone-in)', WORKING_PAPER],
    ['1617', 'Chuck, seven-bone', WORKING_PAPER],
    ['1622', 'Chuck blade', WORKING_PAPER],
    ['1694', 'Short ribs', WORKING_PAPER],
    ['1695', 'Spare ribs', WORKING_PAPER],
    ['2000', 'Topside (inside)', REVISION],
    ['2006', 'Topside, cap off, side muscle removed (alternative description of proposed 2014)', REVISION],
    ['2010', 'Inside (topside), cap on', WORKING_PAPER],
    ['2011', 'Inside (topside), cap off', WORKING_PAPER],
    ['2012', 'Inside cap', WORKING_PAPER],
    ['2020', 'Outside (silverside)'],
    ['2040', 'Eye round', WORKING_PAPER],
    ['2050', 'Outside flat (bottom round)', WORKING_PAPER],
    ['2060', 'Thick flank', WORKING_PAPER],
    ['2070', 'Knuckle', WORKING_PAPER],
    ['2081', 'Bottom sirloin', WORKING_PAPER],
    ['2090', 'Rump', WORKING_PAPER],
    ['2091', 'Rump cap', WORKING_PAPER],
    ['2093', 'Eye of rump', WORKING_PAPER],
    ['2120', 'Top sirloin', WORKING_PAPER],
    ['2131', 'Tri-tip', WORKING_PAPER],
    ['2133', 'Ball tip', WORKING_PAPER],
    ['2140', 'Top loin / striploin, boneless', WORKING_PAPER],
    ['2146', 'Top loin, bone-in', WORKING_PAPER],
    ['2150', 'Tenderloin', WORKING_PAPER],
    ['2160', 'Tenderloin, side strap off', WORKING_PAPER],
    ['2180', 'Thick skirt (hanging tender)', WORKING_PAPER],
    ['2190', 'Thin skirt (outside skirt)'],
    ['2196', 'Rose meat'],
    ['2200', 'Thin flank'],
    ['2210', 'Flank steak'],
    ['2240', 'Cube roll (rib eye)'],
    ['2270', 'Chuck roll'],
    ['2275', 'Chuck'],
    ['2300', 'Blade (clod)'],
    ['2303', 'Oyster blade'],
    ['2310', 'Chuck tender', WORKING_PAPER],
    ['2323', 'Brisket'],
    ['2332', 'Brisket navel end'],
    ['2346', 'Brisket point end, deckle off'],
    ['2360', 'Shin/shank'],
  ]),
  ...listOf('item', 'lamb', [
    ['4500', 'Carcase - lamb'],
    ['4510', 'Side - lamb', GOST],
    ['4610', 'Side - ram lamb / ewe hogget class (term translated)', GOST],
    ['4630', 'Side - ewe or wether hogget/young sheep class (term translated)', GOST],
    ['4631', 'Side - ram (term translated)', GOST],
    ['4800', 'Leg - chump on'],
    ['4880', 'Short loin'],
    ['4960', 'Forequarter'],
    ['4990', 'Square-cut shoulder'],
    ['5010', 'Breast and flap'],
    ['5020', 'Neck'],
    ['5030', 'Foreshank'],
    ['5031', 'Hindshank'],
    ['5060', 'Leg - chump on, boneless'],
    ['5080', 'Tenderloin'],
    ['5100', 'Backstrap'],
  ]),
  ...listOf('item', 'pork', [
    ['4016', 'Leg - long cut'],
    ['4079', 'Belly'],
    ['4140', 'Loin'],
    ['4280', 'Tenderloin'],
  ]),
  ...listOf('unused', null, [['00', 'not used', LLAMA]]),
  ...listOf('refrigeration', null, [
    ['0', 'not specified'],
    ['1', 'chilled'],
    ['2', 'frozen, −12 °C or colder'],
    ['3', 'deep-frozen, −18 °C or colder'],
    ['9', 'other'],
  ]),
  ...listOf('slaughter', null, [
    ['0', 'not specified'],
    ['1', 'conventional'],
    ['2', 'kosher'],
    ['3', 'halal'],
    ['9', 'other'],
  ]),
  ...listOf('fatThickness', 'beef', [
    ['0', 'not specified'],
    ['1', 'peeled, denuded, surface membrane removed'],
    ['2', 'peeled, denuded'],
    ['3', '0–3 mm'],
    ['4', '3–6 mm'],
    ['5', '6–12 mm'],
    ['6', '12–25 mm'],
    ['7', '25 mm and over'],
    ['8', 'chemical lean stated'],
    ['9', 'other'],
  ]),
  ...listOf('packing', null, [
    ['0', 'not specified'],
    ['1', 'carcases and quarters, without packing'],
    ['2', 'carcases and quarters, with packing'],
    ['3', 'cuts wrapped one by one'],
    ['4', 'cuts packed in bulk'],
    ['5', 'cuts packed under vacuum'],
    ['6', 'cuts in modified atmosphere'],
    ['9', 'other'],
  ]),
  ...listOf('conformity', null, [
    ['0', 'not specified'],
    ['1', 'quality'],
    ['2', 'trade standard'],
    ['3', 'animal or batch identification'],
    ['4', 'quality and trade standard'],
    ['5', 'quality and identification'],
    ['6', 'trade standard and identification'],
    ['7', 'quality, trade standard and batch identification', LLAMA],
    ['8', 'not used', LLAMA],
    ['9', 'other', LLAMA],
  ]),
];
