interface Timed {
  readonly name: string;
  /** How much of it: the rows, lines or bytes that are at stake. */
  readonly size: string;
  /** `turn` counts from 0 and is the same for both of a pair; each may be called once a turn. */
  ours(turn: number): unknown;
}

/** One thing that is timed, done by us and as sparsely as it can be done, in turns. */
export interface AgainstFloor extends Timed {
  /** At most so many times the floor. */
  readonly target: number;
  /** What is compared: medians when left out, or what all but one turn in twenty stayed under. */
  readonly by?: 'median' | 'p95';
  floor(turn: number): unknown;
}

/** One thing that has to be done within a time of its own: all but one turn in twenty. */
export interface AgainstLimit extends Timed {
  readonly limitMs: number;
}

export type BenchCase = AgainstFloor | AgainstLimit;

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
