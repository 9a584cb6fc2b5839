import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runModule } from './testing/run-module';

const takeOnce = `
  import { takeLock } from './tools/start/lock.mjs';
  const lock = takeLock(process.env.LOCK, { address: 'here' });
  console.log(JSON.stringify({ heldBy: lock.heldBy?.pid, address: lock.heldBy?.address }));`;

describe('a lock that names its holder', () => {
  let folder: string;
  let lock: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'seamwright-lock-'));
    lock = join(folder, 'lock');
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  it('is taken over from a holder that died without releasing it', async () => {
    expect(JSON.parse((await runModule(takeOnce, { LOCK: lock })).out)).toEqual({});
    expect(JSON.parse((await runModule(takeOnce, { LOCK: lock })).out)).toEqual({});
  });

  it('tells the living holder and its notes', async () => {
    writeFileSync(lock, JSON.stringify({ pid: process.pid, token: 'theirs', address: 'there' }));
    expect(JSON.parse((await runModule(takeOnce, { LOCK: lock })).out)).toEqual({
      heldBy: process.pid,
      address: 'there',
    });
  });

  it('does not take a later process of the same number for the holder', async () => {
    writeFileSync(lock, JSON.stringify({ pid: process.pid, born: 'long ago', token: 'theirs' }));
    expect(JSON.parse((await runModule(takeOnce, { LOCK: lock })).out)).toEqual({});
  });

  it('is taken over from a file that was half written', async () => {
    writeFileSync(lock, '{"pid": 1');
    expect(JSON.parse((await runModule(takeOnce, { LOCK: lock })).out)).toEqual({});
  });

  it('lets one at a time do the work, even over a dead holder', async () => {
    writeFileSync(lock, JSON.stringify({ pid: process.pid, born: 'long ago', token: 'theirs' }));
    const trace = join(folder, 'trace');
    const work = `
      import { appendFileSync } from 'node:fs';
      import { setTimeout as pause } from 'node:timers/promises';
      import { alone } from './tools/start/lock.mjs';
      await alone(process.env.LOCK, async () => {
        appendFileSync(process.env.TRACE, 'in\\n');
        await pause(50);
        appendFileSync(process.env.TRACE, 'out\\n');
      });`;
    const ended = await Promise.all(Array.from({ length: 5 }, () => runModule(work, { LOCK: lock, TRACE: trace })));
    expect(ended.map(({ code }) => code)).toEqual([0, 0, 0, 0, 0]);
    expect(readFileSync(trace, 'utf8')).toBe('in\nout\n'.repeat(5));
  }, 30_000);
});
