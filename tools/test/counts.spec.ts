import { countJest, countPlaywright, lastLine, settle, total } from './counts.cjs';

describe('countJest', () => {
  const green = { success: true, numPassedTests: 12, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0 };

  it('counts a green run', () => {
    expect(countJest(green)).toEqual({ passed: 12, failed: 0, notes: [] });
  });

  it('counts skipped tests, tests to be written and files that could not run as failed', () => {
    const report = { ...green, numFailedTests: 1, numPendingTests: 2, numTodoTests: 3, numRuntimeErrorTestSuites: 4 };
    expect(countJest(report)).toEqual({
      passed: 12,
      failed: 10,
      notes: ['5 skipped', '4 spec files that could not run'],
    });
  });

  it('does not call a run green that the runner calls red', () => {
    expect(countJest({ ...green, success: false }).failed).toBe(1);
  });
});

describe('countPlaywright', () => {
  it('counts what went as expected, and all else as failed', () => {
    expect(countPlaywright({ stats: { expected: 7, unexpected: 0, flaky: 0, skipped: 0 }, errors: [] })).toEqual({
      passed: 7,
      failed: 0,
      notes: [],
    });
    const red = countPlaywright({ stats: { expected: 7, unexpected: 1, flaky: 1, skipped: 2 }, errors: [{}] });
    expect(red).toEqual({
      passed: 7,
      failed: 5,
      notes: ['2 skipped', '1 passed only when repeated', '1 errors outside a test'],
    });
  });
});

describe('settle', () => {
  it('leaves a green kind as it is', () => {
    expect(settle({ passed: 3, failed: 0, notes: [] }, 0)).toEqual({ passed: 3, failed: 0, notes: [] });
  });

  it('fails a kind that wrote no report, ran no test, or ended badly', () => {
    expect(settle(undefined, 0)).toEqual({ passed: 0, failed: 1, notes: ['no report was written'] });
    expect(settle({ passed: 0, failed: 0, notes: [] }, 0)).toEqual({
      passed: 0,
      failed: 1,
      notes: ['no test was run'],
    });
    expect(settle({ passed: 3, failed: 0, notes: [] }, 2)).toEqual({
      passed: 3,
      failed: 1,
      notes: ['the program ended with code 2'],
    });
  });

  it('does not count a failure twice', () => {
    expect(settle({ passed: 3, failed: 2, notes: [] }, 1).failed).toBe(2);
  });
});

it('adds up and ends with one line', () => {
  const sum = total([
    { passed: 3, failed: 0, notes: [] },
    { passed: 4, failed: 1, notes: ['x'] },
  ]);
  expect(lastLine(sum)).toBe('7 passed, 1 failed');
  expect(lastLine(total([]))).toBe('0 passed, 0 failed');
});
