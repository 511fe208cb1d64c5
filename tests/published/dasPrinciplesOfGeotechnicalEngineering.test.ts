/**
 * Das (and Das & Sobhan), Principles of Geotechnical Engineering, worked examples and problems.
 * - Time examples: values from memory (inputs of the third also read in NPTEL course 105103097, chapter 8). The march
 *   gives U; where a time is printed, U at that time is compared: 5e-4 for the numerical solution and what one unit
 *   of the printed time makes of U.
 * - Stress: table 10.4, 2z/B = 1 (from memory), problem 10.12 (0.338 as printed), problem 10.22 (inputs and angles
 *   read, result closed form), rectangle example (from memory).
 * - Settlement of a clay layer, three cases (from memory): 213, 36 and 46.9 mm by the middle of the layer; 36 mm is
 *   printed for 35.5.
 * - Secondary settlement (from memory): 2.15 in primary, 0.59 in secondary; 0.59 in goes with Cα' rounded to 0.011,
 *   unrounded 0.605: tolerance 0.02 in.
 */
import { describe, expect, it } from 'vitest';
import { rectangleInfluence, stressIncrease } from '../../engine/load/stressIncrease.ts';
import { initialEffectiveStress } from '../../engine/ground/initialStress.ts';
import { valueAtDate } from '../../engine/settlement/settlementHistory.ts';
import { endOfPrimary, marchedModel } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';
import { layersOfUniformClay } from './uniformClay.ts';

const DAYS = 365.25;
const SECONDS = 86_400 * DAYS;
/** cm²/s to m²/year */
const perYear = (cv: number) => cv * 1e-4 * SECONDS;

describe('Das, time of consolidation', () => {
  // a specimen of 25 mm, drained at both faces, reaches 50 % in 140 s
  const cv = (0.196735 * 0.0125 * 0.0125) / (140 / SECONDS);

  it('the specimen of 25 mm that is half consolidated in 140 s belongs to a layer of 3 m, drained at one face, half consolidated in 93.33 days', () => {
    const field = linearConsolidation({
      linear: [{ thickness: 3, cv }],
      base: 'closed',
      horizon: 200 / DAYS,
    });
    const specimen = linearConsolidation({ linear: [{ thickness: 0.025, cv }], horizon: 400 / SECONDS });
    expect(Math.abs(specimen.degreeAt(140 / SECONDS) - 0.5)).toBeLessThan(ON_FINE_GRID);
    expect(Math.abs(field.degreeAt(93.33 / DAYS) - 0.5)).toBeLessThan(ON_FINE_GRID);
  });

  it('the same layer is consolidated by 30 % in 33.5 days', () => {
    const field = linearConsolidation({
      linear: [{ thickness: 3, cv }],
      base: 'closed',
      horizon: 200 / DAYS,
    });
    // 0.3 days (the reference tolerance) are 0.3/33.5/2 of U = 0.3
    expect(Math.abs(field.degreeAt(33.5 / DAYS) - 0.3)).toBeLessThan(ON_FINE_GRID + (0.3 * 0.3) / (2 * 33.5));
  });

  it('3 m drained at both faces reach 90 % in 75 days with c_v = 0.00294 cm²/s', () => {
    const { degreeAt } = linearConsolidation({
      linear: [{ thickness: 3, cv: perYear(0.00294) }],
      horizon: 0.5,
    });
    // c_v printed to 5e-6 of 0.00294: 0.17 % of T, at dU/dT · T = π²/4 · 0.848 · 0.1
    expect(Math.abs(degreeAt(75 / DAYS) - 0.9)).toBeLessThan(ON_FINE_GRID + 0.0017 * 0.21);
  });

  it('a specimen of 30 mm of that clay reaches 60 % in 218.9 s', () => {
    const { degreeAt } = linearConsolidation({
      linear: [{ thickness: 0.03, cv: perYear(0.00294) }],
      horizon: 600 / SECONDS,
    });
    // T60 is taken as 0.286 in the example; 0.5 s are 0.23 % of T, at dU/dT · T = 0.29
    expect(Math.abs(degreeAt(218.9 / SECONDS) - 0.6)).toBeLessThan(ON_FINE_GRID + 0.0023 * 0.29);
  });
});

const ENDLESS = { from: -Infinity, to: Infinity };

describe('Das, vertical stress', () => {
  it.each([
    [0, 0.818, 163.6],
    [3, 0.48, 96.0],
    [6, 0.084, 16.8],
    [9, 0.017, 3.4],
  ])(
    'below a strip of 6 m and 200 kPa, 3 m deep and %f m aside, the ratio is %f (%f kPa)',
    (x, ratio, stress) => {
      const found = stressIncrease([{ x1: -3, q1: 200, x2: 3, q2: 200 }], ENDLESS, false, x, 3);
      expect(Math.abs(found / 200 - ratio)).toBeLessThan(5e-4);
      expect(Math.abs(found - stress)).toBeLessThan(0.1);
    },
  );

  it('at 2x/B = 1.2 and 2z/B = 0.8 the ratio is 0.338', () => {
    const found = stressIncrease([{ x1: -1, q1: 1, x2: 1, q2: 1 }], ENDLESS, false, 1.2, 0.8);
    expect(Math.abs(found - 0.338)).toBeLessThan(5e-4);
  });

  it('below a strip of 48 ft and 1450 psf, 21 ft deep and 28.8 ft aside, the increase is 504.8 psf', () => {
    const found = stressIncrease([{ x1: -24, q1: 1450, x2: 24, q2: 1450 }], ENDLESS, false, 28.8, 21);
    expect(Math.abs(found - 504.8)).toBeLessThan(1450 * 0.001);
  });

  it('1 m beyond the high end of a triangular strip of 5 m and 400 kPa, 2 m deep, the increase is 69.07 kPa', () => {
    const found = stressIncrease([{ x1: 0, q1: 0, x2: 5, q2: 400 }], ENDLESS, false, 6, 2);
    expect(Math.abs(found - 69.07)).toBeLessThan(0.1);
  });

  it('below the centre of a rectangle of 2.5 × 5 m and 145 kPa, 6.25 m deep, the increase is 19.02 kPa', () => {
    const found = 145 * rectangleInfluence(-1.25, 1.25, { from: -2.5, to: 2.5 }, 0, 6.25);
    expect(Math.abs(found - 19.02)).toBeLessThan(0.05);
  });
});

describe('Das, settlement of a clay layer under sand', () => {
  const clay = {
    thickness: 4,
    initialStress: 79.14,
    compressionIndex: 0.27,
    recompressionIndex: 0.045,
    voidRatio: 0.8,
    cv: 10,
  };
  it('2 m of dry and 4 m of wet sand and half of 4 m of clay make σ′v0 = 79.14 kPa', () => {
    const layers = [0, 2, 6, 10].slice(1).map((base, i) => ({ layer: i, soil: i, top: [0, 2, 6][i], base }));
    const found = initialEffectiveStress(8, layers, [14, 18, 19], { depth: 2, baseExcessHead: 0 });
    expect(Math.abs(found - 79.14)).toBeLessThan(0.005);
  });

  it.each([
    ['normally consolidated', 79.14, 213, 0.5],
    ['with σ′p = 190 kPa', 190, 36, 0.6],
    ['with σ′p = 170 kPa', 170, 46.9, 0.3],
  ] as const)('%s (%f kPa) it settles %f mm under 100 kPa', (_, sigmaP, printed, tolerance) => {
    const layers = layersOfUniformClay({ ...clay, ocr: sigmaP / clay.initialStress });
    const { settlementAt } = marchedModel({ layers, loads: [{ pressure: 100 }], horizon: 100 });
    expect(Math.abs(1000 * settlementAt(100) - printed)).toBeLessThan(tolerance);
  });
});

describe('Das, primary and secondary settlement', () => {
  const [foot, inch, psf] = [0.3048, 0.0254, 0.04788];
  const given = (cv: number): Plain => ({
    layers: layersOfUniformClay({
      thickness: 8.5 * foot,
      initialStress: 2650 * psf,
      compressionIndex: 0.28,
      recompressionIndex: 0.28,
      voidRatio: 0.8,
      cv,
      secondaryIndex: 0.02,
    }),
    loads: [{ pressure: 970 * psf }],
    secondary: true,
    horizon: 5,
  });
  // the c_v with which primary ends after 1.5 years: times go with 1/c_v
  const cv = endOfPrimary({ ...given(1), secondary: false }) / 1.5;
  const { track } = marchedModel(given(cv));
  const after = (series: Float64Array) => valueAtDate(track, series, 5) / inch;

  it('in five years primary settlement is 2.15 in', () => {
    expect(Math.abs(after(track.settlement) - after(track.secondary) - 2.15)).toBeLessThan(0.02);
  });

  it('secondary settlement from 1.5 to 5 years is 0.59 in', () => {
    expect(Math.abs(after(track.secondary) - 0.59)).toBeLessThan(0.02);
  });

  it('together they are 2.74 in', () => {
    expect(Math.abs(after(track.settlement) - 2.74)).toBeLessThan(0.02);
  });
});
