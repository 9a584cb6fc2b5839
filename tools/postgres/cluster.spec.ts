import { chmodSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { runNode } from '../start/testing/run-module';

// A real cluster, driven as a person would, in a folder of its own.
describe('a private cluster', () => {
  let base: string;
  let data: string;

  beforeAll(() => {
    base = mkdtempSync(join(tmpdir(), 'seamwright-cluster-'));
    chmodSync(base, 0o755); // as root, the server runs as another user, which must get there
    data = join(base, 'test/data');
  });
  afterAll(async () => {
    await cluster('remove');
    rmSync(base, { recursive: true, force: true });
  }, 60_000);

  const cluster = (verb: string) =>
    runNode(['tools/postgres/cluster.mjs', verb, 'test'], { SEAMWRIGHT_DATA_ROOT: base });
  const serverPid = () => Number(readFileSync(join(data, 'postmaster.pid'), 'utf8').split('\n')[0]);

  async function start(): Promise<string> {
    const { code, out, err } = await cluster('start');
    expect({ code, err }).toEqual({ code: 0, err: expect.stringMatching(/PostgreSQL .*on port \d+\n$/) });
    return out.trim();
  }

  async function ask(url: string, sql: string): Promise<unknown[][]> {
    const client = new Client({ connectionString: url });
    await client.connect();
    try {
      return (await client.query<unknown[]>({ text: sql, rowMode: 'array' })).rows;
    } finally {
      await client.end();
    }
  }

  it('is made and started, on the loopback, in UTC and C.UTF-8, with a password that only its owner reads', async () => {
    const url = await start();
    const settings = `select current_setting('TimeZone'), current_setting('listen_addresses'), current_setting('fsync'),
      current_setting('unix_socket_directories'), datcollate, pg_encoding_to_char(encoding)
      from pg_database where datname = 'template1'`;
    expect(await ask(url, settings)).toEqual([['UTC', '127.0.0.1', 'off', '', 'C.UTF-8', 'UTF8']]);
    expect(statSync(join(data, 'seamwright.json')).mode & 0o777).toBe(0o600);
    await expect(ask(url.replace(/:[0-9a-f]+@/, ':wrong@'), 'select 1')).rejects.toThrow(
      'password authentication failed',
    );
  }, 60_000);

  it('is used again when it runs', async () => {
    const url = await start();
    const pid = serverPid();
    expect(await start()).toBe(url);
    expect(serverPid()).toBe(pid);
    expect((await cluster('url')).out.trim()).toBe(url);
  }, 60_000);

  it('starts again after a crash, with what was committed', async () => {
    const url = await start();
    await ask(url, 'create table kept (n int); insert into kept values (7)');
    await ask(url, 'checkpoint');
    process.kill(serverPid(), 'SIGKILL');
    expect(await ask(await start(), 'select n from kept')).toEqual([[7]]);
  }, 60_000);

  it('takes another port when its own is taken, and says when it does not run', async () => {
    const before = new URL(await start());
    await cluster('stop');
    expect(await cluster('url')).toMatchObject({ code: 1, err: expect.stringContaining('does not run') });
    const intruder = await listen(Number(before.port));
    try {
      const after = await start();
      expect(new URL(after).port).not.toBe(before.port);
      expect(await ask(after, 'select n from kept')).toEqual([[7]]);
    } finally {
      intruder.close();
    }
  }, 60_000);

  it('gets past a pid file whose number is now another process', async () => {
    await start();
    const pidFile = readFileSync(join(data, 'postmaster.pid'), 'utf8');
    await cluster('stop');
    writeFileSync(join(data, 'postmaster.pid'), pidFile.replace(/^\d+/, String(process.pid)));
    expect(await ask(await start(), 'select n from kept')).toEqual([[7]]);
  }, 60_000);

  it('makes a half-made data folder anew', async () => {
    await cluster('remove');
    expect(existsSync(data)).toBe(false);
    mkdirSync(join(data, 'base'), { recursive: true });
    writeFileSync(join(data, 'PG_VERSION'), '15\n');
    mkdirSync(`${data}.new`);
    writeFileSync(join(`${data}.new`, 'left-over'), '');
    const { code, out, err } = await cluster('start');
    expect({ code, err }).toEqual({ code: 0, err: expect.stringContaining('removing a half-made data folder') });
    expect(await ask(out.trim(), 'select 1')).toEqual([[1]]);
    expect(existsSync(`${data}.new`)).toBe(false);
  }, 60_000);

  it('is made once when two ask at the same time', async () => {
    await cluster('remove');
    const [one, two] = await Promise.all([start(), start()]);
    expect(one).toBe(two);
    expect(await ask(one, 'select 1')).toEqual([[1]]);
  }, 60_000);

  it('refuses a name or a verb that it does not know', async () => {
    expect(await runNode(['tools/postgres/cluster.mjs', 'start', '../x'])).toMatchObject({
      code: 1,
      err: expect.stringContaining('Usage'),
    });
    expect(await cluster('begin')).toMatchObject({ code: 1, err: expect.stringContaining('Usage') });
  });
});

function listen(port: number): Promise<Server> {
  return new Promise((done, fail) => {
    const server = createServer();
    server.once('error', fail).listen(port, '127.0.0.1', () => done(server));
  });
}
