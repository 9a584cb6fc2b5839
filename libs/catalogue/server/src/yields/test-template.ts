import { Workbook } from 'exceljs';
import type { FileAnswer } from '@seamwright/shared/server';
import type { Subject } from './subjects';
import { TEST_COLUMNS, TEST_HEADS } from './test-columns';

/** An empty workbook of tests of one subject: the fixed heads and one for each output; its code stands in the first row. */
export async function testTemplate({ code, step }: Subject): Promise<FileAnswer> {
  const workbook = new Workbook();
  const sheet = workbook.addWorksheet($localize`Cutting tests`, { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.columns = [
    ...TEST_COLUMNS.map((column) => ({
      header: TEST_HEADS[column],
      width: column === 'note' || column === 'supplier' ? 28 : 12,
      ...(column === 'testedOn' ? { style: { numFmt: 'yyyy-mm-dd' } } : {}),
    })),
    ...step.outputs.map(({ name }) => ({ header: name, width: Math.max(12, name.length + 2) })),
  ];
  sheet.getRow(1).font = { bold: true };
  const notes = workbook.addWorksheet($localize`How to fill it in`);
  notes.columns = [{ width: 100 }];
  notes.addRow([
    $localize`One row for each test of ${code}:code:, ${step.name}:name:. Put that code in the first column.`,
  ]);
  notes.addRow([$localize`Weights are kilograms with up to three decimals. Put 0 where nothing came out.`]);
  notes.addRow([$localize`Everything that came out, with what was lost in cutting, is what went in.`]);
  return {
    fileName: $localize`cutting-tests-${code}:code:.xlsx`,
    bytes: Buffer.from(await workbook.xlsx.writeBuffer()),
  };
}
