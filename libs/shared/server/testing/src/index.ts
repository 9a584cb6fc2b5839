export { openTestHouse, TEST_NOW, type Called, type TestHouse } from './test-house';
export { waitForLock } from './wait-for-lock';
export { watchPlans, type TableRead, type WatchedDatabase } from './watch-plans';
