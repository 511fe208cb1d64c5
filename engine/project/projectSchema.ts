import { PROJECT_KEYS } from './checkProject.ts';
import { FORMAT } from './parseProject.ts';
import { CENTRAL, MOST, PHYSICAL } from './physicalRanges.ts';
import { CORRELATION_KEYS, RANK } from './readCorrelations.ts';
import { DRAIN_KEYS, DRAIN_PATTERNS, SMEAR_MARGINALS, VACUUM_KEYS } from './readDrains.ts';
import { LAYER_KEYS } from './readLayers.ts';
import { MARGINAL_KINDS } from './readMarginal.ts';
import { PAIR_KEYS, POINT_KEYS } from './readPoints.ts';
import {
  BOUNDARY_KEYS,
  BOUNDARY_STATES,
  DEGREE,
  FACTOR_MARGINALS,
  MODEL_FACTOR_KEYS,
  PERCENTILE,
  REALISATIONS,
  RESULT_KEYS,
  SAMPLING_KEYS,
  SECONDARY_KEYS,
  SEED,
  WATER_KEYS,
} from './readSettings.ts';
import { REALISATIONS_IN_REPLICATE } from './replicateSize.ts';
import { TIMES_KEYS } from './readTimes.ts';
import { fillSchema, surfaceLoadSchema } from './schemaOfFill.ts';
import { limitSchema } from './schemaOfLimits.ts';
import { soilSchema } from './schemaOfSoils.ts';
import {
  choiceSchema,
  exactlyOneOf,
  listSchema,
  NAME_SCHEMA,
  numberSchema,
  objectSchema,
  SWITCH_SCHEMA,
  TEXT_SCHEMA,
  wholeNumberSchema,
  type Schema,
} from './schemaParts.ts';
import { SHARED_DEFINITIONS, uncertainSchema } from './uncertainSchema.ts';
import { CURRENT_VERSION } from './upgradeProject.ts';

const YEAR = numberSchema(PHYSICAL.year);
const POSITION = numberSchema(PHYSICAL.position);

/**
 * JSON Schema (2020-12) of the project file: accepts all that `checkProject` accepts, and refuses every wrong
 * shape and every single value out of its range. What holds between values is the checker's alone.
 */
export function projectSchema(): Schema {
  return {
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    title: 'Slow Ground project',
    ...objectSchema(PROJECT_KEYS, {
      $schema: { type: 'string' },
      format: { const: FORMAT },
      version: { const: CURRENT_VERSION },
      name: NAME_SCHEMA,
      notes: TEXT_SCHEMA,
      soils: listSchema(soilSchema(), 1, MOST.soils),
      layers: listSchema(layerSchema(), 1, MOST.layers),
      water: objectSchema(WATER_KEYS, {
        depth_m: uncertainSchema(PHYSICAL.waterDepth),
        base_excess_head_m: uncertainSchema(PHYSICAL.excessHead),
        note: TEXT_SCHEMA,
      }),
      boundaries: objectSchema(BOUNDARY_KEYS, {
        top: choiceSchema(BOUNDARY_STATES),
        base: choiceSchema(BOUNDARY_STATES),
        note: TEXT_SCHEMA,
      }),
      fill: fillSchema(),
      surface_loads: listSchema(surfaceLoadSchema(), 0, MOST.surfaceLoads),
      drains: drainSchema(),
      vacuum: objectSchema(VACUUM_KEYS, {
        pressure_kPa: uncertainSchema(PHYSICAL.vacuum),
        start_year: uncertainSchema(PHYSICAL.year),
        end_year: uncertainSchema(PHYSICAL.year),
        note: TEXT_SCHEMA,
      }),
      secondary: objectSchema(SECONDARY_KEYS, {
        included: SWITCH_SCHEMA,
        reduction_floor: numberSchema(PHYSICAL.share),
        reduction_exponent: numberSchema(PHYSICAL.reductionExponent),
        note: TEXT_SCHEMA,
      }),
      points: listSchema(
        objectSchema(POINT_KEYS, {
          name: NAME_SCHEMA,
          x_m: POSITION,
          fixed: SWITCH_SCHEMA,
          note: TEXT_SCHEMA,
        }),
        1,
        MOST.points,
      ),
      pairs: listSchema(
        objectSchema(PAIR_KEYS, {
          name: NAME_SCHEMA,
          first: NAME_SCHEMA,
          second: NAME_SCHEMA,
          note: TEXT_SCHEMA,
        }),
        0,
        MOST.pairs,
      ),
      times: objectSchema(TIMES_KEYS, {
        handover_year: YEAR,
        horizon_year: YEAR,
        output_years: listSchema(YEAR, 0, MOST.outputTimes),
        note: TEXT_SCHEMA,
      }),
      limits: listSchema(limitSchema(), 0, MOST.limits),
      model_factors: objectSchema(MODEL_FACTOR_KEYS, {
        settlement: uncertainSchema(PHYSICAL.modelFactor, 'nowhere', FACTOR_MARGINALS),
        rate: uncertainSchema(PHYSICAL.modelFactor, 'nowhere', FACTOR_MARGINALS),
        note: TEXT_SCHEMA,
      }),
      rank_correlations: listSchema(
        objectSchema(CORRELATION_KEYS, {
          between: listSchema({ type: 'string' }, 2, 2),
          rank_correlation: numberSchema(RANK),
          note: TEXT_SCHEMA,
        }),
        0,
        MOST.correlations,
      ),
      sampling: objectSchema(SAMPLING_KEYS, {
        realisations: wholeNumberSchema(REALISATIONS, REALISATIONS_IN_REPLICATE),
        seed: wholeNumberSchema(SEED),
        note: TEXT_SCHEMA,
      }),
      results: objectSchema(RESULT_KEYS, {
        percentiles: listSchema(numberSchema(PERCENTILE), 1, MOST.percentiles),
        degree_of_consolidation: numberSchema(DEGREE),
        note: TEXT_SCHEMA,
      }),
    }),
    $defs: SHARED_DEFINITIONS,
  };
}

function layerSchema(): Schema {
  const boring = objectSchema(
    { required: ['x_m', 'thickness_m'] },
    { x_m: POSITION, thickness_m: numberSchema(PHYSICAL.thicknessAtBoring) },
  );
  return objectSchema(
    LAYER_KEYS,
    {
      name: NAME_SCHEMA,
      id: NAME_SCHEMA,
      soil: NAME_SCHEMA,
      thickness_m: uncertainSchema(PHYSICAL.layerThickness, 'along_section'),
      borings: listSchema(boring, 1, MOST.borings),
      thickness_factor: uncertainSchema(
        PHYSICAL.thicknessFactor,
        'along_section',
        MARGINAL_KINDS,
        CENTRAL.thicknessFactor,
      ),
      note: TEXT_SCHEMA,
    },
    exactlyOneOf('thickness_m', 'borings'),
  );
}

function drainSchema(): Schema {
  const size = numberSchema(PHYSICAL.bandSize);
  return objectSchema(
    DRAIN_KEYS,
    {
      pattern: choiceSchema(DRAIN_PATTERNS),
      spacing_m: numberSchema(PHYSICAL.drainSpacing),
      diameter_m: numberSchema(PHYSICAL.drainDiameter),
      band: objectSchema({ required: ['width_mm', 'thickness_mm'] }, { width_mm: size, thickness_mm: size }),
      smear_ratio: uncertainSchema(PHYSICAL.smearRatio, 'nowhere', SMEAR_MARGINALS),
      permeability_ratio: uncertainSchema(PHYSICAL.permeabilityRatio),
      discharge_capacity_m3_per_year: uncertainSchema(PHYSICAL.dischargeCapacity),
      top_m: numberSchema(PHYSICAL.depth),
      foot_m: numberSchema(PHYSICAL.depth),
      installed_year: YEAR,
      from_x_m: POSITION,
      to_x_m: POSITION,
      note: TEXT_SCHEMA,
    },
    exactlyOneOf('diameter_m', 'band'),
  );
}
