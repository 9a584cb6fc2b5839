export { buyerInvoicesRoutes, deskInvoicesRoutes } from './invoices.routes';
