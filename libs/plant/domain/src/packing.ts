import { ok, refuse, type Result } from '@seamwright/shared/util';

/** How far a line is: pieces ordered, packed, and marked short. */
export interface LineProgress {
  readonly position: number;
  readonly pieces: number;
  readonly packedPieces: number;
  readonly shortPieces: number;
}

/** Pieces that are neither packed nor marked short yet. */
export const openPieces = ({ pieces, packedPieces, shortPieces }: LineProgress): number =>
  pieces - packedPieces - shortPieces;

/** Refuses with `pack-over-line` (line, open, pieces) more pieces than the line still waits for. */
export function roomForPack(line: LineProgress, pieces: number): Result<true> {
  const open = openPieces(line);
  return pieces <= open ? ok(true) : refuse('pack-over-line', { line: line.position, open, pieces }, '/pieces');
}
