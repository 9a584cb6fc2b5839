import { Workbook } from 'exceljs';
import { addDays, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import { CUSTOMERS } from '../../../seeds/scenario/customers';
import { USUALS } from '../../../seeds/scenario/usuals';

/** What is ordered and asked the price of, again and again. */
export const THREE_LINES = [
  { code: 'BF-202', chosen: {}, quantity: { unit: 'piece' as const, count: 10 } },
  { code: 'LM-102', chosen: {}, quantity: { unit: 'piece' as const, count: 3 } },
  { code: 'LM-106', chosen: {}, quantity: { unit: 'case' as const, count: 1 } },
];

/** An order that is packed in one go. */
export const ONE_PIECE = [{ code: 'BF-202', chosen: {}, quantity: { unit: 'piece' as const, count: 1 } }];

const SUNDAY = 7;

/** The days of the thread, all of them ahead of the anchor, none a Sunday. */
export interface ThreadDays {
  /** Closed and on the floor before anything is timed. */
  readonly floor: PlantDate;
  readonly placing: PlantDate;
  readonly importing: PlantDate;
  /** Days to be closed, as many as were asked for. */
  readonly closing: readonly PlantDate[];
}

/** Gives out the days after the anchor, a Tuesday: every zone is delivered to on the Friday that orders are imported for. */
export function threadDays(anchor: PlantDate, toClose: number): ThreadDays {
  const [floor, placing, importing] = [1, 2, 3].map((ahead) => addDays(anchor, ahead));
  if (!floor || !placing || !importing) throw new Error('Three days are wanted');
  const closing: PlantDate[] = [];
  for (let day = addDays(importing, 1); closing.length < toClose; day = addDays(day, 1))
    if (weekdayOf(day) !== SUNDAY) closing.push(day);
  return { floor, placing, importing, closing };
}

const HEADS = ['Customer', 'Site', 'Delivery day', 'Code', 'Choices', 'Quantity', 'Unit', 'When short', 'Note'];
const IMPORTING = ['brackenholme', 'ferryman', 'ploughwright', 'osterby', 'tarnside', 'eskmere'];
const LINES_EACH = 3;
const UNIT_WORDS = { piece: 'pieces', case: 'case', kg: 'kg' } as const;

/** The rows of a workbook in which six customers order what they usually do. */
export function importRows(deliveryDay: PlantDate): (string | number)[][] {
  return CUSTOMERS.filter(({ key }) => IMPORTING.includes(key)).flatMap((customer) =>
    (USUALS[customer.key] ?? []).slice(0, LINES_EACH).map(({ code, chosen, unit, least }) => [
      customer.name,
      customer.sites[0]?.name ?? '',
      deliveryDay,
      code,
      Object.entries(chosen)
        .map(([choice, value]) => `${choice}=${value}`)
        .join('; '),
      least,
      UNIT_WORDS[unit],
      '',
      '',
    ]),
  );
}

export async function importWorkbook(deliveryDay: PlantDate): Promise<Buffer> {
  const book = new Workbook();
  const sheet = book.addWorksheet('Orders');
  sheet.addRow(HEADS);
  for (const row of importRows(deliveryDay)) sheet.addRow(row);
  return Buffer.from(await book.xlsx.writeBuffer());
}
