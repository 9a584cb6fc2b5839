export { calendarRoutes } from './calendar.routes';
