/** What a test changes at will, wrong shapes among it. */
// eslint-disable-next-line @typescript-eslint/no-explicit-any
export type Loose = any;

/** A small valid project, invented, without anything that may be left out. A new one at each call. */
export function plainProject(): Record<string, Loose> {
  return {
    format: 'slow-ground-project',
    version: 1,
    name: 'invented small project',
    soils: [
      {
        name: 'clay',
        behaviour: 'compressible',
        unit_weight_kN_m3: 16,
        compression_index: { marginal: 'lognormal', mean: 0.6, cov: 0.25 },
        recompression_ratio: 0.12,
        initial_void_ratio: { marginal: 'normal', mean: 1.6, deviation: 0.15, low: 1, high: 2.2 },
        preconsolidation: { ocr: 1.2 },
        consolidation: { cv_m2_per_year: { marginal: 'lognormal', mean: 2, cov: 0.4 } },
      },
      { name: 'sand', behaviour: 'stiff_free_draining', unit_weight_kN_m3: 19, modulus_kPa: 30000 },
    ],
    layers: [
      { name: 'upper clay', soil: 'clay', thickness_m: 5 },
      { name: 'lower sand', soil: 'sand', thickness_m: 3 },
    ],
    water: { depth_m: 1 },
    boundaries: { top: 'drained', base: 'drained' },
    fill: {
      lifts: [
        {
          name: 'bank',
          crest_centre_x_m: 0,
          crest_width_m: 12,
          left_slope_h_per_v: 2,
          right_slope_h_per_v: 2,
          thickness_m: 2.5,
          unit_weight_kN_m3: 19,
          placing: { start_year: 0, end_year: 0.3 },
        },
      ],
    },
    points: [{ name: 'centre', x_m: 0 }],
    times: { handover_year: 1, horizon_year: 30 },
    sampling: { realisations: 1000, seed: 7 },
  };
}

const SOURCE = { kind: 'judgement', text: 'invented' };
const VARIES = { share_of_variance: 0.5, vertical_scale_m: 1, horizontal_scale_m: 30 };

/** A valid project, invented, with every key of the file and every kind of marginal. A new one at each call. */
export function fullProject(): Record<string, Loose> {
  const plain = plainProject();
  return structuredClone({
    $schema: '../schema/project.schema.json',
    ...plain,
    name: 'invented project with every key',
    notes: 'Invented.',
    soils: [
      {
        ...plain.soils[0],
        id: 'c',
        note: 'invented',
        unit_weight_kN_m3: { marginal: 'fixed', value: 16, source: SOURCE, note: 'invented' },
        compression_index: {
          marginal: 'lognormal',
          mean: 0.6,
          deviation: 0.15,
          varies: VARIES,
          source: { kind: 'test' },
        },
        swelling_ratio: { marginal: 'uniform', low: 0.08, high: 0.14 },
        preconsolidation: {
          pop_kPa: { marginal: 'beta', low: -2, high: 30, mean: 12, deviation: 5, varies: VARIES },
        },
        consolidation: {
          cv_m2_per_year: { marginal: 'pert', low: 1, best: 2, high: 5, varies: VARIES },
          permeability_index: 0.7,
        },
        ch_over_cv: { marginal: 'triangular', low: 1, best: 2, high: 3 },
        pre_yield_permeability_factor: 2,
        secondary_ratio: { marginal: 'normal', mean: 0.04, cov: 0.2, low: 0.02 },
      },
      {
        name: 'organic clay',
        behaviour: 'compressible',
        unit_weight_kN_m3: 14,
        compression_index: 1.2,
        recompression_index: 0.15,
        swelling_index: 0.12,
        initial_void_ratio: { marginal: 'beta', low: 1.5, high: 4, alpha: 2, beta: 3 },
        preconsolidation: {
          profile: [
            { depth_m: 5, stress_kPa: { marginal: 'normal', mean: 60, deviation: 6 } },
            { depth_m: 9, stress_kPa: 80 },
          ],
        },
        consolidation: {
          k0_m_per_s: { marginal: 'lognormal', median: 1e-9, cov: 0.6 },
          permeability_index: 1,
        },
        secondary_index: 0.04,
      },
      { ...plain.soils[1], note: 'invented' },
      {
        name: 'till',
        id: 't',
        note: 'invented',
        behaviour: 'stiff_poorly_draining',
        unit_weight_kN_m3: 20,
        modulus_kPa: { marginal: 'table', values: [10000, 20000, 40000], cumulative: [0, 0.5, 1] },
        cv_m2_per_year: 20,
        ch_over_cv: 1,
      },
    ],
    layers: [
      { name: 'blanket', soil: 'sand', thickness_m: 0.6 },
      {
        name: 'clay',
        id: 'l',
        note: 'invented',
        soil: 'clay',
        borings: [
          { x_m: -20, thickness_m: 4 },
          { x_m: 20, thickness_m: 6 },
        ],
        thickness_factor: {
          marginal: 'lognormal',
          median: 1,
          cov: 0.1,
          varies: { share_of_variance: 0.5, horizontal_scale_m: 20 },
        },
      },
      { name: 'organic clay', soil: 'organic clay', thickness_m: { marginal: 'uniform', low: 3, high: 4 } },
      { name: 'till', soil: 'till', thickness_m: 2 },
    ],
    water: { depth_m: 0.5, base_excess_head_m: 0.3, note: 'invented' },
    boundaries: { top: 'drained', base: 'closed', note: 'invented' },
    fill: {
      note: 'invented',
      lifts: [
        {
          ...withoutPlacing(plain.fill.lifts[0]),
          name: 'old bank',
          id: 'o',
          thickness_m: 0.8,
          standing: true,
        },
        {
          ...plain.fill.lifts[0],
          note: 'invented',
          standing: false,
          thickness_m: { marginal: 'normal', mean: 2.5, deviation: 0.1 },
          placing: { start_year: 0, end_year: { marginal: 'triangular', low: 0.2, best: 0.3, high: 0.5 } },
          removal: { start_year: 1.5, end_year: 1.6 },
          length: { from_m: -30, to_m: 200 },
        },
      ],
      held_to_level: true,
      held_until_year: 3,
      top_up_unit_weight_kN_m3: 18,
      submergence: false,
      wide: false,
    },
    surface_loads: [
      {
        name: 'traffic',
        id: 'q',
        note: 'invented',
        kind: 'traffic',
        pressure_kPa: { marginal: 'uniform', low: 5, high: 10 },
        x1_m: -5,
        x2_m: 5,
        length: { from_m: -50 },
        start_year: 2,
        end_year: 20,
      },
    ],
    drains: {
      note: 'invented',
      pattern: 'triangular',
      spacing_m: 1.3,
      band: { width_mm: 100, thickness_mm: 4 },
      smear_ratio: { marginal: 'uniform', low: 1.5, high: 4 },
      permeability_ratio: { marginal: 'triangular', low: 1, best: 2, high: 4 },
      discharge_capacity_m3_per_year: { marginal: 'lognormal', mean: 100, cov: 0.5 },
      top_m: 0,
      foot_m: 8,
      installed_year: 0,
      from_x_m: -15,
      to_x_m: 15,
    },
    vacuum: {
      note: 'invented',
      pressure_kPa: { marginal: 'uniform', low: 60, high: 80 },
      start_year: 0,
      end_year: 1,
    },
    secondary: { included: true, reduction_floor: 0.1, reduction_exponent: 6, note: 'invented' },
    points: [
      { name: 'centre', x_m: 0, note: 'invented' },
      { name: 'edge', x_m: 9 },
      { name: 'pier', x_m: 14, fixed: true },
    ],
    pairs: [
      { first: 'centre', second: 'edge' },
      { name: 'to the pier', note: 'invented', first: 'edge', second: 'pier' },
    ],
    times: { handover_year: 2, horizon_year: 40, output_years: [0.5, 2, 10, 40], note: 'invented' },
    limits: [
      { name: 'all', note: 'invented', result: 'settlement_at_horizon', point: 'centre', limit_mm: 500 },
      { result: 'settlement_after_handover', point: 'centre', limit_mm: 100 },
      { result: 'differential_at_horizon', pair: 'centre – edge', limit_mm: 80 },
      { result: 'differential_after_handover', pair: 'to the pier', limit_mm: 50 },
      { result: 'slope_at_horizon', pair: 'centre – edge', limit_m_per_m: 0.01 },
      { result: 'slope_after_handover', pair: 'to the pier', limit_m_per_m: 0.008 },
      { result: 'rate_at_handover', point: 'edge', limit_mm_per_year: 20 },
      { result: 'settlement_still_to_come', point: 'centre', limit_mm: 30, date_year: 10 },
    ],
    model_factors: {
      settlement: { marginal: 'lognormal', mean: 1, cov: 0.1 },
      rate: { marginal: 'fixed', value: 1.1 },
      note: 'invented',
    },
    rank_correlations: [
      {
        between: ['soil/c/compression_index', 'soil/c/initial_void_ratio'],
        rank_correlation: 0.6,
        note: 'invented',
      },
      { between: ['soil/c/compression_index', 'soil/c/cv'], rank_correlation: -0.3 },
    ],
    sampling: { realisations: 200, seed: 5, note: 'invented' },
    results: { percentiles: [10, 50, 90], degree_of_consolidation: 0.95, note: 'invented' },
  });
}

function withoutPlacing(lift: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(lift).filter(([key]) => key !== 'placing'));
}
