import type { Thickness } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';

/**
 * Thickness at x from thicknesses at the borings: straight between them and level beyond the outermost.
 *
 * @param x position along the section, m
 * @param borings rising positions of the borings, m
 * @param thickness thickness at each, m
 * @returns thickness at x, m
 */
export function thicknessBetweenBorings(
  x: number,
  borings: readonly number[],
  thickness: readonly number[],
): number {
  const last = borings.length - 1;
  if (x <= borings[0]) return thickness[0];
  if (x >= borings[last]) return thickness[last];
  let right = 1;
  while (borings[right] < x) right += 1;
  const share = (x - borings[right - 1]) / (borings[right] - borings[right - 1]);
  return thickness[right - 1] + share * (thickness[right] - thickness[right - 1]);
}

/**
 * Thickness of a layer at x for a given value of its uncertain number (the thickness itself where it is
 * even, the factor on the borings' thicknesses where it is not).
 */
export function thicknessAt(thickness: Thickness, x: number, value: number): number {
  return thickness.kind === 'even'
    ? value
    : value * thicknessBetweenBorings(x, thickness.x, thickness.thickness);
}

/** The uncertain number behind a thickness. */
export function thicknessNumber(thickness: Thickness): UncertainNumber {
  return thickness.kind === 'even' ? thickness.thickness : thickness.factor;
}
