import type { Soil } from './soil.ts';
import type { UncertainNumber } from './uncertainNumber.ts';

/**
 * The checked model: what the engine computes from. Plain, deeply readonly data in engine units
 * (m, kPa, kN/m³, years), made by `checkProject` only; every value in it is already valid.
 * Depths are positive downward from the ground as found; x runs along the section; dates are years
 * on the project's own calendar.
 */
export interface Model {
  readonly name: string;
  readonly notes: string;
  /** 32 hex digits that change with anything that can change a result. */
  readonly digest: string;
  readonly soils: readonly Soil[];
  /** From the top down. */
  readonly layers: readonly Layer[];
  readonly water: {
    /** Depth of the water level below ground, m; negative for standing water above ground. */
    readonly depth: UncertainNumber;
    /** Excess head at the base of the lowest layer, m; negative when under-drained. */
    readonly baseExcessHead: UncertainNumber;
  };
  readonly boundaries: { readonly top: 'drained' | 'closed'; readonly base: 'drained' | 'closed' };
  /** In the order in which they lie on each other, from the bottom. */
  readonly lifts: readonly Lift[];
  readonly surfaceLoads: readonly SurfaceLoad[];
  readonly drains: Drains | null;
  readonly vacuum: Vacuum | null;
  readonly couplings: {
    /** Date until which the fill is topped up as it settles; null when it is not. */
    readonly heldUntil: number | null;
    /** Unit weight of the topping up, kN/m³; null: that of the last lift that stays. */
    readonly topUpUnitWeight: UncertainNumber | null;
    readonly submergence: boolean;
  };
  /** σz = q at all depths. */
  readonly wideFill: boolean;
  readonly secondary: {
    readonly included: boolean;
    /** m and n of Cα'/Cα = m + (1 − m) exp(−n (σ'before/σ'after − 1)). */
    readonly reductionFloor: number;
    readonly reductionExponent: number;
  };
  readonly points: readonly Point[];
  readonly pairs: readonly Pair[];
  readonly handover: number;
  readonly horizon: number;
  /** Rising, none beyond the horizon. */
  readonly outputTimes: readonly number[];
  readonly limits: readonly Limit[];
  readonly modelFactors: { readonly settlement: UncertainNumber; readonly rate: UncertainNumber };
  readonly sampling: { readonly realisations: number; readonly seed: number };
  readonly results: {
    /** Percentiles of the bands in time, in percent, rising. */
    readonly percentiles: readonly number[];
    /** Degree of consolidation (0–1) whose date is asked for; null when none is. */
    readonly degreeOfConsolidation: number | null;
  };
  /** Every input that is not fixed, in the model's order; `UncertainNumber.index` points into it. */
  readonly inputs: readonly UncertainNumber[];
  /** Rank correlations between inputs, in the file's order, already checked to be positive definite. */
  readonly correlations: readonly RankCorrelation[];
  /** What is allowed but should be known, in words. */
  readonly remarks: readonly Remark[];
}

export interface Remark {
  /** JSON pointer to the place in the file, '' for the whole. */
  readonly pointer: string;
  readonly sentence: string;
}

export interface Layer {
  readonly name: string;
  /** Place in `Model.soils`. */
  readonly soil: number;
  readonly thickness: Thickness;
}

export type Thickness =
  | { readonly kind: 'even'; readonly thickness: UncertainNumber }
  | {
      /** Straight between the borings, level beyond; `factor` has median 1. */
      readonly kind: 'borings';
      readonly x: readonly number[];
      readonly thickness: readonly number[];
      readonly factor: UncertainNumber;
    };

export interface Lift {
  readonly name: string;
  readonly crestCentre: number;
  readonly crestWidth: number;
  /** Horizontal per vertical. */
  readonly leftSlope: number;
  readonly rightSlope: number;
  readonly thickness: UncertainNumber;
  readonly unitWeight: UncertainNumber;
  /** The ground has come to rest under it; then no placing. */
  readonly standing: boolean;
  /** null for a standing lift. */
  readonly placing: Period | null;
  readonly removal: Period | null;
  readonly outOfPlane: OutOfPlane;
}

export interface Period {
  readonly start: UncertainNumber;
  readonly end: UncertainNumber;
}

/** Extent across the section, which lies at y = 0; ±Infinity where it goes on. */
export interface OutOfPlane {
  readonly from: number;
  readonly to: number;
}

export interface SurfaceLoad {
  readonly name: string;
  readonly traffic: boolean;
  readonly pressure: UncertainNumber;
  readonly x1: number;
  readonly x2: number;
  readonly outOfPlane: OutOfPlane;
  readonly start: UncertainNumber;
  /** null: it stays. */
  readonly end: UncertainNumber | null;
}

export interface Drains {
  readonly pattern: 'triangular' | 'square';
  readonly spacing: number;
  /** Equivalent diameter dw, m. */
  readonly diameter: number;
  /** s = ds/dw, 1 for no smear. */
  readonly smearRatio: UncertainNumber;
  /** k_h/k_s. */
  readonly permeabilityRatio: UncertainNumber;
  /** q_w, m³/year; null for no well resistance. */
  readonly dischargeCapacity: UncertainNumber | null;
  readonly top: number;
  readonly foot: number;
  readonly installed: number;
  /** Where along the section they stand; ±Infinity where they go on. */
  readonly from: number;
  readonly to: number;
}

export interface Vacuum {
  /** kPa below the air's, positive. */
  readonly pressure: UncertainNumber;
  readonly start: UncertainNumber;
  readonly end: UncertainNumber;
}

export interface Point {
  readonly name: string;
  readonly x: number;
  /** A piled abutment: it does not settle. */
  readonly fixed: boolean;
}

export interface Pair {
  readonly name: string;
  /** Places in `Model.points`. */
  readonly first: number;
  readonly second: number;
}

export type LimitedResult =
  | 'settlement_at_horizon'
  | 'settlement_after_handover'
  | 'differential_at_horizon'
  | 'differential_after_handover'
  | 'slope_at_horizon'
  | 'slope_after_handover'
  | 'rate_at_handover'
  | 'settlement_still_to_come';

export interface Limit {
  readonly name: string;
  readonly result: LimitedResult;
  /** Place in `Model.points`; −1 for the results of a pair. */
  readonly point: number;
  /** Place in `Model.pairs`; −1 for the results of a point. */
  readonly pair: number;
  /** m, m/m (slope) or m/year (rate); passed when the result (absolute for a pair) is above it. */
  readonly value: number;
  /** Date of a settlement still to come (counted to the horizon); the handover for all others. */
  readonly date: number;
}

export interface RankCorrelation {
  readonly first: number;
  readonly second: number;
  /** Spearman's rank correlation, −1 < ρ < 1. */
  readonly rank: number;
}
