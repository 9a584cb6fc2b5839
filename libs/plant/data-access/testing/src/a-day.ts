import type { CuttingDayWire, PackingLineWire, PackingOrderWire } from '@seamwright/plant/contracts';
import type { DayPapers } from '../../src/cutting-days/cutting-days.actions';

const ID = '00000000-0000-7000-8000-00000000000';

/** An open day as the server presents it; a test states only what it is about. */
export const aDay = (stated: Partial<CuttingDayWire> = {}): CuttingDayWire => ({
  id: `${ID}1`,
  rowVersion: 1,
  deliveryDay: '2026-12-04',
  cuttingDay: '2026-12-03',
  state: 'open',
  timeZone: 'Europe/London',
  closedAt: null,
  releasedAt: null,
  finishedAt: null,
  orders: 2,
  waitingOrders: 0,
  packedOrders: 0,
  lines: 3,
  ...stated,
});

const cut = {
  versionId: `${ID}2`,
  choiceKey: 'trim=6',
  code: 'BF-901',
  name: 'Striploin steak',
  summary: '280 g · 6 mm fat',
};
const quantity = { pieces: 29, cases: 2, loosePieces: 5, outGrams: 8120 };
const primal = { id: `${ID}3`, name: 'Striploin', species: 'beef' as const };
const totals = { ...quantity, inGrams: 10_358, seconds: 1_063 };
const customer = { id: `${ID}4`, name: 'The Heron' };

/** A day's lists: one cut of one primal for one customer. */
export const somePapers = (day: Partial<CuttingDayWire> = {}): DayPapers => ({
  day: aDay(day),
  cutting: {
    deliveryDay: '2026-12-04',
    primals: [
      {
        primal,
        rows: [
          {
            cut,
            ...totals,
            stations: [{ station: 'portioning', seconds: 1_063 }],
            customers: [{ customer, ...quantity, orderNumbers: [1001] }],
          },
        ],
        totals,
      },
    ],
    totals,
    stations: [{ station: 'portioning', seconds: 1_063 }],
    cautions: ['knives'],
    customers: [{ customer, cuts: [{ cut, ...quantity, orderNumbers: [1001] }], totals: quantity }],
  },
  pull: {
    deliveryDay: '2026-12-04',
    rows: [
      {
        primal,
        outGrams: 8120,
        neededGrams: 10_358,
        pieces: 1,
        pulledGrams: 6_000,
        leftOverGrams: 0,
        shortGrams: 4_358,
        pulls: [{ lotId: `${ID}5`, lotCode: 'B-1', useBy: '2026-12-05', pieces: 1, pulledGrams: 6_000 }],
      },
    ],
    totals: {
      outGrams: 8120,
      neededGrams: 10_358,
      pieces: 1,
      pulledGrams: 6_000,
      leftOverGrams: 0,
      shortGrams: 4_358,
    },
  },
});

/** A line of six steaks, nothing packed yet. */
export const aPackingLine = (stated: Partial<PackingLineWire> = {}): PackingLineWire => ({
  id: `${ID}6`,
  position: 1,
  code: 'BF-901',
  name: 'Striploin steak',
  summary: '280 g · 6 mm fat',
  note: '',
  whenShort: 'send-what-there-is',
  pieces: 6,
  estimateGrams: 1_680,
  packedPieces: 0,
  packedGrams: 0,
  shortPieces: 0,
  shortReason: null,
  piecesPerPack: 2,
  piece: { nominalGrams: 280, minGrams: 266, maxGrams: 294 },
  tareGrams: 18,
  storageMinC: 0,
  storageMaxC: 4,
  allergens: [],
  packs: [],
  lots: [
    { id: `${ID}5`, code: 'B-1', useBy: '2026-12-05' },
    { id: `${ID}7`, code: 'B-2', useBy: null },
  ],
  ...stated,
});

/** A released order with that line. */
export const aPackingOrder = (stated: Partial<PackingOrderWire> = {}): PackingOrderWire => ({
  id: `${ID}8`,
  number: 1001,
  customer,
  siteName: 'Kitchen',
  deliveryDay: '2026-12-04',
  note: '',
  packedAt: null,
  lines: [aPackingLine()],
  ...stated,
});
