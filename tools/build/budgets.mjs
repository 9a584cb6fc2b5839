// Weighs the first load of a built application as it goes through the network, and looks for what has no place in it.
//   node tools/build/budgets.mjs [storefront|admin …]
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { Told, checkout, isMain, runMain } from '../start/system.mjs';
import budgets from './budgets.cjs';
import { applications, browserFolder } from './targets.mjs';

/** The first load at most, gzip, in bytes. angular.json holds the coarser net of unpacked bytes. */
export const limits = { storefront: 140_000, admin: 170_000 };

/**
 * Checks a built application.
 * @param {string} root
 * @param {string} application
 * @returns {string} a line that says how heavy it is
 * @throws {Told} with what is too heavy or has no place in the first load
 */
export function checkBudget(root, application) {
  const stats = join(root, 'dist', application, 'stats.json');
  if (!existsSync(stats)) throw new Told(`${application} is not built: node tools/build/build.mjs ${application}`);
  const metafile = JSON.parse(readFileSync(stats, 'utf8'));
  const transferOf = (output) => gzipSync(readFileSync(join(root, browserFolder(application), output))).length;
  const findings = budgets.examine(metafile, transferOf);
  const wrong = budgets.complaint(application, findings, limits[application]);
  if (wrong) throw new Told(wrong);
  return `the first load of ${application} is ${(findings.bytes / 1000).toFixed(1)} kB of ${limits[application] / 1000} kB`;
}

async function main() {
  const names = process.argv.slice(2);
  const strange = names.find((name) => !applications.includes(name));
  if (strange) throw new Told(`"${strange}" is not an application: ${applications.join(', ')}`);
  for (const name of names.length > 0 ? names : applications) console.log(checkBudget(checkout, name));
}

if (isMain(import.meta.url)) await runMain(main);
