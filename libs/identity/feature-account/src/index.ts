export { accountRoutes } from './account.routes';
