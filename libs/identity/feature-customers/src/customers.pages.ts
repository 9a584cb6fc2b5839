import type { Routes } from '@angular/router';
import { hasRole, provideCustomers } from '@seamwright/identity/data-access';
import { CustomerPage } from './customer.page';
import { CustomersPage } from './customers.page';
import { NewCustomerPage } from './new-customer.page';

/** Fetched with the first page of them, together with the store's customers. */
export const customersPages: Routes = [
  {
    path: '',
    providers: [provideCustomers()],
    children: [
      { path: '', title: $localize`:@@identity.customers.title:Customers`, component: CustomersPage },
      {
        path: 'new',
        title: $localize`:@@identity.customers.new:New customer`,
        canActivate: [hasRole('admin', 'accounts')],
        component: NewCustomerPage,
      },
      { path: ':customerId', title: $localize`:@@identity.customer.title:Customer`, component: CustomerPage },
    ],
  },
];
