import { ln } from '../elementary.ts';

/**
 * The rate-independent compression law of a column's cells (method statement, section 3), as columns over
 * the cells. Natural-log slopes: λ = C / ((1 + e0) ln 10). A stiff cell has a modulus instead and no slopes.
 */
export interface CompressionLaw {
  /** σ'v0, kPa */
  readonly initialStress: Float64Array;
  /** σ'p, kPa; Infinity in a stiff cell. */
  readonly yieldStress: Float64Array;
  /** ln σ'v0, ln σ'p and the strain at σ'p on the line of first loading: what follows from the others. */
  readonly logInitial: Float64Array;
  readonly logYield: Float64Array;
  readonly strainAtYield: Float64Array;
  readonly compression: Float64Array;
  readonly recompression: Float64Array;
  readonly swelling: Float64Array;
  /** M, kPa; 0 in a compressible cell. */
  readonly modulus: Float64Array;
}

/**
 * Strain of first loading: ε = λr ln(σ'/σ'v0) up to σ'p, from there on λc ln(σ'/σ'p) more.
 *
 * @param stress σ' of first loading, kPa, above 0
 * @returns strain on the original thickness, compression positive
 */
export function firstLoadingStrain(law: CompressionLaw, cell: number, stress: number): number {
  return stress < law.yieldStress[cell]
    ? law.recompression[cell] * (ln(stress) - law.logInitial[cell])
    : law.strainAtYield[cell] + law.compression[cell] * (ln(stress) - law.logYield[cell]);
}

/** Stress below which the swelling line goes on straight instead of along the logarithm, kPa. */
export const STRAIGHT_BELOW = 1;

/**
 * Strain at σ' of a cell whose largest effective stress so far is `largest`: on the line of first loading
 * from there on, on the swelling line below, also where that is still below the initial σ'p. Below 1 kPa the
 * swelling line goes on straight with the slope that it has there, so that a cell whose effective stress
 * vanishes does not swell without end.
 *
 * @param stress kPa
 * @param largest kPa, at least σ'v0
 */
export function strainAt(law: CompressionLaw, cell: number, stress: number, largest: number): number {
  if (law.modulus[cell] > 0) return (stress - law.initialStress[cell]) / law.modulus[cell];
  if (stress >= largest) return firstLoadingStrain(law, cell, stress);
  return swelledStrain(law, cell, stress, firstLoadingStrain(law, cell, largest), ln(largest));
}

/** Strain on the swelling line that starts at `strain`, where ln of the largest σ' so far is `logLargest`. */
export function swelledStrain(
  law: CompressionLaw,
  cell: number,
  stress: number,
  strain: number,
  logLargest: number,
): number {
  return stress >= STRAIGHT_BELOW
    ? strain - law.swelling[cell] * (logLargest - ln(stress))
    : strain - law.swelling[cell] * (logLargest - ln(STRAIGHT_BELOW) + 1 - stress / STRAIGHT_BELOW);
}

/** m_v = ∂ε/∂σ', 1/kPa, at the same arguments. */
export function compressibilityAt(
  law: CompressionLaw,
  cell: number,
  stress: number,
  largest: number,
): number {
  if (law.modulus[cell] > 0) return 1 / law.modulus[cell];
  if (stress < largest) return law.swelling[cell] / Math.max(stress, STRAIGHT_BELOW);
  return (stress < law.yieldStress[cell] ? law.recompression[cell] : law.compression[cell]) / stress;
}
