import type { AgainstFloor, AgainstLimit } from './bench';
import type { Measured } from './run-pairs';

/** One line of the answer, as `--json` prints it. */
export interface ReportLine {
  readonly bench: string;
  readonly case: string;
  readonly size: string;
  readonly unit: 'ms';
  /** What the ratio is of: medians, or what all but one turn in twenty stayed under. */
  readonly ours: number;
  readonly floor: number;
  readonly ratio: number;
  readonly better: 'smaller' | 'larger';
  /** For the ratio. */
  readonly target: number;
  readonly met: boolean;
}

const rounded = (value: number, places: number): number => Math.round(value * 10 ** places) / 10 ** places;

type Reported = Pick<AgainstFloor, 'name' | 'size' | 'target' | 'by'> | Pick<AgainstLimit, 'name' | 'size' | 'limitMs'>;

/** What is reported of a measured case. The target is held against the ratio as it was measured, not as it is shown. */
export function reportLine(bench: string, reported: Reported, { ours, floor, ratio }: Measured): ReportLine {
  const { name, size } = reported;
  const p95 = 'limitMs' in reported || reported.by === 'p95';
  const target = 'limitMs' in reported ? 1 : reported.target;
  const shown = p95 ? 'p95' : 'median';
  return {
    bench,
    case: name,
    size,
    unit: 'ms',
    ours: rounded(ours[shown], 3),
    floor: rounded(floor[shown], 3),
    ratio: rounded(ratio, 2),
    better: 'smaller',
    target,
    met: ratio <= target,
  };
}

const HEADS = ['case', 'size', 'ours ms', 'p95', 'floor ms', 'p95', 'ratio', 'target', ''] as const;
const WORDS = new Set([0, 1, 8]);

/** The lines of a bench as a table: words to the left, numbers to the right. */
export function table(lines: readonly { readonly line: ReportLine; readonly measured: Measured }[]): string {
  const rows = lines.map(({ line, measured }) => [
    line.case,
    line.size,
    measured.ours.median.toFixed(2),
    measured.ours.p95.toFixed(2),
    measured.floor.median.toFixed(2),
    measured.floor.p95.toFixed(2),
    line.ratio.toFixed(2),
    `≤ ${line.target}`,
    line.met ? 'met' : 'not met',
  ]);
  const all = [[...HEADS], ...rows];
  const widths = HEADS.map((_, at) => Math.max(...all.map((row) => row[at]?.length ?? 0)));
  const written = all.map((row) =>
    row
      .map((cell, at) => (WORDS.has(at) ? cell.padEnd(widths[at] ?? 0) : cell.padStart(widths[at] ?? 0)))
      .join('  ')
      .trimEnd(),
  );
  const rule = widths.map((width) => '─'.repeat(width)).join('  ');
  return [written[0], rule, ...written.slice(1)].join('\n');
}
