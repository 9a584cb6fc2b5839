import type { Role } from '@seamwright/shared/contracts';

/** A place of the desk: where it is, and whose work it is. */
export interface Place {
  readonly path: string;
  readonly label: string;
  /** What is done there, for the first page. */
  readonly about: string;
  readonly roles: readonly Role[];
}

/** Every place in the order of the day's work. Routes and navigation both follow from it. */
export const PLACES = {
  orders: {
    path: 'orders',
    label: $localize`:@@admin.nav.orders:Orders`,
    about: $localize`:@@admin.about.orders:What is ordered for which day; phone orders and holds`,
    roles: ['rep', 'planner', 'accounts', 'admin'],
  },
  imports: {
    path: 'order-import',
    label: $localize`:@@admin.nav.imports:From a spreadsheet`,
    about: $localize`:@@admin.about.imports:Look through a workbook of orders, then take it`,
    roles: ['rep', 'admin'],
  },
  quotes: {
    path: 'quotes',
    label: $localize`:@@admin.nav.quotes:Quotes`,
    about: $localize`:@@admin.about.quotes:Write, send and follow quotes`,
    roles: ['rep', 'admin'],
  },
  prices: {
    path: 'price-lists',
    label: $localize`:@@admin.nav.prices:Price lists`,
    about: $localize`:@@admin.about.prices:Base, group and customer prices`,
    roles: ['rep', 'admin'],
  },
  cuttingDays: {
    path: 'cutting-days',
    label: $localize`:@@admin.nav.cuttingDays:Cutting days`,
    about: $localize`:@@admin.about.cuttingDays:What is cut for each day: cutting list, pull list, workbook`,
    roles: ['planner', 'technical', 'floor', 'admin'],
  },
  scale: {
    path: 'scale',
    label: $localize`:@@admin.nav.scale:Scale`,
    about: $localize`:@@admin.about.scale:Weigh and pack the orders on the floor`,
    roles: ['floor', 'planner'],
  },
  lots: {
    path: 'lots',
    label: $localize`:@@admin.nav.lots:Lots`,
    about: $localize`:@@admin.about.lots:What is in the chiller and how long it keeps`,
    roles: ['planner', 'technical', 'floor'],
  },
  specifications: {
    path: 'specifications',
    label: $localize`:@@admin.nav.specifications:Specifications`,
    about: $localize`:@@admin.about.specifications:Versions, yields and work of every cut`,
    roles: ['technical', 'rep', 'planner', 'admin'],
  },
  invoices: {
    path: 'invoices',
    label: $localize`:@@admin.nav.invoices:Invoices`,
    about: $localize`:@@admin.about.invoices:What was invoiced, paid and is open`,
    roles: ['accounts', 'admin'],
  },
  payments: {
    path: 'payments',
    label: $localize`:@@admin.nav.payments:Card payments`,
    about: $localize`:@@admin.about.payments:Holds, captures and what ends soon`,
    roles: ['accounts', 'admin'],
  },
  reconciliation: {
    path: 'reconciliation',
    label: $localize`:@@admin.nav.reconciliation:Reconciliation`,
    about: $localize`:@@admin.about.reconciliation:From the customers' cards to the bank, to the penny`,
    roles: ['accounts', 'admin'],
  },
  ledger: {
    path: 'ledger',
    label: $localize`:@@admin.nav.ledger:Ledger`,
    about: $localize`:@@admin.about.ledger:Balances and journal entries`,
    roles: ['accounts', 'admin'],
  },
  customers: {
    path: 'customers',
    label: $localize`:@@admin.nav.customers:Customers`,
    about: $localize`:@@admin.about.customers:Accounts, sites, terms and their people`,
    roles: ['admin', 'accounts', 'rep'],
  },
  people: {
    path: 'people',
    label: $localize`:@@admin.nav.people:People`,
    about: $localize`:@@admin.about.people:Staff, roles and invitations`,
    roles: ['admin'],
  },
  calendar: {
    path: 'calendar',
    label: $localize`:@@admin.nav.calendar:Calendar`,
    about: $localize`:@@admin.about.calendar:Delivery zones, cut-off times and closures`,
    roles: ['admin', 'planner', 'rep', 'accounts'],
  },
} as const satisfies Record<string, Place>;

/** The places of somebody with these roles. */
export const placesOf = (roles: readonly Role[]): readonly Place[] =>
  Object.values<Place>(PLACES).filter((place) => place.roles.some((role) => roles.includes(role)));
