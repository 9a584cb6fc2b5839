import { getInvoice, getInvoicePdf, getReconciliation, listInvoices } from '@seamwright/accounts/contracts';
import { addDays, instantAt } from '@seamwright/shared/util';
import { PLANT } from '../../../seeds/scenario/plant';
import type { BenchCase } from '../bench';
import { idsIn, readOrders } from './rows';
import { known, type Stage } from './stage';

const PAGE = 50;
const INVOICES = `select i.*, c.name, c.billing_address, o.number as order_number, coalesce((
    select sum(j.debit_minor - j.credit_minor) from journal_lines j
    where j.customer_id = i.customer_id and j.invoice_id = i.id and j.account = 'receivables'), 0) as due_minor
  from invoices i join orders o on o.id = i.order_id join customers c on c.id = i.customer_id`;

/** What accounts reads of the weeks behind. */
export async function moneyCases({ api, plain, as, anchor }: Stage): Promise<BenchCase[]> {
  const token = () => as('anneke').token;
  const { items } = await api.call(token(), listInvoices, { query: { limit: PAGE } });
  const invoiceId = known(items[0], 'invoice').id;
  const invoice = await api.call(token(), getInvoice, { params: { invoiceId } });
  const paper = await api.download(token(), getInvoicePdf, { params: { invoiceId } });
  const day = addDays(anchor, -7);
  const week = await api.call(token(), getReconciliation, { query: { day } });

  return [
    {
      name: listInvoices.id,
      size: `${items.length} invoices`,
      target: 3,
      ours: () => api.call(token(), listInvoices, { query: { limit: PAGE } }),
      floor: () => plain.inTransaction(() => plain.query(`${INVOICES} order by i.number desc limit $1`, [PAGE + 1])),
    },
    {
      name: getInvoice.id,
      size: `${invoice.lines.length} lines`,
      target: 3,
      ours: () => api.call(token(), getInvoice, { params: { invoiceId } }),
      floor: () =>
        plain.inTransaction(async () => {
          const [found] = await plain.query(`${INVOICES} where i.id = $1`, [invoiceId]);
          await plain.query('select * from invoice_lines where invoice_id = $1 order by position', [invoiceId]);
          await plain.query('select * from payments where order_id = $1', [found?.['order_id']]);
        }),
    },
    {
      name: getInvoicePdf.id,
      size: `${Math.round(paper.length / 1000)} kB`,
      target: 3,
      ours: () => api.download(token(), getInvoicePdf, { params: { invoiceId } }),
      floor: () =>
        plain.inTransaction(async () => {
          const [found] = await plain.query(`${INVOICES} where i.id = $1`, [invoiceId]);
          await plain.query('select * from documents where id = $1', [found?.['document_id']]);
        }),
    },
    {
      name: getReconciliation.id,
      size: `${week.payouts.length} payouts, ${week.legs.length} legs`,
      target: 3,
      ours: () => api.call(token(), getReconciliation, { query: { day } }),
      floor: () =>
        plain.inTransaction(async () => {
          const from = instantAt(week.from as typeof day, '00:00', PLANT.timeZone);
          const until = instantAt(addDays(week.until as typeof day, 1), '00:00', PLANT.timeZone);
          const moved = await plain.query(
            'select * from processor_transactions where created_at >= $1 and created_at < $2 order by created_at, id',
            [from, until],
          );
          const payouts = await plain.query(
            'select * from processor_payouts where created_at >= $1 and created_at < $2 order by created_at',
            [from, until],
          );
          await plain.query('select * from processor_transactions where payout_id = any ($1)', [idsIn(payouts)]);
          await plain.query(
            `select l.*, m.* from bank_lines l left join bank_matches m on m.bank_line_id = l.id
             where m.payout_id = any ($1) or (m.payout_id is null and l.booked_on between $2 and $3)`,
            [idsIn(payouts), week.from, addDays(week.until as typeof day, 14)],
          );
          const payments = await plain.query(
            `select * from payments
             where processor_charge_id = any ($1) or (captured_at >= $2 and captured_at < $3)`,
            [idsIn(moved, 'charge_id'), from, until],
          );
          await readOrders(plain, 'o.id = any ($1)', [idsIn(payments, 'order_id')]);
          await plain.query(
            'select sum(net_minor), sum(net_minor) filter (where created_at < $1) from processor_transactions',
            [from],
          );
          await plain.query('select * from processor_balances');
          await plain.query(
            'select account, sum(debit_minor), sum(credit_minor) from journal_lines group by account, currency',
          );
        }),
    },
  ];
}
