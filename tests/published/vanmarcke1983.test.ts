/**
 * Vanmarcke (1977), Probabilistic modeling of soil profiles, J. Geotech. Eng. Div. ASCE 103(GT11):1227–1246;
 * Vanmarcke (1983), Random Fields: Analysis and Synthesis. Markov correlation exp(−2x), x = lag over scale.
 * The figures follow from the closed form, to twelve digits (50-digit arithmetic, checked by quadrature).
 */
import { describe, it, expect } from 'vitest';
import { varianceReduction } from '../../engine/sampling/varianceReduction.ts';
import { horizontalCorrelation } from '../../engine/sampling/horizontalCorrelation.ts';

/** Twelve printed digits. */
const TOLERANCE = 1e-11;

/** T/θ, Γ². */
const REDUCTIONS: readonly (readonly [number, number])[] = [
  [0.05, 0.967483607192],
  [0.1, 0.936537653899],
  [0.2, 0.879000575445],
  [0.25, 0.852245277701],
  [0.5, 0.735758882343],
  [0.75, 0.642782364576],
  [1, 0.567667641618],
  [1.5, 0.455508237415],
  [2, 0.377289454861],
  [3, 0.277915486232],
  [4, 0.218760483207],
  [5, 0.180000907999],
  [8, 0.117187500879],
  [10, 0.0950000000103],
  [20, 0.04875],
  [50, 0.0198],
  [100, 0.00995],
];

/** Δx/θ, correlation, variance of the difference of two points of unit variance, 2 (1 − ρ). */
const PAIRS: readonly (readonly [number, number, number])[] = [
  [0, 1.0, 0.0],
  [0.1, 0.818730753078, 0.362538493844],
  [0.25, 0.606530659713, 0.786938680575],
  [0.5, 0.367879441171, 1.26424111766],
  [1, 0.135335283237, 1.72932943353],
  [2, 0.0183156388887, 1.96336872222],
  [5, 4.53999297625e-5, 1.99990920014],
];

describe('Vanmarcke 1983, variance of a local average', () => {
  for (const [ratio, reduction] of REDUCTIONS) {
    it(`the mean over ${ratio} scales of fluctuation keeps ${reduction} of the variance`, () => {
      const scale = 1.6;
      expect(Math.abs(varianceReduction(ratio * scale, scale) - reduction)).toBeLessThan(TOLERANCE);
    });
  }
});

describe('Vanmarcke 1983, correlation between two points', () => {
  for (const [ratio, correlation, variance] of PAIRS) {
    it(`two points ${ratio} scales apart have correlation ${correlation}`, () => {
      const scale = 40;
      const found = horizontalCorrelation(-ratio * scale, scale);
      expect(Math.abs(found - correlation)).toBeLessThan(TOLERANCE);
      expect(Math.abs(2 * (1 - found) - variance)).toBeLessThan(TOLERANCE);
    });
  }
});
