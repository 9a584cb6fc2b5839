import type { Tx } from '@seamwright/shared/server';

/** Where the confirmation of an order goes: to the buyer who placed it, else to the customer's address for papers. */
export async function confirmationRecipient(tx: Tx, orderId: string): Promise<{ name: string; email: string } | null> {
  const row = await tx
    .selectFrom('orders as o')
    .innerJoin('customers as c', 'c.id', 'o.customerId')
    .leftJoin('people as p', (join) => join.onRef('p.id', '=', 'o.placedBy').onRef('p.customerId', '=', 'o.customerId'))
    .select(['c.name', 'c.invoiceEmail', 'p.name as buyer', 'p.email'])
    .where('o.id', '=', orderId)
    .executeTakeFirst();
  return row ? { name: row.buyer ?? row.name, email: row.email ?? row.invoiceEmail } : null;
}
