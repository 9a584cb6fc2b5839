import type { Problem } from '@seamwright/shared/contracts';

/** What was asked of the server and how it went; a refusal stays until the next try. */
export interface Deed {
  readonly running: boolean;
  readonly problem: Problem | null;
}

export const still: Deed = { running: false, problem: null };
export const running: Deed = { running: true, problem: null };
export const refused = (problem: Problem): Deed => ({ running: false, problem });
