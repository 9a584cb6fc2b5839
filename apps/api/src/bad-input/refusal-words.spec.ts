// Every refusal that the sources name can be said in words.
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { hasWords } from '@seamwright/shared/contracts';

const LIBS = join(__dirname, '../../../../libs');

/** The ways in which sources name a refusal; each group is a code. */
const NAMED: readonly RegExp[] = [
  // refuse('…'), conflict('…'), and what files call their own makers of refusals.
  /\b(?:refuse|conflict|refusal|refused|unknown|no|ofFile)\(\s*'([a-z-]+)'/g,
  // fault('…-…'); a fault in a column names the column first, which is one word.
  /\bfault\(\s*'([a-z]+(?:-[a-z]+)+)'/g,
  // { code: '…', params … }
  /\bcode: '([a-z-]+)',\s*params\b/g,
  // const code = one ? '…' : '…';
  /\bconst code = [^;]*\? '([a-z-]+)' : '([a-z-]+)'/g,
  // What PostgreSQL's codes become.
  /'\d[0-9A-Z]{4}': '([a-z-]+)'/g,
];

/** Pieces of a price's reasons have a code and parameters too; the screens put them into words. */
const REASONS = ['list-price', 'quantity-break', 'choices'];

function sourcesIn(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return entry.name === 'testing' ? [] : sourcesIn(path);
    return entry.name.endsWith('.ts') && !entry.name.endsWith('.spec.ts') ? [path] : [];
  });
}

const named = sourcesIn(LIBS).flatMap((path) => {
  const text = readFileSync(path, 'utf8');
  return NAMED.flatMap((way) => [...text.matchAll(way)])
    .flatMap(([, ...codes]) => codes)
    .filter((code) => !REASONS.includes(code))
    .map((code) => ({ code, path: relative(LIBS, path) }));
});

it('finds the refusals of every storey', () => {
  const storeys = new Set(named.map(({ path }) => path.split('/')[0]));
  expect([...storeys].sort()).toEqual(
    expect.arrayContaining(['accounts', 'catalogue', 'identity', 'ordering', 'plant', 'pricing', 'shared', 'stock']),
  );
  expect(new Set(named.map(({ code }) => code)).size).toBeGreaterThan(100);
});

it('has words for each of them', () => {
  const mute = named.filter(({ code }) => !hasWords(code)).map(({ code, path }) => `${code} (${path})`);
  expect([...new Set(mute)].sort()).toEqual([]);
});

it('has words for every code with a status of its own', () => {
  const text = readFileSync(join(LIBS, 'shared/server/src/http/problems.ts'), 'utf8');
  const table = /STATUS_OF[^{]*\{([^}]*)\}/.exec(text)?.[1] ?? '';
  const codes = [...table.matchAll(/^\s*'?([a-z-]+)'?: \d{3},/gm)].map(([, code]) => code ?? '');
  expect(codes.length).toBeGreaterThan(10);
  expect(codes.filter((code) => !hasWords(code))).toEqual([]);
});
