import * as contracts from '@seamwright/catalogue/contracts';
import { cuttingTestOf } from './cutting-test-of';
import { implement, implementOnce, inTransaction, type Implementation } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { adoptYields } from './adopt-yields';
import type { YieldParts } from './ports';
import { presentAdoption } from './present-adoption';
import { listTests, readYields } from './read-yields';
import { judgeTest, readTest, recordTests } from './record-tests';
import { subjectByCode } from './subjects';
import { presentTestImport, takeTests, uploadTests } from './take-tests';
import { testTemplate } from './test-template';

export function yieldImplementations(parts: YieldParts): Implementation[] {
  const { timeZone } = parts;
  return [
    implement(contracts.listTests, ({ database, caller }, { query }) =>
      inTransaction(database, caller, (tx) => listTests(tx, query)),
    ),
    implementOnce(contracts.recordTest, {
      make: async (tx, { now, caller }, { body }) => {
        const test = { subject: await subjectByCode(tx, body.subject), content: cuttingTestOf(body) };
        const [id = ''] = await recordTests(tx, { now, caller }, timeZone, [test]);
        return id;
      },
      present: (tx, _context, id) => readTest(tx, id),
    }),
    implement(contracts.judgeTest, ({ database, caller, now, ifMatch }, { params: { testId }, body }) =>
      inTransaction(database, caller, async (tx) => {
        await judgeTest(tx, { now, caller }, { testId, ...body, rowVersion: ifMatch });
        return readTest(tx, testId);
      }),
    ),
    implement(contracts.getYields, ({ database, caller }, { params, query }) =>
      inTransaction(database, caller, (tx) => readYields(tx, params.subject, query.inputMinorPerKg)),
    ),
    implementOnce(contracts.adoptYields, {
      make: (tx, { now, caller }, { params }) => adoptYields(tx, { now, caller }, params.subject),
      present: (tx, { now }, id) => presentAdoption(tx, parts, now, id),
    }),
    // Before the one with an id, which would take "template" for one.
    implement(contracts.getTestTemplate, ({ database, caller }, { query }) =>
      inTransaction(database, caller, async (tx) => testTemplate(await subjectByCode(tx, query.subject))),
    ),
    implementOnce(contracts.uploadTests, {
      make: (tx, { now, caller, upload }) => {
        if (!upload) throw new RefusalError({ code: 'file-missing', params: {} });
        return uploadTests(tx, { now, caller }, timeZone, upload);
      },
      present: (tx, _context, id) => presentTestImport(tx, id),
    }),
    implement(contracts.getTestImport, ({ database, caller }, { params }) =>
      inTransaction(database, caller, (tx) => presentTestImport(tx, params.importId)),
    ),
    implementOnce(contracts.takeTests, {
      make: (tx, { now, caller }, { params, body }) =>
        takeTests(tx, { now, caller }, timeZone, { importId: params.importId, how: body.how }),
      present: (tx, _context, id) => presentTestImport(tx, id),
    }),
  ];
}
