export function readTotals(folder: string): { passed: number; failed: number; skipped: number };
