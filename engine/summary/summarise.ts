import { sampleStandardDeviation } from 'simple-statistics';
import type { Model } from '../project/model.ts';
import type { ClampCounts, Realisations } from '../settlement/realisations.ts';
import { halfWidth } from './confidenceBand.ts';
import { medianConvergence } from './convergence.ts';
import { driverInputs } from './driverInputs.ts';
import { drivers, type RankedInputs } from './drivers.ts';
import { ENGINE_VERSION } from './engineVersion.ts';
import { exceedance } from './exceedance.ts';
import { mean } from './mean.ts';
import { percentilesInTime } from './percentilesInTime.ts';
import { percentileSorted, percentileWithBand } from './percentile.ts';
import { quantities } from './quantities.ts';
import { quantityValues } from './quantityValues.ts';
import { limitedQuantity } from './runningChance.ts';
import { sortedColumn } from './sortedColumn.ts';
import type { Estimate, NumericalError, Quantity, QuantitySummary, Summary } from './summary.ts';
import { summariseLimit } from './summariseLimit.ts';

/** What the summary takes over from the central realisation. */
export interface CentralPart {
  readonly central: readonly (readonly number[])[];
  readonly numericalError: NumericalError | null;
  readonly warnings: readonly string[];
}

/**
 * The summary of some replicates, pooled. Their order does not matter: the same set gives the same bytes.
 *
 * @param replicates one or more, each once
 * @throws where there is none, or one stands twice
 */
export function summarise(model: Model, replicates: readonly Realisations[], central: CentralPart): Summary {
  const pooled = [...replicates].sort((a, b) => a.replicate - b.replicate);
  refuseUnfit(pooled);
  const list = quantities(model);
  const values = list.map((quantity) => quantityValues(model, quantity, pooled));
  const inputsOf = driverInputs(model, pooled);
  const counts = pooled.map(({ count }) => count);
  return {
    model,
    provenance: {
      engineVersion: ENGINE_VERSION,
      seed: model.sampling.seed,
      replicates: pooled.map(({ replicate }) => replicate),
      realisations: counts.reduce((sum, count) => sum + count, 0),
    },
    quantities: list.map((quantity, i) =>
      summariseQuantity(model, quantity, values[i], counts, inputsOf(quantity)),
    ),
    limits: model.limits.map((limit) => {
      const quantity = limitedQuantity(list, limit);
      return summariseLimit(limit, quantity, perReplicate(values[quantity], counts));
    }),
    timeBands: model.points.map((_, point) => percentilesInTime(model, pooled, point)),
    counts: addedCounts(pooled.map(({ counts: own }) => own)),
    numericalError: central.numericalError,
    central: central.central,
    warnings: central.warnings,
    fillVolume: {
      placed: meanWithBand(pooled.map(({ fillVolume, count }) => fillVolume.subarray(0, count))),
      topUp: meanWithBand(pooled.map(({ fillVolume, count }) => fillVolume.subarray(count))),
    },
  };
}

function refuseUnfit(pooled: readonly Realisations[]): void {
  if (!(pooled.length > 0)) throw new RangeError('summarise: there must be a replicate, got none');
  const twice = pooled.find(({ replicate }, i) => i > 0 && replicate === pooled[i - 1].replicate);
  if (twice) throw new RangeError(`summarise: each replicate must stand once, got ${twice.replicate} twice`);
}

/** Cuts a pooled column into those of the replicates. */
function perReplicate(values: Float64Array, counts: readonly number[]): Float64Array[] {
  let offset = 0;
  return counts.map((count) => values.subarray(offset, (offset += count)));
}

function summariseQuantity(
  model: Model,
  quantity: Quantity,
  values: Float64Array,
  counts: readonly number[],
  inputs: RankedInputs,
): QuantitySummary {
  const { order, sorted, ofReplicates } = sortedColumn(values, counts);
  const absolute = quantity.pair >= 0 ? sortedColumn(values.map(Math.abs), counts) : { sorted, ofReplicates };
  return {
    quantity,
    mean: meanWithBand(perReplicate(values, counts)),
    deviation: sampleStandardDeviation(Array.from(values)),
    percentiles: model.results.percentiles.map((percent) => ({
      percent,
      estimate: percentileWithBand(sorted, ofReplicates, percent / 100),
    })),
    exceedance: exceedance(absolute.sorted, absolute.ofReplicates),
    drivers: drivers(inputs, values, order),
    convergence: medianConvergence(
      ofReplicates.map((own) => percentileSorted(own, 0.5)),
      counts,
    ),
  };
}

/** Mean of all values with its band; NaN where a value is not finite. */
function meanWithBand(ofReplicates: readonly Float64Array[]): Estimate {
  const means = ofReplicates.map(mean);
  const weights = ofReplicates.map((column) => column.length);
  const count = weights.reduce((sum, weight) => sum + weight, 0);
  const value = means.reduce((sum, own, i) => sum + own * (weights[i] / count), 0);
  if (!Number.isFinite(value)) return { value: NaN, low: NaN, high: NaN };
  const half = halfWidth(means);
  return { value, low: value - half, high: value + half };
}

function addedCounts(all: readonly ClampCounts[]): ClampCounts {
  const added: Record<string, number> = {};
  for (const counts of all) {
    for (const [name, count] of Object.entries(counts)) added[name] = (added[name] ?? 0) + count;
  }
  return added as unknown as ClampCounts;
}
