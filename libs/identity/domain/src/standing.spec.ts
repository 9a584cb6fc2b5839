import type { Standing } from './standing';
import { checkStanding } from './standing';

const BUYER: Standing = { customerId: 'anchor', roles: ['buyer'], sites: '*', customers: '*' };
const REP: Standing = { customerId: null, roles: ['rep'], sites: '*', customers: '*' };
const codeOf = (standing: Standing) => {
  const result = checkStanding(standing);
  return result.ok ? 'ok' : result.refusal.code;
};

describe('checkStanding', () => {
  it('takes a buyer of a customer, kept to a site or not, and staff of none', () => {
    expect(codeOf(BUYER)).toBe('ok');
    expect(codeOf({ ...BUYER, sites: ['harbour'] })).toBe('ok');
    expect(codeOf(REP)).toBe('ok');
    expect(codeOf({ ...REP, customers: ['anchor'] })).toBe('ok');
    expect(codeOf({ ...REP, roles: ['planner', 'floor'] })).toBe('ok');
  });

  it.each<[string, Standing]>([
    ['roles-missing', { ...REP, roles: [] }],
    ['roles-need-customer', { ...REP, roles: ['buyer'] }],
    ['roles-of-staff', { ...BUYER, roles: ['buyer', 'rep'] }],
    ['sites-not-kept', { ...BUYER, roles: ['buyer_owner'], sites: ['harbour'] }],
    ['sites-not-kept', { ...REP, sites: ['harbour'] }],
    ['sites-missing', { ...BUYER, sites: [] }],
    ['customers-not-kept', { ...REP, roles: ['rep', 'planner'], customers: ['anchor'] }],
    ['customers-not-kept', { ...BUYER, customers: ['anchor'] }],
  ])('refuses with %s', (code, standing) => {
    expect(codeOf(standing)).toBe(code);
  });
});
