import type { Drains, Vacuum } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import { exactlyOneKey, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { PHYSICAL } from './physicalRanges.ts';
import { fixedNumber } from './readCompressibleSoil.ts';
import { MARGINAL_KINDS } from './readMarginal.ts';
import { readUncertain } from './readUncertain.ts';
import { readChoice, readNumber, readText } from './readValues.ts';
import { whole, type Reading } from './reading.ts';

export const DRAIN_KEYS = {
  required: ['pattern', 'spacing_m', 'foot_m', 'installed_year'],
  optional: [
    'note',
    'diameter_m',
    'band',
    'smear_ratio',
    'permeability_ratio',
    'discharge_capacity_m3_per_year',
    'top_m',
    'from_x_m',
    'to_x_m',
  ],
} as const;
export const DRAIN_PATTERNS = ['triangular', 'square'] as const;
/** A lognormal always has a tail below 1, where the smear would be smaller than the drain. */
export const SMEAR_MARGINALS = MARGINAL_KINDS.filter((kind) => kind !== 'lognormal');

const OWNER = { name: 'drains', label: 'the drains' };

/** The vertical drains of a project; null where there are none. */
export function readDrains(reading: Reading, project: OpenedObject): Drains | null | undefined {
  return orElse<Drains | null>(project, 'drains', null, () => {
    const place = placeOfKey(project, 'drains');
    const object = openObject(reading, place, project.entries.get('drains'), DRAIN_KEYS);
    if (object === undefined) return undefined;
    readText(reading, object, 'note');
    const number = (key: string, range: (typeof PHYSICAL)['year']) => readNumber(reading, object, key, range);
    const edge = (key: string, fallback: number) =>
      orElse(object, key, fallback, () => number(key, PHYSICAL.position));
    const drains = whole<Drains>({
      pattern: readChoice(reading, object, 'pattern', DRAIN_PATTERNS),
      spacing: number('spacing_m', PHYSICAL.drainSpacing),
      diameter: readDiameter(reading, object),
      smearRatio: orElse(
        object,
        'smear_ratio',
        fixedNumber('drains/smear_ratio', 'smear ratio of the drains', 1),
        () =>
          readUncertain(reading, object, 'smear_ratio', {
            owner: OWNER,
            range: PHYSICAL.smearRatio,
            kinds: SMEAR_MARGINALS,
          }),
      ),
      permeabilityRatio: orElse(
        object,
        'permeability_ratio',
        fixedNumber('drains/permeability_ratio', 'permeability ratio of the drains', 1),
        () =>
          readUncertain(reading, object, 'permeability_ratio', {
            owner: OWNER,
            range: PHYSICAL.permeabilityRatio,
          }),
      ),
      dischargeCapacity: orElse<UncertainNumber | null>(object, 'discharge_capacity_m3_per_year', null, () =>
        readUncertain(reading, object, 'discharge_capacity_m3_per_year', {
          owner: OWNER,
          range: PHYSICAL.dischargeCapacity,
        }),
      ),
      top: orElse(object, 'top_m', 0, () => number('top_m', PHYSICAL.depth)),
      foot: number('foot_m', PHYSICAL.depth),
      installed: number('installed_year', PHYSICAL.year),
      from: edge('from_x_m', -Infinity),
      to: edge('to_x_m', Infinity),
    });
    if (drains !== undefined && !(drains.from < drains.to)) {
      reading.faults.add(place, `drains from x = ${drains.from} to ${drains.to} m`, 'from_x_m below to_x_m');
    }
    if (drains !== undefined && !(drains.top < drains.foot)) {
      const found = `a foot at ${drains.foot} m under a top at ${drains.top} m`;
      reading.faults.add(placeOfKey(object, 'foot_m'), found, 'a foot deeper than the top');
    }
    return drains;
  });
}

/** Diameter of a drain, m; that of a band drain a × b is 2 (a + b)/π (Hansbo 1979). */
function readDiameter(reading: Reading, object: OpenedObject): number | undefined {
  const key = exactlyOneKey(reading, object, ['diameter_m', 'band']);
  if (key === undefined) return undefined;
  if (key === 'diameter_m') return readNumber(reading, object, key, PHYSICAL.drainDiameter);
  const band = openObject(reading, placeOfKey(object, 'band'), object.entries.get('band'), {
    required: ['width_mm', 'thickness_mm'],
  });
  if (band === undefined) return undefined;
  const width = readNumber(reading, band, 'width_mm', PHYSICAL.bandSize);
  const thickness = readNumber(reading, band, 'thickness_mm', PHYSICAL.bandSize);
  if (width === undefined || thickness === undefined) return undefined;
  return (2 * (width + thickness)) / (1_000 * Math.PI);
}

export const VACUUM_KEYS = {
  required: ['pressure_kPa', 'start_year', 'end_year'],
  optional: ['note'],
} as const;

/** The vacuum of a project; null where there is none. */
export function readVacuum(reading: Reading, project: OpenedObject): Vacuum | null | undefined {
  return orElse<Vacuum | null>(project, 'vacuum', null, () => {
    const place = placeOfKey(project, 'vacuum');
    const object = openObject(reading, place, project.entries.get('vacuum'), VACUUM_KEYS);
    if (object === undefined) return undefined;
    readText(reading, object, 'note');
    const owner = { name: 'vacuum', label: 'the vacuum' };
    const date = (key: string) => readUncertain(reading, object, key, { owner, range: PHYSICAL.year });
    return whole<Vacuum>({
      pressure: readUncertain(reading, object, 'pressure_kPa', { owner, range: PHYSICAL.vacuum }),
      start: date('start_year'),
      end: date('end_year'),
    });
  });
}
