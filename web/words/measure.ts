import { durationMeasure } from './durationText.ts';
import { NARROW_SPACE, enteredNumberText, numberText } from './numberText.ts';
import { slopeText } from './slopeText.ts';

/** A number and its unit apart, so that the unit can be set lighter; unit '' for a slope. */
export interface Measure {
  readonly number: string;
  readonly unit: string;
}

/** The units in which the summary gives its quantities. */
export type QuantityUnit = 'm' | 'm/year' | 'year' | 'm/m';

const MILLIMETRES = 1000;

/** A settlement to the mm under 1 m and to the cm from there. */
export function settlementMeasure(metres: number): Measure {
  const millimetres = Math.round(Math.abs(metres) * MILLIMETRES);
  if (millimetres < MILLIMETRES) return { number: numberText(metres * MILLIMETRES), unit: 'mm' };
  return { number: numberText(metres, 2), unit: 'm' };
}

/** A rate of settlement: whole mm/year from 10 on, tenths below. */
export function rateMeasure(metresPerYear: number): Measure {
  const millimetres = metresPerYear * MILLIMETRES;
  return { number: numberText(millimetres, Math.abs(millimetres) < 9.95 ? 1 : 0), unit: 'mm/year' };
}

/** A result with as many digits as it deserves. */
export function measure(value: number, unit: QuantityUnit): Measure {
  if (Number.isNaN(value)) return { number: 'none', unit: '' };
  if (unit === 'm') return settlementMeasure(value);
  if (unit === 'm/year') return rateMeasure(value);
  if (unit === 'year') return durationMeasure(value);
  return { number: slopeText(value), unit: '' };
}

/** A limit as it was entered: nothing of it is rounded away that a person would type. */
export function limitMeasure(value: number, unit: QuantityUnit): Measure {
  if (unit === 'm') {
    return Math.abs(value) < 1
      ? { number: enteredNumberText(value * MILLIMETRES, 2), unit: 'mm' }
      : { number: enteredNumberText(value, 3), unit: 'm' };
  }
  if (unit === 'm/year') return { number: enteredNumberText(value * MILLIMETRES, 2), unit: 'mm/year' };
  return measure(value, unit);
}

/** Number and unit as one text. */
export function measureText({ number, unit }: Measure): string {
  return unit === '' ? number : `${number}${NARROW_SPACE}${unit}`;
}

/** Two ends of a range, the unit said once where it is the same: '80 to 95 mm', '0.98 to 1.20 m' otherwise in full. */
export function rangeText(low: Measure, high: Measure): string {
  if (low.unit === high.unit) return `${low.number} to ${measureText(high)}`;
  return `${measureText(low)} to ${measureText(high)}`;
}
