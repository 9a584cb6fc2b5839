import type { Choice, ChoiceRule, ChosenValues, OfferedValue } from './choices';

interface Choosable {
  readonly choices: readonly Choice<OfferedValue>[];
  readonly choiceRules: readonly ChoiceRule[];
}

/** What is chosen, with the default for whatever isn't. */
export function withDefaults(choices: readonly Choice<OfferedValue>[], chosen: ChosenValues): ChosenValues {
  return Object.fromEntries(choices.map(({ key, defaultValue }) => [key, chosen[key] ?? defaultValue]));
}

/** The first rule that a full set of values breaks. */
export function brokenRule(rules: readonly ChoiceRule[], full: ChosenValues): ChoiceRule | null {
  return rules.find((rule) => breaks(rule, full)) ?? null;
}

/**
 * Why a value can't be chosen beside what is chosen already (defaults filled in): the reason of the rule that it would
 * break, or null when it may be.
 */
export function whyForbidden(version: Choosable, chosen: ChosenValues, choice: string, value: string): string | null {
  const full = { ...withDefaults(version.choices, chosen), [choice]: value };
  const concerned = version.choiceRules.filter(
    ({ when, forbids }) => forbids.choice === choice || Object.hasOwn(when, choice),
  );
  return brokenRule(concerned, full)?.reason ?? null;
}

function breaks({ when, forbids }: ChoiceRule, full: ChosenValues): boolean {
  const holds = Object.entries(when).every(([key, value]) => full[key] === value);
  return holds && full[forbids.choice] === forbids.value;
}
