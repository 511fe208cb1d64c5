/*
 * exp, ln, pow, atan, sin and cos from exact operations alone, because those of `Math` differ in the last
 * digit between Node and browsers. Each is within one unit in the last place. Reductions and polynomials are
 * those of Sun's freely distributable library (fdlibm 5.3, 1993); the powers of two come from tables, which is
 * faster in JavaScript than taking numbers apart.
 */

const LN2_HIGH = 6.9314718036912382e-1;
const LN2_LOW = 1.9082149292705877e-10;
const SQRT_2 = 1.4142135623730951;

const bits = new Float64Array(1);
const words = new Uint32Array(bits.buffer);
const HIGH = new Uint8Array(new Uint32Array([1]).buffer)[0] === 1 ? 1 : 0;

const ZERO_POWER = 1022;
/** 2^k for −1022 ≤ k ≤ 1023, at k + 1022. */
const POWERS_OF_TWO = powersOfTwo();
/** 2^−k for 0 ≤ k ≤ 31. */
const INVERSE_POWERS = Float64Array.from({ length: 32 }, (_, k) => POWERS_OF_TWO[ZERO_POWER - k]);

function powersOfTwo(): Float64Array {
  const powers = new Float64Array(2046);
  powers[ZERO_POWER] = 1;
  for (let k = 1; k <= 1023; k += 1) powers[ZERO_POWER + k] = 2 * powers[ZERO_POWER + k - 1];
  for (let k = 1; k <= 1022; k += 1) powers[ZERO_POWER - k] = 0.5 * powers[ZERO_POWER - k + 1];
  return powers;
}

/** x · 2^k, rounded once, for −1100 ≤ k ≤ 1024. */
function scaled(x: number, k: number): number {
  if (k < -1022) return x * POWERS_OF_TWO[ZERO_POWER + k + 100] * POWERS_OF_TWO[ZERO_POWER - 100];
  return k > 1023 ? x * POWERS_OF_TWO[ZERO_POWER + 1023] * 2 : x * POWERS_OF_TWO[ZERO_POWER + k];
}

/** x without the lower 32 bits of its mantissa. */
function upperPart(x: number): number {
  bits[0] = x;
  words[1 - HIGH] = 0;
  return bits[0];
}

/** Natural logarithm; −Infinity at 0, NaN below. */
export function ln(x: number): number {
  let k = 0;
  let m = 0;
  if (x >= 1 && x < 2147483648) {
    // the exponent of a number that has a whole part of up to 31 bits
    k = 31 - Math.clz32(x | 0);
    m = x * INVERSE_POWERS[k];
  } else {
    if (!(x > 0)) return x === 0 ? -Infinity : NaN;
    if (x === Infinity) return x;
    const normal = x < 2.2250738585072014e-308 ? x * POWERS_OF_TWO[ZERO_POWER + 54] : x;
    bits[0] = normal;
    k = (words[HIGH] >>> 20) - 1023 - (normal === x ? 0 : 54);
    words[HIGH] = (words[HIGH] & 0xfffff) | 0x3ff00000;
    m = bits[0];
  }
  if (m > SQRT_2) {
    m *= 0.5;
    k += 1;
  }
  const f = m - 1;
  const s = f / (2 + f);
  const z = s * s;
  const w = z * z;
  const even = w * (3.9999999999409419e-1 + w * (2.222219843214978e-1 + w * 1.5313837699209373e-1));
  const odd =
    z *
    (6.666666666666735e-1 +
      w * (2.8571428743662391e-1 + w * (1.818357216161805e-1 + w * 1.4798198605116586e-1)));
  const half = 0.5 * f * f;
  return k * LN2_HIGH - (half - (s * (half + even + odd) + k * LN2_LOW) - f);
}

/** Exponential; 0 below −745.2, Infinity above 709.8. */
export function exp(x: number): number {
  if (!(x < 709.7827128933841)) return x > 0 ? Infinity : NaN;
  if (x < -745.1332191019412) return 0;
  const k = Math.floor(1.4426950408889634 * x + 0.5);
  const high = x - k * LN2_HIGH;
  const low = k * LN2_LOW;
  const r = high - low;
  const c = r - remainder(r * r);
  // 1 + high with what its rounding loses
  const sum = 1 + high;
  const y = sum + (high - (sum - 1) + ((r * c) / (2 - c) - low));
  return k >= -1022 && k <= 1023 ? y * POWERS_OF_TWO[ZERO_POWER + k] : scaled(y, k);
}

/** r (e^r + 1)/(e^r − 1) − 2 as a polynomial in r². */
function remainder(square: number): number {
  return (
    square *
    (1.6666666666666602e-1 +
      square *
        (-2.7777777777015593e-3 +
          square * (6.6137563214379344e-5 + square * (-1.6533902205465252e-6 + square * 4.1381367970572385e-8))))
  );
}

/**
 * x to the power y for x of 0 or more, by log2 x in two pieces.
 *
 * @throws RangeError for a negative base, or when either is not a number
 */
export function pow(x: number, y: number): number {
  if (!(x >= 0 && x < Infinity && Math.abs(y) < Infinity)) {
    throw new RangeError(`pow: x must be finite and 0 or more, y finite, got ${x} and ${y}`);
  }
  if (y === 0 || x === 1) return 1;
  if (x === 0) return y > 0 ? 0 : Infinity;
  if (y === 1) return x;
  const [high, low] = logarithmToBase2(x);
  const yHigh = upperPart(y);
  const pLow = (y - yHigh) * high + y * low;
  const pHigh = yHigh * high;
  const z = pLow + pHigh;
  if (z >= 1024) return Infinity;
  if (z <= -1076) return 0;
  return powerOf2(pHigh, pLow);
}

/** 2^(high + low). */
function powerOf2(high: number, low: number): number {
  const n = Math.floor(high + low + 0.5);
  const rest = high - n;
  const t = upperPart(rest + low);
  const u = t * 6.931471824645996e-1;
  const v = (low - (t - rest)) * 6.931471805599453e-1 + t * -1.904654299957768e-9;
  const z = u + v;
  const w = v - (z - u);
  const c = z - remainder(z * z);
  const sum = 1 + z;
  return scaled(sum + (z - (sum - 1) - ((z * c) / (c - 2) - (w + z * w))), n);
}

/** log2 x in two pieces, together good to about 70 bits; the first has 21 bits in its mantissa. */
function logarithmToBase2(x: number): readonly [number, number] {
  const normal = x < 2.2250738585072014e-308 ? x * POWERS_OF_TWO[ZERO_POWER + 54] : x;
  bits[0] = normal;
  let n = (words[HIGH] >>> 20) - 1023 - (normal === x ? 0 : 54);
  const mantissa = words[HIGH] & 0xfffff;
  let upper = mantissa | 0x3ff00000;
  const isMiddle = mantissa > 0x3988e && mantissa < 0xbb67a;
  if (mantissa >= 0xbb67a) {
    n += 1;
    upper -= 0x100000;
  }
  words[HIGH] = upper;
  const a = bits[0];
  const base = isMiddle ? 1.5 : 1;
  const u = a - base;
  const v = 1 / (a + base);
  const s = u * v;
  const sHigh = upperPart(s);
  bits[0] = 0;
  words[HIGH] = ((upper >> 1) | 0x20000000) + 0x80000 + (isMiddle ? 0x40000 : 0);
  const tHigh = bits[0];
  const tLow = a - (tHigh - base);
  const sLow = v * (u - sHigh * tHigh - sHigh * tLow);
  const s2 = s * s;
  const series =
    s2 *
      s2 *
      (5.999999999999946e-1 +
        s2 *
          (4.285714285785502e-1 +
            s2 *
              (3.3333332981837743e-1 +
                s2 * (2.72728123808534e-1 + s2 * (2.3066074577556175e-1 + s2 * 2.0697501780033842e-1))))) +
    sLow * (sHigh + s);
  const square = sHigh * sHigh;
  const three = upperPart(3 + square + series);
  const threeLow = series - (three - 3 - square);
  const product = sHigh * three;
  const productLow = sLow * three + threeLow * s;
  const pHigh = upperPart(product + productLow);
  const pLow = productLow - (pHigh - product);
  const zHigh = 9.617967009544373e-1 * pHigh;
  const zLow = -7.028461650952758e-9 * pHigh + pLow * 9.617966939259756e-1 + (isMiddle ? 1.350039202129749e-8 : 0);
  const baseHigh = isMiddle ? 5.849624872207642e-1 : 0;
  const high = upperPart(zHigh + zLow + baseHigh + n);
  return [high, zLow - (high - n - baseHigh - zHigh)];
}

/** Arc tangent. */
export function atan(x: number): number {
  const size = Math.abs(x);
  if (!(size < 7.378697629483821e19)) return x > 0 ? 1.5707963267948966 : x < 0 ? -1.5707963267948966 : NaN;
  if (size < 0.4375) return x - x * arcSeries(x);
  const sign = x < 0 ? -1 : 1;
  if (size < 0.6875) return sign * arcFrom((2 * size - 1) / (2 + size), 4.636476090008061e-1, 2.2698777452961687e-17);
  if (size < 1.1875) return sign * arcFrom((size - 1) / (size + 1), 7.853981633974483e-1, 3.061616997868383e-17);
  if (size < 2.4375) {
    return sign * arcFrom((size - 1.5) / (1 + 1.5 * size), 9.827937232473291e-1, 1.3903311031230998e-17);
  }
  return sign * arcFrom(-1 / size, 1.5707963267948966, 6.123233995736766e-17);
}

function arcFrom(x: number, high: number, low: number): number {
  return high - (x * arcSeries(x) - low - x);
}

/** 1 − atan(x)/x for |x| below 7/16. */
function arcSeries(x: number): number {
  const z = x * x;
  const w = z * z;
  const odd =
    z *
    (3.333333333333293e-1 +
      w *
        (1.4285714272503466e-1 +
          w *
            (9.090887133436507e-2 +
              w * (6.661073137387531e-2 + w * (4.976877994615932e-2 + w * 1.6285820115365782e-2)))));
  const even =
    w *
    (-1.9999999999876483e-1 +
      w *
        (-1.1111110405462356e-1 +
          w * (-7.69187620504483e-2 + w * (-5.833570133790573e-2 + w * -3.6531572744216916e-2))));
  return odd + even;
}

/** Sine, |x| up to 100,000. */
export function sin(x: number): number {
  return circular(x, 0);
}

/** Cosine, |x| up to 100,000. */
export function cos(x: number): number {
  return circular(x, 1);
}

/** sin(x + quarter · π/2), π/2 taken off in three pieces. */
function circular(x: number, quarter: number): number {
  if (!(Math.abs(x) <= 1e5)) throw new RangeError(`sin, cos: x must be from −100,000 to 100,000, got ${x}`);
  const n = Math.floor(x * 6.36619772367581343076e-1 + 0.5);
  const t = x - n * 1.5707963267341256;
  const w = n * 6.077100506303966e-11;
  const r = t - w;
  const correction = n * 2.0222662487959506e-21 - (t - r - w);
  const high = r - correction;
  const low = r - high - correction;
  const turn = (n + quarter) & 3;
  const value = (turn & 1) === 0 ? sineNear(high, low) : cosineNear(high, low);
  return turn < 2 ? value : -value;
}

function sineNear(x: number, low: number): number {
  const z = x * x;
  const v = z * x;
  const r =
    8.33333333332249e-3 +
    z * (-1.984126982985795e-4 + z * (2.7557313707070068e-6 + z * (-2.5050760253406863e-8 + z * 1.58969099521155e-10)));
  return x - (z * (0.5 * low - v * r) - low - v * -1.6666666666666632e-1);
}

function cosineNear(x: number, low: number): number {
  const z = x * x;
  const r =
    z *
    (4.1666666666666602e-2 +
      z *
        (-1.388888888887411e-3 +
          z *
            (2.480158728947673e-5 +
              z * (-2.7557314351390663e-7 + z * (2.087572321298175e-9 + z * -1.1359647557788195e-11)))));
  const half = 0.5 * z;
  const w = 1 - half;
  return w + (1 - w - half + (z * r - x * low));
}
