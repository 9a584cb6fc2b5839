import fc from 'fast-check';
import { problem } from '@seamwright/shared/contracts';
import { readProblem } from './problem-document';

const junk = fc.oneof(
  fc.string(),
  fc.integer(),
  fc.double(),
  fc.boolean(),
  fc.constant(null),
  fc.constant([]),
  fc.object(),
);
const mostly = <T>(usual: fc.Arbitrary<T>) =>
  fc.oneof({ arbitrary: usual, weight: 30 }, { arbitrary: junk, weight: 1 });
const text = mostly(fc.string());
const fieldError = mostly(
  fc.record({ pointer: text, message: text, more: junk }, { requiredKeys: ['pointer', 'message'] }),
);

/** Problem documents, and what is nearly one: a field of another kind, missing or too many. */
const nearly = fc.record(
  {
    type: text,
    title: text,
    status: mostly(fc.integer()),
    detail: text,
    instance: text,
    code: text,
    errors: mostly(fc.array(fieldError, { maxLength: 3 })),
    more: junk,
  },
  { requiredKeys: ['type', 'title', 'status', 'detail', 'instance'] },
);

describe('a problem document', () => {
  it('is read as the contract’s schema reads it, and nothing else is', () => {
    const seen = { problems: 0, others: 0 };
    const samples = fc.oneof({ arbitrary: nearly, weight: 9 }, { arbitrary: junk, weight: 1 });
    fc.assert(
      fc.property(samples, (sample) => {
        const read = problem.safeParse(sample);
        seen[read.success ? 'problems' : 'others'] += 1;
        expect(readProblem(sample)).toEqual(read.success ? read.data : null);
      }),
      { numRuns: 2_000 },
    );
    expect(seen.problems).toBeGreaterThan(100);
    expect(seen.others).toBeGreaterThan(100);
  });

  it('has a whole number for its status', () => {
    const stale = { type: '', title: '', status: 412, detail: '', instance: '', code: 'stale' };
    expect(readProblem(stale)).toEqual({ ...stale, errors: [] });
    for (const status of [412.5, Number.NaN, 2 ** 53, '412']) expect(readProblem({ ...stale, status })).toBeNull();
  });
});
