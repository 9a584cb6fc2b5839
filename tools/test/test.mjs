// npm test: every kind of test in order, up to the first red one. See `npm test -- --help`.
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { clusterUrl, ensureCluster } from '../postgres/cluster.mjs';
import { checkNode, ensurePackages } from '../start/packages.mjs';
import { Told, checkout, runMain } from '../start/system.mjs';
import choice from './choice.cjs';
import counts from './counts.cjs';
import { runners } from './kinds.mjs';

const root = checkout;
const log = (line) => console.log(line);

async function main() {
  const wish = readWish(process.argv.slice(2));
  if (wish.help) return log(choice.usage);
  const stop = stopOnSignal();
  const cluster = testCluster(wish.keep);
  const session = { root, folder: join(root, 'tmp/test'), log, signal: stop, adminUrl: cluster.url };
  mkdirSync(session.folder, { recursive: true });
  const results = [];
  try {
    const ready = await settled(() => prepare());
    if (ready.failed > 0) results.push(ready);
    for (const kind of ready.failed > 0 ? [] : wish.kinds) {
      log(`\n── ${kind}`);
      const started = Date.now();
      const result = await settled(() => runners[kind](session));
      const told = [`${((Date.now() - started) / 1000).toFixed(1)} s`, ...result.notes].join('; ');
      log(`── ${kind}: ${counts.lastLine(result)} (${told})`);
      results.push(result);
      if (result.failed > 0 || stop.aborted) break;
    }
  } finally {
    await cluster.stop();
  }
  const left = wish.kinds.slice(results.length);
  if (left.length > 0) log(`\nnot run: ${left.join(', ')}`);
  const sum = counts.total(results);
  log(`\n${counts.lastLine(sum)}`);
  if (sum.failed > 0 || sum.passed === 0 || left.length > 0) process.exitCode = 1;
}

function prepare() {
  checkNode(root);
  ensurePackages({ root, log });
  return { passed: 0, failed: 0, notes: [] };
}

/** What went wrong around the tests counts as a failure, so that the run ends with its line all the same. */
async function settled(work) {
  try {
    return await work();
  } catch (error) {
    log(error instanceof Told ? error.message : error.stack);
    return { passed: 0, failed: 1, notes: [] };
  }
}

function readWish(words) {
  try {
    return choice.readChoice(words);
  } catch (error) {
    throw new Told(error.message);
  }
}

/** The test cluster, started when first asked for. One that somebody else had running is left to them. */
function testCluster(keep) {
  let started;
  return {
    url: async () => (started ??= await ensureCluster({ name: 'test', root, log })).adminUrl,
    stop: async () => {
      if (!started || !clusterUrl({ name: 'test', root })) return;
      if (!keep && !started.reused) return started.stop();
      log('the test cluster goes on running; stop it with: node tools/postgres/cluster.mjs stop test');
    },
  };
}

/** Hears Ctrl-C and its like: the kind that runs is ended, and no other is begun. */
function stopOnSignal() {
  const stop = new AbortController();
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP'])
    process.once(name, () => stop.abort(new Told(`stopped by ${name}`)));
  return stop.signal;
}

await runMain(main);
