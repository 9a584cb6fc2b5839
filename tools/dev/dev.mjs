// npm run dev: like npm start, but everything is built again and restarted as its sources change.
import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { applications, browserFolder } from '../build/targets.mjs';
import { until } from '../start/ports.mjs';
import { runStack } from '../start/stack.mjs';
import { Told, runMain } from '../start/system.mjs';

// Apart from the production builds, so that those stay what their stamps say.
const base = 'dist/dev';

const watched = (root, env, name, source) => ({
  name,
  program: join(root, 'node_modules/.bin/tsx'),
  args: ['watch', '--clear-screen=false', source],
  env: { ...env, NODE_ENV: 'development' },
});

/** Both applications are there before the API starts, which serves their folders. */
async function watchApplications(children, root) {
  for (const name of applications) {
    rmSync(join(root, base, name), { recursive: true, force: true });
    children.start({
      name,
      program: join(root, 'node_modules/.bin/ng'),
      args: ['build', name, '--watch', '--configuration', 'development', '--output-path', `${base}/${name}`],
      env: { ...process.env, NG_CLI_ANALYTICS: 'false' },
      chatty: true,
    });
  }
  const built = () => applications.every((name) => existsSync(join(root, browserFolder(name, base), 'index.html')));
  if (!(await until(built, 180_000))) throw new Told('The applications were not built within three minutes.');
}

await runMain(() =>
  runStack(
    {
      targets: ['tools'],
      statics: { storefront: browserFolder('storefront', base), admin: browserFolder('admin', base) },
      before: watchApplications,
      programs: ({ root, env }) => [
        watched(root, env, 'api', 'apps/api/src/main.ts'),
        watched(root, env, 'worker', 'apps/api/src/worker.ts'),
      ],
      patient: true,
    },
    process.argv.slice(2),
  ),
);
