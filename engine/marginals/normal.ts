import { normalCumulative, normalDensity, normalQuantile } from './standardNormal.ts';
import { momentsBetween } from './normalBetween.ts';

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
  const marginal: Normal = { kind: 'normal', mean, deviation, low, high };
  if (!(shareLeft(marginal) >= LEAST_SHARE)) {
    return 'less than a thousandth of the distribution lies between low and high';
  }
  return marginal;
}

/** Limits in scores, a below b, seen from the side of the longer lower tail: no probability near 1 loses digits. */
interface Facing {
  /** 1 as entered, −1 turned about the mean. */
  readonly sign: 1 | -1;
  readonly a: number;
  readonly b: number;
  /** Φ(a) and Φ(b) − Φ(a). */
  readonly below: number;
  readonly share: number;
}

function facing({ mean, deviation, low, high }: Normal): Facing {
  const [lower, upper] = [(low - mean) / deviation, (high - mean) / deviation];
  const isTurned = lower + upper > 0;
  const [a, b] = isTurned ? [-upper, -lower] : [lower, upper];
  const below = normalCumulative(a);
  return { sign: isTurned ? -1 : 1, a, b, below, share: normalCumulative(b) - below };
}

function shareLeft(marginal: Normal): number {
  return facing(marginal).share;
}

export function normalQuantileCut(marginal: Normal, p: number): number {
  const { mean, deviation, low, high } = marginal;
  if (p === 0) return low;
  if (p === 1) return high;
  const { sign, below, share } = facing(marginal);
  const score = sign * normalQuantile(Math.min(1, below + (sign > 0 ? p : 1 - p) * share));
  return Math.min(high, Math.max(low, mean + deviation * score));
}

export function normalCumulativeCut(marginal: Normal, x: number): number {
  const { mean, deviation, low, high } = marginal;
  if (x <= low) return 0;
  if (x >= high) return 1;
  const { sign, below, share } = facing(marginal);
  const upTo = Math.min(1, Math.max(0, (normalCumulative((sign * (x - mean)) / deviation) - below) / share));
  return sign > 0 ? upTo : 1 - upTo;
}

export function normalDensityCut(marginal: Normal, x: number): number {
  const { mean, deviation, low, high } = marginal;
  if (x < low || x > high) return 0;
  return normalDensity((x - mean) / deviation) / (deviation * shareLeft(marginal));
}

/** Mean and deviation after cutting. */
export function normalMoments(marginal: Normal): { readonly mean: number; readonly deviation: number } {
  const { sign, a, b, share } = facing(marginal);
  const between = momentsBetween(a, b, share);
  return {
    mean: marginal.mean + sign * marginal.deviation * between.mean,
    deviation: marginal.deviation * between.deviation,
  };
}
