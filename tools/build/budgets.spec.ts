import { complaint, examine, initialOutputs, type Metafile } from './budgets.cjs';

const statically = (...paths: string[]) => paths.map((path) => ({ path, kind: 'import-statement' }));
const later = (...paths: string[]) => paths.map((path) => ({ path, kind: 'dynamic-import' }));
const holding = (parts: Record<string, number>) =>
  Object.fromEntries(Object.entries(parts).map(([input, bytesInOutput]) => [input, { bytesInOutput }]));

/** An application whose shell takes the session, and whose basket is loaded by its route. */
const metafile = (shell: Record<string, number> = {}): Metafile => ({
  inputs: {
    'apps/storefront/src/main.ts': { imports: statically('apps/storefront/src/app.ts') },
    'apps/storefront/src/app.ts': {
      imports: [
        ...statically('libs/ordering/data-access/src/index.ts'),
        ...later('libs/ordering/feature-basket/src/index.ts'),
      ],
    },
    'libs/ordering/data-access/src/index.ts': {
      imports: statically('libs/ordering/contracts/src/orders.endpoints.ts'),
    },
    'libs/ordering/contracts/src/orders.endpoints.ts': { imports: [] },
  },
  outputs: {
    'main-ABCD1234.js': {
      imports: [...statically('chunk-SHELL.js'), ...later('chunk-BASKET.js')],
      inputs: holding({ 'apps/storefront/src/main.ts': 100 }),
    },
    'chunk-SHELL.js': {
      imports: statically('main-ABCD1234.js'),
      inputs: holding({
        'node_modules/@angular/core/fesm2022/core.mjs': 600,
        'node_modules/@angular/core/fesm2022/signals.mjs': 200,
        'libs/identity/contracts/src/session.addresses.ts': 100,
        'libs/shared/util/src/money.ts': 100,
        'libs/ordering/contracts/src/index.ts': 0,
        ...shell,
      }),
    },
    'chunk-BASKET.js': {
      imports: statically('chunk-SHELL.js'),
      inputs: holding({ 'libs/ordering/feature-basket/src/basket.page.ts': 400 }),
    },
    'styles-ABCD1234.css': { imports: [], inputs: holding({ 'apps/storefront/src/styles.scss': 50 }) },
  },
});

const sizes: Record<string, number> = { 'main-ABCD1234.js': 50, 'chunk-SHELL.js': 500, 'styles-ABCD1234.css': 20 };
const transferOf = (output: string): number => {
  const size = sizes[output];
  if (size === undefined) throw new Error(`${output} is not of the first load`);
  return size;
};

it('takes the page’s own files and what they import statically, and nothing that a route loads', () => {
  expect(initialOutputs(metafile()).sort()).toEqual(['chunk-SHELL.js', 'main-ABCD1234.js', 'styles-ABCD1234.css']);
});

it('adds up what goes through the network and shares it out by package and room', () => {
  const { bytes, heaviest, strangers } = examine(metafile(), transferOf);
  expect(bytes).toBe(570);
  expect(heaviest[0]).toEqual({ input: '@angular/core', bytes: 400 });
  expect(heaviest).toContainEqual({ input: 'libs/shared/util', bytes: 50 });
  expect(heaviest.reduce((sum, one) => sum + one.bytes, 0)).toBe(570);
  expect(strangers).toEqual([]);
});

it.each([
  ['libs/ordering/contracts/src/orders.endpoints.ts', 'the session'],
  ['libs/shared/contracts/src/wire.ts', 'the session'],
  ['node_modules/zod/v4/core/schemas.js', 'they check'],
  ['libs/ordering/feature-basket/src/basket.page.ts', 'with their route'],
  ['libs/catalogue/domain/src/drawing/views.ts', 'when they are shown'],
  ['node_modules/@angular/material/fesm2022/dialog.mjs', 'the page that shows them'],
  ['node_modules/@angular/material/fesm2022/_form-field-chunk.mjs', 'the page that shows them'],
  ['node_modules/@angular/material/fesm2022/table.mjs', 'the page that shows them'],
])('finds %s in the first load', (input, why) => {
  const { strangers } = examine(metafile({ [input]: 10 }), transferOf);
  expect(strangers).toEqual([expect.objectContaining({ input, why: expect.stringContaining(why) })]);
});

it('leaves alone what the shell may use', () => {
  const used = {
    'node_modules/@angular/material/fesm2022/tooltip.mjs': 10,
    'libs/catalogue/domain/src/choices.ts': 10,
  };
  expect(examine(metafile(used), transferOf).strangers).toEqual([]);
});

it('tells how a stranger came in, and what is heavy', () => {
  const findings = examine(metafile({ 'libs/ordering/contracts/src/orders.endpoints.ts': 10 }), transferOf);
  const said = complaint('storefront', findings, 500);
  expect(said).toContain('The first load of storefront is 0.6 kB (gzip); at most 0.5 kB are allowed.');
  expect(said).toMatch(/0\.4 kB {2}@angular\/core/);
  expect(said).toContain(
    [
      '→ apps/storefront/src/main.ts',
      '→ apps/storefront/src/app.ts',
      '→ libs/ordering/data-access/src/index.ts',
      '→ libs/ordering/contracts/src/orders.endpoints.ts',
    ].join('\n    '),
  );
});

it('has nothing to say about a first load that is light and clean', () => {
  expect(complaint('storefront', examine(metafile(), transferOf), 570)).toBeUndefined();
});
