import { betaCumulative, betaDensity, betaMoments, betaQuantile, type Beta } from './beta.ts';
import {
  tableCumulative,
  tableDensity,
  tableMoments,
  tableQuantile,
  type CumulativeTable,
} from './cumulativeTable.ts';
import type { Fixed } from './fixed.ts';
import {
  lognormalCumulative,
  lognormalDensity,
  lognormalMoments,
  lognormalQuantile,
  type Lognormal,
} from './lognormal.ts';
import {
  normalCumulativeCut,
  normalDensityCut,
  normalMoments,
  normalQuantileCut,
  type Normal,
} from './normal.ts';
import { betaOfPert, type Pert } from './pert.ts';
import {
  triangularCumulative,
  triangularDensity,
  triangularMoments,
  triangularQuantile,
  type Triangular,
} from './triangular.ts';
import { uniformQuantile, type Uniform } from './uniform.ts';

/** A distribution as plain data, valid by how it was made. */
export type Marginal = Fixed | Normal | Lognormal | Uniform | Triangular | Pert | Beta | CumulativeTable;

export function isUncertain(marginal: Marginal): boolean {
  return marginal.kind !== 'fixed';
}

/**
 * F⁻¹(p), the least x with a probability of p or more of x or less.
 *
 * @param p probability; 0 and 1 give the limits, ±Infinity where there are none
 */
export function quantile(marginal: Marginal, p: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`quantile: p must be from 0 to 1, got ${p}`);
  switch (marginal.kind) {
    case 'fixed':
      return marginal.value;
    case 'normal':
      return normalQuantileCut(marginal, p);
    case 'lognormal':
      return lognormalQuantile(marginal, p);
    case 'uniform':
      return uniformQuantile(marginal, p);
    case 'triangular':
      return triangularQuantile(marginal, p);
    case 'pert':
      return betaQuantile(betaOfPert(marginal), p);
    case 'beta':
      return betaQuantile(marginal, p);
    case 'table':
      return tableQuantile(marginal, p);
  }
}

/** F(x), the probability of x or less; NaN for NaN. */
export function cumulative(marginal: Marginal, x: number): number {
  switch (marginal.kind) {
    case 'fixed':
      return x < marginal.value ? 0 : 1;
    case 'normal':
      return normalCumulativeCut(marginal, x);
    case 'lognormal':
      return lognormalCumulative(marginal, x);
    case 'uniform':
      return Math.max(0, Math.min(1, (x - marginal.low) / (marginal.high - marginal.low)));
    case 'triangular':
      return triangularCumulative(marginal, x);
    case 'pert':
      return betaCumulative(betaOfPert(marginal), x);
    case 'beta':
      return betaCumulative(marginal, x);
    case 'table':
      return tableCumulative(marginal, x);
  }
}

/** Density at x; Infinity at the value of a fixed number. */
export function density(marginal: Marginal, x: number): number {
  switch (marginal.kind) {
    case 'fixed':
      return x === marginal.value ? Infinity : 0;
    case 'normal':
      return normalDensityCut(marginal, x);
    case 'lognormal':
      return lognormalDensity(marginal, x);
    case 'uniform':
      return x >= marginal.low && x <= marginal.high ? 1 / (marginal.high - marginal.low) : 0;
    case 'triangular':
      return triangularDensity(marginal, x);
    case 'pert':
      return betaDensity(betaOfPert(marginal), x);
    case 'beta':
      return betaDensity(marginal, x);
    case 'table':
      return tableDensity(marginal, x);
  }
}

function moments(marginal: Marginal): { readonly mean: number; readonly deviation: number } {
  switch (marginal.kind) {
    case 'fixed':
      return { mean: marginal.value, deviation: 0 };
    case 'normal':
      return normalMoments(marginal);
    case 'lognormal':
      return lognormalMoments(marginal);
    case 'uniform':
      return {
        mean: 0.5 * (marginal.low + marginal.high),
        deviation: (marginal.high - marginal.low) / Math.sqrt(12),
      };
    case 'triangular':
      return triangularMoments(marginal);
    case 'pert':
      return betaMoments(betaOfPert(marginal));
    case 'beta':
      return betaMoments(marginal);
    case 'table':
      return tableMoments(marginal);
  }
}

/** Mean, of a cut distribution after cutting. */
export function mean(marginal: Marginal): number {
  return moments(marginal).mean;
}

/** Standard deviation, of a cut distribution after cutting. */
export function deviation(marginal: Marginal): number {
  return moments(marginal).deviation;
}

export function median(marginal: Marginal): number {
  return quantile(marginal, 0.5);
}

/** Ends of what it can be; ±Infinity where there is no end. */
export function limits(marginal: Marginal): { readonly low: number; readonly high: number } {
  return { low: quantile(marginal, 0), high: quantile(marginal, 1) };
}
