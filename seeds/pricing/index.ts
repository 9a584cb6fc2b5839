export { seedPricing } from './seed-pricing';
