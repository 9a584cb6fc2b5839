import * as z from 'zod';
import { TEST_VERDICTS } from '@seamwright/catalogue/domain';
import {
  defineEndpoint,
  id,
  minor,
  MOST_IMPORT_BYTES,
  note,
  pageOf,
  pageQuery,
  staffOnly,
  WORKBOOK_MEDIA_TYPE,
} from '@seamwright/shared/contracts';
import { adoptionAnswer, cuttingTest, newTest, subjectCode, testImport, yieldsAnswer } from './cutting.wire';

const staff = staffOnly('technical', 'rep', 'planner', 'admin');
const technical = staffOnly('technical');

export const listTests = defineEndpoint({
  id: 'cutting-tests.list',
  summary: 'The cutting tests of a scheme or specification, newest first',
  method: 'GET',
  path: '/cutting-tests',
  access: staff,
  query: { ...pageQuery, subject: subjectCode },
  response: pageOf(cuttingTest),
});

export const recordTest = defineEndpoint({
  id: 'cutting-tests.record',
  summary: 'Keeps one measured breakdown; its weights must reconcile to the gram',
  method: 'POST',
  path: '/cutting-tests',
  access: technical,
  body: newTest,
  response: cuttingTest,
  status: 201,
  idempotent: true,
});

export const judgeTest = defineEndpoint({
  id: 'cutting-tests.judge',
  summary: 'Sets a test aside with a reason, or keeps it although it stands out',
  method: 'POST',
  path: '/cutting-tests/:testId/verdict',
  access: technical,
  params: { testId: id },
  body: z.strictObject({ verdict: z.enum(TEST_VERDICTS), reason: note(300) }),
  response: cuttingTest,
  guarded: true,
});

export const getYields = defineEndpoint({
  id: 'yields.get',
  summary:
    'Yields by the tests: whole, by grade and by supplier, with deviation, 95 % interval and a point for each test',
  method: 'GET',
  path: '/yields/:subject',
  access: staff,
  params: { subject: subjectCode },
  query: { inputMinorPerKg: minor.min(1).max(100_000_000).optional() },
  response: yieldsAnswer,
});

export const adoptYields = defineEndpoint({
  id: 'yields.adopt',
  summary: 'Makes a new version in review with the yields of the tests, and tells what reads them',
  method: 'POST',
  path: '/yields/:subject/adoption',
  access: technical,
  params: { subject: subjectCode },
  response: adoptionAnswer,
  status: 201,
  idempotent: true,
});

export const getTestTemplate = defineEndpoint({
  id: 'cutting-test-imports.template',
  summary: 'An empty workbook of cutting tests with a column for each output of the subject',
  method: 'GET',
  path: '/cutting-test-imports/template',
  access: technical,
  query: { subject: subjectCode },
  file: WORKBOOK_MEDIA_TYPE,
});

export const uploadTests = defineEndpoint({
  id: 'cutting-test-imports.upload',
  summary: 'Reads a workbook of cutting tests and shows what would be recorded; nothing is recorded yet',
  method: 'POST',
  path: '/cutting-test-imports',
  access: technical,
  response: testImport,
  status: 201,
  idempotent: true,
  upload: { maxBytes: MOST_IMPORT_BYTES },
});

export const getTestImport = defineEndpoint({
  id: 'cutting-test-imports.get',
  summary: 'A workbook of cutting tests that was read, as it stands now',
  method: 'GET',
  path: '/cutting-test-imports/:importId',
  access: technical,
  params: { importId: id },
  response: testImport,
});

export const takeTests = defineEndpoint({
  id: 'cutting-test-imports.take',
  summary: 'Records the tests of a workbook, once: the good rows, or all or none',
  method: 'POST',
  path: '/cutting-test-imports/:importId/taking',
  access: technical,
  params: { importId: id },
  body: z.strictObject({ how: z.enum(['good-rows', 'all-or-none']) }),
  response: testImport,
  idempotent: true,
});
