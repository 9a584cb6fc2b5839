import { normaliseEmail } from './email';
import { customersOf, siteRule } from './reach';
import { applicationOf } from './role';
import { sessionEnd } from './session';
import { mayLookAfter } from './stewardship';

describe('normaliseEmail', () => {
  it('compares without case, spaces around, or the way an accent was typed', () => {
    expect(normaliseEmail('  Zoe\u0301@Anchor.Example ')).toBe('zoé@anchor.example');
  });
});

describe('reach', () => {
  it('keeps a rep to the assigned customers, and nobody who has another role', () => {
    expect(customersOf(['rep'], ['anchor'])).toEqual(['anchor']);
    expect(customersOf(['rep', 'planner'], ['anchor'])).toBe('*');
  });

  it('keeps a buyer to sites, but not the account owner', () => {
    expect(siteRule(['buyer'], ['harbour'])).toEqual(['harbour']);
    expect(siteRule(['buyer_owner'], ['harbour'])).toBe('*');
  });
});

describe('applicationOf', () => {
  it('sends buyers to the storefront and staff to the desk', () => {
    expect(applicationOf(['buyer_owner'])).toBe('storefront');
    expect(applicationOf(['floor'])).toBe('admin');
  });
});

describe('mayLookAfter', () => {
  it('lets administrators look after everybody, reps after buyers, owners after their own', () => {
    expect(mayLookAfter({ roles: ['admin'], customerId: null }, null)).toBe(true);
    expect(mayLookAfter({ roles: ['rep'], customerId: null }, 'anchor')).toBe(true);
    expect(mayLookAfter({ roles: ['rep'], customerId: null }, null)).toBe(false);
    expect(mayLookAfter({ roles: ['buyer_owner'], customerId: 'anchor' }, 'anchor')).toBe(true);
    expect(mayLookAfter({ roles: ['buyer_owner'], customerId: 'anchor' }, 'mill')).toBe(false);
    expect(mayLookAfter({ roles: ['buyer'], customerId: 'anchor' }, 'anchor')).toBe(false);
    expect(mayLookAfter({ roles: ['accounts'], customerId: null }, 'anchor')).toBe(false);
  });
});

describe('sessionEnd', () => {
  it('is thirty days after the last use and ninety after the sign-in at the latest', () => {
    const signedIn = new Date('2026-01-01T00:00:00Z');
    expect(sessionEnd(signedIn, signedIn)).toEqual(new Date('2026-01-31T00:00:00Z'));
    expect(sessionEnd(signedIn, new Date('2026-03-20T00:00:00Z'))).toEqual(new Date('2026-04-01T00:00:00Z'));
  });
});
