import { enteredNumberText, numberText } from './numberText.ts';

/** A chance as a study knows it: a share of realisations, and how many stand behind it. */
export interface Chance {
  /** 0–1 */
  readonly value: number;
  /** Ends of the 90 % confidence band, NaN where there is none. */
  readonly low: number;
  readonly high: number;
  readonly above: number;
  readonly of: number;
}

/**
 * The chance as a frequency without 'in': '31 of 100', '4 of 1,000', 'fewer than 1 in 1,000' for none of 3,000
 * (upper 95 % limit 3/N, the rule of three: Hanley & Lippman-Hand 1983), 'all but fewer than 1 in 1,000' for all.
 * The base grows until neither 0 nor all of it would be said of a chance that is neither.
 */
export function chanceText({ value, above, of }: Chance): string {
  if (!(of > 0)) return 'an unknown number';
  if (above === 0) return fewerThan(of);
  if (above === of) return `all but ${fewerThan(of)}`;
  const base = chanceBase(value);
  return `${numberText(value * base)} of ${numberText(base)}`;
}

/** 100, or the power of ten above it with which the rarer side of the chance is still a whole number of 1 or more. */
export function chanceBase(value: number): number {
  const rarer = Math.min(value, 1 - value);
  let base = 100;
  while (base < 1e7 && rarer * base < 0.95) base *= 10;
  return base;
}

/** 'fewer than 1 in N/3', N/3 rounded down so that it stays true. */
export function fewerThan(of: number): string {
  const third = Math.floor(of / 3);
  return third > 1 ? `fewer than 1 in ${numberText(third)}` : 'an unknown number';
}

/**
 * The 90 % band of a chance on the same base, widened to whole numbers: '28 to 34 of 100', 'up to 2 of 100',
 * 'at least 97 of 100'; '' where there is none.
 */
export function chanceBandText({ value, low, high }: Chance): string {
  if (!Number.isFinite(low) || !Number.isFinite(high)) return '';
  const base = chanceBase(value);
  const from = Math.max(0, Math.floor(low * base + ROUNDING));
  const to = Math.min(base, Math.ceil(high * base - ROUNDING));
  if (from <= 0 && to >= base) return `anything up to all of ${numberText(base)}`;
  if (from <= 0) return `up to ${numberText(Math.max(to, 1))} of ${numberText(base)}`;
  if (to >= base) return `at least ${numberText(from)} of ${numberText(base)}`;
  return `${numberText(from)} to ${numberText(to)} of ${numberText(base)}`;
}

/** The chance in percent for a narrow table: '31 %', '0.4 %', '< 0.1 %', '> 99.9 %'; never '0 %' or '100 %'. */
export function chancePercentText({ value, above, of }: Chance): string {
  const bound = enteredNumberText(Number((300 / of).toPrecision(2)), 4);
  if (above === 0) return `< ${bound}\u202f%`;
  if (above === of) return `> ${enteredNumberText(100 - Number(bound), 4)}\u202f%`;
  return `${sharePercentText(value)}`;
}

/** A share strictly between 0 and 1 in percent: whole from 10 to 90, tenths outside, bounded at 0.1 and 99.9. */
export function sharePercentText(share: number): string {
  const percent = share * 100;
  if (percent < 0.05) return '< 0.1\u202f%';
  if (percent > 99.95) return '> 99.9\u202f%';
  const decimals = percent < 9.95 || percent > 90.05 ? 1 : 0;
  return `${enteredNumberText(percent, decimals)}\u202f%`;
}

/** Keeps a band end such as 0.28000000000000003 from being widened by a whole ground. */
const ROUNDING = 1e-9;
