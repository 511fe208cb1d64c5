import { MINUS, enteredNumberText, numberText } from './numberText.ts';

/**
 * A slope as '1 in N': tenths of N below 10, whole N below 1,000, three digits from there;
 * 'level' where it is flatter than 1 in 100,000. A slope the other way begins with a minus sign.
 */
export function slopeText(slope: number): string {
  if (Number.isNaN(slope)) return 'none';
  const size = Math.abs(slope);
  if (size < 1e-5) return 'level';
  return `${slope < 0 ? MINUS : ''}1 in ${runText(1 / size)}`;
}

function runText(run: number): string {
  if (run < 9.95) return enteredNumberText(run, 1);
  if (run < 999.5) return numberText(run);
  const step = run < 9995 ? 10 : run < 99950 ? 100 : 1000;
  return numberText(Math.round(run / step) * step);
}
