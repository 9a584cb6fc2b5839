/** A cell of a statement that can't be read. */
export interface StatementFaultRow {
  readonly id: string;
  readonly line: number;
  readonly column: string;
  readonly message: string;
}

/** Faults of a problem document, whose pointers name line and column: "/lines/4/Amount". */
export const statementFaults = (
  errors: readonly { readonly pointer: string; readonly message: string }[],
): StatementFaultRow[] =>
  errors.flatMap(({ pointer, message }) => {
    const [, line, column] = /^\/lines\/(\d+)\/(.*)$/.exec(pointer) ?? [];
    return line === undefined
      ? []
      : [{ id: `${pointer} ${message}`, line: Number(line), column: column ?? '', message }];
  });
