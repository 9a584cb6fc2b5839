import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { digestOf, filesUnder } from './digest.cjs';

describe('the hash over sources', () => {
  let root: string;

  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'seamwright-digest-'));
    mkdirSync(join(root, 'src/deep'), { recursive: true });
    writeFileSync(join(root, 'src/a.ts'), 'one');
    writeFileSync(join(root, 'src/deep/b.ts'), 'two');
  });
  afterEach(() => rmSync(root, { recursive: true, force: true }));

  const both = ['src/a.ts', 'src/deep/b.ts'];

  it('depends neither on order nor on repetition', () => {
    expect(digestOf(root, [...both].reverse())).toBe(digestOf(root, both));
    expect(digestOf(root, [...both, 'src/a.ts'])).toBe(digestOf(root, both));
  });

  it('changes with a content, a name, a removal and the settings', () => {
    const before = digestOf(root, both);
    expect(digestOf(root, both, 'other settings')).not.toBe(before);
    writeFileSync(join(root, 'src/a.ts'), 'One');
    const changed = digestOf(root, both);
    rmSync(join(root, 'src/a.ts'));
    const removed = digestOf(root, both);
    writeFileSync(join(root, 'src/a.ts'), '');
    const empty = digestOf(root, both);
    expect(new Set([before, changed, removed, empty]).size).toBe(4);
    writeFileSync(join(root, 'src/a.ts'), 'one');
    expect(digestOf(root, both)).toBe(before);
  });

  it('does not confuse where one file ends and the next begins', () => {
    writeFileSync(join(root, 'src/a.ts'), 'onetwo');
    writeFileSync(join(root, 'src/deep/b.ts'), '');
    const joined = digestOf(root, both);
    writeFileSync(join(root, 'src/a.ts'), 'one');
    writeFileSync(join(root, 'src/deep/b.ts'), 'two');
    expect(digestOf(root, both)).not.toBe(joined);
  });

  it('lists the files under a folder, leaving out what is not wanted', () => {
    expect(filesUnder(root, 'src').sort()).toEqual(both);
    expect(filesUnder(root, 'src', (path) => !path.endsWith('/deep/'))).toEqual(['src/a.ts']);
    expect(filesUnder(root, 'nowhere')).toEqual([]);
  });
});
