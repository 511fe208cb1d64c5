import type { Model } from '../../../engine/project/model.ts';
import { randomStream } from '../../../engine/random/randomStream.ts';
import type { Realisations } from '../../../engine/settlement/realisations.ts';
import { modelOf } from '../../modelOf.ts';
import { plainProject } from '../project/plainProject.ts';

/** A model with a fixed point, two that settle, pairs with and without slope, and every kind of limit; invented. */
export function summaryModel(): Model {
  const project = plainProject();
  project.soils[0].compression_index = {
    marginal: 'lognormal',
    mean: 0.6,
    cov: 0.25,
    varies: { share_of_variance: 0.5, vertical_scale_m: 1, horizontal_scale_m: 30 },
  };
  project.points = [
    { name: 'pile', x_m: -8, fixed: true },
    { name: 'left', x_m: -4 },
    { name: 'right', x_m: 6 },
    { name: 'same place', x_m: 6 },
  ];
  project.pairs = [
    { name: 'step', first: 'right', second: 'same place' },
    { name: 'slab', first: 'pile', second: 'left' },
    { name: 'turned slab', first: 'left', second: 'pile' },
    { name: 'span', first: 'right', second: 'left' },
  ];
  project.times = { handover_year: 1, horizon_year: 30, output_years: [0.5, 10] };
  project.results = { percentiles: [5, 50, 95], degree_of_consolidation: 0.9 };
  project.limits = [
    { result: 'settlement_after_handover', point: 'left', limit_mm: 100 },
    { result: 'settlement_still_to_come', point: 'left', limit_mm: 50, date_year: 5 },
    { result: 'settlement_still_to_come', point: 'right', limit_mm: 50, date_year: 5 },
    { result: 'settlement_still_to_come', point: 'left', limit_mm: 50, date_year: 8 },
    { name: 'tighter', result: 'settlement_still_to_come', point: 'left', limit_mm: 20, date_year: 5 },
    { result: 'differential_at_horizon', pair: 'span', limit_mm: 30 },
    { result: 'slope_after_handover', pair: 'span', limit_m_per_m: 0.002 },
    { result: 'rate_at_handover', point: 'right', limit_mm_per_year: 40 },
  ];
  return modelOf(project);
}

const HISTORY = Float64Array.of(0, 0.5, 1, 2, 5, 8, 10, 30);

/** A replicate with invented numbers of the right shape, which no ground has given. */
export function inventedReplicate(model: Model, replicate: number, count = 100): Realisations {
  const stream = randomStream(23, 'invented', replicate);
  const points = model.points.length;
  const drawn = (length: number, scale = 1) => Float64Array.from({ length }, () => scale * stream.next());
  const settlement = new Float64Array(points * HISTORY.length * count);
  model.points.forEach(({ fixed }, point) => {
    for (let r = 0; r < count && !fixed; r += 1) {
      let sum = 0;
      HISTORY.forEach((_, time) => {
        settlement[(point * HISTORY.length + time) * count + r] = sum;
        sum += 0.05 * stream.next();
      });
    }
  });
  const stillToCome = model.limits.filter(({ result }) => result === 'settlement_still_to_come').length;
  return {
    replicate,
    count,
    historyTimes: HISTORY,
    settlement,
    secondaryAfterHandover: drawn(points * count, 0.02),
    rateAtHandover: drawn(points * count, 0.06),
    timeToLimit: drawn(stillToCome * count, 20),
    timeToDegree: drawn(points * count, 40).map((date) => (date > 30 ? Infinity : date)),
    topUp: drawn(points * count, 0.3),
    fillVolume: drawn(2 * count, 50),
    inputs: model.inputs.map(({ spread }) => drawn((spread === null ? 1 : points) * count)),
    counts: {
      preconsolidationRaised: replicate,
      recompressionSetToCompression: 1,
      cutAtLimits: 2,
      voidRatioBelowTenth: 0,
      strainAboveThirtyPercent: 3,
      initialStressAtFloor: 0,
      vacuumDrainsCrossSeam: 0,
      datesPutInOrder: 0,
      smearReachesInfluence: 0,
      effectiveStressVanished: 0,
      stepsNotClosed: 0,
    },
  };
}

/** Settlement of a point at a history time in one realisation, read as its shape is documented. */
export function settlementOf(of: Realisations, point: number, date: number, realisation: number): number {
  const time = of.historyTimes.indexOf(date);
  return of.settlement[(point * of.historyTimes.length + time) * of.count + realisation];
}
