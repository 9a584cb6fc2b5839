import { bone, fat, joint, trim, waste, type SchemeData } from './scheme-data';

/** The side is split as Kansas State University's MF3395 shows it: 27, 10, 10, 7, 22, 5, 9, 4, 3 and 3 per cent. */
export const BEEF_SCHEMES: readonly SchemeData[] = [
  {
    code: 'CS-201',
    name: 'Side of beef to primals',
    input: 'beef',
    outputs: [
      joint('beef-chuck', 'Chuck', 270),
      joint('beef-rib', 'Rib', 99),
      joint('beef-short-loin', 'Short loin', 99),
      joint('beef-rump', 'Rump', 69),
      joint('beef-round', 'Round', 219),
      joint('beef-flank', 'Flank', 49),
      joint('beef-plate', 'Short plate', 89),
      joint('beef-brisket', 'Brisket', 39),
      joint('beef-shin', 'Shin', 29),
      waste('Kidney and channel fat', 30, 12),
    ],
    note: 'Quartered between tenth and eleventh rib.',
  },
  {
    code: 'CS-202',
    name: 'Short loin to striploin and tenderloin',
    input: 'beef-short-loin',
    outputs: [
      joint('beef-striploin', 'Striploin', 480),
      joint('beef-tenderloin', 'Tenderloin', 180),
      trim(75, 150, 380),
      bone(120),
      fat(62),
    ],
  },
  {
    code: 'CS-203',
    name: 'Striploin to steaks',
    input: 'beef-striploin',
    outputs: [joint('beef-striploin-steak', 'Striploin steaks', 780), trim(85, 112, 420), fat(98)],
  },
  {
    code: 'CS-204',
    name: 'Tenderloin to fillet steaks',
    input: 'beef-tenderloin',
    outputs: [joint('beef-tenderloin-fillet-steak', 'Fillet steaks', 680), trim(90, 208, 620), fat(98)],
  },
  {
    code: 'CS-205',
    name: 'Fore rib to rib-eye steaks',
    input: 'beef-rib',
    outputs: [joint('beef-rib-eye-steak', 'Rib-eye steaks', 620), trim(75, 150, 380), bone(142), fat(78)],
  },
  {
    code: 'CS-206',
    name: 'Rump to steaks',
    input: 'beef-rump',
    outputs: [joint('beef-rump-steak', 'Rump steaks', 740), trim(85, 160, 420), fat(88)],
  },
  {
    code: 'CS-207',
    name: 'Round to topside and lean trim',
    input: 'beef-round',
    outputs: [joint('beef-topside', 'Topside', 350), trim(90, 490, 460), bone(118), fat(34)],
  },
  {
    code: 'CS-208',
    name: 'Topside to joints',
    input: 'beef-topside',
    outputs: [joint('beef-topside-joint', 'Topside joints', 840), trim(90, 92, 460), fat(58)],
  },
  {
    code: 'CS-209',
    name: 'Chuck to dice and short ribs',
    input: 'beef-chuck',
    outputs: [
      joint('beef-chuck-dice', 'Diced chuck', 460),
      joint('beef-chuck-short-rib', 'Short ribs', 80),
      trim(80, 260, 400),
      bone(128),
      fat(62),
    ],
  },
  {
    code: 'CS-210',
    name: 'Thin flank to mince',
    input: 'beef-flank',
    outputs: [joint('beef-flank-mince', 'Mince', 850), bone(10), fat(132)],
  },
  {
    code: 'CS-211',
    name: 'Short plate to trim',
    input: 'beef-plate',
    outputs: [trim(60, 720, 300), bone(138), fat(132)],
  },
  {
    code: 'CS-212',
    name: 'Brisket, boned and rolled',
    input: 'beef-brisket',
    outputs: [joint('beef-brisket-rolled', 'Brisket, boned and rolled', 700), trim(75, 100, 380), bone(102), fat(90)],
  },
  {
    code: 'CS-213',
    name: 'Shin to lean trim',
    input: 'beef-shin',
    outputs: [trim(90, 600, 460), bone(358), fat(32)],
  },
  {
    code: 'CS-220',
    name: 'Mince of two trims, 83 to 87VL',
    input: 'beef-flank',
    kind: 'blend',
    outputs: [joint('beef-flank-mince', 'Mince 85VL', 995)],
    blend: {
      parts: [
        { name: 'Trim 90VL', visualLean: 90, tolerance: 2, sharePpm: 670_000 },
        { name: 'Trim 75VL', visualLean: 75, tolerance: 2, sharePpm: 330_000 },
      ],
      leastLean: 83,
      mostLean: 87,
    },
  },
];
