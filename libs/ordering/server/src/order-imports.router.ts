import { getImportTemplate, getOrderImport, takeOrders, uploadOrders } from '@seamwright/ordering/contracts';
import { implement, implementOnce, inTransaction, type Implementation } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { importTemplate } from './import-template';
import type { OrderingParts } from './ports';
import { presentImport, takeImport, uploadImport } from './take-import';

export function orderImportsImplementations(parts: OrderingParts): Implementation[] {
  return [
    // Before the one with an id, which would take "template" for one.
    implement(getImportTemplate, () => importTemplate()),
    implementOnce(uploadOrders, {
      make: (tx, { now, caller, upload }) => {
        if (!upload) throw new RefusalError({ code: 'file-missing', params: {} });
        return uploadImport(tx, { now, caller }, parts, upload);
      },
      present: (tx, _context, id) => presentImport(tx, id),
    }),
    implement(getOrderImport, ({ database, caller }, { params }) =>
      inTransaction(database, caller, (tx) => presentImport(tx, params.importId)),
    ),
    implementOnce(takeOrders, {
      make: (tx, { now, caller }, { params, body }) =>
        takeImport(tx, { now, caller }, parts, { importId: params.importId, how: body.how }),
      present: (tx, _context, id) => presentImport(tx, id),
    }),
  ];
}
