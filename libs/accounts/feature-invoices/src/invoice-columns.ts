import type { InvoiceListItem } from '@seamwright/accounts/contracts';
import type { TableColumn } from '@seamwright/shared/ui/table';

type Columns = readonly TableColumn<InvoiceListItem>[];

const head: Columns = [
  {
    key: 'number',
    label: $localize`:@@invoices.column.number:Invoice`,
    kind: 'code',
    value: ({ number }) => String(number),
  },
];

const rest: Columns = [
  { key: 'standing', label: $localize`:@@invoices.column.standing:Standing`, kind: 'template' },
  {
    key: 'order',
    label: $localize`:@@invoices.column.order:Order`,
    kind: 'code',
    value: ({ order }) => String(order.number),
  },
  { key: 'deliveryDay', label: $localize`:@@invoices.column.delivery:Delivery`, kind: 'date', sortable: true },
  { key: 'dueOn', label: $localize`:@@invoices.column.due:Due`, kind: 'date', sortable: true },
  { key: 'totalMinor', label: $localize`:@@invoices.column.total:Total`, kind: 'money', sortable: true },
  {
    key: 'open',
    label: $localize`:@@invoices.column.open:Left to pay`,
    kind: 'money',
    sortable: true,
    value: ({ totalMinor, paidMinor }) => totalMinor - paidMinor || null,
  },
];

/** What a buyer sees of her invoices. */
export const buyerColumns: Columns = [...head, ...rest];

/** What the desk sees of everybody's. */
export const deskColumns: Columns = [
  ...head,
  {
    key: 'customer',
    label: $localize`:@@invoices.column.customer:Customer`,
    kind: 'text',
    sortable: true,
    value: ({ customer }) => customer.name,
  },
  ...rest,
];
