export { teamRoutes } from './team.routes';
