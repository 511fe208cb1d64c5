import type { QuantityUnit } from './measure.ts';
import { significantNumberText } from './numberText.ts';

/** How a quantity is laid off along an axis: multiplied by `factor`, named `title`. */
export interface AxisUnit {
  readonly factor: number;
  readonly title: string;
}

/** The unit in which an axis that reaches to `largest` (in the quantity's own unit) is easiest to read. */
export function axisUnit(unit: QuantityUnit, largest: number): AxisUnit {
  if (unit === 'm') return largest < 2 ? { factor: 1000, title: 'mm' } : { factor: 1, title: 'm' };
  if (unit === 'm/year') return { factor: 1000, title: 'mm/year' };
  if (unit === 'm/m') return { factor: 1000, title: 'mm per m' };
  return largest < 2 ? { factor: 12, title: 'months' } : { factor: 1, title: 'years' };
}

/** A number beside a tick of an axis. */
export function tickText(value: number): string {
  return significantNumberText(value, 4);
}
