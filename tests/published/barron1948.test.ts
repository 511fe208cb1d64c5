/**
 * Barron (1948), Consolidation of fine-grained soils by drain wells, Trans. ASCE 113:718–754. Closed form: F(n) exact
 * (n²/(n²−1) ln n − (3n²−1)/(4n²)) and for large n (ln n − 3/4), six digits, checked by integration of the equal-strain
 * flow; Ur = 1 − exp(−8 Th/F), five digits; Th50 and Th90, four digits. A table of this kind stands in Das (n = 10:
 * Th50 = 0.137, n = 15: 0.171, from memory).
 * The method statement uses the form for large n: the march may lie from the exact degree by what the difference of
 * the two forms makes of it, at most e⁻¹ (F − F large)/F large, and by the 5e-4 of a numerical solution.
 */
import { describe, expect, it } from 'vitest';
import { smearedDrainFactor } from '../../engine/drainage/verticalDrains.ts';
import { radialConsolidation } from './radialConsolidation.ts';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

/** n, F, F for large n. */
const FACTORS: readonly (readonly [number, number, number])[] = [
  [5, 0.936498, 0.859438],
  [10, 1.578344, 1.552585],
  [12, 1.75402, 1.734907],
  [15, 1.971251, 1.95805],
  [20, 2.253865, 2.245732],
  [25, 2.474434, 2.468876],
  [30, 2.655258, 2.651197],
  [40, 2.941343, 2.938879],
  [50, 3.163688, 3.162023],
];

const TIME_FACTORS = [0.01, 0.02, 0.05, 0.1, 0.137, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.8, 1.0];
/** n, Ur at each time factor; from n = 10, from which on the form for large n holds. */
const DEGREES: readonly (readonly [number, readonly number[]])[] = [
  [
    10,
    [
      0.04942, 0.0964, 0.22387, 0.39762, 0.50063, 0.53247, 0.63713, 0.71837, 0.78142, 0.86833, 0.92068,
      0.95222, 0.98266, 0.99371,
    ],
  ],
  [
    12,
    [
      0.04459, 0.08718, 0.20391, 0.36625, 0.46466, 0.49548, 0.59836, 0.68026, 0.74546, 0.83868, 0.89776,
      0.93521, 0.97398, 0.98955,
    ],
  ],
  [
    15,
    [
      0.03977, 0.07796, 0.18365, 0.33358, 0.4265, 0.45597, 0.55588, 0.63745, 0.70403, 0.80276, 0.86856,
      0.9124, 0.9611, 0.98272,
    ],
  ],
  [
    20,
    [
      0.03487, 0.06853, 0.16262, 0.29879, 0.38509, 0.41282, 0.5083, 0.58826, 0.65522, 0.75823, 0.83047,
      0.88112, 0.94155, 0.97126,
    ],
  ],
  [
    25,
    [
      0.03181, 0.06262, 0.14926, 0.27625, 0.35785, 0.38428, 0.47618, 0.55437, 0.62089, 0.72562, 0.80141,
      0.85627, 0.92471, 0.96056,
    ],
  ],
  [
    30,
    [
      0.02968, 0.05848, 0.13985, 0.26014, 0.33818, 0.3636, 0.4526, 0.52915, 0.595, 0.70035, 0.7783, 0.83597,
      0.91021, 0.95085,
    ],
  ],
  [
    40,
    [
      0.02683, 0.05294, 0.12715, 0.23813, 0.31107, 0.33501, 0.41956, 0.49336, 0.55778, 0.66309, 0.74332,
      0.80444, 0.88649, 0.93412,
    ],
  ],
  [
    50,
    [
      0.02497, 0.04932, 0.11877, 0.22343, 0.29279, 0.31566, 0.39694, 0.46856, 0.53168, 0.63632, 0.71758,
      0.78068, 0.86774, 0.92024,
    ],
  ],
];
/** n, Th50, Th90. */
const TIMES: readonly (readonly [number, number, number])[] = [
  [10, 0.1368, 0.4543],
  [12, 0.152, 0.5048],
  [15, 0.1708, 0.5674],
  [20, 0.1953, 0.6487],
  [25, 0.2144, 0.7122],
  [30, 0.2301, 0.7642],
  [40, 0.2548, 0.8466],
  [50, 0.2741, 0.9106],
];

/** What the form for large n may change of a degree. */
function ofTheForm(n: number): number {
  const [, exact, large] = FACTORS.find(([ratio]) => ratio === n)!;
  return (Math.exp(-1) * (exact - large)) / large;
}

describe('Barron 1948, factor without smear', () => {
  it.each(FACTORS)(
    'for n = %f the factor for large n is below the exact %f and comes to %f',
    (n, exact, large) => {
      expect(Math.abs(smearedDrainFactor(n, 1, 1) - large)).toBeLessThan(1e-6);
      expect(smearedDrainFactor(n, 1, 1)).toBeLessThan(exact);
    },
  );
});

describe('Barron 1948, radial consolidation', () => {
  it.each(DEGREES)('for n = %f the degree at fourteen time factors is %j', (n, expected) => {
    const { degreeAt } = linearConsolidation(radialConsolidation({ n, horizon: 1 }));
    TIME_FACTORS.forEach((timeFactor, i) => {
      expect(Math.abs(degreeAt(timeFactor) - expected[i])).toBeLessThan(ofTheForm(n) + ON_FINE_GRID);
    });
  });

  it.each(TIMES)('for n = %f half is reached at Th = %f and nine tenths at %f', (n, half, nine) => {
    const { degreeAt } = linearConsolidation(radialConsolidation({ n, horizon: 1 }));
    expect(Math.abs(degreeAt(half) - 0.5)).toBeLessThan(ofTheForm(n) + ON_FINE_GRID);
    expect(Math.abs(degreeAt(nine) - 0.9)).toBeLessThan(ofTheForm(n) + ON_FINE_GRID);
  });
});
