import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readSettings } from './settings';
import { stripeClient } from './testing/running-mock';

describe('settings', () => {
  it('have defaults', () => {
    expect(readSettings({ STRIPE_MOCK_PORT: '' })).toEqual({
      port: 12111,
      key: 'sk_test_seamwright',
      webhook: undefined,
      snapshotFile: undefined,
      fees: { ratePpm: 15_000, fixedMinor: 20 },
      timing: { availableAfterDays: 2, payoutArrivesAfterDays: 1 },
    });
  });

  it('name what is wrong', () => {
    expect(() => readSettings({ STRIPE_MOCK_PORT: 'abc' })).toThrow(/STRIPE_MOCK_PORT/);
    expect(() => readSettings({ STRIPE_MOCK_WEBHOOK_URL: 'http://127.0.0.1:1/x' })).toThrow(/go together/);
  });
});

describe('run by itself', () => {
  it('listens, answers, and on SIGTERM ends well with its state kept', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'stripe-mock-main-'));
    const snapshot = join(folder, 'state.json');
    const child = spawn(process.execPath, ['--import', 'tsx', join(__dirname, 'main.ts')], {
      env: { ...process.env, STRIPE_MOCK_PORT: '0', STRIPE_MOCK_KEY: 'sk_test_other', STRIPE_MOCK_SNAPSHOT: snapshot },
      stdio: ['ignore', 'pipe', 'inherit'],
    });
    try {
      const [line] = (await once(child.stdout, 'data')) as [Buffer];
      const url = /http:\S+/.exec(line.toString())?.[0] ?? '';
      expect(url).toMatch(/^http:\/\/127\.0\.0\.1:\d+$/);
      const { id } = await stripeClient(url, 'sk_test_other').customers.create({ name: 'Kept' });
      const ended = once(child, 'exit');
      child.kill('SIGTERM');
      expect(await ended).toEqual([0, null]);
      expect(readFileSync(snapshot, 'utf8')).toContain(id);
    } finally {
      child.kill('SIGKILL');
      rmSync(folder, { recursive: true });
    }
  }, 30_000);
});
