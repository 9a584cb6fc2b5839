import { execFileSync } from 'node:child_process';
import path from 'node:path';

/** A piece of code and the place, relative to the root, where it is to be linted as if it stood there. */
export interface Snippet {
  readonly file: string;
  readonly code: string;
}

export interface LintMessage {
  readonly ruleId: string | null;
  readonly message: string;
}

/** Lints all snippets in one run of the repository's own configuration; the answers come in the same order. */
export function lintSnippets(snippets: readonly Snippet[]): LintMessage[][] {
  const answer = execFileSync(process.execPath, [path.join(__dirname, 'lint-snippets.mjs')], {
    input: JSON.stringify(snippets),
    encoding: 'utf8',
  });
  return JSON.parse(answer) as LintMessage[][];
}
