export { MovableClock, SetClock, systemClock, type Clock } from './clock';
export { readConfig, type Config } from './config';
export { anonymous, customersOf, personOf, rolesOf, system, type Caller, type SystemPurpose } from './database/caller';
export { openDatabase, type Database } from './database/database';
export { inTransaction, type Tx } from './database/in-transaction';
export { pageFrom, readCursor, writeCursor, type CursorValues } from './database/paging';
export { violates } from './database/violations';
export { documentById, storeDocument, type NewDocument } from './documents/documents';
export { apiRouter, problemHandler, type ApiDependencies } from './http/api-router';
export { docsPage } from './http/docs-page';
export { healthRouter } from './http/health';
export {
  implement,
  implementOnce,
  type FileAnswer,
  type Handler,
  type Implementation,
  type Maker,
} from './http/implement';
export { openApiDocument } from './http/openapi';
export { conflict, notFound, problemOf, ProblemError, sendProblem, stale } from './http/problems';
export type { RequestContext, UploadedFile } from './http/request-context';
export { requestLog } from './http/request-log';
export { drainOutbox } from './jobs/drain';
export { emit, type NewEvent, type OutboxEvent } from './jobs/outbox';
export type { JobContext, PeriodicJob, Subscriber } from './jobs/subscriber';
export { startWorker, type Worker } from './jobs/worker';
export { LiveHub, mayHear } from './live/live-hub';
export { createLog, type Log } from './log';
export { mailSubscriber, queueMail, smtpMailer, type Mailer, type NewMail } from './mail/mail';
export { cellText, firstSheet, MOST_ROWS } from './workbooks/read-sheet';
