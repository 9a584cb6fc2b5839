import { buyersOf, customerById, type Addressee } from '@seamwright/identity/server';
import type { OrderWithLines } from '@seamwright/ordering/domain';
import type { Tx } from '@seamwright/shared/server';

/**
 * Who is told that an order is confirmed: the buyer who placed it. One that the desk took is told to everybody who
 * orders for its site, and where nobody does, to the customer's address for papers.
 */
export async function confirmationRecipients(
  tx: Tx,
  { customerId, siteId, placedBy }: Pick<OrderWithLines, 'customerId' | 'siteId' | 'placedBy'>,
): Promise<readonly Addressee[]> {
  const buyers = await buyersOf(tx, customerId, siteId);
  const own = buyers.filter(({ id }) => id === placedBy);
  if (own.length > 0) return own;
  if (buyers.length > 0) return buyers;
  const { id, name, invoiceEmail } = await customerById(tx, customerId);
  return [{ id, name, email: invoiceEmail }];
}
