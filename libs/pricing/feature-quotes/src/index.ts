export { quotesRoutes } from './quotes.routes';
