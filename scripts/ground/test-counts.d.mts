export type Counts = { passed: number; failed: number; skipped: number };

export function countStage(report: object | null, exitCode: number): Counts;
export function addCounts(counts: Counts[]): Counts;
export function closingLine(counts: Counts): string;
