import type { CutNode } from '@seamwright/catalogue/domain';
import type { Caller } from '@seamwright/shared/server';
import { addDays, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import { receiveLot, releaseLot } from '@seamwright/stock/contracts';
import type { Chance } from '../chance';
import type { Desk } from '../desk';
import { SUPPLIERS, WEEKLY, type Arrival } from '../scenario/lots';

const MONDAY = 1;

/** Books in what arrives on a Monday and releases it; nothing on other days. */
export async function receiveWeek(
  desk: Desk,
  planner: Caller,
  nodes: ReadonlyMap<string, CutNode>,
  day: PlantDate,
  chance: Chance,
): Promise<void> {
  if (weekdayOf(day) !== MONDAY) return;
  for (const arrival of WEEKLY) {
    const node = nodes.get(arrival.node);
    if (!node) throw new Error(`There is no cut "${arrival.node}" to book in`);
    const body = { ...lotOf(arrival, node, day, chance), nodeId: node.id };
    const lot = await desk.call(planner, receiveLot, { body });
    await desk.call(planner, releaseLot, { params: { id: lot.id }, ifMatch: lot.rowVersion });
  }
}

function lotOf(arrival: Arrival, node: CutNode, day: PlantDate, chance: Chance) {
  const { supplier, slaughterhouse } = SUPPLIERS[node.species];
  const killDate = addDays(day, -arrival.hungDays);
  const drift = chance.whole(-30, 30);
  return {
    // L-<primal>-<month><day>: unique, short and readable on a label.
    code: `${arrival.node.toUpperCase().slice(0, 12)}-${day.slice(5, 7)}${day.slice(8, 10)}`,
    supplier,
    killDate,
    receivedOn: day,
    useBy: addDays(killDate, arrival.lifeDays),
    receivedPieces: arrival.pieces,
    receivedGrams: arrival.pieces * (arrival.pieceGrams + drift),
    origin: { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse },
  };
}
