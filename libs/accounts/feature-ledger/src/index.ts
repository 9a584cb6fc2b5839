export { ledgerRoutes } from './ledger.routes';
