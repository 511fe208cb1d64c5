/*
 * Elementary functions that give the same bytes on every machine, as those of Math do not: written with + − × ÷,
 * floor, abs and the bits of a number, each within 1 unit in the last place of the exact value.
 */

const WHOLE = Float64Array.of(1);
/** The same eight bytes as two words; which of them is the upper one depends on the machine. */
const WORDS = new Int32Array(WHOLE.buffer);
const UPPER = WORDS[1] === 0 ? 0 : 1;
const SMALLEST_NORMAL = 2.2250738585072014e-308;
const LIFT = 18014398509481984; // 2^54

/** 2^(i − 1023) at place i, from 2^−1023 (subnormal) to 2^1023, by doubling: each is exact. */
const POWERS_OF_TWO = new Float64Array(2047);
POWERS_OF_TWO[1023] = 1;
for (let i = 1024; i < 2047; i += 1) POWERS_OF_TWO[i] = POWERS_OF_TWO[i - 1] * 2;
for (let i = 1022; i >= 0; i -= 1) POWERS_OF_TWO[i] = POWERS_OF_TWO[i + 1] * 0.5;

/** 2^(j/32), j = 0 … 31, each to 53 bits and followed by what is then left. */
const ROOTS_OF_TWO = Float64Array.from([
  1, 0, 1.0218971486541166, 5.109225028973444e-17, 1.0442737824274138, 8.551889705537965e-17,
  1.0671404006768237, -7.899853966841582e-17, 1.0905077326652577, -3.046782079812471e-17, 1.1143867425958924,
  1.0410278456845571e-16, 1.1387886347566916, 8.912812676025408e-17, 1.1637248587775775,
  3.8292048369240935e-17, 1.189207115002721, 3.982015231465646e-17, 1.215247359980469, -7.712630692681488e-17,
  1.241857812073484, 4.658027591836937e-17, 1.2690509571917332, 2.667932131342186e-18, 1.2968395546510096,
  2.5382502794888315e-17, 1.3252366431597413, -2.8587312100388614e-17, 1.3542555469368927,
  7.70094837980299e-17, 1.383909881963832, -6.770511658794786e-17, 1.4142135623730951, -9.667293313452913e-17,
  1.4451808069770467, -3.0237581349939873e-17, 1.4768261459394993, -3.483994556892796e-17, 1.5091644275934228,
  -1.016455327754295e-16, 1.5422108254079407, 7.949834809697621e-17, 1.5759808451078865,
  -1.0136916471278304e-17, 1.6104903319492543, 2.4707192569797888e-18, 1.645755478153965,
  -1.0125679913673774e-16, 1.681792830507429, 8.199010020581497e-17, 1.718619298122478,
  -1.851380418263111e-17, 1.7562521603732995, 2.960140695448873e-17, 1.7947090750031072,
  1.8227458427912087e-17, 1.8340080864093424, 3.283107224245627e-17, 1.8741676341103, -6.122763413004143e-17,
  1.9152065613971474, -1.0619946056195963e-16, 1.9571441241754002, 8.960767791036668e-17,
]);

/**
 * e^x: with k the whole number nearest to 32 x/ln 2 and r = x − k ln 2/32, e^x = 2^(k/32) · e^r, the first from a
 * table, the second a Taylor sum (|r| < 0.011). Infinity above 709.78, 0 below −745.13.
 *
 * Source: the table method of Tang (1989), Table-driven implementation of the exponential function, ACM TOMS 15.
 */
export function exp(x: number): number {
  return exponential(x, 0);
}

/** e^(x + left), where left is what rounding left of x. */
function exponential(x: number, left: number): number {
  const k = Math.floor(46.16624130844683 * x + 0.5);
  const r = x - k * 0.021660849392446835 + (left - k * 5.145609244655338e-14);
  const square = r * r;
  const fourth = 0.041666666666666664 + r * 0.008333333333333333 + square * 0.001388888888888889;
  const gain = r + square * (0.5 + r * 0.16666666666666666 + square * fourth);
  const place = 2 * (k & 31);
  const root = ROOTS_OF_TWO[place];
  const mantissa = root + (ROOTS_OF_TWO[place + 1] + root * gain);
  if (x > -708 && x < 709) return mantissa * POWERS_OF_TWO[(k >> 5) + 1023];
  if (x >= 709) return x > 710 ? Infinity : mantissa * POWERS_OF_TWO[(k >> 5) + 1022] * 2;
  // a subnormal result is rounded once, in the last product
  if (x <= -708) return x < -746 ? 0 : mantissa * POWERS_OF_TWO[(k >> 5) + 1123] * POWERS_OF_TWO[923];
  return NaN;
}

/**
 * Natural logarithm: with x = 2^k m, m between √½ and √2, s = (m − 1)/(m + 1), ln x = k ln 2 + 2 artanh s.
 * ln 0 = −Infinity; NaN for what is negative.
 *
 * Source: coefficients of e_log.c, fdlibm (Sun Microsystems 1993, freely granted).
 */
export function ln(x: number): number {
  let extra = 0;
  if (!(x >= SMALLEST_NORMAL && x < Infinity)) {
    if (!(x > 0 && x < Infinity)) return x === 0 ? -Infinity : x > 0 ? x : NaN;
    x *= LIFT;
    extra = -54;
  }
  WHOLE[0] = x;
  const power = (WORDS[UPPER] - 0x3fe6a09e) >> 20;
  const k = power + extra;
  const f = x * POWERS_OF_TWO[1023 - power] - 1;
  const s = f / (2 + f);
  const z = s * s;
  const w = z * z;
  const odd = w * (0.3999999999940942 + w * (0.22222198432149784 + w * 0.15313837699209373));
  const far = 0.2857142874366239 + w * (0.1818357216161805 + w * 0.14798198605116586);
  const even = z * (0.6666666666666735 + w * far);
  const half = 0.5 * f * f;
  return k * 0.6931471803691238 - (half - (s * (half + (odd + even)) + k * 1.9082149292705877e-10) - f);
}

/** log x, base 10; outside 0 to Infinity as ln. */
export function log10(x: number): number {
  if (!(x > 0 && x < Infinity)) return ln(x);
  return times(lnInTwo(x), REST[0], 0.4342944819032518, 1.098319650216765e-17);
}

/** 10^x. Infinity above 308.25, 0 below −323.6. */
export function exp10(x: number): number {
  if (!(x > -330 && x < 310)) return x >= 310 ? Infinity : x <= -330 ? 0 : NaN;
  return exponential(times(x, 0, 2.302585092994046, -2.1707562233822494e-16), REST[0]);
}

/**
 * x^y, for x of 0 or more: 0^0 = 1, 0^y = Infinity for y < 0.
 *
 * @throws RangeError for a negative base, whatever the exponent, and for what is not finite
 */
export function pow(x: number, y: number): number {
  if (!(x >= 0 && x < Infinity && Math.abs(y) < Infinity)) {
    throw new RangeError(`pow: x must be finite and 0 or more, y finite, got ${x} and ${y}`);
  }
  if (y === 0 || x === 1) return 1;
  if (x === 0) return y > 0 ? 0 : Infinity;
  const logarithm = lnInTwo(x);
  const size = logarithm * y;
  if (!(size > -750 && size < 710)) return size > 0 ? Infinity : 0;
  return exponential(times(logarithm, REST[0], y, 0), REST[0]);
}

/** In its only place: what rounding left of the last result of the next four functions. */
const REST = new Float64Array(1);

/** a + b in two parts (Knuth 1969, The Art of Computer Programming 2, section 4.2.2). */
function sum(a: number, b: number): number {
  const total = a + b;
  const part = total - a;
  REST[0] = a - (total - part) + (b - part);
  return total;
}

/** (a + aRest) + (b + bRest) in two parts, where |a| ≥ |b| or a = 0. */
function plus(a: number, aRest: number, b: number, bRest: number): number {
  const total = a + b;
  const left = b - (total - a) + (aRest + bRest);
  const rounded = total + left;
  REST[0] = left - (rounded - total);
  return rounded;
}

/** (a + aRest)(b + bRest) in two parts (Dekker 1971, A floating-point technique, Numerische Mathematik 18). */
function times(a: number, aRest: number, b: number, bRest: number): number {
  const product = a * b;
  const aHead = 134217729 * a - (134217729 * a - a);
  const bHead = 134217729 * b - (134217729 * b - b);
  const aTail = a - aHead;
  const bTail = b - bHead;
  const error = aTail * bTail - (product - aHead * bHead - aTail * bHead - aHead * bTail);
  return plus(product, error, a * bRest + aRest * b, 0);
}

/** ln x in two parts, good to about 2^−65, as 2 (s + s³/3 + s⁵/5 + …); x above 0 and finite. */
function lnInTwo(x: number): number {
  const normal = x < SMALLEST_NORMAL ? x * LIFT : x;
  WHOLE[0] = normal;
  const power = (WORDS[UPPER] - 0x3fe6a09e) >> 20;
  const k = power - (normal === x ? 0 : 54);
  const m = normal * POWERS_OF_TWO[1023 - power];
  const below = m + 1;
  const s = (m - 1) / below;
  const back = times(s, 0, below, m - (below - 1));
  const sRest = (m - 1 - back - REST[0]) / below;
  const z = times(s, sRest, s, sRest);
  const zRest = REST[0];
  let far = 0; // z/5 + z²/7 + …
  for (let i = 0; i < ODD_INVERSES.length; i += 1) far = (far + ODD_INVERSES[i]) * z;
  let series = plus(0.3333333333333333, 1.850371707708594e-17, far, 0);
  series = times(series, REST[0], z, zRest);
  series = times(series, REST[0], 2 * s, 2 * sRest);
  series = plus(2 * s, 2 * sRest, series, REST[0]);
  // ln 2 in two parts, of which the first is exact times k
  return plus(k * 0.6931471805598903, k * 5.497923018708371e-14, series, REST[0]);
}

/** 1/25, 1/23 … 1/5 */
const ODD_INVERSES = Float64Array.from({ length: 11 }, (_, i) => 1 / (25 - 2 * i));

/**
 * Arc tangent, radians: x taken to the nearest of 0, ½, 1, 3/2 and ∞ by the addition formula, then a polynomial.
 *
 * Source: coefficients of s_atan.c, fdlibm (Sun Microsystems 1993, freely granted).
 */
export function atan(x: number): number {
  const size = Math.abs(x);
  if (size < 0.4375) return size < 1e-9 ? x : x - x * arcSeries(x);
  return x < 0 ? -arcBeyond(size) : arcBeyond(size);
}

function arcBeyond(x: number): number {
  if (x < 0.6875) return arcFrom((2 * x - 1) / (2 + x), 0.4636476090008061, 2.2698777452961687e-17);
  if (x < 1.1875) return arcFrom((x - 1) / (x + 1), 0.7853981633974483, 3.061616997868383e-17);
  if (x < 2.4375) return arcFrom((x - 1.5) / (1 + 1.5 * x), 0.982793723247329, 1.3903311031230998e-17);
  return arcFrom(-1 / x, 1.5707963267948966, 6.123233995736766e-17);
}

function arcFrom(t: number, near: number, nearRest: number): number {
  return near - (t * arcSeries(t) - nearRest - t);
}

/** 1 − atan(t)/t for |t| below 7/16. */
function arcSeries(t: number): number {
  const z = t * t;
  const w = z * z;
  const oddFar =
    0.09090887133436507 + w * (0.06661073137387531 + w * (0.049768779946159324 + w * 0.016285820115365782));
  const odd = z * (0.3333333333333293 + w * (0.14285714272503466 + w * oddFar));
  const evenFar = -0.0769187620504483 + w * (-0.058335701337905735 + w * -0.036531572744216916);
  return odd + w * (-0.19999999999876483 + w * (-0.11111110405462356 + w * evenFar));
}

/** Sine of an angle in radians. Throws RangeError beyond −100,000 to 100,000. */
export function sin(x: number): number {
  return wave('sin', x, 0);
}

/** Cosine of an angle in radians. Throws RangeError beyond −100,000 to 100,000. */
export function cos(x: number): number {
  return wave('cos', x, 1);
}

/** sin(x + quarters · π/2); π/2 in four parts, of which three are exact times n (Cody & Waite 1980). */
function wave(name: string, x: number, quarters: number): number {
  if (!(Math.abs(x) <= 1e5)) throw new RangeError(`${name}: x must be from -100,000 to 100,000, got ${x}`);
  const n = Math.floor(x * 0.6366197723675814 + 0.5);
  const first = sum(x - n * 1.5707963267341256, n * -6.077100506303966e-11);
  const firstRest = REST[0];
  const second = sum(first, n * -2.0222662487111665e-21);
  const angle = sum(second, firstRest + REST[0] - n * 8.4784276603689e-32);
  const value = (n + quarters) & 1 ? cosineNearZero(angle, REST[0]) : sineNearZero(angle, REST[0]);
  return (n + quarters) & 2 ? -value : value;
}

/** sin(t + left), |t| ≤ π/4; coefficients of k_sin.c, fdlibm. */
function sineNearZero(t: number, left: number): number {
  const z = t * t;
  const far = 2.7557313707070068e-6 + z * (-2.5050760253406863e-8 + z * 1.58969099521155e-10);
  const series = 0.00833333333332249 + z * (-0.00019841269829857949 + z * far);
  const cube = z * t;
  return t - (z * (0.5 * left - cube * series) - left - cube * -0.16666666666666632);
}

/** cos(t + left), |t| ≤ π/4; coefficients of k_cos.c, fdlibm. */
function cosineNearZero(t: number, left: number): number {
  const z = t * t;
  const far = -2.7557314351390663e-7 + z * (2.087572321298175e-9 + z * -1.1359647557788195e-11);
  const series =
    z * (0.0416666666666666 + z * (-0.001388888888887411 + z * (2.480158728947673e-5 + z * far)));
  const half = 0.5 * z;
  const most = 1 - half;
  return most + (1 - most - half + (z * series - t * left));
}
