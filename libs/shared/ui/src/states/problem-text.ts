/** A field the server refused: where (JSON pointer into what was sent) and why, in words. */
export interface FieldProblem {
  readonly pointer: string;
  readonly message: string;
}

/** What a screen shows of a problem document. */
export interface ProblemText {
  readonly title: string;
  /** The answer's HTTP status; what is refused by one has a heading in plain words. */
  readonly status?: number;
  readonly detail?: string;
  readonly errors?: readonly FieldProblem[];
}
