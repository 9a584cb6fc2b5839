export { orderImportRoutes } from './order-import.routes';
