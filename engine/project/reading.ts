import { isUncertain } from '../marginals/marginal.ts';
import { FaultList } from './faultList.ts';
import type { UncertainNumber } from './uncertainNumber.ts';
import type { Place } from './place.ts';

/** What builds up while one file is read: its faults and its inputs. */
export class Reading {
  readonly faults = new FaultList();
  readonly inputs: UncertainNumber[] = [];
  /** Permanent names of numbers that are fixed, or could not be read. */
  readonly fixedNames = new Set<string>();
  readonly brokenNames = new Set<string>();
  /** Where in the file each input stands, in the order of `inputs`. */
  readonly inputPlaces: Place[] = [];

  /** Takes a number into the model, with its place among the inputs where it is uncertain. */
  enter(place: Place, number: Omit<UncertainNumber, 'index'>): UncertainNumber {
    if (!isUncertain(number.marginal)) {
      this.fixedNames.add(number.name);
      return { ...number, index: -1 };
    }
    const entered = { ...number, index: this.inputs.length };
    this.inputs.push(entered);
    this.inputPlaces.push(place);
    return entered;
  }
}

/** The parts together, or undefined where one of them could not be read. */
export function whole<T extends object>(parts: { [Key in keyof T]: T[Key] | undefined }): T | undefined {
  return Object.values(parts).includes(undefined) ? undefined : (parts as T);
}

/** The list, or undefined where one of its members could not be read. */
export function wholeList<T>(members: readonly (T | undefined)[]): T[] | undefined {
  return members.includes(undefined) ? undefined : (members as T[]);
}
