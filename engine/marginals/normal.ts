import { normalCumulative, normalDensity, normalQuantile } from './standardNormal.ts';

/** Normal distribution, cut at `low` and `high`; mean and deviation are those before cutting. */
export interface Normal {
  readonly kind: 'normal';
  readonly mean: number;
  readonly deviation: number;
  /** −Infinity and Infinity where it is not cut. */
  readonly low: number;
  readonly high: number;
}

/** Least share of the uncut distribution that must be left between the limits. */
const LEAST_SHARE = 1e-3;

export function makeNormal(input: {
  readonly mean: number;
  readonly deviation: number;
  readonly low?: number;
  readonly high?: number;
}): Normal | string {
  const { mean, deviation, low = -Infinity, high = Infinity } = input;
  if (!Number.isFinite(mean)) return 'the mean must be a finite number';
  if (!(deviation > 0 && Number.isFinite(deviation))) return 'the deviation must be above 0';
  if (!(low < high)) return 'low must be below high';
  const share = normalCumulative((high - mean) / deviation) - normalCumulative((low - mean) / deviation);
  if (!(share >= LEAST_SHARE)) return 'less than a thousandth of the distribution lies between low and high';
  return { kind: 'normal', mean, deviation, low, high };
}

/** Probabilities of the uncut distribution at the limits. */
function limitShares({ mean, deviation, low, high }: Normal): readonly [number, number] {
  return [normalCumulative((low - mean) / deviation), normalCumulative((high - mean) / deviation)];
}

export function normalQuantileCut(marginal: Normal, p: number): number {
  const { mean, deviation, low, high } = marginal;
  const [below, upTo] = limitShares(marginal);
  const value = mean + deviation * normalQuantile(below + p * (upTo - below));
  return Math.min(high, Math.max(low, value));
}

export function normalCumulativeCut(marginal: Normal, x: number): number {
  const { mean, deviation, low, high } = marginal;
  if (x <= low) return 0;
  if (x >= high) return 1;
  const [below, upTo] = limitShares(marginal);
  return (normalCumulative((x - mean) / deviation) - below) / (upTo - below);
}

export function normalDensityCut(marginal: Normal, x: number): number {
  const { mean, deviation, low, high } = marginal;
  if (x < low || x > high) return 0;
  const [below, upTo] = limitShares(marginal);
  return normalDensity((x - mean) / deviation) / (deviation * (upTo - below));
}

/** Mean and deviation after cutting (Johnson, Kotz & Balakrishnan 1994, section 13.10.1). */
export function normalMoments(marginal: Normal): { readonly mean: number; readonly deviation: number } {
  const { mean, deviation, low, high } = marginal;
  const [a, b] = [(low - mean) / deviation, (high - mean) / deviation];
  const [below, upTo] = limitShares(marginal);
  const share = upTo - below;
  const [densityLow, densityHigh] = [normalDensity(a), normalDensity(b)];
  const shift = (densityLow - densityHigh) / share;
  const atLow = Number.isFinite(a) ? a * densityLow : 0;
  const atHigh = Number.isFinite(b) ? b * densityHigh : 0;
  const variance = 1 + (atLow - atHigh) / share - shift * shift;
  return { mean: mean + deviation * shift, deviation: deviation * Math.sqrt(Math.max(0, variance)) };
}
