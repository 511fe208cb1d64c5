import { centralValue } from './centralValue.ts';
import type { Lift, SurfaceLoad, Vacuum } from './model.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import type { Place } from './place.ts';
import type { Reading } from './reading.ts';

/**
 * Refuses what ends before it starts in the central case: a placing, a removal, a surface load, a vacuum; and a
 * removal that starts before the placing has ended. Single realisations that do so are put in order and counted.
 */
export function checkDates(
  reading: Reading,
  lifts: readonly Lift[],
  loads: readonly SurfaceLoad[],
  vacuum: Vacuum | null,
): void {
  const inOrder = (
    place: Place,
    what: string,
    earlier: UncertainNumber,
    later: UncertainNumber,
    whose: string,
  ) => {
    const [start, end] = [centralValue(earlier), centralValue(later)];
    if (end >= start) return;
    reading.faults.add(place, `${what} in ${end}`, `a year not before ${whose}, ${start}`);
  };
  lifts.forEach(({ name, placing, removal }, i) => {
    const place = (key: string, words: string) => ({
      pointer: `/fill/lifts/${i}/${key}`,
      path: `fill, lift "${name}", ${words}`,
    });
    if (placing !== null) {
      inOrder(place('placing/end_year', 'placing'), 'an end', placing.start, placing.end, 'its start');
    }
    if (removal === null) return;
    inOrder(place('removal/end_year', 'removal'), 'an end', removal.start, removal.end, 'its start');
    if (placing === null) return;
    inOrder(
      place('removal/start_year', 'removal'),
      'a start',
      placing.end,
      removal.start,
      'the end of its placing',
    );
  });
  loads.forEach(({ name, start, end }, i) => {
    const place = { pointer: `/surface_loads/${i}/end_year`, path: `surface load "${name}", end` };
    if (end !== null) inOrder(place, 'an end', start, end, 'its start');
  });
  if (vacuum !== null) {
    inOrder(
      { pointer: '/vacuum/end_year', path: 'vacuum, end' },
      'an end',
      vacuum.start,
      vacuum.end,
      'its start',
    );
  }
}
