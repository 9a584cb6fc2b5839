export { DELIVERY_DAY, openTestPlant, TIME_ZONE, type TestPlant } from './test-plant';
