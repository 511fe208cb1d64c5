import { readFileSync } from 'node:fs';
import { mean, quantile, sampleStandardDeviation } from 'simple-statistics';
import { beforeAll, describe, expect, it } from 'vitest';
import { centralGround } from '../../engine/sampling/centralGround.ts';
import { realise, WORKING_RESOLUTION } from '../../engine/settlement/realise.ts';
import type { Realisations } from '../../engine/settlement/realisations.ts';
import { runReplicate } from '../../engine/study.ts';
import { modelOf } from '../modelOf.ts';
import { projectFromScenario, type Scenario } from './projectFromScenario.ts';

/**
 * The fifth problem: seven kinds of marginal, rank correlations, model factors, a surcharge removed before
 * primary ends, secondary compression; against 4,000 realisations of an independent implementation. Two
 * samples differ, so percentiles are compared within the joint half-width of their 95 % bands.
 */
interface Distribution {
  percentiles: Record<string, number>;
  half_width_95: Record<string, number>;
  mean: number;
}
interface Answer {
  points: Record<
    string,
    {
      total_at_horizon_m: Distribution;
      residual_after_handover_m: Distribution;
      settlement_at_times_m: ({ time_year: number } & Distribution)[];
      share_of_realisations_with_preconsolidation_raised: number;
    }
  >;
  pairs: { second_minus_first_at_horizon_m: Distribution }[];
  central_realisation_marginal_medians: {
    points: Record<string, { times: { time_year: number; settlement_m: number }[] }>;
  };
}

const REPLICATES = 40;
/** Student's t, 97.5 %, 39 degrees of freedom (printed tables: 2.023). */
const T_QUANTILE = 2.023;

const read = <T>(file: string): T => JSON.parse(readFileSync(new URL(file, import.meta.url), 'utf8')) as T;
const answer = read<Answer>('probabilistic_correlated.answer.json');
const model = modelOf(projectFromScenario(read<Scenario>('probabilistic_correlated.json')));
let replicates: Realisations[] = [];

beforeAll(() => {
  replicates = Array.from({ length: REPLICATES }, (_, replicate) => runReplicate(model, replicate));
}, 120_000);

/** Settlement of a point at a date, one array a replicate. */
function settlementAt(point: number, date: number): number[][] {
  return replicates.map(({ historyTimes, settlement, count }) => {
    const time = historyTimes.findIndex((other) => Math.abs(other - date) < 1e-6);
    const start = (point * historyTimes.length + time) * count;
    return [...settlement.subarray(start, start + count)];
  });
}

const difference = (a: number[][], b: number[][]) =>
  a.map((row, i) => row.map((value, r) => value - b[i][r]));

/** Largest distance of a percentile from 5 to 95, in joint half-widths. */
function largestDistance(values: number[][], expected: Distribution): number {
  const pooled = values.flat();
  return Math.max(
    ...['5', '10', '25', '50', '75', '90', '95'].map((percent) => {
      const share = Number(percent) / 100;
      const ofReplicates = values.map((replicate) => quantile(replicate, share));
      const halfWidth = (T_QUANTILE * sampleStandardDeviation(ofReplicates)) / Math.sqrt(REPLICATES);
      const joint = Math.sqrt(halfWidth ** 2 + expected.half_width_95[percent] ** 2);
      return Math.abs(quantile(pooled, share) - expected.percentiles[percent]) / joint;
    }),
  );
}

describe.each(['centre', 'shoulder'])('the problem probabilistic_correlated at the %s', (name) => {
  const point = model.points.findIndex((other) => other.name === name);
  const expected = answer.points[name];

  it('has no percentile from 5 to 95 of the settlement at a listed time outside twice the joint half-width', () => {
    for (const atTime of expected.settlement_at_times_m) {
      expect(largestDistance(settlementAt(point, atTime.time_year), atTime)).toBeLessThan(2);
    }
  });

  it('has no percentile from 5 to 95 of the settlement after handover outside twice the joint half-width', () => {
    const after = difference(settlementAt(point, model.horizon), settlementAt(point, model.handover));
    expect(largestDistance(after, expected.residual_after_handover_m)).toBeLessThan(2);
  });

  it('has means within 0.5 %', () => {
    for (const atTime of expected.settlement_at_times_m) {
      const found = mean(settlementAt(point, atTime.time_year).flat());
      expect(Math.abs(found / atTime.mean - 1)).toBeLessThan(0.005);
    }
    const after = difference(settlementAt(point, model.horizon), settlementAt(point, model.handover));
    expect(Math.abs(mean(after.flat()) / expected.residual_after_handover_m.mean - 1)).toBeLessThan(0.005);
  });
});

describe('the problem probabilistic_correlated', () => {
  it('has no percentile from 5 to 95 of the differential settlement outside twice the joint half-width', () => {
    const [first, second] = [settlementAt(0, model.horizon), settlementAt(1, model.horizon)];
    const expected = answer.pairs[0].second_minus_first_at_horizon_m;
    expect(largestDistance(difference(second, first), expected)).toBeLessThan(2);
  });

  it('raises the preconsolidation stress in the share of realisations expected, within its binomial scatter', () => {
    const share = answer.points.centre.share_of_realisations_with_preconsolidation_raised;
    const raised = replicates.reduce((sum, { counts }) => sum + counts.preconsolidationRaised, 0);
    const realisations = 100 * REPLICATES;
    const deviation = Math.sqrt((share * (1 - share)) / realisations);
    expect(Math.abs(raised / realisations - share)).toBeLessThan(3 * Math.SQRT2 * deviation);
  });

  it.each([
    ['on the working grid within 1 %', 1, 0.01],
    ['with cells and steps four times finer within 0.3 %', 4, 0.003],
  ])('meets the central realisation %s of its final settlement', (_, times, tolerance) => {
    const resolution = { cells: times * WORKING_RESOLUTION.cells, steps: times * WORKING_RESOLUTION.steps };
    const central = realise(model, centralGround(model), resolution);
    const dates = [...central.historyTimes];
    model.points.forEach((point, index) => {
      const expected = answer.central_realisation_marginal_medians.points[point.name].times;
      const final = Math.max(...expected.map((time) => time.settlement_m));
      for (const { time_year, settlement_m } of expected) {
        const at = dates.findIndex((date) => Math.abs(date - time_year) < 1e-6);
        const found = central.settlement[index * dates.length + at];
        expect(Math.abs(found - settlement_m) / final).toBeLessThan(tolerance);
      }
    });
  });
});
