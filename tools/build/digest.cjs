'use strict';
// One hash for many files: says whether what was built still matches what it was built from.
const { createHash } = require('node:crypto');
const { readFileSync, readdirSync } = require('node:fs');
const { join } = require('node:path');

/**
 * A hash over the names and contents of files. A missing file counts as such, so that removing one changes the hash.
 * @param {string} root
 * @param {string[]} files relative to the root, in any order
 * @param {string} [settings] anything else that the result depends on
 * @returns {string}
 */
function digestOf(root, files, settings = '') {
  const hash = createHash('sha256').update(settings);
  for (const file of [...new Set(files)].sort()) {
    const content = readOrNothing(join(root, file));
    hash.update(`\n${file}\n${content === undefined ? 'missing' : content.length}\n`).update(content ?? '');
  }
  return hash.digest('hex');
}

function readOrNothing(path) {
  try {
    return readFileSync(path);
  } catch {
    return undefined;
  }
}

/**
 * The files under a folder, relative to the root.
 * @param {string} root
 * @param {string} folder relative to the root
 * @param {(path: string) => boolean} [wanted] asked for folders (ending in a slash) and files alike
 * @returns {string[]}
 */
function filesUnder(root, folder, wanted = () => true) {
  let entries;
  try {
    entries = readdirSync(join(root, folder), { withFileTypes: true });
  } catch {
    return [];
  }
  return entries.flatMap((entry) => {
    const path = `${folder}/${entry.name}`;
    if (entry.isDirectory()) return wanted(`${path}/`) ? filesUnder(root, path, wanted) : [];
    return wanted(path) ? [path] : [];
  });
}

module.exports = { digestOf, filesUnder };
