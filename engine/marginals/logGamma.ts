import { ln } from '../elementary.ts';

/** ½ ln 2π */
const HALF_LN_TWO_PI = 0.9189385332046728;

/**
 * ln Γ(x) = (x − ½) ln x − x + ½ ln 2π + the rest of Stirling's formula; good to about 1e-14 of the largest of
 * its terms.
 *
 * @param x above 0
 */
export function logGamma(x: number): number {
  if (!(x > 0)) throw new RangeError(`logGamma: x must be above 0, got ${x}`);
  return (x - 0.5) * ln(x) - x + HALF_LN_TWO_PI + stirlingRest(x);
}

/**
 * ln Γ(x) − (x − ½) ln x + x − ½ ln 2π, by the asymptotic series from 16 on and stepwise down from there.
 *
 * Source: series as in Abramowitz & Stegun (1964) 6.1.41.
 *
 * @param x above 0
 */
export function stirlingRest(x: number): number {
  let y = x;
  let steps = 0;
  while (y < 16) {
    steps += (y + 0.5) * lnOnePlus(1 / y) - 1;
    y += 1;
  }
  const z = 1 / (y * y);
  const far = 5.952380952380953e-4 - z * (8.417508417508417e-4 - z * 1.9175269175269176e-3);
  const series = 8.333333333333333e-2 - z * (2.777777777777778e-3 - z * (7.936507936507937e-4 - z * far));
  return steps + series / y;
}

/** ln(1 + x) without losing a small x (Kahan's correction of the rounded 1 + x). */
export function lnOnePlus(x: number): number {
  const rounded = 1 + x;
  return rounded === 1 || rounded === Infinity ? x : (ln(rounded) * x) / (rounded - 1);
}
