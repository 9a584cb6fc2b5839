export { FakeCards, type FakeCard } from './fake-cards';
export { openOrderingHouse, type OrderingHouse } from './ordering-house';
export { addTestTrade, type TestCustomer, type TestTrade } from './test-trade';
