/** One row of a file of separated values; `line` is where it begins in the file, from 1. */
export interface CsvRow {
  readonly line: number;
  readonly cells: readonly string[];
}

const SEPARATORS = [',', ';', '\t'] as const;

/** The separator that the first line uses most, outside quotes. */
function separatorOf(text: string): string {
  const head = (/^[^\r\n]*/.exec(text)?.[0] ?? '').replace(/"[^"]*"/g, '');
  const counts = SEPARATORS.map((mark) => ({ mark, count: head.split(mark).length }));
  return counts.reduce((most, next) => (next.count > most.count ? next : most)).mark;
}

/**
 * Reads separated values (RFC 4180): comma, semicolon or tab, quoted cells with doubled quotes and line breaks in them,
 * any line ends, with or without a byte order mark. Rows without any text are left out. Null when a quote never ends.
 */
export function readCsv(file: string): CsvRow[] | null {
  const text = file.replace(/^\uFEFF/, '');
  const separator = separatorOf(text);
  const rows: CsvRow[] = [];
  let cells: string[] = [];
  let cell = '';
  let quoted = false;
  let line = 1;
  let begun = 1;
  const endRow = () => {
    cells.push(cell);
    if (cells.some((each) => each.trim() !== '')) rows.push({ line: begun, cells: cells.map((each) => each.trim()) });
    cells = [];
    cell = '';
  };
  for (let at = 0; at < text.length; at++) {
    const sign = text[at] ?? '';
    if (sign === '\n') line += 1;
    if (quoted) {
      if (sign !== '"') cell += sign;
      else if (text[at + 1] === '"') {
        cell += '"';
        at += 1;
      } else quoted = false;
    } else if (sign === '"' && cell.trim() === '') {
      quoted = true;
      cell = '';
    } else if (sign === separator) {
      cells.push(cell);
      cell = '';
    } else if (sign === '\n') {
      endRow();
      begun = line;
    } else if (sign === '\r') {
      if (text[at + 1] === '\n') continue;
      line += 1;
      endRow();
      begun = line;
    } else {
      cell += sign;
    }
  }
  if (quoted) return null;
  endRow();
  return rows;
}
