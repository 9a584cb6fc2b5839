import { runPairs } from './run-pairs';

/** A clock that moves only while something works. */
function standing() {
  let now = 0;
  const order: string[] = [];
  const works =
    (name: string, milliseconds: (turn: number) => number) =>
    async (turn: number): Promise<void> => {
      order.push(`${name}${turn}`);
      now += milliseconds(turn);
    };
  return { clock: () => now, order, works };
}

it('runs pair by pair, the floor first every other time', async () => {
  const { clock, order, works } = standing();
  await runPairs({ ours: works('o', () => 1), floor: works('f', () => 1) }, { warmUps: 1, turns: 2, clock });
  expect(order).toEqual(['o0', 'f0', 'f1', 'o1', 'o2', 'f2']);
});

it('leaves the warm-up out and divides the medians', async () => {
  const { clock, works } = standing();
  const slowAtFirst = (turn: number) => (turn === 0 ? 900 : 10 + turn);
  const measured = await runPairs(
    { ours: works('o', slowAtFirst), floor: works('f', () => 4) },
    { warmUps: 1, turns: 3, clock },
  );
  expect(measured.ours).toEqual({ median: 12, p95: expect.closeTo(12.9, 10) });
  expect(measured.floor).toEqual({ median: 4, p95: 4 });
  expect(measured.ratio).toBe(3);
});

it('divides what all but one turn in twenty stayed under, where a case says so', async () => {
  const { clock, works } = standing();
  const once = (turn: number) => (turn === 19 ? 60 : 10);
  const measured = await runPairs(
    { ours: works('o', once), floor: works('f', () => 5), by: 'p95' },
    { warmUps: 0, turns: 20, clock },
  );
  expect(measured.ratio).toBeCloseTo(12.5 / 5, 10);
});

it('times a case with a limit alone, and holds its p95 against that', async () => {
  const { clock, order, works } = standing();
  const measured = await runPairs({ ours: works('o', () => 1), limitMs: 2 }, { warmUps: 1, turns: 2, clock });
  expect(order).toEqual(['o0', 'o1', 'o2']);
  expect(measured).toEqual({ ours: { median: 1, p95: 1 }, floor: { median: 2, p95: 2 }, ratio: 0.5 });
});

it('ends at the first failure', async () => {
  const { clock, works } = standing();
  const fails = async () => {
    throw new Error('refused');
  };
  await expect(runPairs({ ours: fails, floor: works('f', () => 1) }, { warmUps: 0, turns: 3, clock })).rejects.toThrow(
    'refused',
  );
});
