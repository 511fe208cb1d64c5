import type { Cells } from '../ground/cells.ts';
import type { CompressionLaw } from '../ground/compressionLaw.ts';
import type { PermeabilityLaw } from '../ground/permeabilityLaw.ts';
import type { ActingPeriod } from '../load/programme.ts';

/** Everything that the march needs of one point in one realisation, in engine units; arrays over the cells. */
export interface Column {
  readonly cells: Cells;
  readonly law: CompressionLaw;
  readonly permeability: PermeabilityLaw;
  /** 1 + e0 of each cell; 0 in a stiff cell. */
  readonly initialVolume: Float64Array;
  /** 1 in a free-draining cell, whose excess pore pressure is given. */
  readonly free: Uint8Array;
  /** 1 in a free-draining cell joined to the top, which a vacuum lowers. */
  readonly joinedToTop: Uint8Array;
  /** 1 in a cell whose stress at rest the vacuum raises. */
  readonly reachedByVacuum: Uint8Array;
  readonly topDrained: boolean;
  readonly baseDrained: boolean;
  readonly drains: RadialDrainage | null;
  readonly vacuum: { readonly pressure: number; readonly period: ActingPeriod } | null;
  readonly loads: readonly AppliedLoad[];
  readonly heldUntil: number;
  /** Unit weight of the topping up, kN/m³. */
  readonly topUpUnitWeight: number;
  /** Share of each cell that lies below the water level, for the loss by submergence; null without it. */
  readonly belowWater: Float64Array | null;
  /** Height of standing water above the ground as found, m, 0 where there is none. */
  readonly waterHeight: number;
  readonly wideFill: boolean;
  readonly secondary: SecondaryLaw | null;
  /** Factor on settlement. */
  readonly settlementFactor: number;
  /** Date of the earliest placing, load or vacuum, years. */
  readonly timeZero: number;
  readonly horizon: number;
  /** Degree of consolidation whose date is asked for; NaN when none is. */
  readonly degree: number;
  readonly clamps: ColumnClamps;
}

/** What was clamped while the column was made. */
export interface ColumnClamps {
  readonly preconsolidationRaised: boolean;
  readonly recompressionSetToCompression: boolean;
  readonly initialStressAtFloor: boolean;
  readonly vacuumDrainsCrossSeam: boolean;
  readonly datesPutInOrder: boolean;
  readonly smearReachesInfluence: boolean;
}

/** A load as it acts on the column. */
export interface AppliedLoad {
  readonly kind: 'lift' | 'standing' | 'surface';
  /** Vertical stress increase in each cell when it acts in full, kPa. */
  readonly stress: Float64Array;
  /** Its pressure on the ground at the point, kPa. */
  readonly pressure: number;
  /** Its thickness at the point, m; 0 for a surface load. */
  readonly thickness: number;
  readonly period: ActingPeriod;
}

/** Radial flow to vertical drains (Hansbo 1981). */
export interface RadialDrainage {
  /** Share of each cell that the drains reach and lead from. */
  readonly reached: Float64Array;
  /** 8/(γw de²), 1/(kPa m) */
  readonly conductance: number;
  /** μ without well resistance. */
  readonly factor: number;
  /** π z (2l − z)/q_w of each cell, year/m, 0 without well resistance. */
  readonly wellResistance: Float64Array;
  readonly installed: number;
  /** The smear zone was drawn as wide as the whole cylinder and set to it. */
  readonly smearReachesInfluence: boolean;
}

/** Secondary compression, by stratum. */
export interface SecondaryLaw {
  /** Stratum of each cell, −1 in a free-draining one. */
  readonly stratum: Int32Array;
  readonly strata: number;
  /** Cα/((1 + e0) ln 10) of each cell; 0 where there is none. */
  readonly rate: Float64Array;
  /** Cr/Cc of each cell, by which the rate is smaller before σ'p is passed. */
  readonly rateBeforeYield: Float64Array;
  /** Strata that the vacuum reaches. */
  readonly reachedByVacuum: readonly boolean[];
  readonly reductionFloor: number;
  readonly reductionExponent: number;
}
