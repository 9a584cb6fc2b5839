export { customersRoutes } from './customers.routes';
