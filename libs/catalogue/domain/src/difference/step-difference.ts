import type { MethodStep } from '../specification-version';

/** A step that only one of two versions has, with its number there, counted from one. */
export interface StepChange {
  readonly kind: 'added' | 'removed';
  readonly number: number;
  readonly step: MethodStep;
}

/**
 * The steps that were taken out and put in, in the order in which the new method is read. The longest run of steps that
 * both have in the same order counts as kept, so that one new step at the top doesn't change all that follow.
 */
export function changedSteps(before: readonly MethodStep[], after: readonly MethodStep[]): StepChange[] {
  const kept = keptLengths(before, after);
  const changes: StepChange[] = [];
  let [old, now] = [0, 0];
  while (old < before.length || now < after.length) {
    const [was, is] = [before[old], after[now]];
    if (was && is && isSame(was, is)) {
      old += 1;
      now += 1;
    } else if (was && (kept(old + 1, now) >= kept(old, now + 1) || !is)) {
      old += 1;
      changes.push({ kind: 'removed', number: old, step: was });
    } else if (is) {
      now += 1;
      changes.push({ kind: 'added', number: now, step: is });
    }
  }
  return changes;
}

const isSame = (a: MethodStep, b: MethodStep): boolean =>
  JSON.stringify(sortedStep(a)) === JSON.stringify(sortedStep(b));

const sortedStep = (step: MethodStep): [string, unknown][] =>
  Object.entries(step)
    .filter(([, value]) => value !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1));

/** How many steps can be kept from two places on: the longest common subsequence, filled from the end. */
function keptLengths(
  before: readonly MethodStep[],
  after: readonly MethodStep[],
): (old: number, now: number) => number {
  const width = after.length + 1;
  const lengths = new Uint16Array((before.length + 1) * width);
  const at = (old: number, now: number): number => lengths[old * width + now] ?? 0;
  for (let old = before.length - 1; old >= 0; old -= 1) {
    for (let now = after.length - 1; now >= 0; now -= 1) {
      const [was, is] = [before[old], after[now]];
      lengths[old * width + now] =
        was && is && isSame(was, is) ? at(old + 1, now + 1) + 1 : Math.max(at(old + 1, now), at(old, now + 1));
    }
  }
  return (old, now) => (old > before.length || now > after.length ? 0 : at(old, now));
}
