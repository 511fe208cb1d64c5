import type { LinearCase } from './linearConsolidation.ts';

/** A linear layer that drains to vertical drains alone: de = 1 m and c_h = 1 m²/year, so that dates are Th. */
export interface RadialCase {
  /** de/dw */
  readonly n: number;
  readonly smearRatio?: number;
  readonly permeabilityRatio?: number;
  readonly horizon: number;
}

const ALMOST_NO_VERTICAL_FLOW = 1e-9;

export function radialConsolidation({ n, horizon, ...smear }: RadialCase): LinearCase {
  const thickness = 4;
  return {
    linear: [{ thickness, cv: ALMOST_NO_VERTICAL_FLOW, horizontalRatio: 1 / ALMOST_NO_VERTICAL_FLOW }],
    drains: { pattern: 'triangular', spacing: 1 / 1.05, diameter: 1 / n, foot: thickness, ...smear },
    horizon,
  };
}
