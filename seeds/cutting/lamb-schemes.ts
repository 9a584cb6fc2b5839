import { bone, fat, joint, trim, type SchemeData } from './scheme-data';

/** The carcase is split by the cutting lines of the US Army handbook's chart: 32, 13, 11, 23 and 21 per cent. */
export const LAMB_SCHEMES: readonly SchemeData[] = [
  {
    code: 'CS-101',
    name: 'Lamb carcase to primals',
    input: 'lamb',
    outputs: [
      joint('lamb-leg', 'Legs with sirloin', 318),
      joint('lamb-loin', 'Loin, untrimmed', 129),
      joint('lamb-rack', 'Rack, eight ribs', 109),
      joint('lamb-shoulder', 'Shoulders, five ribs', 229),
      joint('lamb-breast', 'Breasts, shanks and neck', 209),
    ],
    note: 'Split between last rib and first lumbar joint; keep the dust of the saw on the tray and weigh it as loss.',
  },
  {
    code: 'CS-102',
    name: 'Leg of lamb, bone-in, and rump',
    input: 'lamb-leg',
    outputs: [
      joint('lamb-leg-bone-in', 'Leg, bone-in', 773),
      joint('lamb-leg-rump', 'Rump', 80),
      trim(80, 10, 340),
      bone(50),
      fat(80),
    ],
  },
  {
    code: 'CS-103',
    name: 'Leg of lamb, boneless, and rump',
    input: 'lamb-leg',
    outputs: [
      joint('lamb-leg-boneless', 'Leg, boneless', 600),
      joint('lamb-leg-rump', 'Rump', 80),
      trim(80, 45, 340),
      bone(190),
      fat(78),
    ],
  },
  {
    code: 'CS-104',
    name: 'Loin of lamb to chops',
    input: 'lamb-loin',
    outputs: [joint('lamb-loin-chop', 'Loin chops', 760), trim(70, 60, 300), bone(30), fat(142)],
  },
  {
    code: 'CS-105',
    name: 'Rack of lamb, French-trimmed',
    input: 'lamb-rack',
    outputs: [joint('lamb-rack-french', 'Rack, French-trimmed', 620), trim(75, 80, 320), bone(160), fat(130)],
  },
  {
    code: 'CS-106',
    name: 'Shoulder of lamb, square-cut',
    input: 'lamb-shoulder',
    outputs: [joint('lamb-shoulder-square', 'Square-cut shoulder', 870), trim(75, 20, 320), bone(40), fat(62)],
  },
  {
    code: 'CS-107',
    name: 'Shoulder of lamb, boned and rolled',
    input: 'lamb-shoulder',
    outputs: [joint('lamb-shoulder-rolled', 'Shoulder, boned and rolled', 690), trim(75, 70, 320), bone(160), fat(72)],
  },
  {
    code: 'CS-108',
    name: 'Breast, shank and neck to trim',
    input: 'lamb-breast',
    outputs: [trim(70, 380, 300), bone(392), fat(218)],
  },
  {
    code: 'CS-120',
    name: 'Diced shoulder in marinade',
    input: 'lamb-shoulder',
    kind: 'recipe',
    outputs: [joint('lamb-shoulder-dice', 'Diced shoulder, marinated', 640), trim(75, 110, 320), bone(200), fat(92)],
    ingredients: [
      { name: 'Rapeseed oil', ppmOfInput: 32_000, allergens: [], declared: false },
      { name: 'Mustard, vinegar and herbs', ppmOfInput: 24_000, allergens: ['mustard'], declared: true },
    ],
  },
];
