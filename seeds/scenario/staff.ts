import type { StaffRole } from '@seamwright/identity/domain';

export interface DemoStaff {
  readonly key: string;
  readonly name: string;
  readonly roles: readonly StaffRole[];
  /** Keys of the customers that a rep is kept to; all of them when left out. */
  readonly customers?: readonly string[];
  readonly does: string;
}

export const STAFF: readonly DemoStaff[] = [
  { key: 'ada', name: 'Ada Thornquist', roles: ['admin'], does: 'people, roles, customers, calendar' },
  {
    key: 'ruben',
    name: 'Ruben Castellane',
    roles: ['rep'],
    does: 'quotes, prices, phone orders, orders from a spreadsheet',
  },
  {
    key: 'maud',
    name: 'Maud Pellworm',
    roles: ['rep'],
    customers: ['ferryman', 'ploughwright', 'eskmere'],
    does: 'a rep who serves three customers only',
  },
  { key: 'tamsin', name: 'Tamsin Okafor-Reed', roles: ['technical'], does: 'specifications' },
  { key: 'idris', name: 'Idris Vantongeren', roles: ['technical'], does: 'approves what Tamsin writes' },
  {
    key: 'petra',
    name: 'Petra Lindqvist-Mole',
    roles: ['planner'],
    does: 'closes the day, cutting list, pull list, lots',
  },
  { key: 'femi', name: 'Femi Adeyinka-Holt', roles: ['floor'], does: 'weighs and packs at the scale' },
  {
    key: 'anneke',
    name: 'Anneke Brandsma',
    roles: ['accounts'],
    does: 'invoices, card payments, bank, reconciliation, ledger',
  },
];
