import type { SurfaceLoad } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import { openObject, orElse, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import { readOutOfPlane } from './readFill.ts';
import { readUncertain } from './readUncertain.ts';
import { readChoice, readMembers, readName, readNumber, readText } from './readValues.ts';
import { refuseSameNames, type Named } from './refuseSameNames.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const SURFACE_LOAD_KEYS = {
  required: ['name', 'kind', 'pressure_kPa', 'x1_m', 'x2_m', 'start_year'],
  optional: ['id', 'note', 'length', 'end_year'],
} as const;
export const LOAD_KINDS = ['load', 'traffic'] as const;

/** Rectangular loads on the ground, traffic among them. */
export function readSurfaceLoads(reading: Reading, project: OpenedObject): SurfaceLoad[] | undefined {
  const identities: Named[] = [];
  const count = { least: 0, most: MOST.surfaceLoads };
  const loads = readMembers(reading, project, 'surface_loads', count, 'surface load', (place, value) => {
    const object = openObject(reading, place, value, SURFACE_LOAD_KEYS);
    if (object === undefined) return undefined;
    const name = readName(reading, object, 'name');
    const id = readName(reading, object, 'id');
    readText(reading, object, 'note');
    identities.push({ place, name, id });
    const owner = { name: `load/${id ?? name ?? ''}`, label: name ?? 'the load' };
    const kind = readChoice(reading, object, 'kind', LOAD_KINDS);
    const edge = (key: string) => readNumber(reading, object, key, PHYSICAL.position);
    const [x1, x2] = [edge('x1_m'), edge('x2_m')];
    if (x1 !== undefined && x2 !== undefined && !(x1 < x2)) {
      reading.faults.add(place, `a load from x1 = ${x1} m to x2 = ${x2} m`, 'x1 below x2');
    }
    const date = (key: string) => readUncertain(reading, object, key, { owner, range: PHYSICAL.year });
    return whole<SurfaceLoad>({
      name,
      traffic: kind && kind === 'traffic',
      pressure: readUncertain(reading, object, 'pressure_kPa', { owner, range: PHYSICAL.pressure }),
      x1,
      x2,
      outOfPlane: readOutOfPlane(reading, object),
      start: date('start_year'),
      end: orElse<UncertainNumber | null>(object, 'end_year', null, () => date('end_year')),
    });
  });
  refuseSameNames(reading, 'surface load', identities);
  return loads && wholeList(loads);
}
