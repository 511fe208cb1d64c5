import { chanceBandText, chanceText, fewerThan, type Chance } from './chanceText.ts';
import { limitMeasure, measure, measureText, rangeText, type QuantityUnit } from './measure.ts';
import { numberText } from './numberText.ts';

/** An estimate as the summary holds it. */
export interface BandedValue {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** What a finding is about. */
export interface FindingSubject {
  /** In words, such as 'settlement after handover at Pier east'. */
  readonly label: string;
  readonly unit: QuantityUnit;
}

/**
 * The finding on a limit: 'In 31 of 100 equally likely grounds, settlement after handover at Pier east passes 100 mm.'
 *
 * @param limit in the subject's unit
 */
export function limitFinding(subject: FindingSubject, limit: number, chance: Chance): string {
  const amount = measureText(limitMeasure(limit, subject.unit));
  const predicate = subject.unit === 'm/m' ? `is steeper than ${amount}` : `passes ${amount}`;
  if (chance.above === 0) {
    return `${capital(subject.label)} ${predicate} in ${fewerThan(chance.of)} equally likely grounds.`;
  }
  return `In ${chanceText(chance)} equally likely grounds, ${subject.label} ${predicate}.`;
}

/**
 * The finding where there is no limit: between what most grounds lie, and the middle one.
 *
 * @param percentiles of the subject, percent rising; the outermost two are said, and the 50th where it is given
 */
export function rangeFinding(
  subject: FindingSubject,
  percentiles: readonly { readonly percent: number; readonly value: number }[],
): string {
  const known = percentiles.filter(({ value }) => Number.isFinite(value));
  if (known.length < 2)
    return `${capital(subject.label)} is not reached in enough grounds to say where it lies.`;
  const [low, high] = [known[0], known[known.length - 1]];
  const range = rangeText(measure(low.value, subject.unit), measure(high.value, subject.unit));
  const share = numberText(high.percent - low.percent);
  const middle = known.find(({ percent }) => percent === 50);
  const half = middle ? `; half of all lie above ${measureText(measure(middle.value, subject.unit))}` : '';
  return `In ${share} of 100 equally likely grounds, ${subject.label} lies between ${andText(range)}${half}.`;
}

/** What is said of the band below a finding: '90 % band: 28 to 34 of 100.' or why there is none. */
export function bandFinding(chance: Chance, replicates: number): string {
  if (replicates < FEWEST_REPLICATES) return noBandText(replicates);
  const band = chanceBandText(chance);
  return band === '' ? 'No band is known for it.' : `90\u202f% band of this number: ${band}.`;
}

/** Why no band is shown. */
export function noBandText(replicates: number): string {
  const said = replicates === 1 ? '1 replicate stands' : `${replicates} replicates stand`;
  return `No band yet: ${said} behind it, and a band needs ${FEWEST_REPLICATES}.`;
}

/** An estimate with its band: '84 mm (80 to 89 mm)'; the value alone where there is no band. */
export function estimateText({ value, low, high }: BandedValue, unit: QuantityUnit): string {
  const text = measureText(measure(value, unit));
  if (!Number.isFinite(low) || !Number.isFinite(high)) return text;
  return `${text} (${rangeText(measure(low, unit), measure(high, unit))})`;
}

/** At least so many replicates stand behind a band (method statement, section 6). */
const FEWEST_REPLICATES = 10;

/** The first letter as a capital, the rest as it is. */
export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function andText(range: string): string {
  return range.replace(' to ', ' and ');
}
