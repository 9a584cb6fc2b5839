import { lintSnippets, type LintMessage } from './linted';

type Case = readonly [file: string, specifier: string];

const REFUSED: Readonly<Record<string, readonly Case[]>> = {
  'a storey above': [
    ['libs/pricing/domain/src/quote.ts', '@seamwright/ordering/domain'],
    ['libs/catalogue/contracts/src/cuts.endpoints.ts', '@seamwright/pricing/contracts'],
    ['libs/pricing/server/src/quotes.repository.ts', '@seamwright/stock/server'],
    ['libs/stock/data-access/src/lots.effects.ts', '@seamwright/ordering/data-access'],
    ['libs/catalogue/ui/src/cut-card.ts', '@seamwright/plant/ui'],
    ['libs/shared/server/src/outbox.ts', '@seamwright/identity/server'],
    ['libs/shared/ui/src/shell.ts', '@seamwright/identity/ui'],
    ['libs/shared/ui/src/ladder.ts', '@seamwright/catalogue/domain'],
    ['libs/plant/domain/src/block.ts', '@seamwright/accounts/domain'],
    ['libs/plant/server/src/close-day.spec.ts', '@seamwright/accounts/server'],
    ['libs/plant/server/src/close-day.spec.ts', '@seamwright/accounts/server/testing'],
  ],
  'a room the importing room has no way to': [
    ['libs/ordering/domain/src/order.ts', '@seamwright/ordering/contracts'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/shared/contracts'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/ordering/server'],
    ['libs/ordering/domain/src/order.spec.ts', '@seamwright/shared/server/testing'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/ordering/server'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/ordering/data-access'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/pricing/contracts'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/ordering/data-access'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/shared/ui'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/pricing/contracts'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/ordering/server'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/ordering/ui'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/ordering/data-access'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/ordering/contracts'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/shared/data-access'],
    ['libs/ordering/feature-order-pad/src/order-pad.page.ts', '@seamwright/ordering/server'],
    ['libs/ordering/feature-order-pad/src/order-pad.page.ts', '@seamwright/shared/server'],
    ['libs/ordering/feature-order-pad/src/order-pad.page.spec.ts', '@seamwright/ordering/server/testing'],
    ['libs/shared/util/src/money.ts', '@seamwright/shared/contracts'],
    ['apps/storefront/src/app/app.config.ts', '@seamwright/ordering/server'],
    ['apps/storefront/src/app/app.config.ts', '@seamwright/shared/server'],
    ['apps/admin/src/app/app.config.ts', '@seamwright/accounts/server'],
    ['apps/api/src/main.ts', '@seamwright/ordering/data-access'],
    ['apps/api/src/main.ts', '@seamwright/shared/ui'],
    ['seeds/load.ts', '@seamwright/ordering/data-access'],
    ['database/migrate.ts', '@seamwright/shared/server'],
    ['database/migrate.ts', '@seamwright/catalogue/domain'],
    ['database/policies.spec.ts', '@seamwright/shared/ui/testing'],
  ],
  'a feature, which only the two applications import': [
    ['libs/ordering/feature-order-pad/src/order-pad.page.ts', '@seamwright/ordering/feature-basket'],
    ['libs/plant/feature-block/src/block.page.ts', '@seamwright/catalogue/feature-cuts'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/ordering/feature-basket'],
    ['libs/accounts/ui/src/invoice-table.ts', '@seamwright/ordering/feature-basket'],
    ['apps/api/src/main.ts', '@seamwright/ordering/feature-basket'],
    ['apps/e2e/thread.spec.ts', '@seamwright/ordering/feature-basket'],
    ['tools/bench/bench.ts', '@seamwright/ordering/feature-basket'],
    ['seeds/load.ts', '@seamwright/ordering/feature-basket'],
  ],
  'a way in that is no entry': [
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing/domain/src/quote'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing/domain/quote'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing/sums'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing/util'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/invoices/domain'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/ordering/domain'],
    ['libs/ordering/domain/src/order.ts', '../../../pricing/domain/src/index'],
    ['libs/ordering/server/src/place-order.ts', '../../domain/src/order'],
    ['libs/ordering/server/src/place-order.ts', '../../../../database/index'],
    ['libs/ordering/server/src/place-order.ts', '../../../../package.json'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/database/schema'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/shared/server/testing'],
    ['libs/ordering/feature-basket/src/basket.page.ts', '@seamwright/shared/ui/theme'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/database/testing'],
    ['libs/ordering/domain/src/order.spec.ts', '@seamwright/database/testing'],
    ['apps/storefront/src/main.ts', '../../../libs/ordering/domain/src/index'],
    ['apps/storefront/src/main.ts', '../../admin/src/app/app'],
    ['apps/e2e/thread.spec.ts', '../../libs/ordering/domain/src/order'],
    ['tools/bench/bench.ts', '../../libs/ordering/domain/src/order'],
    ['apps/api/src/main.ts', '../../../seeds/load'],
    ['apps/api/src/main.ts', '../../../tools/mail-catcher/server'],
  ],
  'the database': [
    ['libs/ordering/domain/src/order.ts', '@seamwright/database'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/database'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/database'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/database'],
    ['libs/ordering/feature-basket/src/basket.page.ts', '@seamwright/database'],
    ['libs/shared/util/src/money.ts', '@seamwright/database'],
    ['apps/storefront/src/main.ts', '@seamwright/database'],
    ['apps/admin/src/main.ts', '@seamwright/database'],
  ],
  'a package or module the room has no use for': [
    ['libs/ordering/domain/src/order.ts', 'express'],
    ['libs/ordering/domain/src/order.ts', 'kysely'],
    ['libs/ordering/domain/src/order.ts', 'rxjs'],
    ['libs/ordering/domain/src/order.ts', 'rxjs/operators'],
    ['libs/ordering/domain/src/order.ts', 'zod'],
    ['libs/ordering/domain/src/order.ts', 'pg'],
    ['libs/ordering/domain/src/order.ts', '@angular/core'],
    ['libs/ordering/domain/src/order.ts', '@ngrx/store'],
    ['libs/ordering/domain/src/order.ts', 'node:crypto'],
    ['libs/ordering/domain/src/order.ts', 'fs'],
    ['libs/ordering/domain/src/order.spec.ts', '@angular/core'],
    ['libs/shared/util/src/money.ts', 'node:fs'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', 'express'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@angular/core'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', 'node:crypto'],
    ['libs/ordering/server/src/place-order.ts', '@angular/core'],
    ['libs/ordering/server/src/place-order.ts', '@angular/common/http'],
    ['libs/ordering/server/src/place-order.ts', '@ngrx/store'],
    ['libs/ordering/data-access/src/orders.effects.ts', 'node:crypto'],
    ['libs/ordering/data-access/src/orders.effects.ts', 'express'],
    ['libs/ordering/ui/src/order-line.ts', 'path'],
    ['libs/ordering/feature-basket/src/basket.page.ts', 'node:fs/promises'],
    ['libs/ordering/feature-basket/src/basket.page.ts', 'kysely'],
    ['apps/storefront/src/main.ts', 'node:fs'],
    ['apps/admin/src/main.ts', 'pg'],
  ],
};

const PERMITTED: Readonly<Record<string, readonly Case[]>> = {
  'its own and lower storeys': [
    ['libs/ordering/domain/src/order.ts', '@seamwright/shared/util'],
    ['libs/ordering/domain/src/order.ts', '@seamwright/pricing/domain'],
    ['libs/accounts/domain/src/invoice.ts', '@seamwright/identity/domain'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/ordering/domain'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/shared/contracts'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', '@seamwright/pricing/contracts'],
    ['libs/ordering/feature-basket/src/basket.page.ts', '@seamwright/shared/ui/table'],
    ['apps/storefront/src/app/app.ts', '@seamwright/shared/ui/frame'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/shared/contracts'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/ordering/contracts'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/ordering/domain'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/shared/server'],
    ['libs/ordering/server/src/place-order.ts', '@seamwright/pricing/server'],
    ['libs/shared/server/src/router.ts', '@seamwright/shared/contracts'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/ordering/contracts'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/shared/data-access'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@seamwright/catalogue/data-access'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/shared/ui'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/catalogue/ui'],
    ['libs/ordering/ui/src/order-line.ts', '@seamwright/ordering/domain'],
  ],
  'any storey, from a feature or an application': [
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/accounts/domain'],
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/pricing/contracts'],
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/ordering/data-access'],
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/ordering/ui'],
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/shared/util'],
    ['libs/catalogue/feature-cuts/src/cuts.page.ts', '@seamwright/shared/data-access'],
    ['apps/storefront/src/app/app.routes.ts', '@seamwright/ordering/feature-order-pad'],
    ['apps/admin/src/app/app.routes.ts', '@seamwright/plant/feature-cutting-day'],
    ['apps/storefront/src/app/app.ts', '@seamwright/shared/ui'],
    ['apps/admin/src/app/app.config.ts', '@seamwright/identity/data-access'],
    ['apps/api/src/main.ts', '@seamwright/accounts/server'],
    ['apps/api/src/main.ts', '@seamwright/ordering/contracts'],
    ['apps/api/src/main.ts', '@seamwright/stock/domain'],
    ['seeds/load.ts', '@seamwright/ordering/server'],
    ['seeds/load.ts', '@seamwright/catalogue/domain'],
    ['apps/e2e/thread.spec.ts', '@seamwright/ordering/domain'],
    ['apps/e2e/thread.spec.ts', '@seamwright/shared/ui'],
    ['tools/bench/bench.ts', '@seamwright/accounts/server'],
    ['tools/bench/bench.ts', '@seamwright/shared/data-access'],
  ],
  'the database': [
    ['libs/shared/server/src/database/pool.ts', '@seamwright/database'],
    ['libs/ordering/server/src/orders.repository.ts', '@seamwright/database'],
    ['apps/api/src/main.ts', '@seamwright/database'],
    ['apps/e2e/thread.spec.ts', '@seamwright/database'],
    ['seeds/load.ts', '@seamwright/database'],
    ['tools/start/start.ts', '@seamwright/database'],
  ],
  'testing helpers, from specs and testing folders': [
    ['libs/shared/server/src/outbox.spec.ts', '@seamwright/shared/server/testing'],
    ['libs/shared/server/src/outbox.spec.ts', '@seamwright/database/testing'],
    ['libs/ordering/server/src/place-order.spec.ts', '@seamwright/shared/server/testing'],
    ['libs/ordering/server/src/place-order.spec.ts', '@seamwright/pricing/server/testing'],
    ['libs/ordering/server/testing/src/index.ts', '@seamwright/pricing/server/testing'],
    ['libs/ordering/feature-basket/src/basket.page.spec.ts', '@seamwright/shared/ui/testing'],
    ['database/policies.spec.ts', '@seamwright/shared/server/testing'],
    ['apps/api/src/permissions.spec.ts', '@seamwright/identity/server/testing'],
    ['apps/e2e/stack.ts', '@seamwright/shared/server/testing'],
  ],
  'its own files by a relative path': [
    ['libs/ordering/domain/src/order.ts', './order-line'],
    ['libs/ordering/server/src/orders/orders.router.ts', '../place-order'],
    ['libs/ordering/server/testing/src/index.ts', '../../src/index'],
    ['apps/storefront/src/main.ts', './app/app'],
    ['database/migrate.ts', './migrations/0001_callers'],
    ['apps/e2e/thread.spec.ts', '../../tools/mail-catcher/server'],
    ['tools/bench/bench.ts', '../../seeds/load'],
  ],
  'packages and modules that belong there': [
    ['libs/ordering/contracts/src/orders.endpoints.ts', 'zod'],
    ['libs/ordering/domain/src/order.spec.ts', 'fast-check'],
    ['libs/ordering/domain/src/order.standards.spec.ts', 'node:fs'],
    ['libs/ordering/server/src/place-order.ts', 'kysely'],
    ['libs/ordering/server/src/place-order.ts', 'node:crypto'],
    ['libs/ordering/server/src/orders.router.ts', 'express'],
    ['libs/ordering/data-access/src/orders.effects.ts', '@ngrx/effects'],
    ['libs/ordering/data-access/src/orders.effects.ts', 'rxjs/operators'],
    ['libs/ordering/ui/src/order-line.ts', '@angular/core'],
    ['libs/ordering/feature-basket/src/card.ts', '@stripe/stripe-js'],
    ['apps/api/src/main.ts', 'node:http'],
    ['tools/start/start.ts', 'node:child_process'],
  ],
};

const statement = (specifier: string) => `import * as used from '${specifier}';\nexport const kept = used;\n`;

/** Every way to write an import, each of something that `ordering/domain` may not have. */
const FORMS = [
  `import '@seamwright/ordering/server';`,
  `import type { Order } from '@seamwright/ordering/server';\nexport const order = {} as Order;`,
  `export { order } from '@seamwright/ordering/server';`,
  `export * from '@seamwright/ordering/server';`,
  `export const order = () => import('@seamwright/ordering/server');`,
  'export const order = () => import(`@seamwright/ordering/server`);',
  `export type Order = import('@seamwright/ordering/server').Order;`,
  `import order = require('@seamwright/ordering/server');\nexport const kept = order;`,
  `export const order = require('@seamwright/ordering/server');`,
  `jest.mock('@seamwright/ordering/server');`,
  `export const order = (name: string) => import(name);`,
];

/** Folders that the house has no place for. */
const STRAY = [
  'libs/invoices/domain/src/index.ts',
  'libs/ordering/helpers/src/index.ts',
  'libs/ordering/util/src/index.ts',
  'libs/shared/domain/src/index.ts',
];

const refusals = (messages: readonly LintMessage[] | undefined) =>
  (messages ?? []).filter(({ ruleId }) => ruleId === 'boundaries/imports' || ruleId === null);

describe('the boundary rule', () => {
  const cases = [...Object.values(REFUSED), ...Object.values(PERMITTED)].flat();
  const key = (file: string, code: string) => `${file}\n${code}`;
  const answers = new Map<string, LintMessage[]>();

  beforeAll(() => {
    const snippets = [
      ...cases.map(([file, specifier]) => ({ file, code: statement(specifier) })),
      ...FORMS.map((code) => ({ file: 'libs/ordering/domain/src/order.ts', code })),
      ...STRAY.map((file) => ({ file, code: 'export {};' })),
    ];
    lintSnippets(snippets).forEach((messages, at) => {
      const { file, code } = snippets[at]!;
      answers.set(key(file, code), messages);
    });
  }, 60_000);

  const answerTo = (file: string, code: string) => {
    const messages = answers.get(key(file, code));
    if (!messages) throw new Error(`not linted: ${file}`);
    return refusals(messages);
  };

  describe.each(Object.entries(REFUSED))('refuses %s', (_what, rows) => {
    it.each(rows)('%s ← %s', (file, specifier) => {
      expect(answerTo(file, statement(specifier))).toEqual([
        { ruleId: 'boundaries/imports', message: expect.stringContaining(`may not import '${specifier}'`) },
      ]);
    });
  });

  describe.each(Object.entries(PERMITTED))('permits %s', (_what, rows) => {
    it.each(rows)('%s ← %s', (file, specifier) => {
      expect(answerTo(file, statement(specifier))).toEqual([]);
    });
  });

  it.each(FORMS)('sees the import in %s', (code) => {
    expect(answerTo('libs/ordering/domain/src/order.ts', code)).toHaveLength(1);
  });

  it.each(STRAY)('refuses the stray library %s', (file) => {
    expect(answerTo(file, 'export {};')).toEqual([
      { ruleId: 'boundaries/imports', message: expect.stringMatching(/is no (storey|room) of the/) },
    ]);
  });

  it('says what to do instead', () => {
    const [refusal] = answerTo('libs/ordering/domain/src/order.ts', statement('@seamwright/pricing/domain/src/quote'));
    expect(refusal?.message).toContain(`import from '@seamwright/pricing/domain'`);
  });
});
