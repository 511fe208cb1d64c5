import type { Quantity, QuantitySummary, Summary, TimeBands } from '../../../engine/summary/summary.ts';
import { inventedModel } from './inventedModel.ts';

/** A thousand evenly spread results between two ends: the exceedance share is a straight line, known by hand. */
export function evenResult(quantity: Quantity, from: number, to: number): QuantitySummary {
  const steps = 200;
  const values = Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps);
  const shares = values.map((_, i) => 1 - i / steps);
  const at = (percent: number) => from + ((to - from) * percent) / 100;
  const banded = (value: number, half: number) => ({ value, low: value - half, high: value + half });
  return {
    quantity,
    mean: banded((from + to) / 2, 0.01 * (to - from)),
    deviation: (to - from) / Math.sqrt(12),
    percentiles: [5, 25, 50, 75, 95].map((percent) => ({
      percent,
      estimate: banded(at(percent), 0.02 * (to - from)),
    })),
    exceedance: {
      values,
      shares,
      low: shares.map((share) => Math.max(0, share - 0.03)),
      high: shares.map((share) => Math.min(1, share + 0.03)),
      unresolvedAbove: at(99),
    },
    drivers: [
      { input: 0, rankCorrelation: 0.71, rankRegression: 0.69, firstOrderShare: 0.48 },
      { input: 1, rankCorrelation: -0.42, rankRegression: -0.4, firstOrderShare: 0.17 },
      { input: 2, rankCorrelation: 0.2, rankRegression: 0.22, firstOrderShare: 0.05 },
    ],
    convergence: [1000, 2000, 3000].map((realisations) => ({
      realisations,
      median: at(50),
      halfWidth: 0.02 / Math.sqrt(realisations),
    })),
  };
}

const quantity = (
  kind: Quantity['kind'],
  label: string,
  unit: Quantity['unit'],
  point: number,
  pair = -1,
): Quantity => ({
  kind,
  id: `${kind}@${label}`,
  label,
  unit,
  point,
  pair,
  date: 2,
});

function timeBands(point: number, final: number): TimeBands {
  const times = Array.from({ length: 80 }, (_, i) => (30 * i) / 79);
  const bands = [0.6, 0.85, 1, 1.15, 1.4].map((factor, i) => {
    const values = times.map((time) => (final * factor * time) / (time + 1));
    return { percent: [5, 25, 50, 75, 95][i], values, low: values, high: values };
  });
  return { point, times, bands, mean: bands[2].values };
}

/** An invented answer, shaped like one of the engine; made by hand for tests of the page alone. */
export const inventedSummary: Summary = {
  model: inventedModel,
  provenance: {
    engineVersion: '0.0.0',
    seed: 7,
    replicates: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9],
    realisations: 1000,
  },
  quantities: [
    evenResult(
      quantity('settlement_after_handover', 'settlement after handover at Far end', 'm', 2),
      0,
      0.15,
    ),
    evenResult(quantity('settlement_at_horizon', 'settlement at the horizon at Far end', 'm', 2), 0.2, 0.9),
    evenResult(
      quantity('slope_after_handover', 'slope after handover, Abutment to near end', 'm/m', -1, 0),
      0,
      0.008,
    ),
  ],
  limits: [
    {
      quantity: 0,
      chance: { value: 0.333, low: 0.31, high: 0.36 },
      above: 333,
      of: 1000,
      boundWhenNone: NaN,
      convergence: [1000, 2000, 3000].map((realisations) => ({
        realisations,
        chance: 0.33,
        halfWidth: 0.8 / Math.sqrt(realisations),
      })),
    },
    {
      quantity: 2,
      chance: { value: 0.375, low: 0.35, high: 0.4 },
      above: 375,
      of: 1000,
      boundWhenNone: NaN,
      convergence: [],
    },
  ],
  timeBands: [timeBands(0, 0), timeBands(1, 0.4), timeBands(2, 0.7)],
  counts: {
    preconsolidationRaised: 12,
    recompressionSetToCompression: 0,
    cutAtLimits: 3,
    voidRatioBelowTenth: 0,
    strainAboveThirtyPercent: 0,
    initialStressAtFloor: 0,
    vacuumDrainsCrossSeam: 0,
    datesPutInOrder: 0,
    smearReachesInfluence: 0,
    stepsNotClosed: 0,
    effectiveStressVanished: 0,
  },
  numericalError: { largest: 0.0012, relative: 0.0021 },
  central: [[], [], []],
  warnings: ['Lateral spreading is likely to govern and is not computed: σ′_p matters.'],
  fillVolume: { placed: { value: 312, low: 310, high: 314 }, topUp: { value: 21, low: 20, high: 22 } },
};
