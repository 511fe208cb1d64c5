/**
 * NIST Statistical Reference Datasets (StRD): univariate summary statistics and linear regression, certified to 15
 * digits. They hold the library that means, deviations and regressions of this project and its tests rest on to
 * print, and the slope and correlation that its drivers use.
 *
 * Tolerance: 1e-13 of the value, and what rounding the data to doubles does to a deviation far below the mean.
 */
import { describe, it, expect } from 'vitest';
import {
  linearRegression,
  linearRegressionLine,
  mean,
  rSquared,
  sampleStandardDeviation,
} from 'simple-statistics';

interface Univariate {
  readonly name: string;
  readonly data: readonly number[];
  readonly mean: number;
  readonly deviation: number;
  /** Correlation of each value with the next, both about the mean of all. */
  readonly lag1: number;
}

/** First value, then two others in turn, 1001 in all; the rule of these data is from memory. */
const inTurn = (first: number, one: number, other: number): number[] => [
  first,
  ...Array.from({ length: 1000 }, (_, i) => (i % 2 === 0 ? one : other)),
];

const UNIVARIATE: readonly Univariate[] = [
  {
    name: 'Lew',
    data: [
      -213, -564, -35, -15, 141, 115, -420, -360, 203, -338, -431, 194, -220, -513, 154, -125, -559, 92, -21,
      -579, -52, 99, -543, -175, 162, -457, -346, 204, -300, -474, 164, -107, -572, -8, 83, -541, -224, 180,
      -420, -374, 201, -236, -531, 83, 27, -564, -112, 131, -507, -254, 199, -311, -495, 143, -46, -579, -90,
      136, -472, -338, 202, -287, -477, 169, -124, -568, 17, 48, -568, -135, 162, -430, -422, 172, -74, -577,
      -13, 92, -534, -243, 194, -355, -465, 156, -81, -578, -64, 139, -449, -384, 193, -198, -538, 110, -44,
      -577, -6, 66, -552, -164, 161, -460, -344, 205, -281, -504, 134, -28, -576, -118, 156, -437, -381, 200,
      -220, -540, 83, 11, -568, -160, 172, -414, -408, 188, -125, -572, -32, 139, -492, -321, 205, -262, -504,
      142, -83, -574, 0, 48, -571, -106, 137, -501, -266, 190, -391, -406, 194, -186, -553, 83, -13, -577,
      -49, 103, -515, -280, 201, 300, -506, 131, -45, -578, -80, 138, -462, -361, 201, -211, -554, 32, 74,
      -533, -235, 187, -372, -442, 182, -147, -566, 25, 68, -535, -244, 194, -351, -463, 174, -125, -570, 15,
      72, -550, -190, 172, -424, -385, 198, -218, -536, 96,
    ],
    mean: -177.435,
    deviation: 277.332168044316,
    lag1: -0.307304800605679,
  },
  {
    name: 'Mavro',
    data: [
      2.0018, 2.0017, 2.0018, 2.0019, 2.0018, 2.0017, 2.0015, 2.0014, 2.0015, 2.0015, 2.0017, 2.0018, 2.0018,
      2.0019, 2.0019, 2.0021, 2.002, 2.0016, 2.0014, 2.0013, 2.0013, 2.0015, 2.0015, 2.0016, 2.0015, 2.0014,
      2.0013, 2.0014, 2.0015, 2.0014, 2.0015, 2.0016, 2.0015, 2.0016, 2.0019, 2.002, 2.002, 2.0021, 2.0022,
      2.0023, 2.0024, 2.0025, 2.0027, 2.0026, 2.0026, 2.0026, 2.0027, 2.0026, 2.0025, 2.0024,
    ],
    mean: 2.001856,
    deviation: 0.000429123454003053,
    lag1: 0.937989183438248,
  },
  {
    name: 'Michelso',
    data: [
      299.85, 299.74, 299.9, 300.07, 299.93, 299.85, 299.95, 299.98, 299.98, 299.88, 300.0, 299.98, 299.93,
      299.65, 299.76, 299.81, 300.0, 300.0, 299.96, 299.96, 299.96, 299.94, 299.96, 299.94, 299.88, 299.8,
      299.85, 299.88, 299.9, 299.84, 299.83, 299.79, 299.81, 299.88, 299.88, 299.83, 299.8, 299.79, 299.76,
      299.8, 299.88, 299.88, 299.88, 299.86, 299.72, 299.72, 299.62, 299.86, 299.97, 299.95, 299.88, 299.91,
      299.85, 299.87, 299.84, 299.84, 299.85, 299.84, 299.84, 299.84, 299.89, 299.81, 299.81, 299.82, 299.8,
      299.77, 299.76, 299.74, 299.75, 299.76, 299.91, 299.92, 299.89, 299.86, 299.88, 299.72, 299.84, 299.85,
      299.85, 299.78, 299.89, 299.84, 299.78, 299.81, 299.76, 299.81, 299.79, 299.81, 299.82, 299.85, 299.87,
      299.87, 299.81, 299.74, 299.81, 299.94, 299.95, 299.8, 299.81, 299.87,
    ],
    mean: 299.8524,
    deviation: 0.0790105478190518,
    lag1: 0.535199668621283,
  },
  {
    name: 'Lottery',
    data: [
      162, 671, 933, 414, 788, 730, 817, 33, 536, 875, 670, 236, 473, 167, 877, 980, 316, 950, 456, 92, 517,
      557, 956, 954, 104, 178, 794, 278, 147, 773, 437, 435, 502, 610, 582, 780, 689, 562, 964, 791, 28, 97,
      848, 281, 858, 538, 660, 972, 671, 613, 867, 448, 738, 966, 139, 636, 847, 659, 754, 243, 122, 455, 195,
      968, 793, 59, 730, 361, 574, 522, 97, 762, 431, 158, 429, 414, 22, 629, 788, 999, 187, 215, 810, 782,
      47, 34, 108, 986, 25, 644, 829, 630, 315, 567, 919, 331, 207, 412, 242, 607, 668, 944, 749, 168, 864,
      442, 533, 805, 372, 63, 458, 777, 416, 340, 436, 140, 919, 350, 510, 572, 905, 900, 85, 389, 473, 758,
      444, 169, 625, 692, 140, 897, 672, 288, 312, 860, 724, 226, 884, 508, 976, 741, 476, 417, 831, 15, 318,
      432, 241, 114, 799, 955, 833, 358, 935, 146, 630, 830, 440, 642, 356, 373, 271, 715, 367, 393, 190, 669,
      8, 861, 108, 795, 269, 590, 326, 866, 64, 523, 862, 840, 219, 382, 998, 4, 628, 305, 747, 247, 34, 747,
      729, 645, 856, 974, 24, 568, 24, 694, 608, 480, 410, 729, 947, 293, 53, 930, 223, 203, 677, 227, 62,
      455, 387, 318, 562, 242, 428, 968,
    ],
    mean: 518.95871559633,
    deviation: 291.699727470969,
    lag1: -0.120948622967393,
  },
  { name: 'NumAcc1', data: [10000001, 10000003, 10000002], mean: 10000002, deviation: 1, lag1: -0.5 },
  { name: 'NumAcc2', data: inTurn(1.2, 1.1, 1.3), mean: 1.2, deviation: 0.1, lag1: -0.999 },
  {
    name: 'NumAcc3',
    data: inTurn(1000000.2, 1000000.1, 1000000.3),
    mean: 1000000.2,
    deviation: 0.1,
    lag1: -0.999,
  },
  {
    name: 'NumAcc4',
    data: inTurn(10000000.2, 10000000.1, 10000000.3),
    mean: 10000000.2,
    deviation: 0.1,
    lag1: -0.999,
  },
];

describe.each(UNIVARIATE)('$name', ({ data, mean: wantedMean, deviation, lag1 }) => {
  const roundingOfData = (Number.EPSILON * Math.abs(wantedMean)) / deviation;

  it(`has the mean ${wantedMean}`, () => {
    expect(Math.abs(mean([...data]) / wantedMean - 1)).toBeLessThan(1e-13);
  });

  it(`has the deviation ${deviation}`, () => {
    const found = sampleStandardDeviation([...data]);
    expect(Math.abs(found / deviation - 1)).toBeLessThan(1e-13 + roundingOfData);
  });

  it(`has the correlation ${lag1} of each value with the next`, () => {
    const average = mean([...data]);
    const away = data.map((value) => value - average);
    const products = away.slice(1).reduce((sum, value, i) => sum + value * away[i], 0);
    const squares = away.reduce((sum, value) => sum + value * value, 0);
    expect(Math.abs(products / squares - lag1)).toBeLessThan(1e-13 + 2 * roundingOfData);
  });
});

const NORRIS = {
  x: [
    0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0,
    447.5, 11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3,
    229.2, 669.1, 448.9, 0.5,
  ],
  y: [
    0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3,
    448.9, 10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6,
    228.9, 668.4, 449.2, 0.2,
  ],
  intercept: -0.262323073774029,
  slope: 1.00211681802045,
  rSquared: 0.999993745883712,
};

describe('Norris', () => {
  const pairs = NORRIS.x.map((x, i) => [x, NORRIS.y[i]]);
  const line = linearRegression(pairs);

  it(`has the slope ${NORRIS.slope}`, () => {
    expect(Math.abs(line.m / NORRIS.slope - 1)).toBeLessThan(1e-13);
  });

  it(`has the intercept ${NORRIS.intercept}`, () => {
    // a difference of means near 450: 1e-13 of those
    expect(Math.abs(line.b - NORRIS.intercept)).toBeLessThan(1e-13 * 450);
  });

  it(`has the share ${NORRIS.rSquared} of the variance explained`, () => {
    expect(Math.abs(rSquared(pairs, linearRegressionLine(line)) - NORRIS.rSquared)).toBeLessThan(1e-13);
  });
});
