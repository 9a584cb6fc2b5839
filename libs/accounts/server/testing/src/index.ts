export { openAccountsHouse, TEST_DELIVERY_DAY, type AccountsHouse } from './accounts-house';
export { FAKE_TARIFF, FakeProcessor } from './fake-processor';
