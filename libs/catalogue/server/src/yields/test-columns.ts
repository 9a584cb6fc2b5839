/** The columns that every workbook of tests has; a column for each output follows. */
export const TEST_HEADS = {
  subject: 'Code',
  testedOn: 'Day',
  lotCode: 'Lot',
  supplier: 'Supplier',
  grade: 'Grade',
  pieces: 'Pieces',
  input: 'Input kg',
  added: 'Added kg',
  note: 'Note',
} as const;

export type TestColumn = keyof typeof TEST_HEADS;
export const TEST_COLUMNS = Object.keys(TEST_HEADS) as readonly TestColumn[];

/** The sheet's letters for a column, the first being 1. */
export function columnLetter(column: number): string {
  const last = String.fromCharCode(65 + ((column - 1) % 26));
  return column > 26 ? `${columnLetter(Math.floor((column - 1) / 26))}${last}` : last;
}

/** A weighed output of a row as typed. */
export interface OutputCell {
  readonly column: number;
  /** The head of its column: the output's name. */
  readonly name: string;
  readonly text: string;
}

/** One row of the sheet as text; an empty cell is an empty text. Outputs left empty are not there. */
export interface TestSheetRow extends Readonly<Record<TestColumn, string>> {
  readonly row: number;
  readonly outputs: readonly OutputCell[];
}

export interface TestFault {
  readonly row: number;
  /** The sheet's letters. */
  readonly column: string;
  readonly code: string;
  readonly params: Readonly<Record<string, string | number>>;
}

export interface ReadTests {
  readonly rows: readonly TestSheetRow[];
  /** Cells that could not be read; their rows are left out. */
  readonly faults: readonly TestFault[];
}
