// Lints snippets as if they stood at given places of the repository, by the repository's own configuration.
// Reads a JSON array of {file, code} from standard input (file relative to the root) and writes, in the same order,
// a JSON array of arrays of {ruleId, message}. A process of its own because the test runner's sandbox can't load
// ESLint's modules.
import { text } from 'node:stream/consumers';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ESLint } from 'eslint';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');
const eslint = new ESLint({
  cwd: root,
  overrideConfigFile: path.join(root, 'eslint.config.mjs'),
  // Snippets are in no TypeScript project, so the one rule that needs types is left out.
  overrideConfig: {
    languageOptions: { parserOptions: { projectService: false } },
    rules: { '@typescript-eslint/no-floating-promises': 'off' },
  },
});

const snippets = JSON.parse(await text(process.stdin));
const answers = [];
for (const { file, code } of snippets) {
  const [result] = await eslint.lintText(code, { filePath: path.join(root, file) });
  answers.push(result.messages.map(({ ruleId, message }) => ({ ruleId, message })));
}
process.stdout.write(JSON.stringify(answers));
