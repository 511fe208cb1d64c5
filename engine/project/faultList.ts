import type { Fault } from './fault.ts';
import type { Place } from './place.ts';

/** Faults beyond this many are counted, not listed. */
const MOST_LISTED = 200;

/** Collects the faults of one file, in the order in which they are met. */
export class FaultList {
  private readonly listed: Fault[] = [];
  private count = 0;

  add(place: Place, found: string, right: string): void {
    this.count += 1;
    if (this.count <= MOST_LISTED)
      this.listed.push({ pointer: place.pointer, path: place.path, found, right });
  }

  /** Further faults are only counted: their words need not be found. */
  get isFull(): boolean {
    return this.count >= MOST_LISTED;
  }

  get isEmpty(): boolean {
    return this.count === 0;
  }

  /** Every fault; those beyond 200 as one that says how many more there are. */
  all(): Fault[] {
    const more = this.count - this.listed.length;
    if (more === 0) return [...this.listed];
    const rest = { pointer: '', path: 'the project', found: `${more} more faults`, right: 'none' };
    return [...this.listed, rest];
  }
}
