import { exp } from '../elementary.ts';
import { limits, type Marginal } from '../marginals/marginal.ts';
import { isBelowRange, rangeInWords, type NumberRange } from './numberRange.ts';
import type { Place } from './place.ts';
import type { Reading } from './reading.ts';

/** Deviations from the mean within which an uncut marginal must keep to its physical range. */
const REACH = 4;
/** Deviations beyond which nothing is ever drawn. */
const NEVER_DRAWN = 9;

/**
 * A marginal all of whose values are physical: one with limits must have them inside the range. A normal or
 * lognormal must keep to the range within four deviations (of ln x); what a normal has beyond that, 3 in
 * 100,000 at most, is cut off at the end of the range. A lognormal cannot be cut and keeps its tail.
 *
 * @returns undefined, with a fault, where the marginal leaves the range
 */
export function physicalMarginal(
  reading: Reading,
  place: Place,
  marginal: Marginal,
  range: NumberRange,
): Marginal | undefined {
  const { low, high } = reachOf(marginal);
  const below = isBelowRange(range, low);
  if (!below && high <= range.high)
    return marginal.kind === 'normal' ? cutAtRange(marginal, range) : marginal;
  const found = `values ${below ? 'down' : 'up'} to ${Number((below ? low : high).toPrecision(4))}`;
  reading.faults.add(place, found, `values ${rangeInWords(range)}${remedy(marginal, below)}`);
  return undefined;
}

function remedy(marginal: Marginal, below: boolean): string {
  const key = below ? 'low' : 'high';
  const end = below ? 'below' : 'above';
  if (marginal.kind === 'normal' && !Number.isFinite(marginal[key])) {
    return `: within ${REACH} deviations the normal reaches ${end} that, so give it a "${key}"`;
  }
  return marginal.kind === 'lognormal'
    ? `: within ${REACH} deviations the lognormal reaches ${end} that, so take a marginal with limits`
    : '';
}

function reachOf(marginal: Marginal): { readonly low: number; readonly high: number } {
  switch (marginal.kind) {
    case 'normal': {
      const { mean, deviation, low, high } = marginal;
      return {
        low: Number.isFinite(low) ? low : mean - REACH * deviation,
        high: Number.isFinite(high) ? high : mean + REACH * deviation,
      };
    }
    case 'lognormal': {
      const { logMean, logDeviation } = marginal;
      return { low: exp(logMean - REACH * logDeviation), high: exp(logMean + REACH * logDeviation) };
    }
    default:
      return limits(marginal);
  }
}

function cutAtRange(marginal: Marginal & { kind: 'normal' }, range: NumberRange): Marginal {
  const { mean, deviation, low, high } = marginal;
  const couldBeBelow = low === -Infinity && isBelowRange(range, mean - NEVER_DRAWN * deviation);
  const couldBeAbove = high === Infinity && mean + NEVER_DRAWN * deviation > range.high;
  return { ...marginal, low: couldBeBelow ? range.low : low, high: couldBeAbove ? range.high : high };
}
