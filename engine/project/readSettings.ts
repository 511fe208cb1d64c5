import type { Model } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import { fromTo } from './numberRange.ts';
import { openObject, orElse, placeOfKey, type KnownKeys, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import { placeWithin } from './place.ts';
import { fixedNumber } from './readCompressibleSoil.ts';
import { readUncertain } from './readUncertain.ts';
import {
  numberFrom,
  readChoice,
  readList,
  readNumber,
  readSwitch,
  readText,
  readWholeNumber,
} from './readValues.ts';
import { REALISATIONS_IN_REPLICATE } from './replicateSize.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const WATER_KEYS = { required: ['depth_m'], optional: ['base_excess_head_m', 'note'] } as const;
export const BOUNDARY_KEYS = { required: ['top', 'base'], optional: ['note'] } as const;
export const BOUNDARY_STATES = ['drained', 'closed'] as const;
export const SECONDARY_KEYS = {
  required: [],
  optional: ['included', 'reduction_floor', 'reduction_exponent', 'note'],
} as const;
export const MODEL_FACTOR_KEYS = { required: [], optional: ['settlement', 'rate', 'note'] } as const;
export const SAMPLING_KEYS = { required: ['realisations', 'seed'], optional: ['note'] } as const;
export const RESULT_KEYS = {
  required: [],
  optional: ['percentiles', 'degree_of_consolidation', 'note'],
} as const;

export const REALISATIONS = fromTo(REALISATIONS_IN_REPLICATE, MOST.realisations);
export const SEED = fromTo(0, 9_007_199_254_740_991);
export const PERCENTILE = fromTo(0.1, 99.9);
export const DEGREE = fromTo(0.01, 0.999);
export const FACTOR_MARGINALS = ['lognormal', 'fixed'] as const;
const DEFAULT_PERCENTILES: readonly number[] = [5, 25, 50, 75, 95];

/** Opens the object under a key of the project, and reads its note. */
function openSetting(
  reading: Reading,
  project: OpenedObject,
  key: string,
  keys: KnownKeys,
): OpenedObject | undefined {
  const object = openObject(reading, placeOfKey(project, key), project.entries.get(key), keys);
  if (object !== undefined) readText(reading, object, 'note');
  return object;
}

export function readWater(reading: Reading, project: OpenedObject): Model['water'] | undefined {
  if (!project.entries.has('water')) return undefined;
  const object = openSetting(reading, project, 'water', WATER_KEYS);
  if (object === undefined) return undefined;
  const owner = { name: 'water', label: '' };
  const [depth, head] = ['depth of the water level', 'excess head at the base'];
  const none = { ...fixedNumber('water/base_excess_head', head, 0), unit: 'm' };
  return whole<Model['water']>({
    depth: readUncertain(reading, object, 'depth_m', { owner, range: PHYSICAL.waterDepth, words: depth }),
    baseExcessHead: orElse(object, 'base_excess_head_m', none, () =>
      readUncertain(reading, object, 'base_excess_head_m', {
        owner,
        range: PHYSICAL.excessHead,
        words: head,
      }),
    ),
  });
}

export function readBoundaries(reading: Reading, project: OpenedObject): Model['boundaries'] | undefined {
  if (!project.entries.has('boundaries')) return undefined;
  const object = openSetting(reading, project, 'boundaries', BOUNDARY_KEYS);
  return (
    object &&
    whole<Model['boundaries']>({
      top: readChoice(reading, object, 'top', BOUNDARY_STATES),
      base: readChoice(reading, object, 'base', BOUNDARY_STATES),
    })
  );
}

export function readSecondary(reading: Reading, project: OpenedObject): Model['secondary'] | undefined {
  const usual = { included: true, reductionFloor: 0.1, reductionExponent: 6 };
  return orElse<Model['secondary']>(project, 'secondary', usual, () => {
    const object = openSetting(reading, project, 'secondary', SECONDARY_KEYS);
    if (object === undefined) return undefined;
    const number = (key: string, fallback: number, range: typeof PHYSICAL.share) =>
      orElse(object, key, fallback, () => readNumber(reading, object, key, range));
    return whole<Model['secondary']>({
      included: orElse(object, 'included', usual.included, () => readSwitch(reading, object, 'included')),
      reductionFloor: number('reduction_floor', usual.reductionFloor, PHYSICAL.share),
      reductionExponent: number('reduction_exponent', usual.reductionExponent, PHYSICAL.reductionExponent),
    });
  });
}

export function readModelFactors(reading: Reading, project: OpenedObject): Model['modelFactors'] | undefined {
  const words = {
    settlement: 'model factor on settlement',
    rate: 'model factor on the rate of consolidation',
  };
  const one = (key: 'settlement' | 'rate') => fixedNumber(`model/${key}_factor`, words[key], 1);
  const usual = { settlement: one('settlement'), rate: one('rate') };
  return orElse<Model['modelFactors']>(project, 'model_factors', usual, () => {
    const object = openSetting(reading, project, 'model_factors', MODEL_FACTOR_KEYS);
    if (object === undefined) return undefined;
    const factor = (key: 'settlement' | 'rate'): UncertainNumber | undefined =>
      orElse(object, key, usual[key], () =>
        readUncertain(reading, object, key, {
          owner: { name: 'model', label: '' },
          range: PHYSICAL.modelFactor,
          called: `${key}_factor`,
          words: words[key],
          kinds: FACTOR_MARGINALS,
        }),
      );
    return whole<Model['modelFactors']>({ settlement: factor('settlement'), rate: factor('rate') });
  });
}

export function readSampling(reading: Reading, project: OpenedObject): Model['sampling'] | undefined {
  if (!project.entries.has('sampling')) return undefined;
  const object = openSetting(reading, project, 'sampling', SAMPLING_KEYS);
  return (
    object &&
    whole<Model['sampling']>({
      realisations: readWholeNumber(reading, object, 'realisations', REALISATIONS, REALISATIONS_IN_REPLICATE),
      seed: readWholeNumber(reading, object, 'seed', SEED),
    })
  );
}

export function readResults(reading: Reading, project: OpenedObject): Model['results'] | undefined {
  const usual = { percentiles: DEFAULT_PERCENTILES, degreeOfConsolidation: null };
  return orElse<Model['results']>(project, 'results', usual, () => {
    const object = openSetting(reading, project, 'results', RESULT_KEYS);
    if (object === undefined) return undefined;
    return whole<Model['results']>({
      percentiles: orElse(object, 'percentiles', DEFAULT_PERCENTILES, () => readPercentiles(reading, object)),
      degreeOfConsolidation: orElse<number | null>(object, 'degree_of_consolidation', null, () =>
        readNumber(reading, object, 'degree_of_consolidation', DEGREE),
      ),
    });
  });
}

function readPercentiles(reading: Reading, object: OpenedObject): number[] | undefined {
  const list = readList(reading, object, 'percentiles', { least: 1, most: MOST.percentiles });
  const place = placeOfKey(object, 'percentiles');
  const read = list?.map((value, i) =>
    numberFrom(reading, placeWithin(place, i, `number ${i + 1}`), value, PERCENTILE),
  );
  const percentiles = read && wholeList(read);
  if (percentiles?.some((percentile, i) => i > 0 && !(percentile > percentiles[i - 1]))) {
    reading.faults.add(
      place,
      `the percentiles ${percentiles.join(', ')}`,
      'percentiles that rise, each once',
    );
  }
  return percentiles;
}
