export { reconciliationRoutes } from './reconciliation.routes';
