import type { ChipTone } from '@seamwright/shared/ui';

/** One thing that waits for somebody: what it is, how it stands, and where it is done. */
export interface Task {
  readonly id: string;
  /** What stands first and largest: a count, a weight, a number that is called out. */
  readonly figure: string;
  /** Behind the figure, lighter: "kg", "orders". */
  readonly unit?: string;
  readonly text: string;
  readonly note?: string;
  readonly link: readonly string[];
  /** What is shown there, of all that there is. */
  readonly query?: Readonly<Record<string, string>>;
  /** How it stands, in a word. */
  readonly mark?: { readonly tone: ChipTone; readonly word: string };
}

/** So many are named on the first page; the rest are counted. */
export const MOST_TASKS = 6;
