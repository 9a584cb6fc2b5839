// npm start: the demo, built and running. See `npm start -- --help`.
import { browserFolder, targetNames } from '../build/targets.mjs';
import { runStack } from './stack.mjs';
import { runMain } from './system.mjs';

const program = (name, env) => ({
  name,
  program: process.execPath,
  args: ['--enable-source-maps', `dist/api/${name === 'api' ? 'main' : name}.cjs`],
  env: { ...env, NODE_ENV: 'production' },
});

await runMain(() =>
  runStack(
    {
      targets: targetNames,
      statics: { storefront: browserFolder('storefront'), admin: browserFolder('admin') },
      programs: ({ env }) => [program('api', env), program('worker', env)],
      patient: false,
    },
    process.argv.slice(2),
  ),
);
