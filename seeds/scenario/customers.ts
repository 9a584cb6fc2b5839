import type { CustomerKind, TermsFrom } from '@seamwright/identity/domain';

export interface DemoSite {
  readonly key: string;
  readonly name: string;
  readonly address: string;
  readonly postcode: string;
  readonly contactName: string;
  readonly phone: string;
  readonly accessNotes: string | null;
  readonly zone: 'town' | 'fell' | 'coast';
}

export interface DemoBuyer {
  readonly key: string;
  readonly name: string;
  readonly roles: readonly ('buyer' | 'buyer_owner')[];
  /** Keys of the sites that she is kept to; all of them when left out. */
  readonly sites?: readonly string[];
}

export interface DemoCustomer {
  readonly key: string;
  readonly name: string;
  readonly kind: CustomerKind;
  readonly group: string | null;
  readonly termsDays: number;
  readonly termsFrom: TermsFrom;
  readonly billingAddress: string;
  readonly settlement: 'card' | 'account';
  readonly sites: readonly DemoSite[];
  readonly buyers: readonly DemoBuyer[];
}

/** Telephone numbers are from the range that is kept for drama. */
const phone = (last: number): string => `01632 960${String(last).padStart(3, '0')}`;

const site = (
  key: string,
  name: string,
  zone: DemoSite['zone'],
  street: string,
  postcode: string,
  contactName: string,
  line: number,
  accessNotes: string | null = null,
): DemoSite => ({
  key,
  name,
  zone,
  address: `${street}, Withenbeck`,
  postcode,
  contactName,
  phone: phone(line),
  accessNotes,
});

export const GROUPS = ['Lantern Inns'] as const;

export const CUSTOMERS: readonly DemoCustomer[] = [
  {
    key: 'ladle',
    name: 'The Copper Ladle',
    kind: 'restaurant',
    group: null,
    termsDays: 14,
    termsFrom: 'invoice',
    billingAddress: '3 Market Row, Withenbeck, WB1 1AA',
    settlement: 'card',
    sites: [
      site(
        'ladle',
        'The Copper Ladle',
        'town',
        '3 Market Row',
        'WB1 1AA',
        'Nora Quillam',
        101,
        'Back door in Cooper’s Yard, from 6:30',
      ),
    ],
    buyers: [
      { key: 'nora', name: 'Nora Quillam', roles: ['buyer_owner'] },
      { key: 'jonah', name: 'Jonah Fairweather', roles: ['buyer'] },
    ],
  },
  {
    key: 'brackenholme',
    name: 'Hotel Brackenholme',
    kind: 'hotel',
    group: null,
    termsDays: 30,
    termsFrom: 'end-of-month',
    billingAddress: 'Accounts, Hotel Brackenholme, Fell Road, Withenbeck, WB4 2BH',
    settlement: 'account',
    sites: [
      site(
        'brackenholme-main',
        'Main kitchen',
        'fell',
        'Fell Road',
        'WB4 2BH',
        'Lucian Amberley',
        111,
        'Goods lift at the north side',
      ),
      site('brackenholme-hall', 'Banqueting hall', 'fell', 'Fell Road, east wing', 'WB4 2BJ', 'Delphine Rookwood', 112),
    ],
    buyers: [
      { key: 'lucian', name: 'Lucian Amberley', roles: ['buyer_owner'] },
      { key: 'delphine', name: 'Delphine Rookwood', roles: ['buyer'], sites: ['brackenholme-hall'] },
    ],
  },
  {
    key: 'ferryman',
    name: 'The Ferryman’s Lantern',
    kind: 'pub',
    group: 'Lantern Inns',
    termsDays: 7,
    termsFrom: 'end-of-week',
    billingAddress: 'Lantern Inns, 40 Staithe Street, Withenbeck, WB2 7LI',
    settlement: 'account',
    sites: [site('ferryman', 'The Ferryman’s Lantern', 'coast', '2 Staithe Street', 'WB2 7FL', 'Oswin Tarr', 121)],
    buyers: [{ key: 'oswin', name: 'Oswin Tarr', roles: ['buyer_owner'] }],
  },
  {
    key: 'ploughwright',
    name: 'The Ploughwright',
    kind: 'pub',
    group: 'Lantern Inns',
    termsDays: 7,
    termsFrom: 'end-of-week',
    billingAddress: 'Lantern Inns, 40 Staithe Street, Withenbeck, WB2 7LI',
    settlement: 'account',
    sites: [
      site(
        'ploughwright',
        'The Ploughwright',
        'fell',
        '9 High Pasture Lane',
        'WB4 6PW',
        'Greta Hallowes',
        131,
        'Narrow lane: small van',
      ),
    ],
    buyers: [{ key: 'greta', name: 'Greta Hallowes', roles: ['buyer_owner'] }],
  },
  {
    key: 'quillfeather',
    name: 'Quillfeather Catering',
    kind: 'caterer',
    group: null,
    termsDays: 14,
    termsFrom: 'invoice',
    billingAddress: 'Unit 6, Ropewalk, Withenbeck, WB1 9QC',
    settlement: 'card',
    sites: [site('quillfeather', 'Ropewalk kitchen', 'town', 'Unit 6, Ropewalk', 'WB1 9QC', 'Basil Quillfeather', 141)],
    buyers: [{ key: 'basil', name: 'Basil Quillfeather', roles: ['buyer_owner'] }],
  },
  {
    key: 'osterby',
    name: 'Osterby Family Butchers',
    kind: 'butcher',
    group: null,
    termsDays: 14,
    termsFrom: 'end-of-week',
    billingAddress: '21 Chandler Street, Withenbeck, WB2 1OB',
    settlement: 'account',
    sites: [site('osterby', 'Chandler Street shop', 'coast', '21 Chandler Street', 'WB2 1OB', 'Henrike Osterby', 151)],
    buyers: [{ key: 'henrike', name: 'Henrike Osterby', roles: ['buyer_owner'] }],
  },
  {
    key: 'tarnside',
    name: 'Tarnside Farm Shop',
    kind: 'farm-shop',
    group: null,
    termsDays: 14,
    termsFrom: 'invoice',
    billingAddress: 'Tarnside, Upper Withenbeck, WB5 3TF',
    settlement: 'card',
    sites: [site('tarnside', 'Farm shop', 'fell', 'Tarnside, Upper Withenbeck', 'WB5 3TF', 'Maren Tarnside', 161)],
    buyers: [{ key: 'maren', name: 'Maren Tarnside', roles: ['buyer_owner'] }],
  },
  {
    key: 'eskmere',
    name: 'Eskmere Grange School',
    kind: 'school',
    group: null,
    termsDays: 30,
    termsFrom: 'invoice',
    billingAddress: 'The Bursar, Eskmere Grange, Withenbeck, WB3 8EG',
    settlement: 'account',
    sites: [
      site(
        'eskmere',
        'School kitchen',
        'town',
        'Eskmere Grange',
        'WB3 8EG',
        'Philippa Dunmarrow',
        171,
        'Not between 8:15 and 9:00: children arrive',
      ),
    ],
    buyers: [{ key: 'philippa', name: 'Philippa Dunmarrow', roles: ['buyer_owner'] }],
  },
];

/** A buyer's demo address: her key at her customer's. */
export const buyerEmail = (customer: DemoCustomer, buyer: DemoBuyer): string => `${buyer.key}@${customer.key}.example`;
