import * as z from 'zod';
import { coerceQuery } from './query-coercion';

const schema = z.strictObject({
  q: z.string().optional(),
  limit: z.int().min(1).default(50),
  open: z.boolean().optional(),
  species: z.array(z.enum(['lamb', 'beef'])).default([]),
  sizes: z.array(z.int()).optional(),
});

describe('coerceQuery', () => {
  it.each([
    [{ limit: '20' }, { limit: 20 }],
    [{ limit: '-3' }, { limit: -3 }],
    [{ q: '20' }, { q: '20' }],
    [{ open: 'true' }, { open: true }],
    [{ open: 'false' }, { open: false }],
    [{ species: 'lamb' }, { species: ['lamb'] }],
    [{ species: ['lamb', 'beef'] }, { species: ['lamb', 'beef'] }],
    [{ sizes: ['1', '2'] }, { sizes: [1, 2] }],
  ])('reads %j as %j', (query, expected) => {
    expect(coerceQuery(schema, query)).toEqual(expected);
  });

  it.each([
    [{ limit: '1e3' }],
    [{ limit: '0x10' }],
    [{ limit: '' }],
    [{ limit: '99999999999999999' }],
    [{ open: 'yes' }],
    [{ other: '1' }],
  ])('leaves %j for the schema to refuse', (query) => {
    expect(schema.safeParse(coerceQuery(schema, query)).success).toBe(false);
  });
});
