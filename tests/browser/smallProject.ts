/** A project that is quick to answer, invented: one clay over sand, one lift, one point that settles beside a fixed one. */
export function smallProject(name: string, realisations: number) {
  return {
    format: 'slow-ground-project',
    version: 1,
    name,
    soils: [
      {
        name: 'clay',
        behaviour: 'compressible',
        unit_weight_kN_m3: 16,
        compression_index: { marginal: 'lognormal', mean: 0.6, cov: 0.25 },
        recompression_ratio: 0.12,
        initial_void_ratio: 1.6,
        preconsolidation: { ocr: { marginal: 'uniform', low: 1.1, high: 1.6 } },
        consolidation: { cv_m2_per_year: { marginal: 'lognormal', mean: 2, cov: 0.5 } },
      },
      { name: 'sand', behaviour: 'stiff_free_draining', unit_weight_kN_m3: 19, modulus_kPa: 40_000 },
    ],
    layers: [
      { name: 'clay', soil: 'clay', thickness_m: 4 },
      { name: 'sand', soil: 'sand', thickness_m: 3 },
    ],
    water: { depth_m: 1 },
    boundaries: { top: 'drained', base: 'drained' },
    fill: {
      lifts: [
        {
          name: 'bank',
          crest_centre_x_m: 0,
          crest_width_m: 20,
          left_slope_h_per_v: 2,
          right_slope_h_per_v: 2,
          thickness_m: 3,
          unit_weight_kN_m3: 19,
          placing: { start_year: 0, end_year: 0.3 },
        },
      ],
    },
    points: [
      { name: 'crest', x_m: 0 },
      { name: 'pile', x_m: 14, fixed: true },
    ],
    pairs: [{ name: 'edge', first: 'pile', second: 'crest' }],
    times: { handover_year: 1, horizon_year: 20, output_years: [1, 20] },
    limits: [
      { name: 'ride', result: 'settlement_after_handover', point: 'crest', limit_mm: 100 },
      { name: 'kink', result: 'slope_after_handover', pair: 'edge', limit_m_per_m: 0.008 },
    ],
    sampling: { realisations, seed: 11 },
  };
}
