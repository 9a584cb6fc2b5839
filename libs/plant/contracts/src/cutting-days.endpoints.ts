import * as z from 'zod';
import { STATIONS, SPECIES } from '@seamwright/catalogue/domain';
import { CAUTIONS, CUTTING_DAY_STATES } from '@seamwright/plant/domain';
import {
  defineEndpoint,
  gramsWire,
  id,
  instant,
  pageOf,
  pageQuery,
  plantDay,
  rowVersion,
  staffOnly,
} from '@seamwright/shared/contracts';

const count = z.int().nonnegative();
const state = z.enum(CUTTING_DAY_STATES);
const params = { deliveryDay: plantDay };
const readers = staffOnly('planner', 'floor', 'technical', 'admin');
const planners = staffOnly('planner', 'admin');

const cuttingDay = z.strictObject({
  id,
  rowVersion,
  deliveryDay: plantDay,
  cuttingDay: plantDay,
  state,
  timeZone: z.string().meta({ description: "The plant's time zone, for the times below" }),
  closedAt: instant.nullable(),
  releasedAt: instant.nullable(),
  finishedAt: instant.nullable(),
  orders: count.meta({ description: 'Orders for the day that were not cancelled' }),
  waitingOrders: count.meta({ description: 'Those among them that still wait for payment, promise or credit' }),
  packedOrders: count,
  lines: count,
});
export type CuttingDayWire = z.infer<typeof cuttingDay>;

export const listCuttingDays = defineEndpoint({
  id: 'cutting-days.list',
  summary: 'Cutting days, the latest delivery day first',
  method: 'GET',
  path: '/cutting-days',
  access: readers,
  query: { ...pageQuery, state: state.optional() },
  response: pageOf(cuttingDay),
});

export const getCuttingDay = defineEndpoint({
  id: 'cutting-days.get',
  summary: 'The cutting for one delivery day',
  method: 'GET',
  path: '/cutting-days/:deliveryDay',
  access: readers,
  params,
  response: cuttingDay,
});

export const closeCuttingDay = defineEndpoint({
  id: 'cutting-days.close',
  summary: 'Closes the day to orders; its confirmed orders are released',
  method: 'POST',
  path: '/cutting-days/:deliveryDay/close',
  access: planners,
  guarded: true,
  params,
  response: cuttingDay,
});

export const releaseCuttingDay = defineEndpoint({
  id: 'cutting-days.release',
  summary: 'Takes the list as the plan and sends it to the floor',
  method: 'POST',
  path: '/cutting-days/:deliveryDay/release',
  access: planners,
  guarded: true,
  params,
  response: cuttingDay,
});

export const finishCuttingDay = defineEndpoint({
  id: 'cutting-days.finish',
  summary: 'Finishes the day, once every released order is packed',
  method: 'POST',
  path: '/cutting-days/:deliveryDay/finish',
  access: planners,
  guarded: true,
  params,
  response: cuttingDay,
});

const quantity = {
  pieces: count,
  cases: count.meta({ description: 'Ordered as whole cases' }),
  loosePieces: count.meta({ description: 'Pieces beyond the cases' }),
  outGrams: gramsWire.meta({ description: 'Expected weight' }),
};
const seconds = count.meta({ description: 'Seconds of work' });
const named = z.strictObject({ id, name: z.string() });
const cut = z.strictObject({
  versionId: id,
  choiceKey: z.string(),
  code: z.string(),
  name: z.string(),
  summary: z.string(),
});
const primal = z.strictObject({ id, name: z.string(), species: z.enum(SPECIES) });
const stationLoad = z.strictObject({ station: z.enum(STATIONS), seconds });
const orderNumbers = z.array(z.int().positive());
const totals = z.strictObject({ ...quantity, inGrams: gramsWire, seconds });

const cuttingListAnswer = z.strictObject({
  deliveryDay: plantDay,
  primals: z.array(
    z.strictObject({
      primal,
      rows: z.array(
        z.strictObject({
          cut,
          ...quantity,
          inGrams: gramsWire,
          seconds,
          stations: z.array(stationLoad),
          customers: z.array(z.strictObject({ customer: named, ...quantity, orderNumbers })),
        }),
      ),
      totals,
    }),
  ),
  totals,
  stations: z.array(stationLoad),
  cautions: z.array(z.enum(CAUTIONS)),
  customers: z.array(
    z.strictObject({
      customer: named,
      cuts: z.array(z.strictObject({ cut, ...quantity, orderNumbers })),
      totals: z.strictObject(quantity),
    }),
  ),
});
export type CuttingListWire = z.infer<typeof cuttingListAnswer>;

export const getCuttingList = defineEndpoint({
  id: 'cutting-days.cutting-list',
  summary: 'What is to be cut, per primal and per customer, with expected weight and work',
  method: 'GET',
  path: '/cutting-days/:deliveryDay/cutting-list',
  access: readers,
  params,
  response: cuttingListAnswer,
});

const pullTotals = {
  outGrams: gramsWire,
  neededGrams: gramsWire,
  pieces: count,
  pulledGrams: gramsWire,
  leftOverGrams: gramsWire,
  shortGrams: gramsWire,
};
const pullListAnswer = z.strictObject({
  deliveryDay: plantDay,
  rows: z.array(
    z.strictObject({
      primal,
      ...pullTotals,
      pulls: z.array(
        z.strictObject({
          lotId: id,
          lotCode: z.string(),
          useBy: plantDay.nullable(),
          pieces: count,
          pulledGrams: gramsWire,
        }),
      ),
    }),
  ),
  totals: z.strictObject(pullTotals),
});
export type PullListWire = z.infer<typeof pullListAnswer>;

export const getPullList = defineEndpoint({
  id: 'cutting-days.pull-list',
  summary: 'What to fetch of each primal, from which lots, by simple yield',
  method: 'GET',
  path: '/cutting-days/:deliveryDay/pull-list',
  access: readers,
  params,
  response: pullListAnswer,
});

export const getWorkbook = defineEndpoint({
  id: 'cutting-days.workbook',
  summary: 'Cutting list, by customer, and pull list as a workbook',
  method: 'GET',
  path: '/cutting-days/:deliveryDay/workbook',
  access: readers,
  params,
  file: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
});
