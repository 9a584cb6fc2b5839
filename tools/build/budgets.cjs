'use strict';
// What an application may load before its first page: how much, and which modules not. Reads esbuild's metafile.

/**
 * @typedef {object} Metafile of esbuild, as far as it is read here
 * @property {Record<string, {imports: {path: string, kind: string, external?: boolean}[]}>} inputs
 * @property {Record<string, {imports: {path: string, kind: string, external?: boolean}[], inputs: Record<string, {bytesInOutput: number}>}>} outputs
 *
 * @typedef {object} Findings
 * @property {number} bytes of the first load on its way through the network
 * @property {{input: string, bytes: number}[]} heaviest packages and rooms, their share of those bytes, the heaviest first
 * @property {{input: string, why: string, chain: string[]}[]} strangers modules that have no place in the first load
 */

const ENTRY = /^(main|polyfills|styles)(-[A-Z0-9]{8})?\.(js|css)$/;
const AT_ONCE = new Set(['import-statement', 'import-rule', 'require-call']);

/** Modules that belong to pages. What `ALLOWED` names may come along nevertheless. */
const UNWANTED = [
  { pattern: /^libs\/[^/]+\/feature-/, why: 'features load with their route' },
  { pattern: /^libs\/[^/]+\/contracts\//, why: 'the shell needs nothing but the session’s addresses of the contracts' },
  { pattern: /node_modules\/zod\//, why: 'shapes are loaded with the page whose calls or drafts they check' },
  { pattern: /^libs\/[^/]+\/(domain|ui)\/src\/(chart|drawing)/, why: 'charts and drawings load when they are shown' },
  {
    pattern: /node_modules\/@angular\/material\/(fesm2022\/)?_?(dialog|form-field|table)\b/,
    why: 'tables, dialogs and forms load with the page that shows them',
  },
];

const ALLOWED = [/^libs\/identity\/contracts\/session\//, /^libs\/identity\/contracts\/src\/session\.addresses\.ts$/];

/**
 * The files of the first load: the page's own and what they import statically.
 * @param {Metafile} metafile
 * @returns {string[]}
 */
function initialOutputs(metafile) {
  const found = new Set();
  const waiting = Object.keys(metafile.outputs).filter((path) => ENTRY.test(path));
  while (waiting.length > 0) {
    const path = waiting.pop();
    if (found.has(path) || !metafile.outputs[path]) continue;
    found.add(path);
    for (const { path: next, kind, external } of metafile.outputs[path].imports)
      if (AT_ONCE.has(kind) && !external) waiting.push(next);
  }
  return [...found];
}

/**
 * Weighs the first load and looks through what is in it.
 * @param {Metafile} metafile
 * @param {(output: string) => number} transferOf the bytes of a file on its way through the network
 * @returns {Findings}
 */
function examine(metafile, transferOf) {
  const shares = new Map();
  const inputs = new Set();
  let bytes = 0;
  for (const output of initialOutputs(metafile)) {
    const transfer = transferOf(output);
    bytes += transfer;
    const parts = Object.entries(metafile.outputs[output].inputs).filter(([, part]) => part.bytesInOutput > 0);
    const raw = parts.reduce((sum, [, part]) => sum + part.bytesInOutput, 0);
    for (const [input, { bytesInOutput }] of parts) {
      inputs.add(input);
      const name = packageOrRoom(input);
      shares.set(name, (shares.get(name) ?? 0) + (transfer * bytesInOutput) / raw);
    }
  }
  const heaviest = [...shares]
    .map(([input, share]) => ({ input, bytes: Math.round(share) }))
    .sort((one, other) => other.bytes - one.bytes);
  return { bytes, heaviest, strangers: strangersAmong(metafile, inputs) };
}

function strangersAmong(metafile, inputs) {
  const chainTo = chainsFrom(metafile);
  return [...inputs].sort().flatMap((input) => {
    const rule = UNWANTED.find(({ pattern }) => pattern.test(input));
    if (!rule || ALLOWED.some((pattern) => pattern.test(input))) return [];
    return [{ input, why: rule.why, chain: chainTo(input) }];
  });
}

/** Who imports whom, so that a stranger can be told how it came in: the shortest way from the application's start. */
function chainsFrom(metafile) {
  const cameFrom = new Map();
  const waiting = Object.keys(metafile.inputs).filter((path) => /^apps\/[^/]+\/src\/main\.ts$/.test(path));
  for (const start of waiting) cameFrom.set(start, undefined);
  for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
    for (const { path, kind, external } of metafile.inputs[next]?.imports ?? []) {
      if (!AT_ONCE.has(kind) || external || cameFrom.has(path)) continue;
      cameFrom.set(path, next);
      waiting.push(path);
    }
  }
  return (input) => {
    const chain = [];
    for (let step = input; step !== undefined; step = cameFrom.get(step)) chain.unshift(step);
    return chain;
  };
}

function packageOrRoom(input) {
  const inPackage = input.split('node_modules/').at(-1);
  if (inPackage !== input) return /^(@[^/]+\/)?[^/]+/.exec(inPackage)[0];
  return /^libs\/[^/]+\/[^/]+/.exec(input)?.[0] ?? input;
}

const HEAVY_SHOWN = 12;
const kB = (bytes) => `${(bytes / 1000).toFixed(1)} kB`;

/** The strangers of each room, the one with the shortest way in first. */
function byRoom(strangers) {
  const rooms = new Map();
  for (const one of [...strangers].sort((left, right) => left.chain.length - right.chain.length)) {
    const room = packageOrRoom(one.input);
    rooms.set(room, [...(rooms.get(room) ?? []), one]);
  }
  return rooms;
}

/**
 * What is wrong with a first load, in words; undefined when nothing is.
 * @param {string} application
 * @param {Findings} findings
 * @param {number} limit in bytes
 * @returns {string | undefined}
 */
function complaint(application, { bytes, heaviest, strangers }, limit) {
  const said = [];
  if (bytes > limit) {
    said.push(
      `The first load of ${application} is ${kB(bytes)} (gzip); at most ${kB(limit)} are allowed. The heaviest in it:`,
      ...heaviest.slice(0, HEAVY_SHOWN).map((one) => `  ${kB(one.bytes).padStart(9)}  ${one.input}`),
    );
  }
  if (strangers.length > 0) said.push(`The first load of ${application} holds what belongs to later:`);
  for (const [room, [first, ...more]] of byRoom(strangers)) {
    said.push(`  ${room}: ${first.input}${more.length > 0 ? ` and ${more.length} more` : ''} (${first.why})`);
    if (first.chain.length > 1) said.push(...first.chain.map((step) => `    → ${step}`));
  }
  return said.length > 0 ? said.join('\n') : undefined;
}

module.exports = { initialOutputs, examine, complaint };
