export { ordersRoutes } from './orders.routes';
