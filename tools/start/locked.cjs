'use strict';
// Compares the lock file with the list that npm leaves inside node_modules once everything is in place.

/**
 * Why the installed packages are not those of the lock file; undefined when they are.
 * @param {{packages?: Record<string, {version?: string, optional?: boolean}>}} wanted package-lock.json
 * @param {{packages?: Record<string, {version?: string}>} | undefined} installed node_modules/.package-lock.json
 * @returns {string | undefined}
 */
function whyStale(wanted, installed) {
  if (!installed?.packages) return 'nothing is installed';
  const have = installed.packages;
  for (const [path, entry] of Object.entries(wanted.packages ?? {})) {
    if (path === '') continue;
    const name = path.replace(/^.*node_modules\//, '');
    // Packages for other processors and systems are optional, and absent by design.
    if (!have[path]) {
      if (entry.optional) continue;
      return `${name} is missing`;
    }
    if (have[path].version !== entry.version) return `${name} is ${have[path].version}, not ${entry.version}`;
  }
  const extra = Object.keys(have).find((path) => !wanted.packages?.[path]);
  return extra ? `${extra.replace(/^.*node_modules\//, '')} is no longer used` : undefined;
}

module.exports = { whyStale };
