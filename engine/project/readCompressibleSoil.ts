import { centralValue } from './centralValue.ts';
import type { CompressibleSoil, IndexOrRatio, PermeabilityLaw, Preconsolidation } from './soil.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import type { NumberRange } from './numberRange.ts';
import { exactlyOneKey, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { CENTRAL, PHYSICAL } from './physicalRanges.ts';
import { placeWithin } from './place.ts';
import { readUncertain, shortNumber, type UncertainSpec } from './readUncertain.ts';
import { readList, readNumber } from './readValues.ts';
import { whole, type Reading } from './reading.ts';

/** Where a soil's numbers are read from: the file's object, and what they are called after. */
export interface SoilSource {
  readonly reading: Reading;
  readonly object: OpenedObject;
  readonly owner: UncertainSpec['owner'];
}

export const COMPRESSIBLE_KEYS = {
  required: [
    'name',
    'behaviour',
    'unit_weight_kN_m3',
    'compression_index',
    'initial_void_ratio',
    'preconsolidation',
    'consolidation',
  ],
  optional: [
    'id',
    'note',
    'recompression_index',
    'recompression_ratio',
    'swelling_index',
    'swelling_ratio',
    'ch_over_cv',
    'pre_yield_permeability_factor',
    'secondary_index',
    'secondary_ratio',
  ],
} as const;

/** A number of a soil, which may vary in the ground. */
export function soilNumber(
  { reading, object, owner }: SoilSource,
  key: string,
  range: NumberRange,
  more: Partial<UncertainSpec> = {},
): UncertainNumber | undefined {
  return readUncertain(reading, object, key, { owner, range, varies: 'in the ground', ...more });
}

/** A number of the model that the file does not hold. */
export function fixedNumber(name: string, label: string, value: number): UncertainNumber {
  return {
    name,
    label,
    unit: '1',
    marginal: { kind: 'fixed', value },
    index: -1,
    spread: null,
    keepsMean: true,
    source: { kind: 'not stated', text: '' },
    note: '',
  };
}

/** A soil that follows Cc and Cr. */
export function readCompressibleSoil(
  source: SoilSource,
  name: string | undefined,
): CompressibleSoil | undefined {
  const { reading, object, owner } = source;
  const compressionIndex = soilNumber(source, 'compression_index', PHYSICAL.index);
  const recompression = indexOrRatio(source, 'recompression', compressionIndex);
  const hasSwelling = object.entries.has('swelling_index') || object.entries.has('swelling_ratio');
  const hasSecondary = object.entries.has('secondary_index') || object.entries.has('secondary_ratio');
  return whole<CompressibleSoil>({
    behaviour: 'compressible',
    name,
    unitWeight: soilNumber(source, 'unit_weight_kN_m3', PHYSICAL.soilUnitWeight),
    compressionIndex,
    recompression,
    swelling: hasSwelling ? indexOrRatio(source, 'swelling', compressionIndex) : null,
    initialVoidRatio: soilNumber(source, 'initial_void_ratio', PHYSICAL.voidRatio),
    preconsolidation: readPreconsolidation(source),
    permeability: readPermeability(source),
    horizontalRatio: orElse(
      object,
      'ch_over_cv',
      fixedNumber(`${owner.name}/ch_over_cv`, `c_h/c_v of ${owner.label}`, 1),
      () => soilNumber(source, 'ch_over_cv', PHYSICAL.horizontalRatio, { keepsMean: false }),
    ),
    preYieldFactor: orElse(
      object,
      'pre_yield_permeability_factor',
      fixedNumber(
        `${owner.name}/pre_yield_permeability_factor`,
        `factor on the permeability before yield of ${owner.label}`,
        1,
      ),
      () => soilNumber(source, 'pre_yield_permeability_factor', PHYSICAL.preYieldFactor),
    ),
    secondary: hasSecondary ? secondary(reading, source) : null,
  });
}

/** Cr or Cs, whose central value must be below Cc's. */
function indexOrRatio(
  source: SoilSource,
  called: 'recompression' | 'swelling',
  compressionIndex: UncertainNumber | undefined,
): IndexOrRatio | undefined {
  const { reading, object } = source;
  const key = exactlyOneKey(reading, object, [`${called}_index`, `${called}_ratio`] as const);
  if (key === undefined) return undefined;
  if (key === `${called}_ratio`) {
    const ratio = soilNumber(source, key, PHYSICAL.indexRatio, { central: CENTRAL.indexRatio });
    return ratio && { given: 'ratio', number: ratio };
  }
  const index = soilNumber(source, key, PHYSICAL.index);
  if (index === undefined || compressionIndex === undefined) return undefined;
  const [central, most] = [centralValue(index), centralValue(compressionIndex)];
  if (central < most) return { given: 'index', number: index };
  const right = `a central value below that of the compression index, ${shortNumber(most)}`;
  reading.faults.add(placeOfKey(object, key), `a central value of ${shortNumber(central)}`, right);
  return undefined;
}

function secondary(reading: Reading, source: SoilSource): IndexOrRatio | undefined {
  const key = exactlyOneKey(reading, source.object, ['secondary_index', 'secondary_ratio']);
  if (key === undefined) return undefined;
  const isRatio = key === 'secondary_ratio';
  const number = soilNumber(source, key, isRatio ? PHYSICAL.secondaryRatio : PHYSICAL.secondaryIndex);
  return number && { given: isRatio ? 'ratio' : 'index', number };
}

function readPreconsolidation({ reading, object, owner }: SoilSource): Preconsolidation | undefined {
  if (!object.entries.has('preconsolidation')) return undefined;
  const place = placeOfKey(object, 'preconsolidation');
  const keys = ['ocr', 'pop_kPa', 'profile'] as const;
  const opened = openObject(reading, place, object.entries.get('preconsolidation'), {
    required: [],
    optional: keys,
  });
  const kind = opened && exactlyOneKey(reading, opened, keys);
  if (opened === undefined || kind === undefined) return undefined;
  const source = { reading, object: opened, owner };
  if (kind === 'profile') return readProfile(source);
  if (kind === 'ocr') {
    const ocr = soilNumber(source, kind, PHYSICAL.overconsolidationRatio, {
      central: CENTRAL.overconsolidationRatio,
    });
    return ocr && { kind, ocr };
  }
  const pop = soilNumber(source, kind, PHYSICAL.preOverburden, { central: CENTRAL.preOverburden });
  return pop && { kind: 'pop', pop };
}

function readProfile({ reading, object, owner }: SoilSource): Preconsolidation | undefined {
  const list = readList(reading, object, 'profile', { least: 2, most: 2 });
  const ends = list?.map((value, index) => {
    const which = index === 0 ? 'upper' : 'lower';
    const place = placeWithin(placeOfKey(object, 'profile'), index, `${which} depth`);
    const opened = openObject(reading, place, value, { required: ['depth_m', 'stress_kPa'] });
    return (
      opened &&
      whole<{ depth: number; stress: UncertainNumber }>({
        depth: readNumber(reading, opened, 'depth_m', PHYSICAL.depth),
        stress: soilNumber({ reading, object: opened, owner }, 'stress_kPa', PHYSICAL.preconsolidation, {
          called: `profile_${which}_stress`,
          words: `${which} preconsolidation pressure`,
        }),
      })
    );
  });
  const [upper, lower] = ends ?? [];
  if (upper === undefined || lower === undefined) return undefined;
  if (upper.depth < lower.depth) return { kind: 'profile', upper, lower };
  reading.faults.add(
    placeOfKey(object, 'profile'),
    `depths of ${upper.depth} and ${lower.depth} m`,
    'the second deeper than the first',
  );
  return undefined;
}

function readPermeability({ reading, object, owner }: SoilSource): PermeabilityLaw | undefined {
  if (!object.entries.has('consolidation')) return undefined;
  const opened = openObject(
    reading,
    placeOfKey(object, 'consolidation'),
    object.entries.get('consolidation'),
    {
      required: [],
      optional: ['cv_m2_per_year', 'k0_m_per_s', 'permeability_index'],
    },
  );
  const key = opened && exactlyOneKey(reading, opened, ['cv_m2_per_year', 'k0_m_per_s']);
  if (opened === undefined || key === undefined) return undefined;
  const source = { reading, object: opened, owner };
  const permeabilityIndex = orElse<UncertainNumber | null>(opened, 'permeability_index', null, () =>
    soilNumber(source, 'permeability_index', PHYSICAL.permeabilityIndex),
  );
  if (key === 'cv_m2_per_year') {
    return whole<PermeabilityLaw & { kind: 'cv' }>({
      kind: 'cv',
      verticalCoefficient: soilNumber(source, key, PHYSICAL.consolidation, { keepsMean: false }),
      permeabilityIndex,
    });
  }
  return whole<PermeabilityLaw & { kind: 'k0' }>({
    kind: 'k0',
    permeability: soilNumber(source, key, PHYSICAL.permeability, { keepsMean: false }),
    permeabilityIndex,
  });
}
