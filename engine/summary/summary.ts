import type { Model } from '../project/model.ts';
import type { ClampCounts } from '../settlement/realisations.ts';

/** The small plain object that charts, tables and files are made from. Units: m, years, m/year, m/m, shares 0–1. */
export interface Summary {
  /** The model that it was made from. */
  readonly model: Model;
  readonly provenance: {
    readonly engineVersion: string;
    readonly seed: number;
    /** Numbers of the replicates pooled, rising. */
    readonly replicates: readonly number[];
    readonly realisations: number;
  };
  readonly quantities: readonly QuantitySummary[];
  /** One for each of `Model.limits`, in its order. */
  readonly limits: readonly LimitSummary[];
  /** One for each point, in the model's order. */
  readonly timeBands: readonly TimeBands[];
  readonly counts: ClampCounts;
  /** Largest difference of the central realisation to a finer grid and step, over all points and history times. */
  readonly numericalError: NumericalError | null;
  /** The central realisation: settlement of each point at each history time, m; [point][time]. */
  readonly central: readonly (readonly number[])[];
  /** Stability, spreading, seepage where one is likely to govern, and everything else that must be said. */
  readonly warnings: readonly string[];
  readonly fillVolume: { readonly placed: Estimate; readonly topUp: Estimate };
}

export interface NumericalError {
  /** m */
  readonly largest: number;
  /** Share of the final settlement of that point. */
  readonly relative: number;
}

export type QuantityKind =
  | 'settlement_at_horizon'
  | 'settlement_after_handover'
  | 'secondary_after_handover'
  | 'settlement_at_time'
  | 'settlement_still_to_come'
  | 'rate_at_handover'
  | 'time_to_limit'
  | 'time_to_degree'
  | 'top_up'
  | 'differential_at_horizon'
  | 'differential_after_handover'
  | 'slope_at_horizon'
  | 'slope_after_handover';

/** A single number of each realisation, of which a distribution is reported. */
export interface Quantity {
  readonly kind: QuantityKind;
  /** 'settlement_after_handover@Pier east', unique. */
  readonly id: string;
  /** In words, without the number: 'settlement after handover at Pier east'. */
  readonly label: string;
  readonly unit: 'm' | 'm/year' | 'year' | 'm/m';
  readonly point: number;
  readonly pair: number;
  /** Date, for settlement_at_time and settlement_still_to_come. */
  readonly date: number;
}

export interface Estimate {
  readonly value: number;
  /** Ends of the 90 % confidence band; NaN where fewer than 10 replicates stand behind it, or no realisation bounds a percentile. */
  readonly low: number;
  readonly high: number;
}

export interface QuantitySummary {
  readonly quantity: Quantity;
  readonly mean: Estimate;
  readonly deviation: number;
  /** Of the signed value. */
  readonly percentiles: readonly { readonly percent: number; readonly estimate: Estimate }[];
  /** Of the absolute value for a pair. */
  readonly exceedance: ExceedanceCurve;
  /** One for each of `Model.inputs` with any influence computed; empty when there are no inputs. */
  readonly drivers: readonly Driver[];
  /** Mean of the replicates' medians so far, with the half-width of its band. */
  readonly convergence: readonly {
    readonly realisations: number;
    readonly median: number;
    readonly halfWidth: number;
  }[];
}

/** Share of realisations above each value; values rising. */
export interface ExceedanceCurve {
  readonly values: readonly number[];
  readonly shares: readonly number[];
  readonly low: readonly number[];
  readonly high: readonly number[];
  /** Least value above which fewer than 10 realisations lie: from it on, itself included, the tail is unresolved. */
  readonly unresolvedAbove: number;
}

export interface LimitSummary {
  /** Place in `Summary.quantities`. */
  readonly quantity: number;
  readonly chance: Estimate;
  /** Realisations above the limit, and all. */
  readonly above: number;
  readonly of: number;
  /** One-sided 95 % limit of the chance: the upper where none of the realisations pass, the lower where all do; NaN elsewhere. */
  readonly boundWhenNone: number;
  /** How far the band reaches to its longer side, after each replicate from the tenth on. */
  readonly convergence: readonly {
    readonly realisations: number;
    readonly chance: number;
    readonly halfWidth: number;
  }[];
}

export interface Driver {
  /** Place in `Model.inputs`. */
  readonly input: number;
  /** Spearman's rank correlation. */
  readonly rankCorrelation: number;
  /** Standardised rank regression coefficient. */
  readonly rankRegression: number;
  /** First-order share of the variance, bias removed (may be slightly negative). */
  readonly firstOrderShare: number;
}

export interface TimeBands {
  readonly point: number;
  readonly times: readonly number[];
  /** One for each of `Model.results.percentiles`: its value at each time with its band. */
  readonly bands: readonly {
    readonly percent: number;
    readonly values: readonly number[];
    readonly low: readonly number[];
    readonly high: readonly number[];
  }[];
  readonly mean: readonly number[];
}
