export interface Counts {
  passed: number;
  failed: number;
  notes: string[];
}
export function countJest(report: Record<string, unknown>): Counts;
export function countPlaywright(report: { stats?: Record<string, number>; errors?: unknown[] }): Counts;
export function settle(counts: Counts | undefined, code: number): Counts;
export function total(all: Counts[]): { passed: number; failed: number };
export function lastLine(sum: { passed: number; failed: number }): string;
