import { DAYS_PER_YEAR } from '../../engine/units.ts';
import type { Measure } from './measure.ts';
import { NARROW_SPACE, enteredNumberText, numberText } from './numberText.ts';

const MONTHS_PER_YEAR = 12;

/** A length of time: days up to two months, months up to two years, then years with one decimal below 20. */
export function durationMeasure(years: number): Measure {
  if (!Number.isFinite(years)) return { number: 'never', unit: '' };
  const months = Math.abs(years) * MONTHS_PER_YEAR;
  if (months < 2) return counted(years * DAYS_PER_YEAR, 'day');
  if (Math.round(months) < 24) return counted(years * MONTHS_PER_YEAR, 'month');
  const decimals = Math.abs(years) < 19.95 ? 1 : 0;
  return { number: enteredNumberText(years, decimals), unit: 'years' };
}

/** A length of time as text, such as '18 months'. */
export function durationText(years: number): string {
  const { number, unit } = durationMeasure(years);
  return unit === '' ? number : `${number}${NARROW_SPACE}${unit}`;
}

/** A date on the project's calendar: 'year 1.5'. */
export function dateText(years: number): string {
  return `year${NARROW_SPACE}${enteredNumberText(years, 2)}`;
}

function counted(amount: number, unit: string): Measure {
  const number = numberText(amount);
  return { number, unit: number === '1' ? unit : `${unit}s` };
}
