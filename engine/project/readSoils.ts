import type { Soil, StiffFreeDrainingSoil, StiffPoorlyDrainingSoil } from './soil.ts';
import { openObject, orElse, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import type { Place } from './place.ts';
import { describeFound } from './describeFound.ts';
import { COMPRESSIBLE_KEYS, fixedNumber, readCompressibleSoil, soilNumber } from './readCompressibleSoil.ts';
import { readMembers, readName, readText } from './readValues.ts';
import { refuseSameNames } from './refuseSameNames.ts';
import { whole, type Reading } from './reading.ts';

export const BEHAVIOURS = ['compressible', 'stiff_free_draining', 'stiff_poorly_draining'] as const;
export const FREE_DRAINING_KEYS = {
  required: ['name', 'behaviour', 'unit_weight_kN_m3', 'modulus_kPa'],
  optional: ['id', 'note'],
} as const;
export const POORLY_DRAINING_KEYS = {
  required: ['name', 'behaviour', 'unit_weight_kN_m3', 'modulus_kPa', 'cv_m2_per_year'],
  optional: ['id', 'note', 'ch_over_cv'],
} as const;

/** The soils of a project, and the names under which layers may name them. */
export interface ReadSoils {
  readonly names: readonly (string | undefined)[];
  readonly soils: readonly (Soil | undefined)[];
}

export function readSoils(reading: Reading, project: OpenedObject): ReadSoils {
  const names: (string | undefined)[] = [];
  const identities: { place: Place; name: string | undefined; id: string | undefined }[] = [];
  const soils = readMembers(
    reading,
    project,
    'soils',
    { least: 1, most: MOST.soils },
    'soil',
    (place, value) => {
      const { soil, ...identity } = readSoil(reading, place, value);
      names.push(identity.name);
      identities.push({ place, ...identity });
      return soil;
    },
  );
  refuseSameNames(reading, 'soil', identities);
  return { names, soils: soils ?? [] };
}

function readSoil(reading: Reading, place: Place, value: unknown) {
  const behaviour = behaviourOf(value);
  const keys =
    behaviour === 'stiff_free_draining'
      ? FREE_DRAINING_KEYS
      : behaviour === 'stiff_poorly_draining'
        ? POORLY_DRAINING_KEYS
        : COMPRESSIBLE_KEYS;
  if (typeof value === 'object' && value !== null && !Array.isArray(value) && behaviour === undefined) {
    const given: unknown = Object.hasOwn(value, 'behaviour')
      ? (value as { behaviour: unknown }).behaviour
      : undefined;
    const right = '"compressible", "stiff_free_draining" or "stiff_poorly_draining"';
    const where = { pointer: `${place.pointer}/behaviour`, path: `${place.path}, behaviour` };
    reading.faults.add(where, describeFound(given), right);
    return { name: undefined, id: undefined, soil: undefined };
  }
  const object = openObject(reading, place, value, keys);
  if (object === undefined) return { name: undefined, id: undefined, soil: undefined };
  const name = readName(reading, object, 'name');
  const id = readName(reading, object, 'id');
  readText(reading, object, 'note');
  const owner = { name: `soil/${id ?? name ?? ''}`, label: name ?? 'the soil' };
  const source = { reading, object, owner };
  const stiff = () => ({
    name,
    unitWeight: soilNumber(source, 'unit_weight_kN_m3', PHYSICAL.soilUnitWeight),
    modulus: soilNumber(source, 'modulus_kPa', PHYSICAL.modulus),
  });
  const soil = (): Soil | undefined => {
    switch (behaviour!) {
      case 'compressible':
        return readCompressibleSoil(source, name);
      case 'stiff_free_draining':
        return whole<StiffFreeDrainingSoil>({ behaviour: 'stiff_free_draining', ...stiff() });
      case 'stiff_poorly_draining':
        return whole<StiffPoorlyDrainingSoil>({
          behaviour: 'stiff_poorly_draining',
          ...stiff(),
          verticalCoefficient: soilNumber(source, 'cv_m2_per_year', PHYSICAL.consolidation, {
            keepsMean: false,
          }),
          horizontalRatio: orElse(
            object,
            'ch_over_cv',
            fixedNumber(`${owner.name}/ch_over_cv`, `c_h/c_v of ${owner.label}`, 1),
            () => soilNumber(source, 'ch_over_cv', PHYSICAL.horizontalRatio, { keepsMean: false }),
          ),
        });
    }
  };
  return { name, id, soil: soil() };
}

function behaviourOf(value: unknown): (typeof BEHAVIOURS)[number] | undefined {
  if (typeof value !== 'object' || value === null || !Object.hasOwn(value, 'behaviour')) return undefined;
  return BEHAVIOURS.find((each) => each === (value as { behaviour: unknown }).behaviour);
}
