import { exp, ln } from '../elementary.ts';

/** φ(z), density of the standard normal distribution. */
export function normalDensity(z: number): number {
  return 0.3989422804014327 * gaussian(Math.abs(z));
}

/** exp(−z²/2) without losing the digits of z², z of 0 or more. */
function gaussian(z: number): number {
  if (!(z < 40)) return z >= 40 ? 0 : NaN;
  const head = Math.floor(z * 16) * 0.0625;
  return exp(-0.5 * head * head) * exp(-0.5 * (z - head) * (z + head));
}

/**
 * Φ(z) = ½ erfc(−z/√2), good to about 1e-15 of its value, also far down the lower tail.
 *
 * Source: Cody (1969), Rational Chebyshev approximations for the error function, Math. Comp. 23; the power in
 * z, not in z/√2, so that rounding the latter is not magnified in the tail.
 */
export function normalCumulative(z: number): number {
  const size = Math.abs(z);
  const x = size * 0.7071067811865476;
  if (x <= 0.46875) return 0.5 + 0.5 * z * 0.7071067811865476 * errorOverArgument(x * x);
  const tail = 0.5 * gaussian(size) * (x <= 4 ? middle(x) : (0.5641895835477563 - far(1 / (x * x))) / x);
  return z < 0 ? tail : 1 - tail;
}

/** erf(x)/x in z = x², |x| ≤ 0.46875. */
function errorOverArgument(z: number): number {
  const above =
    3209.3775891384695 +
    z * (377.4852376853021 + z * (113.86415415105016 + z * (3.1611237438705656 + z * 0.18577770618460315)));
  const below =
    2844.236833439171 + z * (1282.6165260773723 + z * (244.02463793444417 + z * (23.601290952344122 + z)));
  return above / below;
}

/** exp(x²) erfc(x), 0.46875 ≤ x ≤ 4. */
function middle(x: number): number {
  const aboveFar =
    298.6351381974001 +
    x * (66.11919063714163 + x * (8.883149794388376 + x * (0.5641884969886701 + x * 2.1531153547440385e-8)));
  const above =
    1230.3393547979972 +
    x * (2051.0783778260715 + x * (1712.0476126340706 + x * (881.9522212417691 + x * aboveFar)));
  const belowFar =
    1621.3895745666903 + x * (537.1811018620099 + x * (117.6939508913125 + x * (15.744926110709835 + x)));
  const below =
    1230.3393548037495 +
    x * (3439.3676741437216 + x * (4362.619090143247 + x * (3290.7992357334596 + x * belowFar)));
  return above / below;
}

/** 1/√π − x exp(x²) erfc(x) in y = 1/x², x ≥ 4. */
function far(y: number): number {
  const above =
    0.0006587491615298378 +
    y *
      (0.016083785148742275 +
        y *
          (0.12578172611122926 +
            y * (0.36034489994980445 + y * (0.30532663496123236 + y * 0.016315387137302097))));
  const below =
    0.0023352049762686918 +
    y *
      (0.06051834131244132 +
        y * (0.5279051029514284 + y * (1.8729528499234604 + y * (2.568520192289822 + y))));
  return (y * above) / below;
}

/**
 * Φ⁻¹(p), good to about 1e-15 of its value.
 *
 * Source: algorithm AS 241, PPND16: Wichura (1988), The percentage points of the normal distribution, Applied
 * Statistics 37.
 *
 * @param p probability; 0 and 1 give −Infinity and Infinity
 */
export function normalQuantile(p: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`normalQuantile: p must be from 0 to 1, got ${p}`);
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * centre(0.180625 - q * q);
  const tail = q < 0 ? p : 1 - p;
  if (tail === 0) return q < 0 ? -Infinity : Infinity;
  const r = Math.sqrt(-ln(tail));
  const z = r <= 5 ? near(r - 1.6) : outer(r - 5);
  return q < 0 ? -z : z;
}

function centre(r: number): number {
  const aboveFar =
    45921.95393154987 + r * (67265.7709270087 + r * (33430.57558358813 + r * 2509.0809287301227));
  const above =
    3.3871328727963665 +
    r * (133.14166789178438 + r * (1971.5909503065513 + r * (13731.69376550946 + r * aboveFar)));
  const belowFar =
    21213.794301586597 + r * (39307.89580009271 + r * (28729.085735721943 + r * 5226.495278852854));
  const below =
    1 + r * (42.31333070160091 + r * (687.1870074920579 + r * (5394.196021424751 + r * belowFar)));
  return above / below;
}

function near(r: number): number {
  const aboveFar =
    1.2704582524523684 + r * (0.2417807251774506 + r * (0.022723844989269184 + r * 7.745450142783414e-4));
  const above =
    1.4234371107496835 +
    r * (4.630337846156546 + r * (5.769497221460691 + r * (3.6478483247632045 + r * aboveFar)));
  const belowFar =
    0.14810397642748008 + r * (0.015198666563616457 + r * (5.475938084995345e-4 + r * 1.0507500716844169e-9));
  const below = 1 + r * (2.053191626637759 + r * (1.6763848301838038 + r * (0.6897673349851 + r * belowFar)));
  return above / below;
}

function outer(r: number): number {
  const aboveFar =
    0.026532189526576124 +
    r * (0.0012426609473880784 + r * (2.7115555687434876e-5 + r * 2.0103343992922881e-7));
  const above =
    6.657904643501103 +
    r * (5.463784911164114 + r * (1.7848265399172913 + r * (0.29656057182850487 + r * aboveFar)));
  const belowFar =
    7.868691311456133e-4 +
    r * (1.8463183175100548e-5 + r * (1.421511758316446e-7 + r * 2.0442631033899397e-15));
  const below =
    1 + r * (0.599832206555888 + r * (0.13692988092273581 + r * (0.014875361290850615 + r * belowFar)));
  return above / below;
}
