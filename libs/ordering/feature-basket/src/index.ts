export { basketRoutes } from './basket.routes';
