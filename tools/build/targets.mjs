// What is built, from what, into what.
import digest from './digest.cjs';

const shared = ['package-lock.json', 'tsconfig.json'];

/**
 * @typedef {object} BundleTarget a bundle for Node.js, made by esbuild
 * @property {'api' | 'tools'} name
 * @property {Record<string, string>} entries result (without .cjs) → source
 *
 * @typedef {object} BrowserTarget an Angular application
 * @property {'storefront' | 'admin'} name
 */

/** @type {BundleTarget[]} */
export const bundles = [
  { name: 'api', entries: { 'api/main': 'apps/api/src/main.ts', 'api/worker': 'apps/api/src/worker.ts' } },
  {
    name: 'tools',
    entries: { 'tools/stripe-mock': 'tools/stripe-mock/main.ts', 'tools/mail-catcher': 'tools/mail-catcher/main.ts' },
  },
];

/** @type {BrowserTarget['name'][]} */
export const applications = ['storefront', 'admin'];

/** Every target, in the order of building. */
export const targetNames = [...bundles.map(({ name }) => name), ...applications];

/** The folder of a built application that is served. */
export const browserFolder = (application, base = 'dist') => `${base}/${application}/browser`;

/**
 * The files that an Angular application may be made from: its own and those of the rooms it may import.
 * @param {string} root
 * @param {string} application
 * @returns {string[]}
 */
export function applicationInputs(root, application) {
  const wanted = (path) => !/\/(server|testing)\/$|\.(spec|standards\.spec)\.ts$|\/jest[^/]*$/.test(path);
  return [
    ...shared,
    'angular.json',
    ...digest.filesUnder(root, `apps/${application}`, wanted),
    ...digest.filesUnder(root, 'libs', wanted),
  ];
}

/** The files that a bundle was made from, as esbuild tells them. */
export const bundleInputs = (metafile) => [...shared, ...Object.keys(metafile.inputs)];
