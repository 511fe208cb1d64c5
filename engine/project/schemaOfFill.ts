import { MOST, PHYSICAL } from './physicalRanges.ts';
import { FILL_KEYS, LIFT_KEYS } from './readFill.ts';
import { LOAD_KINDS, SURFACE_LOAD_KEYS } from './readSurfaceLoads.ts';
import {
  choiceSchema,
  listSchema,
  NAME_SCHEMA,
  numberSchema,
  objectSchema,
  SWITCH_SCHEMA,
  TEXT_SCHEMA,
  type Schema,
} from './schemaParts.ts';
import { uncertainSchema } from './uncertainSchema.ts';

const POSITION = numberSchema(PHYSICAL.position);
const UNCERTAIN_YEAR = uncertainSchema(PHYSICAL.year);
const LENGTH = objectSchema(
  { required: [], optional: ['from_m', 'to_m'] },
  { from_m: POSITION, to_m: POSITION },
);
const PERIOD = objectSchema(
  { required: ['start_year', 'end_year'] },
  { start_year: UNCERTAIN_YEAR, end_year: UNCERTAIN_YEAR },
);

export function fillSchema(): Schema {
  const lift = objectSchema(LIFT_KEYS, {
    name: NAME_SCHEMA,
    id: NAME_SCHEMA,
    note: TEXT_SCHEMA,
    crest_centre_x_m: POSITION,
    crest_width_m: numberSchema(PHYSICAL.crestWidth),
    left_slope_h_per_v: numberSchema(PHYSICAL.slope),
    right_slope_h_per_v: numberSchema(PHYSICAL.slope),
    thickness_m: uncertainSchema(PHYSICAL.liftThickness),
    unit_weight_kN_m3: uncertainSchema(PHYSICAL.fillUnitWeight),
    standing: SWITCH_SCHEMA,
    placing: PERIOD,
    removal: PERIOD,
    length: LENGTH,
  });
  return objectSchema(FILL_KEYS, {
    note: TEXT_SCHEMA,
    lifts: listSchema(lift, 0, MOST.lifts),
    held_to_level: SWITCH_SCHEMA,
    held_until_year: numberSchema(PHYSICAL.year),
    top_up_unit_weight_kN_m3: uncertainSchema(PHYSICAL.fillUnitWeight),
    submergence: SWITCH_SCHEMA,
    wide: SWITCH_SCHEMA,
  });
}

export function surfaceLoadSchema(): Schema {
  return objectSchema(SURFACE_LOAD_KEYS, {
    name: NAME_SCHEMA,
    id: NAME_SCHEMA,
    note: TEXT_SCHEMA,
    kind: choiceSchema(LOAD_KINDS),
    pressure_kPa: uncertainSchema(PHYSICAL.pressure),
    x1_m: POSITION,
    x2_m: POSITION,
    length: LENGTH,
    start_year: UNCERTAIN_YEAR,
    end_year: UNCERTAIN_YEAR,
  });
}
