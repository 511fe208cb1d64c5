import { exp } from '../elementary.ts';

/**
 * Variance of the mean over a thickness as a share of the variance at a place, Γ², for Markov correlation
 * exp(−2|Δz|/θ) along the depth:
 *
 *     Γ² = (θ/T)² · ½ · (2T/θ − 1 + e^(−2T/θ)),   1 at T = 0
 *
 * Falls from 1 and tends to θ/T. Below T/θ = ½ it is summed as a power series, where the closed form
 * would lose its digits.
 *
 * @param thickness T, m, 0 or more
 * @param scale vertical scale of fluctuation θ, m, above 0
 * @returns Γ², above 0 and at most 1
 * @throws RangeError when a value is out of its range
 * Source: Vanmarcke (1983), Random Fields; Vanmarcke (1977), J. Geotech. Eng. Div. 103(GT11):1227–1246.
 */
export function varianceReduction(thickness: number, scale: number): number {
  if (!(thickness >= 0 && thickness < Infinity)) {
    throw new RangeError(`varianceReduction: thickness must be 0 or more, got ${thickness}`);
  }
  if (!(scale > 0)) throw new RangeError(`varianceReduction: scale must be above 0, got ${scale}`);
  const x = (2 * thickness) / scale;
  return x < 1 ? seriesOfReduction(x) : (2 * (x - 1 + exp(-x))) / (x * x);
}

/** 2 (x − 1 + e^(−x))/x² = 2 Σ (−x)^k/(k + 2)!, to the last digit for 0 ≤ x < 1 in twenty terms. */
function seriesOfReduction(x: number): number {
  let sum = 0;
  let term = 1;
  for (let k = 1; k <= 20; k++) {
    sum += term;
    term *= -x / (k + 2);
  }
  return sum;
}
