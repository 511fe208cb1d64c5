import { CENTRAL, PHYSICAL } from './physicalRanges.ts';
import type { NumberRange } from './numberRange.ts';
import { COMPRESSIBLE_KEYS } from './readCompressibleSoil.ts';
import { MARGINAL_KINDS } from './readMarginal.ts';
import { FREE_DRAINING_KEYS, POORLY_DRAINING_KEYS } from './readSoils.ts';
import {
  exactlyOneOf,
  listSchema,
  NAME_SCHEMA,
  notBoth,
  numberSchema,
  objectSchema,
  TEXT_SCHEMA,
  type Schema,
} from './schemaParts.ts';
import { uncertainSchema } from './uncertainSchema.ts';

const inGround = (range: NumberRange, fixed = range) =>
  uncertainSchema(range, 'in_ground', MARGINAL_KINDS, fixed);

/** A soil of one of the three behaviours. */
export function soilSchema(): Schema {
  const stiff = (behaviour: string) => ({
    ...called(behaviour),
    modulus_kPa: inGround(PHYSICAL.modulus),
  });
  return {
    oneOf: [
      compressibleSchema(),
      objectSchema(FREE_DRAINING_KEYS, stiff('stiff_free_draining')),
      objectSchema(POORLY_DRAINING_KEYS, {
        ...stiff('stiff_poorly_draining'),
        cv_m2_per_year: inGround(PHYSICAL.consolidation),
        ch_over_cv: inGround(PHYSICAL.horizontalRatio),
      }),
    ],
  };
}

function called(behaviour: string): Readonly<Record<string, Schema>> {
  return {
    name: NAME_SCHEMA,
    id: NAME_SCHEMA,
    note: TEXT_SCHEMA,
    behaviour: { const: behaviour },
    unit_weight_kN_m3: inGround(PHYSICAL.soilUnitWeight),
  };
}

function compressibleSchema(): Schema {
  const depthAndStress = objectSchema(
    { required: ['depth_m', 'stress_kPa'] },
    { depth_m: numberSchema(PHYSICAL.depth), stress_kPa: inGround(PHYSICAL.preconsolidation) },
  );
  const properties = {
    ...called('compressible'),
    compression_index: inGround(PHYSICAL.index),
    recompression_index: inGround(PHYSICAL.index),
    recompression_ratio: inGround(PHYSICAL.indexRatio, CENTRAL.indexRatio),
    swelling_index: inGround(PHYSICAL.index),
    swelling_ratio: inGround(PHYSICAL.indexRatio, CENTRAL.indexRatio),
    initial_void_ratio: inGround(PHYSICAL.voidRatio),
    preconsolidation: objectSchema(
      { required: [], optional: ['ocr', 'pop_kPa', 'profile'] },
      {
        ocr: inGround(PHYSICAL.overconsolidationRatio, CENTRAL.overconsolidationRatio),
        pop_kPa: inGround(PHYSICAL.preOverburden, CENTRAL.preOverburden),
        profile: listSchema(depthAndStress, 2, 2),
      },
      exactlyOneOf('ocr', 'pop_kPa', 'profile'),
    ),
    consolidation: objectSchema(
      { required: [], optional: ['cv_m2_per_year', 'k0_m_per_s', 'permeability_index'] },
      {
        cv_m2_per_year: inGround(PHYSICAL.consolidation),
        k0_m_per_s: inGround(PHYSICAL.permeability),
        permeability_index: inGround(PHYSICAL.permeabilityIndex),
      },
      exactlyOneOf('cv_m2_per_year', 'k0_m_per_s'),
    ),
    ch_over_cv: inGround(PHYSICAL.horizontalRatio),
    pre_yield_permeability_factor: inGround(PHYSICAL.preYieldFactor),
    secondary_index: inGround(PHYSICAL.secondaryIndex),
    secondary_ratio: inGround(PHYSICAL.secondaryRatio),
  };
  const together = [
    exactlyOneOf('recompression_index', 'recompression_ratio'),
    notBoth('swelling_index', 'swelling_ratio'),
    notBoth('secondary_index', 'secondary_ratio'),
  ];
  return objectSchema(COMPRESSIBLE_KEYS, properties, { allOf: together });
}
