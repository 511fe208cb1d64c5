import { exp, ln } from '../elementary.ts';

/**
 * Permeability of a column's cells as a function of void ratio alone, times a factor before first yield.
 * Columns over the cells.
 */
export interface PermeabilityLaw {
  /** k_v at the void ratio e_y of the initial σ'p, m/year; the constant k of a stiff cell. */
  readonly atYield: Float64Array;
  /** Strain at the initial σ'p on the line of first loading. */
  readonly strainAtYield: Float64Array;
  /** (1 + e0) ln 10 / Ck; 0 in a stiff cell. */
  readonly sensitivity: Float64Array;
  /** Factor on k up to 0.9 σ'p. */
  readonly preYieldFactor: Float64Array;
  readonly yieldStress: Float64Array;
  /** 1 where Ck = Cc, so that k σ' is constant in virgin compression. */
  readonly followsStress: Uint8Array;
  /** Least (1 + e)/(1 + e0) that flow is computed with: that of e = 0.1; 0 in a stiff cell. */
  readonly leastVolume: Float64Array;
  /** k_h / k_v */
  readonly horizontalRatio: Float64Array;
}

/** Share of σ'p up to which the factor before first yield acts in full. */
const FADE_FROM = 0.9;
const FADE_LENGTH = -ln(FADE_FROM);

/**
 * k_v = k_y · 10^((e − e_y)/Ck) · f, with e − e_y = −(1 + e0)(ε − ε_y), and f the factor before first yield,
 * which fades to 1 between 0.9 and 1.0 of σ'p, linear in the logarithm of the largest σ' so far. In virgin
 * compression with Ck = Cc that is k_y σ'p/σ'.
 *
 * @param stress σ', kPa, at which the strain is reached
 * @param largest largest σ' before, kPa
 * @returns m/year
 */
export function permeabilityAt(
  law: PermeabilityLaw,
  cell: number,
  strain: number,
  stress: number,
  largest: number,
): number {
  const sensitivity = law.sensitivity[cell];
  if (sensitivity === 0) return law.atYield[cell];
  const yieldStress = law.yieldStress[cell];
  if (stress >= yieldStress && stress >= largest && law.followsStress[cell] === 1) {
    return (law.atYield[cell] * yieldStress) / stress;
  }
  const permeability = law.atYield[cell] * exp(-sensitivity * (strain - law.strainAtYield[cell]));
  const factor = law.preYieldFactor[cell];
  return factor === 1
    ? permeability
    : permeability * fadedFactor(factor, Math.max(stress, largest) / yieldStress);
}

/** The factor before first yield at a largest effective stress given as a share of σ'p. */
export function fadedFactor(factor: number, shareOfYield: number): number {
  if (shareOfYield >= 1) return 1;
  if (shareOfYield <= FADE_FROM) return factor;
  return 1 + (factor - 1) * (-ln(shareOfYield) / FADE_LENGTH);
}
