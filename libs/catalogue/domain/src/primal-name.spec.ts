import { primalName } from './primal-name';

describe('the name of a primal', () => {
  it('tells the same part of two species apart', () => {
    expect(primalName('lamb', 'Leg')).toBe('Lamb leg');
    expect(primalName('pork', 'Leg')).toBe('Pork leg');
  });

  it('lowers the first letter only', () => {
    expect(primalName('beef', 'Rump and D-cut')).toBe('Beef rump and D-cut');
  });
});
