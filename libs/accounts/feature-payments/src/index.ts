export { paymentsRoutes } from './payments.routes';
