import { lintSnippets, type LintMessage } from './linted';

type Case = readonly [file: string, code: string];

const REFUSED: Readonly<Record<string, readonly Case[]>> = {
  'habits/one-transaction': [
    ['libs/ordering/server/src/place-order.ts', 'db.transaction().execute(work);'],
    ['libs/ordering/server/src/place-order.ts', 'db.startTransaction().execute();'],
    ['libs/ordering/server/src/place-order.ts', 'new Pool({});'],
    ['libs/shared/server/src/events.ts', 'new pg.Client({});'],
    ['libs/ordering/server/src/place-order.ts', `client.query('BEGIN');`],
    ['libs/ordering/server/src/place-order.ts', 'client.query(`\n  begin; select 1`);'],
    ['libs/ordering/server/src/place-order.ts', `client.query({ text: 'start transaction' });`],
    ['libs/ordering/server/src/place-order.ts', 'sql`begin`.execute(db);'],
    ['apps/api/src/worker.ts', 'db.transaction().execute(work);'],
    ['apps/e2e/thread.spec.ts', 'new Client({});'],
    ['seeds/load.ts', 'db.transaction().execute(work);'],
  ],
  'habits/clock-is-handed-in': [
    ['libs/ordering/domain/src/order.ts', 'export const at = new Date();'],
    ['libs/ordering/domain/src/order.ts', 'export const at = Date.now();'],
    ['libs/ordering/server/src/place-order.ts', 'export const at = new Date();'],
    ['libs/shared/server/src/outbox.ts', 'export const clock = Date.now;'],
    ['libs/shared/util/src/plant-day.ts', 'export const at = DateTime.now();'],
    ['libs/shared/util/src/plant-day.ts', 'export const at = DateTime.utc();'],
  ],
  'habits/whole-numbers': [
    ['libs/pricing/domain/src/quote.ts', 'export const price = parseFloat(text);'],
    ['libs/pricing/server/src/quote.pdf.ts', 'export const price = (minor / 100).toFixed(2);'],
    ['libs/ordering/data-access/src/pad.selectors.ts', 'export const kg = Number.parseFloat(text);'],
    ['libs/ordering/feature-basket/src/basket.page.ts', 'export const kg = grams.toFixed(3);'],
  ],
  'no-console': [
    ['libs/ordering/server/src/place-order.ts', `console.log('placed');`],
    ['apps/api/src/main.ts', `console.error('down');`],
    ['database/migrate.ts', `console.log('migrated');`],
  ],
  'no-restricted-globals': [
    ['libs/ordering/domain/src/order.ts', 'export const key = process.env;'],
    ['libs/ordering/contracts/src/orders.endpoints.ts', `export const answer = fetch('/');`],
  ],
  '@typescript-eslint/no-explicit-any': [['libs/ordering/domain/src/order.ts', 'export const order: any = 1;']],
  '@typescript-eslint/no-unused-vars': [['libs/ordering/domain/src/order.ts', 'const order = 1;']],
  '@angular-eslint/prefer-on-push-component-change-detection': [
    [
      'libs/ordering/ui/src/order-line.ts',
      `import { Component } from '@angular/core';\n@Component({ selector: 'sw-line', template: '' })\nexport class Line {}`,
    ],
  ],
  '@angular-eslint/prefer-standalone': [
    [
      'apps/admin/src/app/shell.ts',
      `import { Component } from '@angular/core';\n@Component({ selector: 'sw-line', standalone: false, template: '' })\nexport class Line {}`,
    ],
  ],
  '@angular-eslint/template/alt-text': [
    ['libs/ordering/ui/src/order-line.html', '<img src="cut.webp">'],
    [
      'libs/ordering/ui/src/order-line.ts',
      `import { Component } from '@angular/core';\n@Component({ selector: 'sw-line', template: '<img src="cut.webp">' })\nexport class Line {}`,
    ],
  ],
  '@angular-eslint/template/click-events-have-key-events': [
    ['libs/ordering/feature-basket/src/basket.page.html', '<div (click)="open()">Basket</div>'],
  ],
};

const PERMITTED: Readonly<Record<string, readonly Case[]>> = {
  'habits/one-transaction': [
    ['libs/shared/server/src/database/in-transaction.ts', 'new Pool({});'],
    ['libs/shared/server/src/database/in-transaction.ts', `client.query('begin');`],
    ['database/migrate.ts', 'db.transaction().execute(work);'],
    ['tools/start/cluster.ts', 'new Client({});'],
    ['libs/ordering/server/src/place-order.ts', 'inTransaction(caller, work);'],
    ['libs/ordering/server/src/place-order.ts', 'sql`select beginning from shifts`.execute(db);'],
  ],
  'habits/clock-is-handed-in': [
    ['libs/shared/server/src/clock.ts', 'export const at = new Date();'],
    ['libs/shared/server/src/clock/system-clock.ts', 'export const at = Date.now();'],
    ['libs/ordering/domain/src/order.ts', `export const at = new Date('2026-03-02T06:00:00Z');`],
    ['libs/shared/ui/src/countdown.ts', 'export const at = Date.now();'],
  ],
  'habits/whole-numbers': [
    ['libs/shared/ui/src/ladder.ts', 'export const x = width.toFixed(1);'],
    ['libs/pricing/domain/src/quote.ts', `export const price = Number.parseInt('250', 10);`],
  ],
  'no-console': [
    ['tools/start/start.ts', `console.log('started');`],
    ['seeds/load.ts', `console.log('loaded');`],
    ['database/cli.ts', `console.log('migrated');`],
  ],
  'no-restricted-globals': [
    ['libs/ordering/domain/src/order.ts', 'export const keep = (document: string) => document;'],
    ['libs/ordering/domain/src/order.spec.ts', 'export const key = process.env;'],
  ],
  '@typescript-eslint/no-unused-vars': [
    ['libs/ordering/domain/src/order.ts', 'export const first = (_order: string, line: string) => line;'],
  ],
};

const rows = (table: Readonly<Record<string, readonly Case[]>>) =>
  Object.entries(table).flatMap(([rule, cases]) => cases.map(([file, code]) => [rule, file, code] as const));

describe('the habits of the house', () => {
  const refused = rows(REFUSED);
  const permitted = rows(PERMITTED);
  let answers: LintMessage[][] = [];

  beforeAll(() => {
    answers = lintSnippets([...refused, ...permitted].map(([, file, code]) => ({ file, code })));
  }, 60_000);

  const rulesBrokenAt = (index: number) => answers[index]?.map(({ ruleId }) => ruleId);

  it.each(refused.map((row, index) => [...row, index] as const))(
    '%s refuses in %s: %s',
    (rule, _file, _code, index) => {
      expect(rulesBrokenAt(index)).toContain(rule);
    },
  );

  it.each(permitted.map((row, index) => [...row, index] as const))(
    '%s permits in %s: %s',
    (rule, _file, _code, index) => {
      const broken = rulesBrokenAt(refused.length + index);
      expect(broken).toBeDefined();
      expect(broken).not.toContain(rule);
      expect(broken).not.toContain(null);
    },
  );
});
