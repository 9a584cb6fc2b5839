import fc from 'fast-check';

const nested = (depth: number): unknown => (depth === 0 ? 'deep' : [{ in: nested(depth - 1) }]);

/** Texts that trip whoever trusts them: no text at all, too much of it, no characters, patterns, days that never were. */
export const WICKED_TEXTS: readonly string[] = [
  '',
  ' ',
  'a\u0000b',
  '\u0000',
  'half a pair \ud83d',
  '\udfff\ud800',
  '\u202eright to left',
  'Zürich 牛 🥩',
  '\uffff',
  'x'.repeat(70_000),
  '%',
  '\\',
  "'; drop table orders; --",
  '${jndi}',
  '../../etc/passwd',
  '__proto__',
  '2026-02-30',
  '0000-00-00',
  '0000-01-01',
  '9999-12-31',
  '+012026-01-01',
  '2026-12-01T12:00:00Z',
  '24:00',
  'NaN',
  '-0',
  '1e9',
  '99999999999999999999',
];

export const WICKED_NUMBERS: readonly number[] = [
  0,
  -0,
  -1,
  0.5,
  1e-9,
  2_147_483_647,
  2_147_483_648,
  -2_147_483_649,
  Number.MAX_SAFE_INTEGER,
  Number.MIN_SAFE_INTEGER,
  2 ** 53,
  2 ** 63,
  1e308,
];

const WICKED_REST: readonly unknown[] = [
  null,
  true,
  false,
  [],
  {},
  [[]],
  [null],
  { length: 2 },
  { toString: 'x' },
  JSON.parse('{"__proto__":{"admin":true}}'),
  nested(40),
  Array.from({ length: 3_000 }, () => 'x'),
];

/** Anything that JSON can carry and nobody wants. */
export const junk: fc.Arbitrary<unknown> = fc.oneof(
  fc.constantFrom(...WICKED_TEXTS),
  fc.constantFrom(...WICKED_NUMBERS),
  fc.constantFrom(...WICKED_REST),
  fc.uuid({ version: 7 }),
  fc.string({ unit: 'binary', maxLength: 30 }),
  fc.integer(),
);

/** Places in a list that were written for another list, or by somebody else. */
export const cursors: fc.Arbitrary<string> = fc.oneof(
  fc.constantFrom('', 'made-up', '!!!', 'e30', 'bnVsbA'),
  fc
    .array(
      fc.oneof(
        fc.constantFrom(...WICKED_TEXTS.filter(({ length }) => length < 60)),
        fc.constantFrom(...WICKED_NUMBERS),
      ),
      { minLength: 1, maxLength: 3 },
    )
    .map((values) => Buffer.from(JSON.stringify(values)).toString('base64url')),
);

/** Texts that a header can carry. */
export const headers: fc.Arbitrary<string | undefined> = fc.constantFrom(
  undefined,
  '',
  '*',
  '1',
  '""',
  '"0"',
  '"1"',
  'W/"1"',
  '"-1"',
  '"999999999"',
  '"2147483648"',
  '"99999999999999999999"',
  '"1", "2"',
  "'; --",
  'x'.repeat(101),
  'x'.repeat(3_000),
  '\u00e9\u00ff'.repeat(5),
);

type Path = readonly (string | number)[];

function pathsIn(value: unknown, at: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [at];
  return [at, ...Object.entries(value).flatMap(([key, each]) => pathsIn(each, [...at, key]))];
}

function changedAt(value: unknown, [key, ...rest]: Path, change: (value: unknown) => unknown): unknown {
  if (key === undefined) return change(value);
  const copy = (Array.isArray(value) ? [...value] : { ...(value as object) }) as Record<string | number, unknown>;
  copy[key] = changedAt(copy[key], rest, change);
  return copy;
}

/** A right value with one thing wrong in it: a field of another kind, left out, unknown, or a list in its place. */
export function spoilt(right: unknown): fc.Arbitrary<unknown> {
  const path = fc.constantFrom(...pathsIn(right));
  return fc.oneof(
    { weight: 5, arbitrary: fc.tuple(path, junk).map(([at, bad]) => changedAt(right, at, () => bad)) },
    { weight: 1, arbitrary: path.map((at) => changedAt(right, at, () => undefined)) },
    { weight: 1, arbitrary: path.map((at) => changedAt(right, at, (value) => [value, value])) },
    {
      weight: 1,
      arbitrary: fc
        .tuple(path, junk)
        .map(([at, bad]) =>
          changedAt(right, at, (value) =>
            typeof value === 'object' && value !== null && !Array.isArray(value)
              ? { ...value, unknownField: bad }
              : { wrapped: value },
          ),
        ),
    },
  );
}
