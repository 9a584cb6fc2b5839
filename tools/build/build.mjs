// Builds what changed: the API, the stand-ins, both applications.
//   node tools/build/build.mjs [--force] [api|tools|storefront|admin …]
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { alone } from '../start/lock.mjs';
import { Told, checkout, isMain, lastLines, runMain, runMeanwhile } from '../start/system.mjs';
import { checkBudget, limits } from './budgets.mjs';
import digest from './digest.cjs';
import { isFresh, removeStamp, writeStamp } from './stamp.mjs';
import { applicationInputs, browserFolder, bundleInputs, bundles, targetNames } from './targets.mjs';

const bundleOptions = {
  bundle: true,
  platform: 'node',
  target: 'node20',
  format: 'cjs',
  packages: 'external', // some carry native parts, and all are installed anyway
  sourcemap: 'linked',
  outdir: 'dist',
  outExtension: { '.js': '.cjs' },
  tsconfig: 'tsconfig.json',
  metafile: true,
  keepNames: true,
  logLevel: 'silent',
};

/**
 * Builds the targets whose sources changed since their last build.
 * @param {object} [wish]
 * @param {string} [wish.root]
 * @param {string[]} [wish.only] all when left out
 * @param {boolean} [wish.force] builds the fresh ones too
 * @param {(line: string) => void} [wish.log]
 * @param {AbortSignal} [wish.signal] ends the build
 * @returns {Promise<{built: string[], fresh: string[]}>}
 * @throws {Told} with the builder's words
 */
export function build({ root = checkout, only = targetNames, force = false, log = () => undefined, signal } = {}) {
  return alone(join(root, 'dist/.stamps/lock'), () => buildAlone({ root, only, force, log, signal }), 15 * 60_000);
}

async function buildAlone({ root, only, force, log, signal }) {
  const done = { built: [], fresh: [] };
  for (const name of targetNames.filter((one) => only.includes(one))) {
    const target = describeTarget(root, name, log);
    if (!force && isFresh(root, target)) {
      done.fresh.push(name);
      continue;
    }
    signal?.throwIfAborted();
    const started = Date.now();
    removeStamp(root, name);
    const { files, hash } = await target.make(signal);
    writeStamp(root, name, files, hash);
    log(`built ${name} in ${((Date.now() - started) / 1000).toFixed(1)} s`);
    done.built.push(name);
  }
  return done;
}

function describeTarget(root, name, log) {
  const bundle = bundles.find((one) => one.name === name);
  return bundle ? bundleTarget(root, bundle) : applicationTarget(root, name, log);
}

function bundleTarget(root, { name, entries }) {
  const settings = JSON.stringify({ ...bundleOptions, entries });
  const outputs = Object.keys(entries).map((result) => `dist/${result}.cjs`);
  const make = async () => {
    const absent = Object.values(entries).find((source) => !existsSync(join(root, source)));
    if (absent) throw new Told(`${name} cannot be built: ${absent} is missing.`);
    const { build: esbuild, formatMessages } = await import('esbuild');
    try {
      const { metafile } = await esbuild({
        ...bundleOptions,
        absWorkingDir: root,
        entryPoints: withoutEnding(entries),
      });
      const files = bundleInputs(metafile);
      return { files, hash: digest.digestOf(root, files, settings) };
    } catch (error) {
      if (!error.errors) throw error;
      throw new Told(`${name} does not build:\n${(await formatMessages(error.errors, { kind: 'error' })).join('')}`);
    }
  };
  return { name, outputs, settings, make };
}

const withoutEnding = (entries) => Object.entries(entries).map(([out, source]) => ({ out, in: source }));

function applicationTarget(root, name, log) {
  const inputs = () => applicationInputs(root, name);
  const configuration = 'production';
  const settings = `${configuration}, first load at most ${limits[name]}`;
  const make = async (signal) => {
    const files = inputs();
    const hash = digest.digestOf(root, files, settings);
    const env = { ...process.env, NG_CLI_ANALYTICS: 'false' };
    const done = await runMeanwhile(
      join(root, 'node_modules/.bin/ng'),
      ['build', name, '--configuration', configuration],
      {
        cwd: root,
        env,
        signal,
      },
    );
    signal?.throwIfAborted();
    if (done.code !== 0) throw new Told(`${name} does not build:\n${lastLines(done.out + done.err, 60)}`);
    log(checkBudget(root, name));
    return { files, hash };
  };
  return { name, outputs: [`${browserFolder(name)}/index.html`], settings, inputs, make };
}

async function main() {
  const words = process.argv.slice(2);
  const names = words.filter((word) => !word.startsWith('--'));
  const strange =
    names.find((name) => !targetNames.includes(name)) ??
    words.find((word) => word.startsWith('--') && word !== '--force');
  if (strange)
    throw new Told(
      `"${strange}" is not a target. Usage: node tools/build/build.mjs [--force] [${targetNames.join('|')} …]`,
    );
  const only = names.length > 0 ? names : targetNames;
  const { fresh } = await build({ only, force: words.includes('--force'), log: console.log });
  if (fresh.length > 0) console.log(`unchanged: ${fresh.join(', ')}`);
}

if (isMain(import.meta.url)) await runMain(main);
