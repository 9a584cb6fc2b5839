import { newId } from './identifiers';

describe('a new identifier', () => {
  it('is a UUID of version 7', () => {
    expect(newId<'Order'>()).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
  });

  it('is never the same twice and sorts after the ones before it', () => {
    const ids = Array.from({ length: 1000 }, () => newId<'Order'>());
    expect(new Set(ids).size).toBe(1000);
    expect(ids.toSorted()).toEqual(ids);
  });
});
