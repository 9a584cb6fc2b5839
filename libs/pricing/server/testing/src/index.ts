export { addTestMarket, type TestMarket } from './test-market';
