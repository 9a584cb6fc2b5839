import {
  getCutTree,
  getSpecification,
  getStaffSpecification,
  listVersions,
  withdrawSpecification as withdrawal,
} from '@seamwright/catalogue/contracts';
import { implement, inTransaction, type Implementation, type RequestContext, type Tx } from '@seamwright/shared/server';
import { cutNodes } from './cut-nodes.repository';
import { listNewestVersions, readSpecification, readStaffSpecification } from './read-catalogue';
import { withdrawSpecification } from './withdraw-specification';

const read = <T>({ database, caller }: RequestContext, work: (tx: Tx) => Promise<T>): Promise<T> =>
  inTransaction(database, caller, work);

/** Reading specifications and the cut tree, and withdrawing. */
export const readingImplementations: readonly Implementation[] = [
  implement(getSpecification, (context, { params }) => read(context, (tx) => readSpecification(tx, params.code))),
  implement(getStaffSpecification, (context, { params, query }) =>
    read(context, (tx) => readStaffSpecification(tx, params.code, query.version)),
  ),
  implement(listVersions, (context, { query }) => read(context, (tx) => listNewestVersions(tx, query))),
  implement(withdrawal, ({ database, caller, now, ifMatch }, { params, body }) =>
    inTransaction(database, caller, async (tx) => {
      await withdrawSpecification(tx, { now, code: params.code, reason: body.reason, rowVersion: ifMatch });
      return readStaffSpecification(tx, params.code);
    }),
  ),
  implement(getCutTree, (context) => read(context, async (tx) => ({ nodes: [...(await cutNodes(tx)).values()] }))),
];
