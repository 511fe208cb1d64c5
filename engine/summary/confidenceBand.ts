import { sampleStandardDeviation } from 'simple-statistics';
import { inverseIncompleteBeta } from '../marginals/incompleteBeta.ts';
import { studentTQuantile } from '../marginals/studentT.ts';
import type { Estimate } from './summary.ts';

/** Confidence of every band. */
export const CONFIDENCE = 0.9;
/** Replicates that must stand behind a band. */
export const LEAST_REPLICATES = 10;
/** Realisations beyond a value below which the exact binomial interval joins in. */
export const FEW_BEYOND = 50;

/**
 * Half-width of the band of a mean over independent replicates: t(R − 1) · sd/√R at 90 %.
 *
 * @param values one of each replicate
 * @returns NaN for fewer than 10 replicates
 */
export function halfWidth(values: ArrayLike<number>): number {
  const replicates = values.length;
  if (replicates < LEAST_REPLICATES) return NaN;
  const deviation = sampleStandardDeviation(Array.isArray(values) ? values : Array.from(values));
  return (tQuantile(replicates - 1) * deviation) / Math.sqrt(replicates);
}

const quantiles = new Map<number, number>();
function tQuantile(degreesOfFreedom: number): number {
  const known = quantiles.get(degreesOfFreedom);
  if (known !== undefined) return known;
  const quantile = studentTQuantile(0.5 + 0.5 * CONFIDENCE, degreesOfFreedom);
  quantiles.set(degreesOfFreedom, quantile);
  return quantile;
}

/** The tails of all curves of a study share the same few intervals. */
const intervals = new Map<string, readonly [low: number, high: number]>();
const MOST_KEPT = 10_000;

/**
 * Exact binomial interval of a share at 90 %: the beta quantiles of Clopper & Pearson (1934).
 *
 * @param above realisations that pass, from 0 to `total`
 * @param total all realisations, 1 or more
 * @throws where `above` or `total` is outside its range
 */
export function binomialInterval(above: number, total: number): readonly [low: number, high: number] {
  const key = `${above} ${total}`;
  const known = intervals.get(key);
  if (known !== undefined) return known;
  if (!(total >= 1)) throw new RangeError(`binomialInterval: total must be 1 or more, got ${total}`);
  if (!(above >= 0 && above <= total)) {
    throw new RangeError(`binomialInterval: above must be from 0 to ${total}, got ${above}`);
  }
  const tail = 0.5 * (1 - CONFIDENCE);
  const low = above === 0 ? 0 : inverseIncompleteBeta(tail, above, total - above + 1);
  const high = above === total ? 1 : inverseIncompleteBeta(1 - tail, above + 1, total - above);
  if (intervals.size >= MOST_KEPT) intervals.clear();
  intervals.set(key, [low, high]);
  return [low, high];
}

/**
 * Share of all realisations that pass, with its band: from the spread between replicates, and the wider of it
 * and the exact binomial interval where fewer than 50 realisations lie on either side.
 *
 * @param aboveOfReplicates realisations that pass, in each replicate
 * @param countOfReplicates realisations of each replicate
 */
export function bandOfShare(
  aboveOfReplicates: ArrayLike<number>,
  countOfReplicates: ArrayLike<number>,
): Estimate {
  let above = 0;
  let total = 0;
  const shares: number[] = [];
  for (let i = 0; i < aboveOfReplicates.length; i += 1) {
    above += aboveOfReplicates[i];
    total += countOfReplicates[i];
    shares.push(aboveOfReplicates[i] / countOfReplicates[i]);
  }
  const value = above / total;
  const half = halfWidth(shares);
  if (Number.isNaN(half)) return { value, low: NaN, high: NaN };
  let [low, high] = [value - half, value + half];
  if (Math.min(above, total - above) < FEW_BEYOND) {
    const [exactLow, exactHigh] = binomialInterval(above, total);
    [low, high] = [Math.min(low, exactLow), Math.max(high, exactHigh)];
  }
  return { value, low: Math.max(0, low), high: Math.min(1, high) };
}
