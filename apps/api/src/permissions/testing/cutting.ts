import {
  createScheme,
  getTestTemplate,
  moveScheme,
  recordTest,
  uploadTests,
  type CuttingTestWire,
  type NewTest,
  type SchemeContentWire,
  type SchemeRecord,
} from '@seamwright/catalogue/contracts';
import { Workbook } from 'exceljs';
import { aSpecification } from './trade';
import type { World } from './world';

/** Striploin to steaks, bone and a little loss. */
export const schemeOf = ({ tree }: World): SchemeContentWire => ({
  name: 'Striploin to steaks',
  kind: 'cutting',
  inputNodeId: tree.striploinId,
  outputs: [
    {
      key: 'steak',
      name: 'Steaks',
      kind: 'joint-product',
      nodeId: tree.steakId,
      yieldPpm: 780_000,
      valueMinorPerKg: 2_000,
    },
    { key: 'bone', name: 'Bone', kind: 'by-product', nodeId: null, yieldPpm: 200_000, valueMinorPerKg: -8 },
  ],
  ingredients: [],
  blend: null,
  note: '',
});

export const newSchemeCode = ({ next }: World): string => `CS-${String(next()).padStart(3, '0')}`;

export const aScheme = (world: World): Promise<SchemeRecord> =>
  world.deed(world.staff.technical, createScheme, {
    body: { code: newSchemeCode(world), content: schemeOf(world) },
  });

/** A scheme that waits for another person's approval. */
export async function aSubmittedScheme(world: World): Promise<SchemeRecord> {
  const { code, rowVersion } = await aScheme(world);
  const submission = { params: { code }, body: { move: 'submit' as const }, ifMatch: rowVersion };
  return world.deed(world.staff.technical, moveScheme, submission);
}

export const testOf = (subject: string): NewTest => ({
  subject,
  input: { lotCode: 'L-1', supplier: 'Alder Farm', grade: 'R3', pieces: 4, grams: 20_000, addedGrams: 0 },
  outputs: [{ key: 'cut', grams: 15_700 }],
  testedOn: '2026-11-30',
  note: '',
});

/** A test of a specification that nobody else tests. */
export async function aTest(world: World): Promise<CuttingTestWire> {
  const body = testOf(await aSpecification(world));
  return world.deed(world.staff.technical, recordTest, { body });
}

/** The template of the steak with one test in it. */
export async function aTestWorkbook(world: World): Promise<{ bytes: Buffer; name: string }> {
  const { code } = world.steak;
  const template = await world.house.call(world.staff.technical, getTestTemplate, { query: { subject: code } });
  const workbook = new Workbook();
  await workbook.xlsx.load(template.bytes as unknown as Parameters<typeof workbook.xlsx.load>[0]);
  workbook.worksheets[0]?.addRow([code, '2026-11-30', 'L-1', 'Alder Farm', 'R3', 4, '20.000', '', '', '15.700']);
  return { bytes: Buffer.from(await workbook.xlsx.writeBuffer()), name: 'tests.xlsx' };
}

export async function aTestImport(world: World): Promise<string> {
  const { id } = await world.deed(world.staff.technical, uploadTests, { file: await aTestWorkbook(world) });
  return id;
}
