/**
 * Slow elementary functions in two parts of 53 bits each (good to 1e-22 and better), as the yardstick for a million
 * arguments. They share no coefficient and no reduction with the engine's, start from nothing but Taylor's sums
 * and Newton's steps, and are themselves held against decimal.js.
 */
export type Two = readonly [number, number];

const sum = (a: number, b: number): Two => {
  const total = a + b;
  const part = total - a;
  return [total, a - (total - part) + (b - part)];
};

const product = (a: number, b: number): Two => {
  const split = (value: number) => {
    const wide = 134217729 * value;
    const head = wide - (wide - value);
    return [head, value - head];
  };
  const [aHead, aTail] = split(a);
  const [bHead, bTail] = split(b);
  const total = a * b;
  return [total, aTail * bTail - (total - aHead * bHead - aTail * bHead - aHead * bTail)];
};

export const plus = (a: Two, b: Two): Two => {
  const [high, error] = sum(a[0], b[0]);
  const [low, lowError] = sum(a[1], b[1]);
  const [middle, middleError] = sum(high, error + low);
  return sum(middle, middleError + lowError);
};

export const times = (a: Two, b: Two): Two => {
  const [high, error] = product(a[0], b[0]);
  return sum(high, error + (a[0] * b[1] + a[1] * b[0]));
};

const minus = (a: Two, b: Two): Two => plus(a, [-b[0], -b[1]]);

const over = (a: Two, b: Two): Two => {
  const first = a[0] / b[0];
  const left = minus(a, times(b, [first, 0]));
  const second = left[0] / b[0];
  const last = minus(left, times(b, [second, 0]));
  return plus(sum(first, second), [last[0] / b[0], 0]);
};

const scaled = (a: Two, factor: number): Two => [a[0] * factor, a[1] * factor];

/** 1/k! in two parts. */
const INVERSE_FACTORIALS: readonly Two[] = (() => {
  const list: Two[] = [[1, 0]];
  for (let k = 1; k <= 28; k += 1) list.push(over(list[k - 1], [k, 0]));
  return list;
})();

/** ln 2 and ln 10 and π/2 by their first digits: rounded parts of the printed decimals. */
const LN_2: Two = [0.6931471805599453, 2.3190468138462996e-17];
const LN_10: Two = [2.302585092994046, -2.1707562233822494e-16];
const HALF_PI: readonly [number, number, number] = [
  1.5707963267948966, 6.123233995736766e-17, -1.4973849048591698e-33,
];

/** e^x; |x| < 745, and a result below 1e-290 loses digits of its second part. */
export function expTwo(x: Two): Two {
  const k = Math.round(x[0] / LN_2[0]);
  const r = scaled(minus(x, times(LN_2, [k, 0])), 1 / 16);
  let series: Two = [0, 0];
  for (let term = 20; term >= 1; term -= 1) series = times(r, plus(INVERSE_FACTORIALS[term], series));
  // e^(2r) − 1 = (e^r − 1)² + 2 (e^r − 1)
  for (let doubling = 0; doubling < 4; doubling += 1) series = plus(times(series, series), scaled(series, 2));
  const half = Math.trunc(k / 2);
  return scaled(scaled(plus([1, 0], series), 2 ** half), 2 ** (k - half));
}

/** ln x by one step of Halley's rule from Math.log. */
export function lnTwo(x: number): Two {
  const guess = Math.log(x);
  const grown = expTwo([-guess, 0]);
  const ratio = times([x, 0], grown);
  const step = over(scaled(minus(ratio, [1, 0]), 2), plus(ratio, [1, 0]));
  return plus([guess, 0], step);
}

export const log10Two = (x: number): Two => over(lnTwo(x), LN_10);

export const exp10Two = (x: number): Two => expTwo(times(LN_10, [x, 0]));

export const powTwo = (x: number, y: number): Two => expTwo(times(lnTwo(x), [y, 0]));

/** Sine and cosine of x, |x| ≤ 1e5. */
export function sinCosTwo(x: Two): readonly [Two, Two] {
  const n = Math.round(x[0] / HALF_PI[0]);
  let r = plus(x, scaled(product(n, HALF_PI[0]), -1));
  r = plus(r, scaled(product(n, HALF_PI[1]), -1));
  r = plus(r, scaled(product(n, HALF_PI[2]), -1));
  const square = times(r, r);
  let sine: Two = [0, 0];
  let cosine: Two = [0, 0];
  for (let k = 28; k >= 2; k -= 2) {
    const sign = k % 4 === 0 ? 1 : -1;
    cosine = times(square, plus(scaled(INVERSE_FACTORIALS[k], sign), cosine));
    sine = times(square, plus(scaled(INVERSE_FACTORIALS[k - 1], -sign), sine));
  }
  // the sine's sum ran over the odd powers from r¹ on, each with one square too many
  const s = over(times(r, sine), square);
  const c = plus([1, 0], cosine);
  const flip = (value: Two): Two => scaled(value, -1);
  switch (((n % 4) + 4) % 4) {
    case 0:
      return [s, c];
    case 1:
      return [c, flip(s)];
    case 2:
      return [flip(s), flip(c)];
    default:
      return [flip(c), s];
  }
}

/** atan x by one step from Math.atan: tan(atan x − y) = (x cos y − sin y)/(cos y + x sin y). */
export function atanTwo(x: number): Two {
  const guess = Math.atan(x);
  const [sine, cosine] = sinCosTwo([guess, 0]);
  const above = minus(times([x, 0], cosine), sine);
  const below = plus(cosine, times([x, 0], sine));
  return plus([guess, 0], over(above, below));
}

/** Distance of a result from the exact value in units in the last place of the latter. */
export function unitsInLastPlace(result: number, exact: Two): number {
  if (result === exact[0] && exact[1] === 0) return 0;
  const size = Math.abs(exact[0]);
  let exponent = Math.floor(Math.log2(size));
  if (2 ** exponent > size) exponent -= 1;
  if (2 ** (exponent + 1) <= size) exponent += 1;
  const unit = 2 ** Math.max(exponent - 52, -1074);
  return Math.abs(result - exact[0] - exact[1]) / unit;
}
