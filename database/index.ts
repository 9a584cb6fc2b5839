export type { DB } from './schema';
export { MIGRATIONS } from './migrations';
export { appliedMigrations, migrateToHead } from './migrate';
export { DELIVERIES_QUEUE, PERIODIC_QUEUE } from './queues';
