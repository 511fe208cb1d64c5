import { exp, ln } from '../elementary.ts';

/** Density of the standard normal distribution. */
export function normalDensity(z: number): number {
  return 0.3989422804014327 * exp(-0.5 * z * z);
}

/**
 * Φ(z) = ½ erfc(−z/√2), by the rational approximations of Cody (1969), good to about 1e-15 relative, also in
 * the lower tail.
 */
export function normalCumulative(z: number): number {
  return 0.5 * complementaryError(-z * 0.7071067811865476);
}

/** erfc(x), Cody (1969), Rational Chebyshev approximation for the error function. */
export function complementaryError(x: number): number {
  const size = Math.abs(x);
  if (size <= 0.46875) return 1 - x * ratio(ERROR_NUMERATOR, ERROR_DENOMINATOR, size * size);
  let tail = 0;
  if (size <= 4) {
    tail = scaled(size) * ratio(MIDDLE_NUMERATOR, MIDDLE_DENOMINATOR, size);
  } else if (size < 26.6) {
    const inverse = 1 / (size * size);
    const sum = inverse * ratio(TAIL_NUMERATOR, TAIL_DENOMINATOR, inverse);
    tail = (scaled(size) * (0.5641895835477563 - sum)) / size;
  }
  return x < 0 ? 2 - tail : tail;
}

/** exp(−x²) without losing the digits of x². */
function scaled(x: number): number {
  const head = Math.floor(x * 16) / 16;
  return exp(-head * head) * exp(-(x - head) * (x + head));
}

/** Coefficients from the highest power down. */
function ratio(numerator: readonly number[], denominator: readonly number[], x: number): number {
  let [above, below] = [0, 0];
  for (const coefficient of numerator) above = above * x + coefficient;
  for (const coefficient of denominator) below = below * x + coefficient;
  return above / below;
}

const ERROR_NUMERATOR = [
  1.8577770618460315e-1, 3.1611237438705656, 1.1386415415105016e2, 3.774852376853021e2, 3.2093775891384695e3,
];
const ERROR_DENOMINATOR = [
  1, 2.3601290952344122e1, 2.4402463793444417e2, 1.2826165260773723e3, 2.844236833439171e3,
];
const MIDDLE_NUMERATOR = [
  2.1531153547440385e-8, 5.641884969886701e-1, 8.883149794388376, 6.611919063714163e1, 2.986351381974001e2,
  8.819522212417691e2, 1.7120476126340706e3, 2.0510783778260715e3, 1.2303393547979972e3,
];
const MIDDLE_DENOMINATOR = [
  1, 1.5744926110709835e1, 1.1769395089131219e2, 5.371811018620099e2, 1.6213895745666903e3,
  3.2907992357334596e3, 4.362619090143247e3, 3.4393676741437216e3, 1.2303393548037495e3,
];
const TAIL_NUMERATOR = [
  1.6315387137302097e-2, 3.0532663496123236e-1, 3.6034489994980445e-1, 1.2578172611122926e-1,
  1.6083785148742275e-2, 6.587491615298378e-4,
];
const TAIL_DENOMINATOR = [
  1, 2.568520192289822, 1.8729528499234604, 5.279051029514284e-1, 6.051834131244132e-2, 2.3352049762686918e-3,
];

/**
 * Φ⁻¹(p), algorithm AS 241 (Wichura 1988, PPND16), good to about 1e-16 relative.
 *
 * @param p probability; 0 and 1 give −Infinity and Infinity
 */
export function normalQuantile(p: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`normalQuantile: p must be from 0 to 1, got ${p}`);
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * ratio(CENTRE_A, CENTRE_B, 0.180625 - q * q);
  const tail = q < 0 ? p : 1 - p;
  if (tail === 0) return q < 0 ? -Infinity : Infinity;
  const r = Math.sqrt(-ln(tail));
  const z = r <= 5 ? ratio(NEAR_C, NEAR_D, r - 1.6) : ratio(FAR_E, FAR_F, r - 5);
  return q < 0 ? -z : z;
}

const CENTRE_A = [
  2509.0809287301227, 33430.57558358813, 67265.7709270087, 45921.95393154987, 13731.69376550946,
  1971.5909503065513, 133.14166789178438, 3.3871328727963665,
];
const CENTRE_B = [
  5226.495278852854, 28729.085735721943, 39307.89580009271, 21213.794301586597, 5394.196021424751,
  687.1870074920579, 42.31333070160091, 1,
];
const NEAR_C = [
  7.745450142783414e-4, 0.022723844989269184, 0.2417807251774506, 1.2704582524523684, 3.6478483247632045,
  5.769497221460691, 4.630337846156546, 1.4234371107496835,
];
const NEAR_D = [
  1.0507500716444169e-9, 5.475938084995345e-4, 0.015198666563616457, 0.14810397642748008, 0.6897673349851,
  1.6763848301838038, 2.053191626637759, 1,
];
const FAR_E = [
  2.0103343992922881e-7, 2.7115555687434876e-5, 0.0012426609473880784, 0.026532189526576124,
  0.29656057182850487, 1.7848265399172913, 5.463784911164114, 6.657904643501103,
];
const FAR_F = [
  2.0442631033899397e-15, 1.421511758316446e-7, 1.8463183175100548e-5, 7.868691311456133e-4,
  0.014875361290850615, 0.13692988092273581, 0.599832206555888, 1,
];
