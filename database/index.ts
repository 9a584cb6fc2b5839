export type { DB } from './schema';
export { MIGRATIONS } from './migrations';
export { appliedMigrations, migrateToHead } from './migrate';
export { DELIVERIES_QUEUE, PERIODIC_QUEUE } from './queues';
export { UNECE_START_VALUES, type UneceStartValue } from './reference/unece-field-values';
