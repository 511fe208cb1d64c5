import type { Summary } from '../../engine/summary/summary.ts';

/** Everything that must be known before the answer is used: of the calculation, then of the file; each once. */
export function warningsOf(summary: Summary): string[] {
  return [...new Set([...summary.warnings, ...summary.model.remarks.map(({ sentence }) => sentence)])];
}
