/** A field the server refused: where (JSON pointer into what was sent) and why, in words. */
export interface FieldProblem {
  readonly pointer: string;
  readonly message: string;
}

/** What a screen shows of a problem document. */
export interface ProblemText {
  readonly title: string;
  readonly detail?: string;
  readonly errors?: readonly FieldProblem[];
}
