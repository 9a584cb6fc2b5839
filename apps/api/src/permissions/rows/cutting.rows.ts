import * as catalogue from '@seamwright/catalogue/contracts';
import { ofHouse, type Row } from '../row';
import {
  aScheme,
  aSubmittedScheme,
  aTest,
  aTestImport,
  aTestWorkbook,
  newSchemeCode,
  schemeOf,
  testOf,
} from '../testing/cutting';

export const cuttingRows: readonly Row[] = [
  ofHouse(catalogue.listSchemes, () => ({ query: { q: 'steaks' } })),
  ofHouse(catalogue.getScheme, async (world) => ({ params: { code: (await aScheme(world)).code } })),
  ofHouse(catalogue.createScheme, (world) => ({ body: { code: newSchemeCode(world), content: schemeOf(world) } })),
  ofHouse(catalogue.saveSchemeDraft, async (world) => {
    const { code, rowVersion } = await aScheme(world);
    return { params: { code }, body: { ...schemeOf(world), note: 'Saw the chine first.' }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.moveScheme, async (world) => {
    const { code, rowVersion } = await aSubmittedScheme(world);
    return {
      params: { code },
      body: { move: 'send-back' as const, reason: 'Weigh the bone again' },
      ifMatch: rowVersion,
    };
  }),
  ofHouse(catalogue.getCutOut, ({ tree, steak }) => ({
    params: { nodeId: tree.striploinId },
    query: { through: steak.code },
  })),
  ofHouse(catalogue.listTests, ({ steak }) => ({ query: { subject: steak.code } })),
  ofHouse(catalogue.recordTest, ({ steak }) => ({ body: testOf(steak.code) })),
  ofHouse(catalogue.judgeTest, async (world) => {
    const { id, rowVersion } = await aTest(world);
    return {
      params: { testId: id },
      body: { verdict: 'set-aside' as const, reason: 'The scale stuck' },
      ifMatch: rowVersion,
    };
  }),
  ofHouse(catalogue.getYields, ({ steak }) => ({
    params: { subject: steak.code },
    query: { inputMinorPerKg: 1_000 },
  })),
  ofHouse(catalogue.adoptYields, async (world) => ({ params: { subject: (await aTest(world)).subject } })),
  ofHouse(catalogue.getTestTemplate, ({ steak }) => ({ query: { subject: steak.code } })),
  ofHouse(catalogue.uploadTests, async (world) => ({ file: await aTestWorkbook(world) })),
  ofHouse(catalogue.getTestImport, async (world) => ({ params: { importId: await aTestImport(world) } })),
  ofHouse(catalogue.takeTests, async (world) => ({
    params: { importId: await aTestImport(world) },
    body: { how: 'good-rows' as const },
  })),
];
