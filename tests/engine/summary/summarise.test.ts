import { mean, sampleRankCorrelation, sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { centralStudy, runReplicate } from '../../../engine/study.ts';
import { quantityValues } from '../../../engine/summary/quantityValues.ts';
import { runningChances } from '../../../engine/summary/runningChance.ts';
import { summarise } from '../../../engine/summary/summarise.ts';
import { modelOf } from '../../modelOf.ts';
import { inventedReplicate, summaryModel } from './inventedRealisations.ts';

const model = modelOf({
  format: 'slow-ground-project',
  version: 1,
  name: 'invented',
  soils: [
    {
      name: 'clay',
      behaviour: 'compressible',
      unit_weight_kN_m3: 16,
      compression_index: {
        marginal: 'lognormal',
        mean: 0.6,
        cov: 0.2,
        varies: { share_of_variance: 0.4, vertical_scale_m: 1, horizontal_scale_m: 20 },
      },
      recompression_ratio: 0.1,
      initial_void_ratio: 1.5,
      preconsolidation: { ocr: { marginal: 'uniform', low: 1.05, high: 1.5 } },
      consolidation: { cv_m2_per_year: 2 },
    },
  ],
  layers: [{ name: 'clay', soil: 'clay', thickness_m: 4 }],
  water: { depth_m: 0.5 },
  boundaries: { top: 'drained', base: 'drained' },
  fill: {
    lifts: [
      {
        name: 'fill',
        crest_centre_x_m: 0,
        crest_width_m: 20,
        left_slope_h_per_v: 2,
        right_slope_h_per_v: 2,
        thickness_m: 2,
        unit_weight_kN_m3: 19,
        placing: { start_year: 0, end_year: 0.2 },
      },
    ],
  },
  points: [
    { name: 'left', x_m: -4 },
    { name: 'right', x_m: 4 },
    { name: 'pile', x_m: 10, fixed: true },
  ],
  pairs: [{ name: 'slab', first: 'pile', second: 'right' }],
  times: { handover_year: 0.5, horizon_year: 10, output_years: [1] },
  limits: [
    { result: 'settlement_after_handover', point: 'left', limit_mm: 120 },
    { result: 'slope_at_horizon', pair: 'slab', limit_m_per_m: 0.05 },
  ],
  sampling: { realisations: 300, seed: 4 },
});
const replicates = [0, 1, 2].map((replicate) => runReplicate(model, replicate));
const central = centralStudy(model);
const summary = summarise(model, replicates, central);

describe('a summary', () => {
  it('is the same whatever the order of the replicates', () => {
    const turned = summarise(model, [replicates[2], replicates[0], replicates[1]], central);
    expect(JSON.stringify(turned)).toBe(JSON.stringify(summary));
  });

  it('leaves out what a fixed point would settle', () => {
    expect(summary.quantities.some(({ quantity }) => quantity.point === 2)).toBe(false);
  });

  it('has the differential settlement of a pair as second minus first, and its slope over the distance', () => {
    const values = (id: string) =>
      quantityValues(
        model,
        summary.quantities.find(({ quantity }) => quantity.id === id)!.quantity,
        replicates,
      );
    const right = values('settlement_at_horizon@right');
    values('differential_at_horizon@slab').forEach((value, r) => expect(value).toBeCloseTo(right[r], 14));
    values('slope_at_horizon@slab').forEach((value, r) => expect(value).toBeCloseTo(right[r] / 6, 14));
  });

  it('counts for each limit the realisations above it', () => {
    const { quantity } = summary.quantities[summary.limits[0].quantity];
    const above = quantityValues(model, quantity, replicates).filter((value) => value > 0.12).length;
    expect(summary.limits[0].above).toBe(above);
    expect(summary.limits[0].chance.value).toBeCloseTo(above / 300, 14);
    expect(runningChances(model, replicates)[0].value).toBeCloseTo(above / 300, 14);
  });

  it('has no band before ten replicates', () => {
    expect(summary.limits[0].chance.low).toBeNaN();
    expect(summary.quantities[0].mean.low).toBeNaN();
  });

  it('names the compression index as a driver of what settles, more at a softer ground', () => {
    const [{ drivers }] = summary.quantities;
    const index = model.inputs.findIndex(({ name }) => name === 'soil/clay/compression_index');
    expect(drivers[index].rankCorrelation).toBeGreaterThan(0.5);
  });
});

describe('a summary of invented realisations', () => {
  const invented = summaryModel();
  const many = Array.from({ length: 12 }, (_, r) => inventedReplicate(invented, r));
  const nothingCentral = { central: [], numericalError: null, warnings: [] };
  const found = summarise(invented, many, nothingCentral);
  const of = (id: string) => found.quantities.find(({ quantity }) => quantity.id === id)!;

  it('has for a pair with a fixed point the drivers of the point that settles, turned where that is the first', () => {
    const left = of('settlement_at_horizon@left').drivers;
    expect(left.length).toBeGreaterThan(2);
    expect(left.some(({ rankCorrelation }) => rankCorrelation !== 0)).toBe(true);
    expect(of('differential_at_horizon@slab').drivers).toEqual(left);
    of('differential_at_horizon@turned slab').drivers.forEach(({ rankCorrelation, firstOrderShare }, i) => {
      expect(rankCorrelation).toBeCloseTo(-left[i].rankCorrelation, 12);
      expect(firstOrderShare).toBeCloseTo(left[i].firstOrderShare, 12);
    });
  });

  it('has for two points that settle the rank correlation with the difference of an input that varies', () => {
    const input = invented.inputs.findIndex(({ spread }) => spread !== null);
    const { quantity, drivers } = of('differential_at_horizon@span');
    const { first, second } = invented.pairs[quantity.pair];
    const differences = many.flatMap(({ inputs, count }) =>
      Array.from(
        { length: count },
        (_, r) => inputs[input][second * count + r] - inputs[input][first * count + r],
      ),
    );
    const values = [...quantityValues(invented, quantity, many)];
    expect(drivers[input].rankCorrelation).toBeCloseTo(sampleRankCorrelation(differences, values), 12);
  });

  it('gives the exceedance of a pair without the sign, and its percentiles with it', () => {
    const { quantity, exceedance, percentiles } = of('differential_at_horizon@span');
    const values = [...quantityValues(invented, quantity, many)];
    expect(Math.min(...values)).toBeLessThan(0);
    expect(exceedance.values[0]).toBe(Math.min(...values.map(Math.abs)));
    expect(percentiles[0].estimate.value).toBeLessThan(0);
  });

  it('has percentiles of a date that is not always reached, and no mean', () => {
    const { mean, deviation, percentiles, exceedance } = of('time_to_degree@left');
    // invented dates run evenly to 40 years, those past 30 are not reached
    expect(percentiles.map(({ estimate }) => Number.isFinite(estimate.value))).toEqual([true, true, false]);
    expect(percentiles[2].estimate).toEqual({ value: Infinity, low: NaN, high: NaN });
    expect([mean.value, mean.low, mean.high, deviation]).toEqual([NaN, NaN, NaN, NaN]);
    const last = exceedance.values.length - 2;
    expect(exceedance.values[last]).toBeLessThanOrEqual(30);
    expect(exceedance.shares[last]).toBeCloseTo(0.25, 1);
  });

  it('has mean and deviation of another library, of realisations of each replicate alike', () => {
    const values = [...quantityValues(invented, of('settlement_at_horizon@left').quantity, many)];
    expect(of('settlement_at_horizon@left').mean.value).toBeCloseTo(mean(values), 13);
    expect(of('settlement_at_horizon@left').deviation).toBe(sampleStandardDeviation(values));
  });

  it('finds for each limit the quantity that it is set on', () => {
    expect(found.limits.map(({ quantity }) => found.quantities[quantity].quantity.id)).toEqual([
      'settlement_after_handover@left',
      'settlement_still_to_come 5@left',
      'settlement_still_to_come 5@right',
      'settlement_still_to_come 8@left',
      'settlement_still_to_come 5@left',
      'differential_at_horizon@span',
      'slope_after_handover@span',
      'rate_at_handover@right',
    ]);
  });

  it('says the same chances and bands as those shown on the way', () => {
    expect(runningChances(invented, many)).toEqual(found.limits.map(({ chance }) => chance));
  });

  it('adds up what was clamped, and keeps which replicates stand behind it', () => {
    expect(found.counts.preconsolidationRaised).toBe(66);
    expect(found.counts.strainAboveThirtyPercent).toBe(36);
    expect(found.provenance).toMatchObject({
      realisations: 1200,
      replicates: many.map(({ replicate }) => replicate),
    });
  });

  it('leaves what it is given unchanged', () => {
    const again = Array.from({ length: 12 }, (_, r) => inventedReplicate(invented, r));
    expect(many).toEqual(again);
  });

  it('refuses no replicate, and one that stands twice', () => {
    expect(() => summarise(invented, [], nothingCentral)).toThrow('there must be a replicate');
    expect(() => summarise(invented, [many[3], many[1], many[3]], nothingCentral)).toThrow('got 3 twice');
  });
});
