import type { QuantityInput } from '@seamwright/shared/util';

/** What a customer orders again and again: from so many to so many. */
export interface Usual {
  readonly code: string;
  readonly chosen: Readonly<Record<string, string>>;
  readonly unit: QuantityInput['unit'];
  readonly least: number;
  readonly most: number;
}

const usual = (
  code: string,
  unit: Usual['unit'],
  least: number,
  most: number,
  chosen: Usual['chosen'] = {},
): Usual => ({ code, unit, least, most, chosen });

/** By the customers' keys; kilograms are whole. */
export const USUALS: Readonly<Record<string, readonly Usual[]>> = {
  ladle: [
    usual('LM-104', 'piece', 2, 5),
    usual('BF-201', 'piece', 8, 16, { trim: '3', portion: '225' }),
    usual('LM-103', 'piece', 2, 6),
    usual('PK-301', 'kg', 7, 15),
    usual('BF-203', 'piece', 6, 12),
  ],
  brackenholme: [
    usual('BF-202', 'piece', 10, 20),
    usual('LM-102', 'piece', 3, 6),
    usual('PK-303', 'piece', 2, 4),
    usual('BF-205', 'piece', 2, 5),
    usual('LM-106', 'case', 1, 1),
  ],
  ferryman: [
    usual('BF-204', 'piece', 10, 18),
    usual('BF-208', 'case', 1, 2),
    usual('LM-108', 'piece', 8, 14),
    usual('PK-302', 'case', 1, 1),
  ],
  ploughwright: [
    usual('BF-204', 'piece', 8, 14, { portion: '300' }),
    usual('BF-207', 'piece', 1, 3),
    usual('PK-304', 'piece', 1, 3),
    usual('LM-109', 'kg', 5, 10),
  ],
  quillfeather: [
    usual('LM-104', 'kg', 10, 20),
    usual('BF-209', 'case', 1, 2),
    usual('PK-301', 'piece', 2, 4, { finish: 'plain' }),
    usual('PK-305', 'piece', 6, 12),
  ],
  osterby: [
    usual('LM-101', 'piece', 3, 6),
    usual('LM-105', 'piece', 2, 4),
    usual('PK-306', 'piece', 2, 4),
    usual('BF-206', 'piece', 2, 4),
  ],
  tarnside: [usual('LM-106', 'piece', 12, 24), usual('BF-201', 'piece', 6, 12), usual('PK-302', 'piece', 8, 16)],
  eskmere: [usual('BF-209', 'case', 1, 2), usual('BF-208', 'case', 1, 2), usual('LM-109', 'kg', 5, 10)],
};
