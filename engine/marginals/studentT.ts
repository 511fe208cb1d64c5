import { inverseWithComplement } from './incompleteBeta.ts';

/**
 * Quantile of Student's t distribution, by P(|T| > t) = I_(ν/(ν+t²))(ν/2, ½).
 *
 * @param p probability, above 0 and below 1
 * @param degreesOfFreedom ν, above 0
 */
export function studentTQuantile(p: number, degreesOfFreedom: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`studentTQuantile: p must lie between 0 and 1, got ${p}`);
  if (!(degreesOfFreedom > 0)) {
    throw new RangeError(`studentTQuantile: degreesOfFreedom must be above 0, got ${degreesOfFreedom}`);
  }
  if (p === 0.5) return 0;
  const bothTails = 2 * Math.min(p, 1 - p);
  const [x, y] = inverseWithComplement(bothTails, 0.5 * degreesOfFreedom, 0.5);
  const t = Math.sqrt((degreesOfFreedom * y) / x);
  return p < 0.5 ? -t : t;
}
