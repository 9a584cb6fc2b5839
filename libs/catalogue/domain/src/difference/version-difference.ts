import { choiceKey } from '../choice-key';
import type { VersionContent } from '../specification-version';
import { changedSteps, type StepChange } from './step-difference';

/** A single thing that a version says. */
export type Stated = string | number | boolean;

/**
 * One thing that two versions say differently. The path names it: ['fatCoverMm'], ['stations', 'boning', 'secondsPerKg'],
 * ['choices', 'trim', 'values', '6', 'priceChangeMinorPerKg'], ['allergens', 'celery']. What only one version has, or
 * what is left open (null) in the other, is undefined there.
 */
export interface VersionChange {
  readonly path: readonly string[];
  readonly before: Stated | undefined;
  readonly after: Stated | undefined;
}

export interface VersionDifference {
  /** In the order in which a version is written. */
  readonly changes: readonly VersionChange[];
  readonly steps: readonly StepChange[];
}

/** What changed from one version to another, down to the single number; both lists empty when they say the same. */
export function versionDifference(before: VersionContent, after: VersionContent): VersionDifference {
  const [was, is] = [statements(before), statements(after)];
  const keys = [...new Set([...was.keys(), ...is.keys()])];
  const changes = keys.flatMap((key): VersionChange[] => {
    const [old, now] = [was.get(key), is.get(key)];
    const path = (old ?? now)?.path ?? [];
    return old?.value === now?.value ? [] : [{ path, before: old?.value, after: now?.value }];
  });
  return { changes, steps: changedSteps(before.steps, after.steps) };
}

interface Statement {
  readonly path: readonly string[];
  readonly value: Stated;
}

/** What each kind of list tells its entries apart by; a list without one holds plain words. */
const NAME_OF: Readonly<Record<string, (entry: never) => string>> = {
  choices: ({ key }: { key: string }) => key,
  values: ({ value }: { value: string }) => value,
  stations: ({ station }: { station: string }) => station,
  otherOutputs: ({ name }: { name: string }) => name,
  choiceRules: ({ when, forbids }: VersionContent['choiceRules'][number]) =>
    `${choiceKey(when)} × ${choiceKey({ [forbids.choice]: forbids.value })}`,
};

/** Everything a version says but its steps and what only names it within its own record. */
function statements(content: VersionContent): ReadonlyMap<string, Statement> {
  const { steps: _, ...said } = content;
  return new Map(statedBy(said, []).map((statement) => [JSON.stringify(statement.path), statement]));
}

function statedBy(value: unknown, path: readonly string[]): Statement[] {
  if (Array.isArray(value)) return value.flatMap((entry: unknown) => statedByEntry(entry, path));
  if (typeof value === 'object' && value !== null) {
    return Object.entries(value).flatMap(([key, each]) => statedBy(each, [...path, key]));
  }
  return value === undefined || value === null ? [] : [{ path, value: value as Stated }];
}

/** An entry stands in the path by its name, not by its place: moving it changes nothing. */
function statedByEntry(entry: unknown, path: readonly string[]): Statement[] {
  if (typeof entry !== 'object' || entry === null) return [{ path: [...path, String(entry)], value: true }];
  const nameOf = NAME_OF[path.at(-1) ?? ''] as ((entry: object) => string) | undefined;
  if (!nameOf) throw new Error(`Entries of "${path.join(' ')}" have no name to be told apart by`);
  return statedBy(entry, [...path, nameOf(entry)]);
}
