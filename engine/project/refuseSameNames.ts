import { quoted } from './describeFound.ts';
import { placeWithin, type Place } from './place.ts';
import type { Reading } from './reading.ts';

export interface Named {
  readonly place: Place;
  readonly name: string | undefined;
  /** Takes the name's place in the permanent name of its inputs. */
  readonly id?: string | undefined;
}

/** Refuses every member whose name, or whose permanent name, an earlier member of the list has. */
export function refuseSameNames(reading: Reading, member: string, named: readonly Named[]): void {
  const names = new Set<string>();
  const identities = new Set<string>();
  for (const { place, name, id } of named) {
    const identity = id ?? name;
    const sameName = name !== undefined && names.has(name);
    if (sameName) {
      const where = placeWithin(place, 'name', 'name');
      reading.faults.add(
        where,
        `the name ${quoted(name)} a second time`,
        `a name that no other ${member} has`,
      );
    }
    if (!sameName && identity !== undefined && identities.has(identity)) {
      const where = placeWithin(place, id === undefined ? 'name' : 'id', id === undefined ? 'name' : 'id');
      reading.faults.add(
        where,
        `${quoted(identity)} as what another ${member} is called by`,
        `an id of its own`,
      );
    }
    if (name !== undefined) names.add(name);
    if (identity !== undefined) identities.add(identity);
  }
}
