'use strict';
// Reads the words behind `npm test --`.

/** Every kind, in the order of running: the quick ones say early what is wrong. */
const kinds = ['lint', 'types', 'unit', 'client', 'build', 'browser'];

const usage = `Usage: npm test -- [--only kind,kind] [--keep]
  --only   runs these kinds alone: ${kinds.join(', ')}
  --keep   leaves the test cluster running`;

/**
 * @param {string[]} words
 * @returns {{kinds: string[], keep: boolean, help: boolean}} kinds in the order of running; the browser needs the build
 * @throws {Error} with the usage, when a word is not understood
 */
function readChoice(words) {
  let wanted = kinds;
  let [keep, help] = [false, false];
  for (let i = 0; i < words.length; i++) {
    if (words[i] === '--keep') keep = true;
    else if (words[i] === '--help') help = true;
    else if (words[i] === '--only') wanted = readKinds(words[++i]);
    else if (words[i].startsWith('--only=')) wanted = readKinds(words[i].slice('--only='.length));
    else throw new Error(`"${words[i]}" is not understood.\n${usage}`);
  }
  const chosen = kinds.filter((kind) => wanted.includes(kind) || (kind === 'build' && wanted.includes('browser')));
  return { kinds: chosen, keep, help };
}

function readKinds(text) {
  const named = (text ?? '').split(',').filter(Boolean);
  const strange = named.find((kind) => !kinds.includes(kind));
  if (strange !== undefined || named.length === 0) throw new Error(`"${strange ?? ''}" is no kind of test.\n${usage}`);
  return named;
}

module.exports = { kinds, usage, readChoice };
