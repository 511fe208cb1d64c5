/**
 * What one replicate gives: the settlement of each point at each history time, all realisations of the
 * replicate in a column, and the figures read off the march itself. Only typed arrays, so that it can be
 * transferred. Offsets: [point][time][realisation] → (point · times + time) · count + realisation.
 */
export interface Realisations {
  readonly replicate: number;
  readonly count: number;
  /** Dates of the history, years on the project's calendar, rising; the same in every replicate of a model. */
  readonly historyTimes: Float64Array;
  /** m; [point][time][realisation]; 0 for a fixed point. */
  readonly settlement: Float64Array;
  /** Secondary part of the settlement between handover and horizon, m; [point][realisation]. */
  readonly secondaryAfterHandover: Float64Array;
  /** Mean rate of settlement over the 30 days after handover, m/year; [point][realisation]. */
  readonly rateAtHandover: Float64Array;
  /** First date from which on the settlement still to come (to the horizon) is at most the limit, years; [limit of kind settlement_still_to_come, in the model's order][realisation]. */
  readonly timeToLimit: Float64Array;
  /** First date at which the primary settlement is the asked share of its drained value, years, Infinity when not by the horizon; [point][realisation]; empty when no degree is asked. */
  readonly timeToDegree: Float64Array;
  /** Thickness of fill added to hold the level, m; [point][realisation]. */
  readonly topUp: Float64Array;
  /** Volume of fill per metre of embankment, m³/m: placed in lifts (without standing ones), and of topping up; [2][realisation]. */
  readonly fillVolume: Float64Array;
  /** Drawn values of the inputs (see `DrawnGround`), for the drivers: input after input, each `count` or points × count values. */
  readonly inputs: readonly Float64Array[];
  readonly counts: ClampCounts;
}

/** In how many realisations of the replicate physics made the engine clamp, or leave its law, at any point. */
export interface ClampCounts {
  /** σ'p raised to σ'v0 in any cell. */
  readonly preconsolidationRaised: number;
  /** Cr set to Cc. */
  readonly recompressionSetToCompression: number;
  /** Values of bounded marginals cut at their limits again (values, not realisations). */
  readonly cutAtLimits: number;
  /** A void ratio fell below 0.1. */
  readonly voidRatioBelowTenth: number;
  /** A strain passed 30 %. */
  readonly strainAboveThirtyPercent: number;
  /** σ'v0 held at 1 kPa deeper than 0.25 m (above that it is so in any ground). */
  readonly initialStressAtFloor: number;
  /** Drains under vacuum crossed a free-draining layer. */
  readonly vacuumDrainsCrossSeam: number;
  /** Dates that were drawn out of order and set equal. */
  readonly datesPutInOrder: number;
  /** A smear zone as wide as the cylinder that its drain serves. */
  readonly smearReachesInfluence: number;
  /** The effective stress of a cell fell below 1 kPa, where swelling is taken straight. */
  readonly effectiveStressVanished: number;
  /** Steps of the march whose iteration did not close (steps, not realisations). */
  readonly stepsNotClosed: number;
}
