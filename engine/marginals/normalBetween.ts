import { normalDensity } from './standardNormal.ts';

/**
 * Mean and deviation of a standard normal variable between a and b: shift = (φ(a) − φ(b))/share, variance
 * 1 + (a φ(a) − b φ(b))/share − shift² (Johnson, Kotz & Balakrishnan 1994, section 13.10.1); between limits less
 * than 2 apart, where those differences would lose their digits, by Gauss's rule of ten points.
 *
 * @param a lower limit, −Infinity or finite
 * @param b upper limit, above a
 * @param share Φ(b) − Φ(a)
 */
export function momentsBetween(
  a: number,
  b: number,
  share: number,
): { readonly mean: number; readonly deviation: number } {
  if (b - a < 2) return momentsBetweenClose(a, b);
  const [densityA, densityB] = [normalDensity(a), normalDensity(b)];
  const shift = (densityA - densityB) / share;
  const ends = (a > -Infinity ? a * densityA : 0) - (b < Infinity ? b * densityB : 0);
  return { mean: shift, deviation: Math.sqrt(1 + ends / share - shift * shift) };
}

/** Nodes and weights of Gauss's rule on −1 to 1 (Abramowitz & Stegun 1964, table 25.4). */
const NODES = [
  0.14887433898163122, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845, 0.9739065285171717,
];
const WEIGHTS = [
  0.29552422471475287, 0.26926671930999635, 0.21908636251598204, 0.1494513491505806, 0.06667134430868814,
];

function momentsBetweenClose(a: number, b: number): { readonly mean: number; readonly deviation: number } {
  const middle = 0.5 * (a + b);
  const half = 0.5 * (b - a);
  const [total, first, second] = [0, 0, 0].map((_, power) =>
    NODES.reduce((sum, node, i) => {
      const above = WEIGHTS[i] * normalDensity(middle + half * node);
      const below = WEIGHTS[i] * normalDensity(middle - half * node);
      const sign = power === 1 ? -1 : 1;
      return sum + (power === 0 ? 1 : power === 1 ? node : node * node) * (above + sign * below);
    }, 0),
  );
  const shift = first / total;
  return { mean: middle + half * shift, deviation: half * Math.sqrt(second / total - shift * shift) };
}
