/**
 * The one worked example that every number of the thread is compared with, computed by hand.
 *
 * Nora of The Copper Ladle (town, delivered free; raw meat is zero-rated) orders for Friday 4 December 2026:
 *
 *   1  LM-104 Shoulder of lamb, trim 4 mm, joint of 1,400 g (1,260 to 1,540 g), 4 joints
 *      price      £11.20 base + £0.85 for the trim                 = £12.05 a kg
 *      estimate   4 × 1,400 g = 5.600 kg    5.600 × 12.05 = 67.480 → £67.48
 *      at least   4 × 1,260 g = 5.040 kg    5.040 × 12.05 = 60.732 → £60.73
 *      at most    4 × 1,540 g = 6.160 kg    6.160 × 12.05 = 74.228 → £74.23
 *   2  BF-201 Striploin steak, trim 3 mm, portion of 225 g (214 to 236 g), 1 case of 12 packs of 2 = 24 steaks
 *      before     £23.60 base + £0.90 trim + £0.15 portion         = £24.65 a kg, 5.400 kg = £133.11 a case
 *      price      quoted and accepted                              = £118.00 a case, whatever it weighs
 *      weight     24 × 225 g = 5.400 kg, from 24 × 214 g = 5.136 kg to 24 × 236 g = 5.664 kg
 *   3  PK-301 Pork belly, scored, piece of 3,600 g (3,150 to 4,050 g), about 12 kg
 *      pieces     12,000 / 3,600 = 3.33 → the nearest whole number is 3
 *      price      £6.20 a kg
 *      estimate   3 × 3,600 g = 10.800 kg   10.800 × 6.20 = 66.960 → £66.96
 *      at least   3 × 3,150 g =  9.450 kg    9.450 × 6.20 = 58.590 → £58.59
 *      at most    3 × 4,050 g = 12.150 kg   12.150 × 6.20 = 75.330 → £75.33
 *
 *   estimate      67.48 + 118.00 + 66.96 = £252.44
 *   at least      60.73 + 118.00 + 58.59 = £237.32
 *   upper bound   74.23 + 118.00 + 75.33 = £267.56, which is held on the card
 *
 * Packed, net (what the scale shows less the tare of the pack, which is 28 g, 18 g and 36 g):
 *
 *   1  1,390 + 1,430 + 1,565 g = 4.385 kg   4.385 × 12.05 = 52.839… → £52.84
 *      the third is 25 g over its 1,540 g and goes with a reason; the fourth joint is short
 *   2  6 × 448 + 6 × 456 g = 5.424 kg        1 whole case               £118.00
 *   3  3,620 + 3,555 + 3,818 g = 10.993 kg  10.993 × 6.20 = 68.156… → £68.16
 *
 *   invoice       52.84 + 118.00 + 68.16 = £239.00, captured
 *   let go        267.56 − 239.00        =  £28.56
 *   fee           1.5 % of 239.00 = 3.585 → half up £3.59, + £0.20 = £3.79
 *   net           239.00 − 3.79          = £235.21, paid out
 *
 * The cutting list of that delivery, with the rows that a workbook brings (see `ORDERED_BY_WORKBOOK`). Yields are those
 * of the specifications, primal in is rounded up to the gram:
 *
 *   Shoulder    LM-104 trim 4, 1,400 g     4 + 2 + 4 = 10 pieces  14.000 kg out / (0.69 × 0.945 = 0.65205) = 21.471 in
 *               LM-104 as usual, 1,850 g           1 piece    1.850 kg out / 0.69                     =  2.682 in
 *                                                 11         15.850                                     24.153
 *   Striploin   BF-201 trim 3, 225 g     24 + 24 = 48 pieces  10.800 kg out / (0.78 × 0.96 = 0.7488)  = 14.424 in
 *               one case was ordered as a case, the other 24 are loose
 *   Belly       PK-301 scored             3 + 3 = 6 pieces   21.600 kg out / 0.86                     = 25.117 in
 *               PK-301 plain                      2 pieces    7.200 kg out / 0.86                     =  8.373 in
 *                                                 8          28.800                                     33.490
 *   the day                          11 + 48 + 8 = 67        55.450 kg                                  72.067 kg
 *
 * Its work in seconds: set-up + kg in × seconds a kg, rounded up, + pieces × seconds a piece; minutes that have begun:
 *
 *               kg in        boning              trimming             portions or tying    packing         in all
 *   LM-104 t 4  21.470747    180 + 2,362 + 500   120 + 645            60 + 800             120 + 65 + 120  4,972 = 83 min
 *   LM-104       2.681159    180 +   295 +  50   120 +  43            60 +  80             120 +  9 +  12    969 = 17 min
 *   BF-201      14.423077                        240 + 606            180 + 174 + 432      120 + 44 + 192  1,988 = 34 min
 *   PK-301 sc.  25.116279    150 +   503         120 + 201 + 120                           120 + 76 +  72  1,362 = 23 min
 *   PK-301 pl.   8.372093    150 +   168         120 +  67 +  10                           120 + 26 +  24    685 = 12 min
 *   the day                  4,538 = 76 min      2,412 = 41 min       tying 1,000 = 17 min  1,240 = 21 min  9,976 = 167 min
 *                                                                     portions 786 = 14 min
 *   by primal: shoulder 4,972 + 969 = 5,941 = 100 min, belly 1,362 + 685 = 2,047 = 35 min
 */
export const NORAS_ORDER = {
  deliveryDay: '2026-12-04',
  deliveryDayShort: 'Fri 4 Dec',
  deliveryDayLong: 'Friday 4 December 2026',
  lamb: {
    code: 'LM-104',
    name: 'Shoulder of lamb, boned, rolled and tied',
    ladder: {
      atLeast: ['£60.73', '5.040 kg'],
      mostLikely: ['£67.48', '5.600 kg'],
      atMost: ['£74.23', '6.160 kg'],
    },
    price: '£12.05/kg',
    packedMinor: 5_284,
    packedKg: '4.385',
    packedPieces: 3,
    packs: [
      { grossGrams: 1_418, netKg: '1.390' },
      { grossGrams: 1_458, netKg: '1.430' },
      { grossGrams: 1_593, netKg: '1.565', tooHeavyBy: 25, reason: 'Shape of the primal' },
    ],
    shortBecause: 'Quality not good enough',
  },
  beef: {
    code: 'BF-201',
    name: 'Striploin steak',
    priceBefore: '£24.65/kg',
    caseBefore: '£133.11',
    price: '£118.00/case',
    ladder: {
      atLeast: ['£118.00', '5.136 kg'],
      mostLikely: ['£118.00', '5.400 kg'],
      atMost: ['£118.00', '5.664 kg'],
    },
    packedMinor: 11_800,
    packedKg: '5.424',
    packedPieces: 24,
    packs: Array.from({ length: 6 }).flatMap(() => [
      { grossGrams: 466, netKg: '0.448' },
      { grossGrams: 474, netKg: '0.456' },
    ]),
  },
  pork: {
    code: 'PK-301',
    name: 'Pork belly, boneless, rind on',
    price: '£6.20/kg',
    ladder: {
      atLeast: ['£58.59', '9.450 kg'],
      mostLikely: ['£66.96', '10.800 kg'],
      atMost: ['£75.33', '12.150 kg'],
    },
    packedMinor: 6_816,
    packedKg: '10.993',
    packedPieces: 3,
    packs: [
      { grossGrams: 3_656, netKg: '3.620' },
      { grossGrams: 3_591, netKg: '3.555' },
      { grossGrams: 3_854, netKg: '3.818' },
    ],
  },
  estimateMinor: 25_244,
  leastMinor: 23_732,
  holdMinor: 26_756,
  invoiceMinor: 23_900,
  letGoMinor: 2_856,
  feeMinor: 379,
  payoutMinor: 23_521,
} as const;

const day = NORAS_ORDER.deliveryDay;

/** Six customers' orders for the same day, one row each, on rows 2 to 7 of the sheet. */
export const ORDERED_BY_WORKBOOK = [
  {
    customer: 'Hotel Brackenholme',
    site: 'Main kitchen',
    day,
    code: 'BF-201',
    choices: 'trim=3; portion=225',
    quantity: 24,
    unit: 'piece',
  },
  { customer: 'The Ferryman’s Lantern', day, code: 'PK-301', quantity: 12, unit: 'kg' },
  { customer: 'The Ploughwright', day, code: 'LM-104', choices: 'trim=4; portion=1400', quantity: 2, unit: 'piece' },
  {
    customer: 'Quillfeather Catering',
    day,
    code: 'LM-104',
    choices: 'trim=4; portion=1400',
    quantity: 4,
    unit: 'piece',
  },
  { customer: 'Tarnside Farm Shop', day, code: 'PK-301', choices: 'finish=plain', quantity: 2, unit: 'piece' },
  { customer: 'Eskmere Grange School', day, code: 'LM-104', quantity: 1, unit: 'piece' },
] as const;

/** Rows 8 to 10: a code that is none, a site that must be said, a quantity that is no quantity. */
export const BAD_ROWS = [
  { customer: 'Osterby Family Butchers', day, code: 'LM-999', quantity: 1, unit: 'piece' },
  { customer: 'Hotel Brackenholme', day, code: 'BF-201', quantity: 2, unit: 'piece' },
  { customer: 'Quillfeather Catering', day, code: 'LM-104', quantity: -2, unit: 'piece' },
] as const;

/** Rows of the cutting list: pieces, how they were ordered, kilograms out and in, and minutes begun. */
export const CUTTING_LIST = {
  shoulder: {
    trimmed: ['10', '10 loose', '14.000', '21.471', '83'],
    usual: ['1', '1 loose', '1.850', '2.682', '17'],
    total: ['11', '', '15.850', '24.153', '100'],
  },
  striploin: ['48', '1 case + 24', '10.800', '14.424', '34'],
  belly: {
    scored: ['6', '6 loose', '21.600', '25.117', '23'],
    plain: ['2', '2 loose', '7.200', '8.373', '12'],
    total: ['8', '', '28.800', '33.490', '35'],
  },
  day: ['67', '', '55.450', '72.067', '167'],
  /** Minutes begun at each station. */
  stations: { Boning: '76', Trimming: '41', Portions: '14', Tying: '17', Packing: '21' },
} as const;
