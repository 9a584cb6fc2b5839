export { peopleRoutes } from './people.routes';
