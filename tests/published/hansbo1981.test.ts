/**
 * Hansbo (1979, 1981), Consolidation of fine-grained soils by prefabricated drains, 10th ICSMFE Stockholm 3:677–682.
 * Closed form: simplified μ with smear, six digits; exact μ (equal strain, average over all soil, checked by
 * quadrature) beside it; well resistance μ(z) = μ + π z (2l − z) k_h/q_w, five digits; diameters, 0.01 mm and the
 * rounded factors of practice (formulas from memory; the square one read as 1.128 in a design note).
 * t90 with 100 × 4 mm drains by two definitions of dw: direct evaluation with de by equal areas, not rounded as in
 * practice; μ to one unit of its fourth decimal, the march at t90 to 5e-4 of U. The year has 365.25 days.
 * Das and other texts print another μ, which averages outside the smear zone only (1.8196 against 1.8066 for the
 * first case below).
 */
import { describe, expect, it } from 'vitest';
import {
  bandDrainDiameter,
  influenceDiameter,
  smearedDrainFactor,
  wayToOutlet,
  wellResistance,
} from '../../engine/drainage/verticalDrains.ts';
import { metresPerYear, WATER_UNIT_WEIGHT } from '../../engine/units.ts';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

/** n, s, k_h/k_s, simplified μ, exact μ. */
const SMEARED: readonly (readonly [number, number, number, number, number])[] = [
  [9, 1.4, 2, 1.783697, 1.806564],
  [15, 2, 3, 3.344345, 3.337097],
  [20, 3, 2, 3.344345, 3.335306],
  [20, 2, 2, 2.938879, 2.941254],
  [18.18, 2.5, 4, 4.899194, 4.869559],
  [24, 3, 5, 6.822503, 6.780696],
];
/** z, μ(z) for n = 20, s = 3, k_h/k_s = 2, k_h = 1e-9 m/s, q_w = 100 m³/year, l = 10 m. */
const WITH_RESISTANCE: readonly (readonly [number, number])[] = [
  [0, 3.34434],
  [2.5, 3.38772],
  [5, 3.4187],
  [7.5, 3.43729],
  [10, 3.44349],
];
/** q_w, degree averaged over depth at Th = 0.3, same drain. */
const CAPACITIES: readonly (readonly [number, number])[] = [
  [100, 0.50528],
  [5, 0.40605],
];
/** Pattern, spacing, dw, s, k_h/k_s, μ, t90 in years with c_h = 2 m²/year. */
const TIMES_TO_NINETY: readonly (readonly [
  'triangular' | 'square',
  number,
  number,
  number,
  number,
  number,
  number,
])[] = [
  ['triangular', 1.0, 0.0662, 1, 1, 2.0139, 0.3196],
  ['triangular', 1.0, 0.0662, 3, 2, 3.1125, 0.4939],
  ['triangular', 1.0, 0.0662, 3, 4, 5.3098, 0.8426],
  ['triangular', 1.0, 0.052, 1, 1, 2.2554, 0.3579],
  ['triangular', 1.0, 0.052, 3, 2, 3.354, 0.5322],
  ['triangular', 1.0, 0.052, 3, 4, 5.5512, 0.8809],
  ['triangular', 1.2, 0.0662, 1, 1, 2.1963, 0.5019],
  ['triangular', 1.2, 0.0662, 3, 2, 3.2949, 0.7529],
  ['triangular', 1.2, 0.0662, 3, 4, 5.4921, 1.255],
  ['triangular', 1.2, 0.052, 1, 1, 2.4377, 0.557],
  ['triangular', 1.2, 0.052, 3, 2, 3.5363, 0.8081],
  ['triangular', 1.2, 0.052, 3, 4, 5.7335, 1.3102],
  ['triangular', 1.5, 0.0662, 1, 1, 2.4194, 0.8638],
  ['triangular', 1.5, 0.0662, 3, 2, 3.518, 1.2561],
  ['triangular', 1.5, 0.0662, 3, 4, 5.7152, 2.0406],
  ['triangular', 1.5, 0.052, 1, 1, 2.6608, 0.95],
  ['triangular', 1.5, 0.052, 3, 2, 3.7595, 1.3423],
  ['triangular', 1.5, 0.052, 3, 4, 5.9567, 2.1268],
  ['triangular', 2.0, 0.0662, 1, 1, 2.7071, 1.7183],
  ['triangular', 2.0, 0.0662, 3, 2, 3.8057, 2.4156],
  ['triangular', 2.0, 0.0662, 3, 4, 6.0029, 3.8103],
  ['triangular', 2.0, 0.052, 1, 1, 2.9485, 1.8715],
  ['triangular', 2.0, 0.052, 3, 2, 4.0471, 2.5689],
  ['triangular', 2.0, 0.052, 3, 4, 6.2444, 3.9635],
  ['square', 1.0, 0.0662, 1, 1, 2.0859, 0.3822],
  ['square', 1.0, 0.0662, 3, 2, 3.1845, 0.5835],
  ['square', 1.0, 0.0662, 3, 4, 5.3817, 0.9861],
  ['square', 1.0, 0.052, 1, 1, 2.3273, 0.4264],
  ['square', 1.0, 0.052, 3, 2, 3.4259, 0.6277],
  ['square', 1.0, 0.052, 3, 4, 5.6231, 1.0303],
  ['square', 1.2, 0.0662, 1, 1, 2.2682, 0.5985],
  ['square', 1.2, 0.0662, 3, 2, 3.3668, 0.8884],
  ['square', 1.2, 0.0662, 3, 4, 5.564, 1.4681],
  ['square', 1.2, 0.052, 1, 1, 2.5096, 0.6622],
  ['square', 1.2, 0.052, 3, 2, 3.6082, 0.9521],
  ['square', 1.2, 0.052, 3, 4, 5.8055, 1.5318],
  ['square', 1.5, 0.0662, 1, 1, 2.4913, 1.0271],
  ['square', 1.5, 0.0662, 3, 2, 3.5899, 1.48],
  ['square', 1.5, 0.0662, 3, 4, 5.7872, 2.3859],
  ['square', 1.5, 0.052, 1, 1, 2.7328, 1.1267],
  ['square', 1.5, 0.052, 3, 2, 3.8314, 1.5796],
  ['square', 1.5, 0.052, 3, 4, 6.0286, 2.4854],
  ['square', 2.0, 0.0662, 1, 1, 2.779, 2.0368],
  ['square', 2.0, 0.0662, 3, 2, 3.8776, 2.842],
  ['square', 2.0, 0.0662, 3, 4, 6.0748, 4.4525],
  ['square', 2.0, 0.052, 1, 1, 3.0204, 2.2138],
  ['square', 2.0, 0.052, 3, 2, 4.1191, 3.019],
  ['square', 2.0, 0.052, 3, 4, 6.3163, 4.6294],
];

describe('Hansbo 1981, factor with smear', () => {
  it.each(SMEARED)(
    'for n = %f, s = %f, k_h/k_s = %f the simplified factor is %f (exact %f)',
    (n, s, ratio, simple, exact) => {
      expect(Math.abs(smearedDrainFactor(n, s, ratio) - simple)).toBeLessThan(1e-6);
      // what the simplification leaves out goes with 1/n²
      expect(Math.abs(smearedDrainFactor(n, s, ratio) - exact)).toBeLessThan((2 * exact) / n);
    },
  );
});

describe('Hansbo 1981, well resistance', () => {
  const horizontal = metresPerYear(1e-9);
  it.each(WITH_RESISTANCE)('%f m from the outlet the factor is %f', (depth, expected) => {
    // the drain is open at its top and ends blindly at 10 m
    const way = wayToOutlet(depth, [0], 0, 10)!;
    const factor = smearedDrainFactor(20, 3, 2) + horizontal * wellResistance(way.distance, way.longest, 100);
    expect(Math.abs(factor - expected)).toBeLessThan(1e-5);
  });

  it.each(CAPACITIES)(
    'with q_w = %f m³/year the degree over the whole depth at Th = 0.3 is %f',
    (capacity, expected) => {
      const modulus = 1000;
      const ch = (horizontal * modulus) / WATER_UNIT_WEIGHT;
      const [influence, flat] = [1.05, 1e-9];
      const date = (0.3 * influence * influence) / ch;
      const { degreeAt } = linearConsolidation({
        linear: [{ thickness: 10, modulus, cv: flat * ch, horizontalRatio: 1 / flat }],
        drains: {
          pattern: 'triangular',
          spacing: 1,
          diameter: influence / 20,
          smearRatio: 3,
          permeabilityRatio: 2,
          dischargeCapacity: capacity,
          foot: 10,
        },
        base: 'closed',
        horizon: date,
      });
      expect(Math.abs(degreeAt(date) - expected)).toBeLessThan(ON_FINE_GRID);
    },
  );
});

describe('Hansbo 1979 and 1981, diameters', () => {
  it('a band drain of 100 × 4 mm counts as one of 66.21 mm', () => {
    expect(Math.abs(1000 * bandDrainDiameter(0.1, 0.004) - 66.21)).toBeLessThan(0.01);
  });

  it('a triangular grid serves a cylinder of 1.05 spacings', () => {
    expect(Math.abs(influenceDiameter('triangular', 1) - 1.05008)).toBeLessThan(0.005);
    expect(influenceDiameter('triangular', 1.5)).toBeCloseTo(1.05 * 1.5, 12);
  });

  it('a square grid serves a cylinder of 1.13 spacings', () => {
    expect(Math.abs(influenceDiameter('square', 1) - 1.12838)).toBeLessThan(0.005);
    expect(influenceDiameter('square', 1.5)).toBeCloseTo(1.13 * 1.5, 12);
  });
});

/** de over spacing by equal areas. */
const EQUAL_AREAS = { triangular: 1.05008, square: 1.12838 };

describe('Hansbo 1981, time for nine tenths, radial flow only', () => {
  it.each(TIMES_TO_NINETY)(
    'on a %s grid of %f m with dw = %f m, s = %f, k_h/k_s = %f: μ = %f, t90 = %f years',
    (pattern, spacing, diameter, smearRatio, permeabilityRatio, factor, years) => {
      const influence = EQUAL_AREAS[pattern] * spacing;
      const n = influence / diameter;
      expect(Math.abs(smearedDrainFactor(n, smearRatio, permeabilityRatio) - factor)).toBeLessThan(1e-4);
      // the spacing at which the rounded factor of practice gives the table's de
      const spacingOfPractice = influence / influenceDiameter(pattern, 1);
      const flat = 1e-9;
      const { degreeAt } = linearConsolidation(
        {
          linear: [{ thickness: 4, cv: 2 * flat, horizontalRatio: 1 / flat }],
          drains: { pattern, spacing: spacingOfPractice, diameter, smearRatio, permeabilityRatio, foot: 4 },
          horizon: years,
        },
        { cells: 16, steps: 128 },
      );
      expect(Math.abs(degreeAt(years) - 0.9)).toBeLessThan(ON_FINE_GRID);
    },
  );
});
