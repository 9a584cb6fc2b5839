import { whyStale } from './locked.cjs';

const wanted = {
  packages: {
    '': { version: '1.0.0' },
    'node_modules/knife': { version: '2.1.0' },
    'node_modules/knife/node_modules/steel': { version: '3.0.0' },
    'node_modules/other-processor': { version: '1.0.0', optional: true },
  },
};
const installed = {
  'node_modules/knife': { version: '2.1.0' },
  'node_modules/knife/node_modules/steel': { version: '3.0.0' },
};

describe('whyStale', () => {
  it('accepts what the lock file asks for, without the packages of other systems', () => {
    expect(whyStale(wanted, { packages: installed })).toBeUndefined();
  });

  it('finds that nothing, or not everything, is installed', () => {
    expect(whyStale(wanted, undefined)).toBe('nothing is installed');
    expect(whyStale(wanted, { packages: { 'node_modules/knife': { version: '2.1.0' } } })).toBe('steel is missing');
  });

  it('finds another version and a package that is no longer used', () => {
    const older = { ...installed, 'node_modules/knife': { version: '2.0.9' } };
    expect(whyStale(wanted, { packages: older })).toBe('knife is 2.0.9, not 2.1.0');
    const more = { ...installed, 'node_modules/@scale/reader': { version: '1.0.0' } };
    expect(whyStale(wanted, { packages: more })).toBe('@scale/reader is no longer used');
  });
});
