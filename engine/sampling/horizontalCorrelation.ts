import { exp } from '../elementary.ts';

/**
 * Correlation of a layer's mean between two points of the section, Markov: exp(−2|Δx|/θh).
 *
 * @param distance Δx, m, of either sign
 * @param scale horizontal scale of fluctuation θh, m, above 0
 * @returns correlation, above 0 (or 0 when it underflows) and at most 1
 * @throws RangeError when distance is NaN or scale is not above 0
 * Source: Vanmarcke (1983), Random Fields.
 */
export function horizontalCorrelation(distance: number, scale: number): number {
  if (!(Math.abs(distance) <= Infinity)) {
    throw new RangeError(`horizontalCorrelation: distance must be a number, got ${distance}`);
  }
  if (!(scale > 0)) throw new RangeError(`horizontalCorrelation: scale must be above 0, got ${scale}`);
  return exp((-2 * Math.abs(distance)) / scale);
}
