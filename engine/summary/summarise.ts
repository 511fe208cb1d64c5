import { mean as meanOf, sampleStandardDeviation } from 'simple-statistics';
import type { Model } from '../project/model.ts';
import type { ClampCounts, Realisations } from '../settlement/realisations.ts';
import { bandOfShare, halfWidth } from './confidenceBand.ts';
import { convergence } from './convergence.ts';
import { drivers, rankedInput, type RankedInput } from './drivers.ts';
import { ENGINE_VERSION } from './engineVersion.ts';
import { exceedance } from './exceedance.ts';
import { percentilesInTime } from './percentilesInTime.ts';
import { percentileSorted, percentileWithBand } from './percentile.ts';
import { quantities } from './quantities.ts';
import { quantityValues } from './quantityValues.ts';
import { countAbove, limitedQuantity } from './runningChance.ts';
import type {
  Estimate,
  LimitSummary,
  NumericalError,
  Quantity,
  QuantitySummary,
  Summary,
} from './summary.ts';

/** What the summary takes over from the central realisation. */
export interface CentralPart {
  readonly central: readonly (readonly number[])[];
  readonly numericalError: NumericalError | null;
  readonly warnings: readonly string[];
}

/**
 * The summary of some replicates, pooled. Their order does not matter: the same set gives the same bytes.
 *
 * @param replicates one or more
 */
export function summarise(model: Model, replicates: readonly Realisations[], central: CentralPart): Summary {
  const pooled = [...replicates].sort((a, b) => a.replicate - b.replicate);
  const list = quantities(model);
  const values = list.map((quantity) => quantityValues(model, quantity, pooled));
  const inputsAt = inputsByPlace(model, pooled);
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
      summariseQuantity(model, quantity, values[i], counts, inputsAt(quantity)),
    ),
    limits: model.limits.map((_, limit) => summariseLimit(model, limit, list, values, counts)),
    timeBands: model.points.map((_, point) => percentilesInTime(model, pooled, point)),
    counts: addedCounts(pooled.map(({ counts: own }) => own)),
    numericalError: central.numericalError,
    central: central.central,
    warnings: central.warnings,
    fillVolume: {
      placed: meanWithBand(pooled.map(({ fillVolume, count }) => fillVolume.slice(0, count))),
      topUp: meanWithBand(pooled.map(({ fillVolume, count }) => fillVolume.slice(count))),
    },
  };
}

/** Cuts a pooled column into those of the replicates. */
function perReplicate(values: Float64Array, counts: readonly number[]): Float64Array[] {
  let offset = 0;
  return counts.map((count) => values.slice(offset, (offset += count)));
}

function summariseQuantity(
  model: Model,
  quantity: Quantity,
  values: Float64Array,
  counts: readonly number[],
  inputs: readonly RankedInput[],
): QuantitySummary {
  const own = perReplicate(values, counts);
  const mean = meanWithBand(own);
  const sortedOwn = own.map((column) => column.slice().sort());
  const sorted = values.slice().sort();
  const isOfPair = quantity.pair >= 0;
  const absolute = isOfPair ? values.map(Math.abs).sort() : sorted;
  const absoluteOwn = isOfPair ? own.map((column) => column.map(Math.abs).sort()) : sortedOwn;
  return {
    quantity,
    mean,
    deviation: sampleStandardDeviation(Array.from(values)),
    percentiles: model.results.percentiles.map((percent) => ({
      percent,
      estimate: percentileWithBand(sorted, sortedOwn, percent / 100),
    })),
    exceedance: exceedance(absolute, absoluteOwn),
    drivers: drivers(inputs, values),
    convergence: convergence(
      sortedOwn.map((column) => percentileSorted(column, 0.5)),
      counts,
    ).map(({ realisations, value, halfWidth: half }) => ({ realisations, median: value, halfWidth: half })),
  };
}

function summariseLimit(
  model: Model,
  place: number,
  list: readonly Quantity[],
  values: readonly Float64Array[],
  counts: readonly number[],
): LimitSummary {
  const limit = model.limits[place];
  const quantity = limitedQuantity(list, limit);
  const ofReplicates = perReplicate(values[quantity], counts).map((column) => countAbove(column, limit));
  const above = ofReplicates.reduce((sum, count) => sum + count, 0);
  const of = counts.reduce((sum, count) => sum + count, 0);
  const shares = ofReplicates.map((count, i) => count / counts[i]);
  return {
    quantity,
    chance: bandOfShare(ofReplicates, counts),
    above,
    of,
    // the 'rule of three': with none of N, the upper 95 % limit is close to 3/N
    boundWhenNone: above === 0 || above === of ? 3 / of : NaN,
    convergence: convergence(shares, counts).map(({ realisations, value, halfWidth: half }) => ({
      realisations,
      chance: value,
      halfWidth: half,
    })),
  };
}

/** Mean of all values with its band; NaN where a value is not finite. */
function meanWithBand(ofReplicates: readonly Float64Array[]): Estimate {
  const means = ofReplicates.map((column) => meanOf(Array.from(column)));
  const weights = ofReplicates.map((column) => column.length);
  const count = weights.reduce((sum, weight) => sum + weight, 0);
  const value = means.reduce((sum, own, i) => sum + own * (weights[i] / count), 0);
  if (!Number.isFinite(value)) return { value: NaN, low: NaN, high: NaN };
  const half = halfWidth(means);
  return { value, low: value - half, high: value + half };
}

/**
 * The inputs as a quantity sees them: at its point; of a pair the common value, or for an input that varies from
 * place to place the difference, second minus first. Ranked once for each place.
 */
function inputsByPlace(model: Model, pooled: readonly Realisations[]): (quantity: Quantity) => RankedInput[] {
  const kept = new Map<string, RankedInput>();
  const columnAt = (input: number, point: number) => {
    const count = pooled.reduce((sum, replicate) => sum + replicate.count, 0);
    const values = new Float64Array(count);
    let offset = 0;
    for (const { inputs, count: own } of pooled) {
      const start = inputs[input].length > own ? point * own : 0;
      values.set(inputs[input].subarray(start, start + own), offset);
      offset += own;
    }
    return values;
  };
  return (quantity) =>
    model.inputs.map(({ spread }, input) => {
      const varies = spread !== null;
      const place = varies
        ? quantity.pair >= 0
          ? `pair ${quantity.pair}`
          : `point ${quantity.point}`
        : 'all';
      const key = `${input} ${place}`;
      const known = kept.get(key);
      if (known !== undefined) return known;
      let values: Float64Array;
      if (varies && quantity.pair >= 0) {
        const { first, second } = model.pairs[quantity.pair];
        const atFirst = columnAt(input, first);
        values = columnAt(input, second).map((value, i) => value - atFirst[i]);
      } else values = columnAt(input, Math.max(0, quantity.point));
      const ranked = rankedInput(input, values);
      kept.set(key, ranked);
      return ranked;
    });
}

function addedCounts(all: readonly ClampCounts[]): ClampCounts {
  const added: Record<string, number> = {};
  for (const counts of all) {
    for (const [name, count] of Object.entries(counts)) added[name] = (added[name] ?? 0) + count;
  }
  return added as unknown as ClampCounts;
}
