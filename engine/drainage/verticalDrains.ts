import { ln } from '../elementary.ts';

/**
 * Diameter of the cylinder of soil that one drain serves: 1.05 × spacing on a triangular grid, 1.13 × on a
 * square one (equal areas, rounded as in practice; Hansbo 1981).
 *
 * @param spacing m, above 0
 * @returns m
 */
export function influenceDiameter(pattern: 'triangular' | 'square', spacing: number): number {
  return (pattern === 'triangular' ? 1.05 : 1.13) * spacing;
}

/** Equivalent diameter of a band drain of width a and thickness b, m: dw = 2 (a + b)/π (Hansbo 1979). */
export function bandDrainDiameter(width: number, thickness: number): number {
  return (2 * (width + thickness)) / Math.PI;
}

/**
 * Drain factor without well resistance: μ = ln(n/s) + (k_h/k_s) ln s − 3/4 (Barron 1948, equal strain;
 * simplified by Hansbo 1981; holds for n of about 10 and more).
 *
 * @param n de/dw, above 1
 * @param s ds/dw, 1 for no smear, at most n
 * @param permeabilityRatio k_h/k_s, 1 or more
 */
export function smearedDrainFactor(n: number, s: number, permeabilityRatio: number): number {
  if (!(n > 1)) throw new RangeError(`smearedDrainFactor: n must be above 1, got ${n}`);
  if (!(s >= 1 && s <= n)) throw new RangeError(`smearedDrainFactor: s must be from 1 to n, got ${s}`);
  return ln(n / s) + permeabilityRatio * ln(s) - 0.75;
}

/**
 * Well resistance over k_h: π z (2l − z)/q_w, to be added to μ times the current k_h (Hansbo 1981).
 *
 * @param z distance from the nearer outlet, m
 * @param l longest way along the drain to its outlet, m
 * @param dischargeCapacity q_w, m³/year
 * @returns year/m
 */
export function wellResistance(z: number, l: number, dischargeCapacity: number): number {
  return (Math.PI * z * (2 * l - z)) / dischargeCapacity;
}

/** How far the water at a depth has to go along the drain. */
export interface WayToOutlet {
  /** z: distance from the nearer outlet, m. */
  readonly distance: number;
  /** l: half the way between two outlets, or the whole way from a blind end to the only one, m. */
  readonly longest: number;
}

/**
 * Way to the outlet for water that enters a drain at `depth`; null where the drain has no outlet at all.
 *
 * @param outlets depths of its outlets within the drain, m
 * @param top depth of the drain's upper end, m
 * @param foot depth of its lower end, m
 */
export function wayToOutlet(
  depth: number,
  outlets: readonly number[],
  top: number,
  foot: number,
): WayToOutlet | null {
  const above = Math.max(...outlets.filter((outlet) => outlet <= depth));
  const below = Math.min(...outlets.filter((outlet) => outlet > depth));
  if (above > -Infinity && below < Infinity) {
    return { distance: Math.min(depth - above, below - depth), longest: 0.5 * (below - above) };
  }
  if (above > -Infinity) return { distance: depth - above, longest: foot - above };
  if (below < Infinity) return { distance: below - depth, longest: below - top };
  return null;
}
