export { priceListsRoutes } from './price-lists.routes';
