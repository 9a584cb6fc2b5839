import { bone, fat, joint, trim, waste, type SchemeData } from './scheme-data';

/** The carcase is split as the University of Kentucky's chart shows it, picnic and Boston butt together as shoulder. */
export const PORK_SCHEMES: readonly SchemeData[] = [
  {
    code: 'CS-301',
    name: 'Pork carcase to primals',
    input: 'pork',
    outputs: [
      joint('pork-leg', 'Leg', 244),
      joint('pork-belly', 'Belly with ribs', 189),
      joint('pork-loin', 'Loin with tenderloin', 183),
      joint('pork-shoulder', 'Shoulder', 170),
      trim(35, 84, 60, 'Jowl, feet and tail'),
      waste('Skin, fat and bone', 119, -4),
    ],
  },
  {
    code: 'CS-302',
    name: 'Leg of pork, boned and rolled',
    input: 'pork-leg',
    outputs: [joint('pork-leg-rolled', 'Leg, boned and rolled', 625), trim(85, 125, 260), bone(130), fat(112)],
  },
  {
    code: 'CS-303',
    name: 'Belly of pork, boneless, and spare ribs',
    input: 'pork-belly',
    outputs: [
      joint('pork-belly-boneless', 'Belly, boneless', 548),
      trim(55, 166, 320, 'Spare ribs'),
      trim(70, 254, 180),
      fat(26),
    ],
  },
  {
    code: 'CS-304',
    name: 'Loin of pork to rack, steaks and tenderloin',
    input: 'pork-loin',
    outputs: [
      joint('pork-loin-rack', 'Loin rack', 300),
      joint('pork-loin-steak', 'Loin steaks', 500),
      joint('pork-tenderloin', 'Tenderloin', 47),
      trim(80, 50, 240),
      bone(58),
      fat(40),
    ],
  },
  {
    code: 'CS-305',
    name: 'Tenderloin of pork, trimmed',
    input: 'pork-tenderloin',
    outputs: [joint('pork-tenderloin-whole', 'Tenderloin, whole', 880), trim(85, 90, 260), fat(26)],
  },
  {
    code: 'CS-306',
    name: 'Shoulder of pork, boned and rolled',
    input: 'pork-shoulder',
    outputs: [joint('pork-shoulder-rolled', 'Shoulder, boned and rolled', 685), trim(80, 168, 240), bone(86), fat(56)],
  },
];
