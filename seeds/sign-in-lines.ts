import { buyerEmail, CUSTOMERS } from './scenario/customers';
import { DEMO_PASSWORD, staffEmail } from './scenario/plant';
import { STAFF } from './scenario/staff';

/** Who may sign in to the demo, ready for a terminal. */
export function signInLines(): string[] {
  const staff = STAFF.map(({ key, roles, does }) => row(staffEmail(key), `${roles.join(', ')}: ${does}`));
  const buyers = CUSTOMERS.flatMap((customer) =>
    customer.buyers.map((buyer) => row(buyerEmail(customer, buyer), `${customer.name}, ${buyer.roles.join(', ')}`)),
  );
  return [
    `Demo sign-ins, all with the password "${DEMO_PASSWORD}":`,
    '',
    '  storefront',
    ...buyers,
    '',
    '  administration',
    ...staff,
  ];
}

const row = (email: string, about: string): string => `    ${email.padEnd(34)}${about}`;
