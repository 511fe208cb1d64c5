import type { TimeBands } from '../../engine/summary/summary.ts';
import { enteredNumberText } from '../words/numberText.ts';

/** 'P5, P25, P50, P75 and P95' */
export function percentList({ bands }: TimeBands): string {
  const names = bands.map(({ percent }) => `P${enteredNumberText(percent)}`);
  return names.length < 2
    ? names.join('')
    : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;
}
