export { openTestHouse, TEST_NOW, type Called, type TestHouse } from './test-house';
