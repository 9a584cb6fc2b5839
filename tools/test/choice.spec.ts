import { kinds, readChoice } from './choice.cjs';

describe('readChoice', () => {
  it('runs every kind in order when nothing is said', () => {
    expect(readChoice([])).toEqual({
      kinds: ['lint', 'types', 'unit', 'client', 'build', 'browser'],
      keep: false,
      help: false,
    });
  });

  it('runs the chosen kinds, in the order of running', () => {
    expect(readChoice(['--only', 'client,unit', '--keep'])).toEqual({
      kinds: ['unit', 'client'],
      keep: true,
      help: false,
    });
    expect(readChoice(['--only=lint']).kinds).toEqual(['lint']);
  });

  it('builds before the browser tests', () => {
    expect(readChoice(['--only', 'browser']).kinds).toEqual(['build', 'browser']);
  });

  it('refuses what it does not know, naming the kinds', () => {
    for (const words of [['--only', 'units'], ['--only', ''], ['--only'], ['unit']]) {
      expect(() => readChoice(words)).toThrow(kinds.join(', '));
    }
  });
});
