import type { Lift, OutOfPlane, Period } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import { openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import type { Place } from './place.ts';
import { readUncertain } from './readUncertain.ts';
import { readMembers, readName, readNumber, readSwitch, readText } from './readValues.ts';
import { refuseSameNames, type Named } from './refuseSameNames.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const FILL_KEYS = {
  required: ['lifts'],
  optional: ['note', 'held_to_level', 'held_until_year', 'top_up_unit_weight_kN_m3', 'submergence', 'wide'],
} as const;
export const LIFT_KEYS = {
  required: [
    'name',
    'crest_centre_x_m',
    'crest_width_m',
    'left_slope_h_per_v',
    'right_slope_h_per_v',
    'thickness_m',
    'unit_weight_kN_m3',
  ],
  optional: ['id', 'note', 'standing', 'placing', 'removal', 'length'],
} as const;

/** The fill with its two couplings; `heldUntil` is 'handover' where the file does not state it. */
export interface ReadFill {
  readonly lifts: readonly Lift[];
  readonly heldUntil: number | 'handover' | null;
  readonly topUpUnitWeight: UncertainNumber | null;
  readonly submergence: boolean;
  readonly wideFill: boolean;
}

export function readFill(reading: Reading, project: OpenedObject): ReadFill | undefined {
  if (!project.entries.has('fill')) return undefined;
  const object = openObject(reading, placeOfKey(project, 'fill'), project.entries.get('fill'), FILL_KEYS);
  if (object === undefined) return undefined;
  readText(reading, object, 'note');
  const identities: Named[] = [];
  const lifts = readMembers(
    reading,
    object,
    'lifts',
    { least: 0, most: MOST.lifts },
    'lift',
    (place, value) => readLift(reading, place, value, identities),
  );
  refuseSameNames(reading, 'lift', identities);
  const held = orElse(object, 'held_to_level', true, () => readSwitch(reading, object, 'held_to_level'));
  const until = orElse<number | 'handover'>(object, 'held_until_year', 'handover', () =>
    readNumber(reading, object, 'held_until_year', PHYSICAL.year),
  );
  return whole<ReadFill>({
    lifts: lifts && wholeList(lifts),
    heldUntil: held === undefined || until === undefined ? undefined : held ? until : null,
    topUpUnitWeight: orElse<UncertainNumber | null>(object, 'top_up_unit_weight_kN_m3', null, () =>
      readUncertain(reading, object, 'top_up_unit_weight_kN_m3', {
        owner: { name: 'fill', label: '' },
        range: PHYSICAL.fillUnitWeight,
        words: 'unit weight of the topping up',
      }),
    ),
    submergence: orElse(object, 'submergence', true, () => readSwitch(reading, object, 'submergence')),
    wideFill: orElse(object, 'wide', false, () => readSwitch(reading, object, 'wide')),
  });
}

function readLift(reading: Reading, place: Place, value: unknown, identities: Named[]): Lift | undefined {
  const object = openObject(reading, place, value, LIFT_KEYS);
  if (object === undefined) return undefined;
  const name = readName(reading, object, 'name');
  const id = readName(reading, object, 'id');
  readText(reading, object, 'note');
  identities.push({ place, name, id });
  const owner = { name: `lift/${id ?? name ?? ''}`, label: name ?? 'the lift' };
  const number = (key: keyof typeof RANGES) => readNumber(reading, object, key, RANGES[key]);
  const standing = orElse(object, 'standing', false, () => readSwitch(reading, object, 'standing'));
  const hasPlacing = object.entries.has('placing');
  if (standing === true && hasPlacing) {
    reading.faults.add(
      placeOfKey(object, 'placing'),
      'a placing of a standing lift',
      'none: it stands already',
    );
  } else if (standing === false && !hasPlacing) {
    reading.faults.add(
      placeOfKey(object, 'placing'),
      'nothing',
      'the key "placing" with its dates, or "standing": true',
    );
  }
  const placing = orElse(object, 'placing', null, () => readPeriod(reading, object, 'placing', owner));
  const [crestWidth, leftSlope, rightSlope] = [
    number('crest_width_m'),
    number('left_slope_h_per_v'),
    number('right_slope_h_per_v'),
  ];
  if (crestWidth === 0 && leftSlope === 0 && rightSlope === 0) {
    reading.faults.add(place, 'a lift without any width', 'a crest width or a slope above 0');
  }
  return whole<Lift>({
    name,
    crestCentre: number('crest_centre_x_m'),
    crestWidth,
    leftSlope,
    rightSlope,
    thickness: readUncertain(reading, object, 'thickness_m', { owner, range: PHYSICAL.liftThickness }),
    unitWeight: readUncertain(reading, object, 'unit_weight_kN_m3', {
      owner,
      range: PHYSICAL.fillUnitWeight,
    }),
    standing,
    placing: standing === false && placing === null ? undefined : placing,
    removal: orElse(object, 'removal', null, () => readPeriod(reading, object, 'removal', owner)),
    outOfPlane: readOutOfPlane(reading, object),
  });
}

const RANGES = {
  crest_centre_x_m: PHYSICAL.position,
  crest_width_m: PHYSICAL.crestWidth,
  left_slope_h_per_v: PHYSICAL.slope,
  right_slope_h_per_v: PHYSICAL.slope,
};

/** The dates between which a lift is placed or removed. */
function readPeriod(
  reading: Reading,
  object: OpenedObject,
  key: 'placing' | 'removal',
  owner: { name: string; label: string },
): Period | undefined {
  const opened = openObject(reading, placeOfKey(object, key), object.entries.get(key), {
    required: ['start_year', 'end_year'],
  });
  const date = (end: 'start' | 'end') =>
    opened &&
    readUncertain(reading, opened, `${end}_year`, {
      owner,
      range: PHYSICAL.year,
      called: `${key}_${end}`,
      words: `${end} of the ${key}`,
    });
  return whole<Period>({ start: date('start'), end: date('end') });
}

/** Extent across the section; without end where the file does not state one. */
export function readOutOfPlane(reading: Reading, object: OpenedObject): OutOfPlane | undefined {
  const forEver = { from: -Infinity, to: Infinity };
  return orElse<OutOfPlane>(object, 'length', forEver, () => {
    const place = placeOfKey(object, 'length');
    const opened = openObject(reading, place, object.entries.get('length'), {
      required: [],
      optional: ['from_m', 'to_m'],
    });
    if (opened === undefined) return undefined;
    const end = (key: string, fallback: number) =>
      orElse(opened, key, fallback, () => readNumber(reading, opened, key, PHYSICAL.position));
    const extent = whole<OutOfPlane>({ from: end('from_m', -Infinity), to: end('to_m', Infinity) });
    if (extent === undefined || extent.from < extent.to) return extent;
    reading.faults.add(place, `an extent from ${extent.from} to ${extent.to} m`, 'from_m below to_m');
    return undefined;
  });
}
