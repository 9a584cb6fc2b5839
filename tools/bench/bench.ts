/** One thing that is timed, done by us and as sparsely as it can be done, in turns. */
export interface BenchCase {
  readonly name: string;
  /** How much of it: the rows, lines or bytes that are at stake. */
  readonly size: string;
  /** At most so many times the floor. */
  readonly target: number;
  /** `turn` counts from 0 and is the same for both of a pair; each may be called once a turn. */
  ours(turn: number): Promise<unknown>;
  floor(turn: number): Promise<unknown>;
}

/** A bench that stands ready. */
export interface ReadyBench {
  readonly cases: readonly BenchCase[];
  /** Called ahead of each case, outside the timing. */
  beforeCase(): Promise<void>;
  close(): Promise<void>;
}

export interface Preparing {
  /** How many turns each case will be given. */
  readonly turns: number;
  readonly say: (line: string) => void;
}

export interface Bench {
  readonly name: string;
  prepare(preparing: Preparing): Promise<ReadyBench>;
}
