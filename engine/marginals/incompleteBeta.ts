import { exp, ln } from '../elementary.ts';
import { stirlingRest } from './logGamma.ts';

const MOST_TERMS = 100_000;
const MOST_STEPS = 200;
const SMALLEST = 1e-300;

/**
 * Regularised incomplete beta function I_x(a, b), by its continued fraction on the side where that closes fast.
 *
 * @param x from 0 to 1
 * @param a shape, above 0
 * @param b shape, above 0
 */
export function regularisedIncompleteBeta(x: number, a: number, b: number): number {
  refuseShapes('regularisedIncompleteBeta', a, b);
  if (!(x >= 0 && x <= 1)) throw new RangeError(`regularisedIncompleteBeta: x must be from 0 to 1, got ${x}`);
  if (x === 0 || x === 1) return x;
  const scale = weightScale(a, b);
  return x <= turningPoint(a, b) ? lowerShare(x, 1 - x, a, b, scale) : 1 - lowerShare(1 - x, x, b, a, scale);
}

/**
 * x with I_x(a, b) = p, by Newton's method for ln I over ln x, from the nearer end. It is the lower limit of
 * Clopper & Pearson for k of n at (k, n − k + 1).
 *
 * @param p from 0 to 1
 * @param a shape, above 0
 * @param b shape, above 0
 */
export function inverseIncompleteBeta(p: number, a: number, b: number): number {
  return inverseWithComplement(p, a, b)[0];
}

/** x with I_x(a, b) = p, and 1 − x without losing its digits where x is close to 1. */
export function inverseWithComplement(p: number, a: number, b: number): readonly [number, number] {
  refuseShapes('inverseIncompleteBeta', a, b);
  if (!(p >= 0 && p <= 1)) throw new RangeError(`inverseIncompleteBeta: p must be from 0 to 1, got ${p}`);
  if (p === 0 || p === 1) return [p, 1 - p];
  const turn = turningPoint(a, b);
  const scale = weightScale(a, b);
  const atTurn = lowerShare(turn, 1 - turn, a, b, scale);
  if (p <= atTurn) {
    const x = solvedFromBelow(p, a, b, scale, turn, atTurn);
    return [x, 1 - x];
  }
  const y = solvedFromBelow(1 - p, b, a, scale, 1 - turn, 1 - atTurn);
  return [1 - y, y];
}

/**
 * x^a (1 − x)^b / B(a, b), by the deviance of the binomial distribution, which stays good for large shapes.
 *
 * Source: Loader (2000), Fast and accurate computation of binomial probabilities.
 *
 * @param x between 0 and 1
 * @param y 1 − x
 * @param scale what does not depend on x, weightScale(a, b)
 */
export function betaWeight(x: number, y: number, a: number, b: number, scale: number): number {
  return scale * exp(-deviance(a, (a + b) * x) - deviance(b, (a + b) * y));
}

export function weightScale(a: number, b: number): number {
  const rest = stirlingRest(a + b) - stirlingRest(a) - stirlingRest(b);
  return exp(rest) * Math.sqrt(((a / (a + b)) * b) / (2 * Math.PI));
}

/** k ln(k/m) + m − k, by a series where k and m are close. */
function deviance(k: number, m: number): number {
  const apart = k - m;
  if (!(Math.abs(apart) < 0.1 * (k + m))) return k * (ln(k) - ln(m)) - apart;
  const v = apart / (k + m);
  const square = v * v;
  let term = 2 * k * v;
  let total = apart * v;
  for (let odd = 3; ; odd += 2) {
    term *= square;
    const next = total + term / odd;
    if (next === total) return total;
    total = next;
  }
}

function refuseShapes(name: string, a: number, b: number): void {
  if (!(a > 0 && b > 0 && a + b < Infinity)) {
    throw new RangeError(`${name}: a and b must be above 0, got ${a} and ${b}`);
  }
}

/** Up to here the continued fraction closes within about √max(a, b) terms; past it that of (1 − x, b, a) does. */
function turningPoint(a: number, b: number): number {
  return (a + 1) / (a + b + 2);
}

/** I_x(a, b) for x up to the turning point; y is 1 − x. */
function lowerShare(x: number, y: number, a: number, b: number, scale: number): number {
  return (betaWeight(x, y, a, b, scale) / a) * continuedFraction(x, a, b);
}

/** By Lentz's method as in Press et al. (1992), Numerical Recipes, section 6.4. */
function continuedFraction(x: number, a: number, b: number): number {
  let c = 1;
  let d = 1 / awayFromZero(1 - ((a + b) * x) / (a + 1));
  let fraction = d;
  for (let m = 1; m < MOST_TERMS; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / awayFromZero(1 + even * d);
    c = awayFromZero(1 + even / c);
    fraction *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / awayFromZero(1 + odd * d);
    c = awayFromZero(1 + odd / c);
    const factor = d * c;
    fraction *= factor;
    if (Math.abs(factor - 1) < 3e-16) return fraction;
  }
  throw new RangeError(`regularisedIncompleteBeta: the fraction does not close for x ${x}, a ${a}, b ${b}`);
}

function awayFromZero(value: number): number {
  return Math.abs(value) < SMALLEST ? SMALLEST : value;
}

/** x up to `turn`, where I is `atTurn`, with I_x(a, b) = p; d ln I/d ln x = a/((1 − x) · fraction). */
function solvedFromBelow(
  p: number,
  a: number,
  b: number,
  scale: number,
  turn: number,
  atTurn: number,
): number {
  let [low, high] = [0, turn];
  // I grows about as x^a
  let x = turn * exp(Math.max(-700, ln(p / atTurn) / a));
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const fraction = continuedFraction(x, a, b);
    const share = (betaWeight(x, 1 - x, a, b, scale) / a) * fraction;
    const change = ((share > 0 ? ln(p / share) : 700) * (1 - x) * fraction) / a;
    // the next step's error is about a times the square of this one
    if (Math.abs(change) < 1e-10) return x + x * change;
    if (share > p) high = x;
    else low = x;
    const newton = x * exp(Math.max(-50, Math.min(50, change)));
    x = newton > low && newton < high ? newton : low > 0 ? Math.sqrt(low) * Math.sqrt(high) : 0.5 * high;
  }
  return x;
}
