export { receivedQuotesRoutes } from './received-quotes.routes';
