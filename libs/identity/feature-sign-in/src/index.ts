export { signInRoutes } from './sign-in.routes';
