export { seedCatalogue } from './seed-catalogue';
export { SPECIFICATIONS } from './specifications';
