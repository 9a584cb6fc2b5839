import { forTerminal } from './log-line.cjs';

describe('forTerminal', () => {
  it('keeps ordinary lines in the log file', () => {
    expect(forTerminal('{"level":30,"msg":"request completed"}', 'out')).toBeUndefined();
    expect(forTerminal('listening', 'out')).toBeUndefined();
    expect(forTerminal('   ', 'err')).toBeUndefined();
  });

  it('shows warnings and errors with their cause', () => {
    expect(forTerminal('{"level":40,"msg":"mail is late"}', 'out')).toBe('warning: mail is late');
    expect(forTerminal('{"level":50,"msg":"job failed","err":{"message":"no route"}}', 'out')).toBe(
      'error: job failed: no route',
    );
    expect(forTerminal('{"level":60,"msg":"gone","err":{"message":"gone"}}', 'out')).toBe('fatal: gone');
  });

  it('shows what is written to the error stream in plain words', () => {
    expect(forTerminal('Error: out of twine', 'err')).toBe('Error: out of twine');
    expect(forTerminal('{ not: json', 'err')).toBe('{ not: json');
  });
});
