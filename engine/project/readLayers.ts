import { quoted } from './describeFound.ts';
import type { Layer, Thickness } from './model.ts';
import { nearestWord } from './nearestWord.ts';
import { exactlyOneKey, inWords, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { CENTRAL, MOST, PHYSICAL } from './physicalRanges.ts';
import type { Place } from './place.ts';
import { fixedNumber } from './readCompressibleSoil.ts';
import { readUncertain } from './readUncertain.ts';
import { readMembers, readName, readNumber, readText } from './readValues.ts';
import { refuseSameNames, type Named } from './refuseSameNames.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const LAYER_KEYS = {
  required: ['name', 'soil'],
  optional: ['id', 'note', 'thickness_m', 'borings', 'thickness_factor'],
} as const;

/** The layers from the top down, each of one of the soils. */
export function readLayers(
  reading: Reading,
  project: OpenedObject,
  soils: readonly (string | undefined)[],
): Layer[] | undefined {
  const identities: Named[] = [];
  const layers = readMembers(
    reading,
    project,
    'layers',
    { least: 1, most: MOST.layers },
    'layer',
    (place, value) => {
      const object = openObject(reading, place, value, LAYER_KEYS);
      if (object === undefined) return undefined;
      const name = readName(reading, object, 'name');
      const id = readName(reading, object, 'id');
      readText(reading, object, 'note');
      identities.push({ place, name, id });
      const owner = { name: `layer/${id ?? name ?? ''}`, label: name ?? 'the layer' };
      return whole<Layer>({
        name,
        soil: soilOf(reading, object, soils),
        thickness: readThickness(reading, object, owner),
      });
    },
  );
  refuseSameNames(reading, 'layer', identities);
  return layers && wholeList(layers);
}

function soilOf(
  reading: Reading,
  object: OpenedObject,
  soils: readonly (string | undefined)[],
): number | undefined {
  const name = readName(reading, object, 'soil');
  if (name === undefined) return undefined;
  const index = soils.indexOf(name);
  if (index >= 0) return index;
  const known = soils.filter((soil) => soil !== undefined);
  const nearest = nearestWord(name, known);
  const right =
    nearest !== null ? quoted(nearest) : `the name of a soil${known.length > 0 ? `: ${inWords(known)}` : ''}`;
  reading.faults.add(placeOfKey(object, 'soil'), `the text ${quoted(name)}, which no soil is called`, right);
  return undefined;
}

function readThickness(
  reading: Reading,
  object: OpenedObject,
  owner: { name: string; label: string },
): Thickness | undefined {
  const key = exactlyOneKey(reading, object, ['thickness_m', 'borings']);
  if (key !== 'borings' && object.entries.has('thickness_factor')) {
    const right = 'no factor: it belongs to a layer that is given by borings';
    reading.faults.add(placeOfKey(object, 'thickness_factor'), 'a factor beside one thickness', right);
  }
  if (key === undefined) return undefined;
  if (key === 'thickness_m') {
    const range = PHYSICAL.layerThickness;
    const thickness = readUncertain(reading, object, key, { owner, range, varies: 'along the section' });
    return thickness && { kind: 'even', thickness };
  }
  const label = `factor on the thickness of ${owner.label}`;
  const factor = orElse(object, 'thickness_factor', fixedNumber(`${owner.name}/thickness`, label, 1), () =>
    readUncertain(reading, object, 'thickness_factor', {
      owner,
      range: PHYSICAL.thicknessFactor,
      central: CENTRAL.thicknessFactor,
      called: 'thickness',
      words: 'factor on the thickness',
      varies: 'along the section',
    }),
  );
  const borings = readBorings(reading, object);
  if (borings === undefined || factor === undefined) return undefined;
  return { kind: 'borings', ...borings, factor };
}

function readBorings(reading: Reading, object: OpenedObject) {
  const members = readMembers(
    reading,
    object,
    'borings',
    { least: 1, most: MOST.borings },
    'boring',
    (place: Place, value) => {
      const opened = openObject(reading, place, value, { required: ['x_m', 'thickness_m'] });
      return (
        opened &&
        whole<{ x: number; thickness: number }>({
          x: readNumber(reading, opened, 'x_m', PHYSICAL.position),
          thickness: readNumber(reading, opened, 'thickness_m', PHYSICAL.thicknessAtBoring),
        })
      );
    },
  );
  const borings = members && wholeList(members);
  if (borings === undefined) return undefined;
  const [x, thickness] = [borings.map((boring) => boring.x), borings.map((boring) => boring.thickness)];
  const place = placeOfKey(object, 'borings');
  const disordered = x.findIndex((position, i) => i > 0 && !(position > x[i - 1]));
  if (disordered > 0) {
    reading.faults.add(
      place,
      `a boring at x = ${x[disordered]} m after one at ${x[disordered - 1]} m`,
      'borings from left to right, each x once',
    );
    return undefined;
  }
  if (thickness.every((each) => each === 0)) {
    reading.faults.add(place, 'no thickness at any boring', 'a thickness above 0 at one boring at least');
    return undefined;
  }
  return { x, thickness };
}
