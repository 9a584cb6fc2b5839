import { Workbook } from 'exceljs';
import { primalName } from '@seamwright/catalogue/domain';
import { cautionScope, cautionWords, type CuttingListWire, type PullListWire } from '@seamwright/plant/contracts';
import { minutesOf } from '@seamwright/plant/domain';
import { formatPlantDate } from '@seamwright/shared/util';
import type { DayPapers } from './read-lists';
import { addSheet, type SheetColumn, type SheetContent, type SheetRow } from './sheet';

const text = (head: string, width: number): SheetColumn => ({ head, kind: 'text', width });
const kg = (head: string): SheetColumn => ({ head, kind: 'kg', width: 14 });
const count = (head: string): SheetColumn => ({ head, kind: 'count', width: 10 });
const nameOf = ({ species, name }: PullListWire['rows'][number]['primal']): string => primalName(species, name);
const total = $localize`:@@plant.workbook.total:Total`;

/** The day's papers as one workbook. Every total is a number, the same that the screen shows. */
export async function cuttingWorkbook({ day, cutting, pull }: DayPapers): Promise<Buffer> {
  const workbook = new Workbook();
  const heading = $localize`:@@plant.workbook.heading:Delivery ${formatPlantDate(day.deliveryDay, 'long')}:delivery:, cutting ${formatPlantDate(day.cuttingDay, 'long')}:cutting:`;
  const cautions = cutting.cautions.length > 0 ? [...cutting.cautions.map(cautionWords), cautionScope()] : [];
  addSheet(workbook, { ...cuttingSheet(cutting), title: heading, notes: cautions });
  addSheet(workbook, { ...customerSheet(cutting), title: heading });
  addSheet(workbook, { ...pullSheet(pull), title: heading });
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

function cuttingSheet({ primals, totals }: CuttingListWire): Omit<SheetContent, 'title'> {
  const numbers = (of: CuttingListWire['totals']) => [
    of.pieces,
    of.cases,
    of.loosePieces,
    of.outGrams,
    of.inGrams,
    minutesOf(of.seconds),
  ];
  return {
    name: $localize`:@@plant.workbook.cutting:Cutting list`,
    columns: [
      text($localize`:@@plant.workbook.primal:Primal`, 22),
      text($localize`:@@plant.workbook.code:Code`, 12),
      text($localize`:@@plant.workbook.cut:Cut`, 30),
      text($localize`:@@plant.workbook.choices:Choices`, 34),
      count($localize`:@@plant.workbook.pieces:Pieces`),
      count($localize`:@@plant.workbook.cases:Whole cases`),
      count($localize`:@@plant.workbook.loose:Loose pieces`),
      kg($localize`:@@plant.workbook.out:Expected out`),
      kg($localize`:@@plant.workbook.in:Primal in`),
      count($localize`:@@plant.workbook.minutes:Minutes`),
    ],
    rows: [
      ...primals.flatMap(({ primal, rows, totals: ofPrimal }): SheetRow[] => [
        ...rows.map(({ cut, ...row }) => ({
          cells: [nameOf(primal), cut.code, cut.name, cut.summary, ...numbers(row)],
        })),
        {
          cells: [
            $localize`:@@plant.workbook.primalTotal:${nameOf(primal)}:primal: in all`,
            null,
            null,
            null,
            ...numbers(ofPrimal),
          ],
          strong: true,
        },
      ]),
      { cells: [total, null, null, null, ...numbers(totals)], strong: true },
    ],
  };
}

function customerSheet({ customers, totals }: CuttingListWire): Omit<SheetContent, 'title'> {
  type Quantity = (typeof customers)[number]['totals'];
  const numbers = (of: Quantity) => [of.pieces, of.cases, of.loosePieces, of.outGrams];
  return {
    name: $localize`:@@plant.workbook.customers:By customer`,
    columns: [
      text($localize`:@@plant.workbook.customer:Customer`, 28),
      text($localize`:@@plant.workbook.orders:Orders`, 16),
      text($localize`:@@plant.workbook.code:Code`, 12),
      text($localize`:@@plant.workbook.cut:Cut`, 30),
      text($localize`:@@plant.workbook.choices:Choices`, 34),
      count($localize`:@@plant.workbook.pieces:Pieces`),
      count($localize`:@@plant.workbook.cases:Whole cases`),
      count($localize`:@@plant.workbook.loose:Loose pieces`),
      kg($localize`:@@plant.workbook.out:Expected out`),
    ],
    rows: [
      ...customers.flatMap(({ customer, cuts, totals: ofCustomer }): SheetRow[] => [
        ...cuts.map(({ cut, orderNumbers, ...quantity }) => ({
          cells: [customer.name, orderNumbers.join(', '), cut.code, cut.name, cut.summary, ...numbers(quantity)],
        })),
        {
          cells: [
            $localize`:@@plant.workbook.customerTotal:${customer.name}:customer: in all`,
            null,
            null,
            null,
            null,
            ...numbers(ofCustomer),
          ],
          strong: true,
        },
      ]),
      { cells: [total, null, null, null, null, ...numbers(totals)], strong: true },
    ],
  };
}

function pullSheet({ rows, totals }: PullListWire): Omit<SheetContent, 'title'> {
  return {
    name: $localize`:@@plant.workbook.pull:Pull list`,
    columns: [
      text($localize`:@@plant.workbook.primal:Primal`, 22),
      text($localize`:@@plant.workbook.lot:Lot`, 18),
      { head: $localize`:@@plant.workbook.useBy:Use by`, kind: 'date', width: 18 },
      count($localize`:@@plant.workbook.pieces:Pieces`),
      kg($localize`:@@plant.workbook.pulled:Weight in`),
      kg($localize`:@@plant.workbook.needed:Needed`),
      kg($localize`:@@plant.workbook.out:Expected out`),
      kg($localize`:@@plant.workbook.left:Left over`),
      kg($localize`:@@plant.workbook.short:Short`),
    ],
    rows: [
      ...rows.flatMap(({ primal, pulls, ...row }): SheetRow[] => [
        ...pulls.map((pull) => ({ cells: [nameOf(primal), pull.lotCode, pull.useBy, pull.pieces, pull.pulledGrams] })),
        {
          cells: [
            $localize`:@@plant.workbook.primalTotal:${nameOf(primal)}:primal: in all`,
            null,
            null,
            row.pieces,
            row.pulledGrams,
            row.neededGrams,
            row.outGrams,
            row.leftOverGrams,
            row.shortGrams,
          ],
          strong: true,
        },
      ]),
      {
        cells: [
          total,
          null,
          null,
          totals.pieces,
          totals.pulledGrams,
          totals.neededGrams,
          totals.outGrams,
          totals.leftOverGrams,
          totals.shortGrams,
        ],
        strong: true,
      },
    ],
  };
}
