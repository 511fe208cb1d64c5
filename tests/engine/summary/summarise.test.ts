import { describe, expect, it } from 'vitest';
import { centralStudy, runReplicate } from '../../../engine/study.ts';
import { quantityValues } from '../../../engine/summary/quantityValues.ts';
import { runningChances } from '../../../engine/summary/runningChance.ts';
import { summarise } from '../../../engine/summary/summarise.ts';
import { modelOf } from '../../modelOf.ts';

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
