export { cardsRoutes } from './cards.routes';
