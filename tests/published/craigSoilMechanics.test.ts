/**
 * Craig, Soil Mechanics, worked examples and problems of the consolidation chapter. Values from memory; all recompute
 * to the printed precision.
 * - 8 m of sand over 6 m of clay, e = 0.88 − 0.32 log(σ′/100), σ′ = 119.8 kPa at its middle, 3 m of fill (60 kPa)
 *   placed in one year, c_v = 1.26 m²/year: 182 mm in the end, after 3 years 61 mm, with a thin layer of sand 1.5 m
 *   above the closed base 157 mm; U = 0.335, with the seam 0.825 and 0.97. Tolerance 1 mm, 0.006 of U. The exact ramp
 *   gives U = 0.3332.
 * - Raft of 45 × 30 m, 125 kPa, 4 m of clay with its middle at 23.5 m, m_v = 0.35 m²/MN: 70 kPa (chart, 0.6 kPa), 98 mm
 *   (0.6 mm).
 * - Sand drains of 300 mm, square grid of 3 m in 8 m, half closed: 25 % without drains is 80 % with them (0.01).
 * - Problem 7.8: 10 m, drains of 300 mm on a square grid of 4 m: 90 % in 8.8 years without and 0.7 with them (0.05).
 */
import { describe, expect, it } from 'vitest';
import { rectangleInfluence } from '../../engine/load/stressIncrease.ts';
import { marchedModel } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';
import { linearConsolidation } from './linearConsolidation.ts';
import { layersOfUniformClay } from './uniformClay.ts';

describe('Craig, wide fill on sand over clay', () => {
  const clay = {
    thickness: 6,
    initialStress: 119.8,
    compressionIndex: 0.32,
    recompressionIndex: 0.32,
    voidRatio: 0.88 - 0.32 * Math.log10(1.198),
    cv: 1.26,
  };
  const fill = {
    lifts: [{ thickness: 3, unitWeight: 20, placing: [0, 1] as const }],
    base: 'closed' as const,
  };
  const final =
    1000 * marchedModel({ layers: layersOfUniformClay(clay), ...fill, horizon: 300 }).settlementAt(300);

  const afterThreeYears = (layers: Plain['layers'], base: Plain['base']) =>
    1000 * marchedModel({ layers, ...fill, base, horizon: 3 }).settlementAt(3);
  /** The book's rate is Terzaghi's: linear layers of the same c_v that settle as much in the end. */
  const soil = { cv: 1.26, modulus: (60 * 6) / (final / 1000) };
  const layer = (thickness: number) => ({ thickness, soil });

  it('settles 182 mm in the end', () => expect(Math.abs(final - 182)).toBeLessThan(1));

  it('has settled 61 mm after three years', () => {
    expect(Math.abs(afterThreeYears([layer(6)], 'closed') - 61)).toBeLessThan(1);
  });

  it('is consolidated by 0.335 after three years', () => {
    expect(Math.abs(afterThreeYears([layer(6)], 'closed') / final - 0.335)).toBeLessThan(0.006);
  });

  it('has settled 157 mm after three years with a thin layer of sand 1.5 m above its base', () => {
    const seam = { thickness: 0.01, soil: { modulus: 1e9 } };
    expect(Math.abs(afterThreeYears([layer(4.5), seam, layer(1.5)], 'closed') - 157)).toBeLessThan(1);
  });

  it.each([
    ['above', 4.5, 'drained', 0.825],
    ['below', 1.5, 'closed', 0.97],
  ] as const)(
    'the part %s that layer, %f m with its base %s, is consolidated by %f',
    (_, thickness, base, degree) => {
      const settled = afterThreeYears([layer(thickness)], base);
      expect(Math.abs((settled * 6) / thickness / final - degree)).toBeLessThan(0.006);
    },
  );
});

describe('Craig, raft on sand over clay', () => {
  it('the increase at the middle of the clay is 70 kPa', () => {
    const found = 125 * rectangleInfluence(-22.5, 22.5, { from: -15, to: 15 }, 0, 23.5);
    expect(Math.abs(found - 70)).toBeLessThan(0.6);
  });

  it('the clay settles 98 mm', () => {
    const { settlementAt } = marchedModel({
      layers: [
        { thickness: 21.5, soil: { modulus: 1e9 } },
        { thickness: 4, soil: { modulus: 1e3 / 0.35, cv: 10 } },
      ],
      loads: [{ pressure: 125, x1: -22.5, x2: 22.5, outOfPlane: { from: -15, to: 15 } }],
      wide: false,
      horizon: 50,
    });
    expect(Math.abs(1000 * settlementAt(50) - 98)).toBeLessThan(0.6);
  });
});

const drains = { pattern: 'square', diameter: 0.3 } as const;

describe('Craig, sand drains below an embankment', () => {
  it('when it would be consolidated by 25 % without drains it is by 80 % with them', () => {
    const linear = [{ thickness: 8, cv: 1 }];
    const without = linearConsolidation({ linear, base: 'closed', horizon: 10 });
    const withDrains = linearConsolidation({
      linear,
      base: 'closed',
      drains: { ...drains, spacing: 3, foot: 8 },
      horizon: 10,
    });
    // Tv = 0.0491 at U = 0.25
    const date = 0.0491 * 64;
    expect(Math.abs(without.degreeAt(date) - 0.25)).toBeLessThan(0.001);
    expect(Math.abs(withDrains.degreeAt(date) - 0.8)).toBeLessThan(0.01);
  });
});

describe('Craig, problem 7.8', () => {
  const given = { linear: [{ thickness: 10, cv: 9.6, horizontalRatio: 14 / 9.6 }], base: 'closed' } as const;

  it('without drains 90 % takes 8.8 years', () => {
    const { degreeAt } = linearConsolidation({ ...given, horizon: 10 });
    expect(degreeAt(8.75)).toBeLessThan(0.9);
    expect(degreeAt(8.85)).toBeGreaterThan(0.9);
  });

  it('with drains it takes 0.7 years', () => {
    const { degreeAt } = linearConsolidation({
      ...given,
      drains: { ...drains, spacing: 4, foot: 10 },
      horizon: 1,
    });
    expect(degreeAt(0.65)).toBeLessThan(0.9);
    expect(degreeAt(0.75)).toBeGreaterThan(0.9);
  });
});
