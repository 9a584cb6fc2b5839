export { orderDeskRoutes } from './order-desk.routes';
