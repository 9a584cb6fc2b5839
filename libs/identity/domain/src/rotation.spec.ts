import { rotationOf } from './rotation';

const NOW = new Date('2026-12-01T12:00:00Z');
const ago = (seconds: number) => new Date(NOW.getTime() - seconds * 1000);

describe('rotationOf', () => {
  it('takes a token that was never used', () => {
    expect(rotationOf({ generation: 3, replacedAt: null }, 3, NOW)).toBe('fresh');
  });

  it('takes a second token of the newest generation, which a grace made', () => {
    expect(rotationOf({ generation: 3, replacedAt: null }, 4, NOW)).toBe('fresh');
  });

  it('gives the direct predecessor twenty seconds', () => {
    expect(rotationOf({ generation: 2, replacedAt: ago(20) }, 3, NOW)).toBe('grace');
    expect(rotationOf({ generation: 2, replacedAt: ago(20.001) }, 3, NOW)).toBe('reuse');
  });

  it('gives an older one nothing, however young', () => {
    expect(rotationOf({ generation: 1, replacedAt: ago(1) }, 3, NOW)).toBe('reuse');
  });
});
