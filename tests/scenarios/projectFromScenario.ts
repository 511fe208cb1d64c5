/**
 * Translates a problem of this folder (its own schema, units in the key names) into the text of a project
 * file. Nothing is decided here: what the problem does not state is left at the project file's default.
 */
type Uncertain = number | Record<string, unknown>;

interface ScenarioLayer {
  name: string;
  thickness_m: Uncertain;
  unit_weight_kN_m3: Uncertain;
  behaviour: 'compressible' | 'stiff_free_draining' | 'stiff_poorly_draining';
  e0?: Uncertain;
  cc?: Uncertain;
  cr_over_cc?: Uncertain;
  preconsolidation?: Record<string, Uncertain>;
  cv_m2_year?: Uncertain;
  k0_m_s?: Uncertain;
  ck?: Uncertain;
  ch_over_cv?: Uncertain;
  k_preyield_factor?: Uncertain;
  c_alpha_over_cc?: Uncertain;
  modulus_kPa?: Uncertain;
}

export interface Scenario {
  title: string;
  options: { wide_fill: boolean; secondary: boolean; secondary_reduction?: { m: number; n: number } };
  couplings: {
    held_to_level_until_year: number | null;
    topup_unit_weight_kN_m3: number;
    submergence: boolean;
  };
  water_depth_m: Uncertain;
  base_excess_head_m: Uncertain;
  boundaries: { top: string; base: string };
  layers: ScenarioLayer[];
  lifts: {
    name: string;
    centre_x_m: number;
    crest_width_m: number;
    left_slope_h_per_v: number;
    right_slope_h_per_v: number;
    thickness_m: Uncertain;
    unit_weight_kN_m3: Uncertain;
    place_start_year: Uncertain;
    place_end_year: Uncertain;
    removal_start_year: Uncertain | null;
    removal_end_year: Uncertain | null;
  }[];
  surface_loads: {
    name: string;
    pressure_kPa: Uncertain;
    x1_m: number;
    x2_m: number;
    start_year: Uncertain;
    end_year: Uncertain | null;
  }[];
  points: { name: string; x_m: number }[];
  pairs: [string, string][];
  output_times_year: number[];
  horizon_year: number;
  handover_year: number;
  model_factors?: { settlement: Uncertain; rate: Uncertain };
  sampling?: { seed: number; replicates: number; strata: number };
  correlations?: [string, string, number][];
}

/** An uncertain number of a problem in the words of the project file. */
function uncertain(value: Uncertain): unknown {
  if (typeof value === 'number') return value;
  const { dist, mode, ...rest } = value as { dist: string; mode?: number };
  return { marginal: dist, ...rest, ...(mode === undefined ? {} : { best: mode }) };
}

function optional(key: string, value: Uncertain | undefined): Record<string, unknown> {
  return value === undefined ? {} : { [key]: uncertain(value) };
}

function soil(layer: ScenarioLayer, top: number, base: number): Record<string, unknown> {
  const shared = {
    name: layer.name,
    behaviour: layer.behaviour,
    unit_weight_kN_m3: uncertain(layer.unit_weight_kN_m3),
  };
  if (layer.behaviour !== 'compressible') {
    return {
      ...shared,
      ...optional('modulus_kPa', layer.modulus_kPa),
      ...optional('cv_m2_per_year', layer.cv_m2_year),
    };
  }
  const given = layer.preconsolidation!;
  const preconsolidation =
    'sigma_p_top_kPa' in given
      ? {
          profile: [
            { depth_m: top, stress_kPa: uncertain(given.sigma_p_top_kPa) },
            { depth_m: base, stress_kPa: uncertain(given.sigma_p_bottom_kPa) },
          ],
        }
      : { ...optional('ocr', given.ocr), ...optional('pop_kPa', given.pop_kPa) };
  return {
    ...shared,
    ...optional('compression_index', layer.cc),
    ...optional('recompression_ratio', layer.cr_over_cc),
    ...optional('initial_void_ratio', layer.e0),
    preconsolidation,
    consolidation: {
      ...optional('cv_m2_per_year', layer.cv_m2_year),
      ...optional('k0_m_per_s', layer.k0_m_s),
      ...optional('permeability_index', layer.ck),
    },
    ...optional('ch_over_cv', layer.ch_over_cv),
    ...optional('pre_yield_permeability_factor', layer.k_preyield_factor),
    ...optional('secondary_ratio', layer.c_alpha_over_cc),
  };
}

/** Permanent name of the input that a path such as 'layers.1.preconsolidation.pop_kPa' points to. */
function permanentName(scenario: Scenario, path: string): string {
  const [, index, ...keys] = path.split('.');
  const parameter: Record<string, string> = {
    cc: 'compression_index',
    e0: 'initial_void_ratio',
    cv_m2_year: 'cv',
    cr_over_cc: 'recompression_ratio',
    pop_kPa: 'pop',
    ocr: 'ocr',
  };
  return `soil/${scenario.layers[Number(index)].name}/${parameter[keys[keys.length - 1]]}`;
}

/** The text of a project file for a problem. */
export function projectFromScenario(scenario: Scenario): string {
  let depth = 0;
  const soils = scenario.layers.map((layer) => {
    const top = depth;
    depth += typeof layer.thickness_m === 'number' ? layer.thickness_m : NaN;
    return soil(layer, top, depth);
  });
  const held = scenario.couplings.held_to_level_until_year;
  return JSON.stringify({
    format: 'slow-ground-project',
    version: 1,
    name: scenario.title,
    soils,
    layers: scenario.layers.map((layer) => ({
      name: layer.name,
      soil: layer.name,
      thickness_m: uncertain(layer.thickness_m),
    })),
    water: {
      depth_m: uncertain(scenario.water_depth_m),
      base_excess_head_m: uncertain(scenario.base_excess_head_m),
    },
    boundaries: scenario.boundaries,
    fill: {
      lifts: scenario.lifts.map((lift) => ({
        name: lift.name,
        crest_centre_x_m: lift.centre_x_m,
        crest_width_m: lift.crest_width_m,
        left_slope_h_per_v: lift.left_slope_h_per_v,
        right_slope_h_per_v: lift.right_slope_h_per_v,
        thickness_m: uncertain(lift.thickness_m),
        unit_weight_kN_m3: uncertain(lift.unit_weight_kN_m3),
        placing: { start_year: uncertain(lift.place_start_year), end_year: uncertain(lift.place_end_year) },
        ...(lift.removal_start_year === null
          ? {}
          : {
              removal: {
                start_year: uncertain(lift.removal_start_year),
                end_year: uncertain(lift.removal_end_year!),
              },
            }),
      })),
      held_to_level: held !== null,
      ...(held === null
        ? {}
        : {
            held_until_year: held,
            top_up_unit_weight_kN_m3: scenario.couplings.topup_unit_weight_kN_m3,
          }),
      submergence: scenario.couplings.submergence,
      wide: scenario.options.wide_fill,
    },
    surface_loads: scenario.surface_loads.map((load) => ({
      name: load.name,
      kind: 'load',
      pressure_kPa: uncertain(load.pressure_kPa),
      x1_m: load.x1_m,
      x2_m: load.x2_m,
      start_year: uncertain(load.start_year),
      ...(load.end_year === null ? {} : { end_year: uncertain(load.end_year) }),
    })),
    secondary: {
      included: scenario.options.secondary,
      ...(scenario.options.secondary_reduction === undefined
        ? {}
        : {
            reduction_floor: scenario.options.secondary_reduction.m,
            reduction_exponent: scenario.options.secondary_reduction.n,
          }),
    },
    points: scenario.points.map(({ name, x_m }) => ({ name, x_m })),
    pairs: scenario.pairs.map(([first, second]) => ({ first, second })),
    times: {
      handover_year: scenario.handover_year,
      horizon_year: scenario.horizon_year,
      output_years: scenario.output_times_year,
    },
    ...(scenario.model_factors === undefined
      ? {}
      : {
          model_factors: {
            settlement: uncertain(scenario.model_factors.settlement),
            rate: uncertain(scenario.model_factors.rate),
          },
        }),
    ...(scenario.correlations === undefined
      ? {}
      : {
          rank_correlations: scenario.correlations.map(([first, second, rank]) => ({
            between: [permanentName(scenario, first), permanentName(scenario, second)],
            rank_correlation: rank,
          })),
        }),
    sampling: { realisations: 4000, seed: scenario.sampling?.seed ?? 1 },
  });
}
