// Two projects: node (domain, contracts, server, database, tools) and client (Angular libraries and applications).
const moduleNameMapper = {
  '^@seamwright/database$': '<rootDir>/database/index.ts',
  '^@seamwright/database/(.*)$': '<rootDir>/database/$1.ts',
  '^@seamwright/(.*)$': '<rootDir>/libs/$1/src/index.ts',
};
const ignored = ['/node_modules/', '/dist/', '<rootDir>/apps/e2e/'];
const clientRooms = '(data-access|ui|feature-[a-z-]+)';

/** @type {import('jest').Config} */
module.exports = {
  // Room for a busy machine: databases are cloned and pages drawn while others work.
  testTimeout: 60_000,
  projects: [
    {
      displayName: 'node',
      rootDir: __dirname,
      testEnvironment: 'node',
      testMatch: ['<rootDir>/{libs,apps,database,seeds,tools}/**/*.spec.ts'],
      testPathIgnorePatterns: [...ignored, `/libs/[a-z]+/${clientRooms}/`, '<rootDir>/apps/(storefront|admin)/'],
      moduleNameMapper,
      transform: {
        '^.+\\.(ts|mjs)$': [
          '@swc/jest',
          { jsc: { parser: { syntax: 'typescript', decorators: true }, target: 'es2022' } },
        ],
      },
      transformIgnorePatterns: ['node_modules/(?!@angular/localize/)'],
      setupFiles: ['<rootDir>/tools/test/node.setup.ts'],
    },
    {
      displayName: 'client',
      rootDir: __dirname,
      preset: 'jest-preset-angular',
      testEnvironment: 'jsdom',
      testMatch: [
        `<rootDir>/libs/*/{data-access,ui,feature-*}/**/*.spec.ts`,
        '<rootDir>/apps/{storefront,admin}/**/*.spec.ts',
      ],
      testPathIgnorePatterns: ignored,
      moduleNameMapper,
      setupFilesAfterEnv: ['<rootDir>/tools/test/client.setup.ts'],
      transform: {
        '^.+\\.(ts|js|mjs|html|svg)$': [
          'jest-preset-angular',
          { tsconfig: '<rootDir>/tsconfig.spec.json', stringifyContentPathRegex: '\\.(html|svg)$' },
        ],
      },
      transformIgnorePatterns: ['node_modules/(?!.*\\.mjs$|@angular/common/locales|uuid/)'],
    },
  ],
};
