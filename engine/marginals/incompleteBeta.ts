import { exp, ln } from '../elementary.ts';

const LANCZOS = [
  0.9999999999998099, 676.5203681218851, -1259.1392167224028, 771.3234287776531, -176.6150291621406,
  12.507343278686905, -0.13857109526572012, 9.984369578019572e-6, 1.5056327351493116e-7,
];

/** ln Γ(x) for x > 0, Lanczos (1964) with g = 7 and nine terms; about 1e-15 relative. */
export function logGamma(x: number): number {
  if (!(x > 0)) throw new RangeError(`logGamma: x must be above 0, got ${x}`);
  if (x < 0.5) return logGamma(x + 1) - ln(x);
  const shifted = x - 1;
  let sum = LANCZOS[0];
  for (let k = 1; k < LANCZOS.length; k += 1) sum += LANCZOS[k] / (shifted + k);
  const t = shifted + 7.5;
  return 0.9189385332046728 + (shifted + 0.5) * ln(t) - t + ln(sum);
}

const MOST_TERMS = 10_000;
const SMALLEST = 1e-300;

/**
 * Regularised incomplete beta function I_x(a, b), by its continued fraction (modified Lentz), on the side of
 * the mean where that closes fast.
 *
 * @param x from 0 to 1
 * @param a shape, above 0
 * @param b shape, above 0
 */
export function regularisedIncompleteBeta(x: number, a: number, b: number): number {
  if (!(a > 0 && b > 0))
    throw new RangeError(`regularisedIncompleteBeta: shapes must be above 0, got ${a}, ${b}`);
  if (!(x >= 0 && x <= 1)) throw new RangeError(`regularisedIncompleteBeta: x must be from 0 to 1, got ${x}`);
  if (x === 0 || x === 1) return x;
  if (x > (a + 1) / (a + b + 2)) return 1 - regularisedIncompleteBeta(1 - x, b, a);
  const front = exp(a * ln(x) + b * ln(1 - x) + logGamma(a + b) - logGamma(a) - logGamma(b)) / a;
  return front * continuedFraction(x, a, b);
}

function continuedFraction(x: number, a: number, b: number): number {
  const away = (value: number) => (Math.abs(value) < SMALLEST ? SMALLEST : value);
  let c = 1;
  let d = 1 / away(1 - ((a + b) * x) / (a + 1));
  let fraction = d;
  for (let m = 1; m < MOST_TERMS; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / away(1 + even * d);
    c = away(1 + even / c);
    fraction *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / away(1 + odd * d);
    c = away(1 + odd / c);
    const factor = d * c;
    fraction *= factor;
    if (Math.abs(factor - 1) < 1e-16) break;
  }
  return fraction;
}

/**
 * x with I_x(a, b) = p: Newton's method kept between bounds that close in.
 *
 * @param p from 0 to 1
 */
export function inverseIncompleteBeta(p: number, a: number, b: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`inverseIncompleteBeta: p must be from 0 to 1, got ${p}`);
  if (p === 0 || p === 1) return p;
  const logScale = logGamma(a + b) - logGamma(a) - logGamma(b);
  let [low, high] = [0, 1];
  let x = a / (a + b);
  for (let iteration = 0; iteration < 200; iteration += 1) {
    const miss = regularisedIncompleteBeta(x, a, b) - p;
    if (miss === 0) return x;
    if (miss > 0) high = x;
    else low = x;
    const slope = exp((a - 1) * ln(x) + (b - 1) * ln(1 - x) + logScale);
    const newton = x - miss / slope;
    const next = newton > low && newton < high ? newton : low > 0 ? 0.5 * (low + high) : 0.5 * high;
    if (Math.abs(next - x) <= 1e-15 * x) return next;
    x = next;
  }
  return x;
}
