import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runModule } from './testing/run-module';

const set = `
  import { Children, endLeftovers } from './tools/start/children.mjs';
  import { setTimeout as pause } from 'node:timers/promises';
  const folder = process.env.FOLDER;
  const files = { logFile: folder + '/all.log', listFile: folder + '/list.json' };
  const children = new Children({ cwd: folder, ...files, log: console.log });
  const start = (name, code) => children.start({ name, program: process.execPath, args: ['-e', code], env: process.env });`;

describe('the processes of a start', () => {
  let folder: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'seamwright-children-'));
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  const run = (code: string) => runModule(`${set}\n${code}`, { FOLDER: folder });

  it('logs every line with its process, and shows warnings alone', async () => {
    const code = `start('api', \`console.log('{"level":30,"msg":"fine"}'); console.log('{"level":40,"msg":"odd"}'); setInterval(() => 0, 1000)\`);
      await pause(700); await children.stopAll();`;
    const { out } = await run(code);
    expect(out).toBe('[api] warning: odd\n');
    const log = readFileSync(join(folder, 'all.log'), 'utf8');
    expect(log).toMatch(/^\S+Z \[api\] \{"level":30,"msg":"fine"\}\n\S+Z \[api\] \{"level":40,"msg":"odd"\}\n$/);
    expect(existsSync(join(folder, 'list.json'))).toBe(false);
  });

  it('tells of a process that ends unasked, with its last lines', async () => {
    const { out } = await run(
      `start('worker', "console.log('about to'); process.exit(3)");
       console.log(await children.death.catch((error) => error.message)); await children.stopAll();`,
    );
    expect(out).toContain('worker ended with code 3. Its last lines:\n  about to\nThe whole log:');
  });

  it('tells of a program that is not there', async () => {
    const { out } = await run(
      `children.start({ name: 'mail', program: folder + '/none', args: [], env: {} });
       console.log(await children.death.catch((error) => error.message)); await children.stopAll();`,
    );
    expect(out).toMatch(/mail ended .*ENOENT/);
  });

  it('ends the last started first', async () => {
    const polite = (name: string) =>
      `process.on('SIGTERM', () => { console.error('${name} ends'); process.exit() }); setInterval(() => 0, 1000);`;
    await run(
      `start('a', ${JSON.stringify(polite('a'))}); start('b', ${JSON.stringify(polite('b'))}); await pause(700); await children.stopAll();`,
    );
    expect(readFileSync(join(folder, 'all.log'), 'utf8')).toMatch(/b ends\n[^]*a ends\n$/);
  });

  it('ends what a killed start left behind', async () => {
    await run(`start('api', 'setInterval(() => 0, 1000)'); await pause(300); process.kill(process.pid, 'SIGKILL');`);
    const [{ pid }] = JSON.parse(readFileSync(join(folder, 'list.json'), 'utf8')) as [{ pid: number }];
    expect(() => process.kill(pid, 0)).not.toThrow();
    const { out } = await run('await endLeftovers(files.listFile, console.log);');
    expect(out).toContain(`ending api (process ${pid})`);
    expect(existsSync(join(folder, 'list.json'))).toBe(false);
    expect(() => process.kill(pid, 0)).toThrow('ESRCH');
  }, 30_000);
});
