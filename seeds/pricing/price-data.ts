import type { PriceBasis, PriceBreak } from '@seamwright/pricing/domain';

/** A price of the demo, whole pence. */
export interface DemoPrice {
  readonly priceMinor: number;
  readonly basis?: PriceBasis;
  readonly breaks?: readonly PriceBreak[];
}

/** Prices by specification code. */
export type DemoPrices = Readonly<Record<string, DemoPrice>>;

/** Pence per kg. */
const perKg = (priceMinor: number, ...breaks: readonly PriceBreak[]): DemoPrice => ({ priceMinor, breaks });
const fromKg = (kg: number, priceMinor: number): PriceBreak => ({ fromQuantity: kg * 1000, priceMinor });

/** What everybody pays: every specification has a price here. All numbers are invented. */
export const BASE_PRICES: DemoPrices = {
  'LM-101': perKg(1_185, fromKg(20, 1_145)),
  'LM-102': perKg(1_495),
  'LM-103': perKg(2_480, fromKg(10, 2_390)),
  'LM-104': perKg(1_120, fromKg(15, 1_080), fromKg(40, 1_035)),
  'LM-105': perKg(895),
  'LM-106': perKg(1_680),
  'LM-107': perKg(1_890),
  'LM-108': perKg(980),
  'LM-109': perKg(1_240, fromKg(20, 1_190)),
  'BF-201': perKg(2_360, fromKg(10, 2_290), fromKg(25, 2_220)),
  'BF-202': perKg(2_690, fromKg(10, 2_610)),
  'BF-203': perKg(4_150),
  'BF-204': perKg(1_540, fromKg(20, 1_480)),
  'BF-205': perKg(1_080),
  'BF-206': perKg(1_160),
  'BF-207': perKg(990, fromKg(20, 950)),
  'BF-208': perKg(925, fromKg(25, 885)),
  'BF-209': perKg(690, fromKg(25, 655)),
  'PK-301': perKg(620, fromKg(20, 590)),
  'PK-302': perKg(740),
  'PK-303': perKg(545, fromKg(25, 520)),
  'PK-304': perKg(595),
  'PK-305': perKg(960),
  'PK-306': perKg(1_050),
};

export interface DemoPriceList {
  readonly name: string;
  /** The scenario's name of the group, or key of the customer. */
  readonly group?: string;
  readonly customer?: string;
  readonly prices: DemoPrices;
}

/** What a group and two customers pay instead. */
export const OWN_LISTS: readonly DemoPriceList[] = [
  {
    name: 'Lantern Inns list',
    group: 'Lantern Inns',
    prices: {
      'LM-104': perKg(1_075),
      'LM-108': perKg(940),
      'BF-201': perKg(2_280),
      'BF-204': perKg(1_490),
      'BF-209': perKg(665),
      'PK-301': perKg(595),
      'PK-302': perKg(715),
      'PK-304': perKg(575),
    },
  },
  {
    name: 'Hotel Brackenholme list',
    customer: 'brackenholme',
    prices: {
      'LM-103': perKg(2_350),
      'BF-201': perKg(2_240, fromKg(15, 2_180)),
      'BF-203': perKg(3_960),
      'PK-306': perKg(1_005),
    },
  },
  {
    name: 'Osterby list',
    customer: 'osterby',
    prices: {
      'LM-101': perKg(1_110),
      'LM-105': perKg(845),
      'BF-205': perKg(1_020),
      'BF-207': perKg(930),
      'BF-208': { priceMinor: 4_400, basis: 'case', breaks: [{ fromQuantity: 4, priceMinor: 4_250 }] },
      'PK-303': perKg(510),
    },
  },
];
