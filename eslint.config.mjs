// The one lint configuration. The house's own rules (imports, transactions, clock, whole numbers) live in tools/lint.
import angular from 'angular-eslint';
import { defineConfig } from 'eslint/config';
import tseslint from 'typescript-eslint';
import { boundaryConfig } from './tools/lint/boundaries.mjs';
import { habitsConfig } from './tools/lint/habits.mjs';

const root = import.meta.dirname;

const code = ['**/*.{ts,mts,cts,js,mjs,cjs}'];
const clientFolders = ['libs/*/{data-access,ui,feature-*}', 'apps/{storefront,admin}'];
const client = clientFolders.map((folder) => `${folder}/**/*.ts`);
const templates = clientFolders.map((folder) => `${folder}/**/*.html`);
// Where a promise that nobody awaits loses a write or a failure: the only rule that needs types, so kept to these.
const awaited = ['libs/*/server/**/*.ts', 'apps/{api,e2e}/**/*.ts', '{database,seeds,tools}/**/*.ts'];
const pure = ['libs/shared/util/**/*.ts', 'libs/*/{domain,contracts}/**/*.ts'];
const specs = ['**/*.spec.ts', '**/testing/**'];

export default defineConfig(
  {
    // The schema is generated; an application's index.html is a document, not a template.
    ignores: [
      '**/dist/',
      '.angular/',
      '.data/',
      'coverage/',
      'tmp/',
      'test-results/',
      'database/schema.ts',
      'apps/*/src/index.html',
    ],
  },
  { linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' } },
  {
    name: 'seamwright/code',
    files: code,
    extends: [tseslint.configs.recommended],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        {
          argsIgnorePattern: '^_',
          varsIgnorePattern: '^_',
          caughtErrorsIgnorePattern: '^_',
          destructuredArrayIgnorePattern: '^_',
        },
      ],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-debugger': 'error',
      'no-self-compare': 'error',
      'no-unreachable-loop': 'error',
      'prefer-const': 'error',
    },
  },
  { name: 'seamwright/commonjs', files: ['**/*.cjs'], rules: { '@typescript-eslint/no-require-imports': 'off' } },
  {
    name: 'seamwright/no-console',
    files: code,
    ignores: ['tools/**', 'seeds/**', 'database/cli.ts', 'database/cli/**'],
    rules: { 'no-console': 'error' },
  },
  {
    name: 'seamwright/pure-rooms',
    files: pure,
    ignores: specs,
    rules: {
      'no-restricted-globals': [
        'error',
        ...[
          'process',
          'Buffer',
          'fetch',
          'window',
          'document',
          'localStorage',
          'sessionStorage',
          'performance',
          'setTimeout',
          'setInterval',
        ].map((name) => ({
          name,
          message: 'This room is plain TypeScript: take what you need as a parameter.',
        })),
      ],
    },
  },
  {
    name: 'seamwright/awaited',
    files: awaited,
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: root } },
    rules: { '@typescript-eslint/no-floating-promises': 'error' },
  },
  {
    name: 'seamwright/angular',
    files: client,
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@angular-eslint/prefer-standalone': 'error',
      '@angular-eslint/prefer-signals': 'error',
      '@angular-eslint/prefer-output-emitter-ref': 'error',
      '@angular-eslint/use-lifecycle-interface': 'error',
    },
  },
  {
    name: 'seamwright/templates',
    files: templates,
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
  },
  boundaryConfig(root),
  habitsConfig(),
);
