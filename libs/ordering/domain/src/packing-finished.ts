interface LineToPack {
  readonly id: string;
  readonly pieces: number;
  readonly shortPieces: number;
}

/** The lines of which pieces are neither in a pack nor marked short. `packed` gives the pieces packed by line id. */
export function unfinishedLines<Line extends LineToPack>(
  lines: readonly Line[],
  packed: ReadonlyMap<string, { readonly pieces: number }>,
): Line[] {
  return lines.filter((line) => (packed.get(line.id)?.pieces ?? 0) + line.shortPieces < line.pieces);
}
