/**
 * University homework and question pages, read as looked up.
 * - SHW12 (problem of Das' type): sand 2 m above (16.4 kN/m³) and 1.5 m below the water level (20.1), 2.5 m of clay
 *   (17.6, e0 = 1.2, Cc = 0.315), σ′v0 = 58.0 kPa, 140 kPa: 191 mm; tolerance 0.7 mm.
 * - Spacing for 90 % in 2 years: 5 m drained one way, drains of 200 mm on a triangular grid, c_v = 1, c_h = 2 m²/year:
 *   inputs read (5 µm for 5 m is a slip of the page), 2.788 m by the closed form with exact F(n); tolerance 0.01 m.
 * - Raft of 6.1 × 15.25 m, 300 kPa, 4.58 m deep: 192 kPa by Fadum's chart; tolerance 3 kPa.
 * - Foundation engineering handbook (probably Day; title inferred): c_v = 0.32 m²/year, 1 m to the drained face:
 *   t50 = 0.61 (0.6156, printed cut off), t90 = 2.65 years; tolerance 0.01 years.
 */
import { describe, expect, it } from 'vitest';
import { initialEffectiveStress } from '../../engine/ground/initialStress.ts';
import { rectangleInfluence } from '../../engine/load/stressIncrease.ts';
import { marchedModel } from '../engine/settlement/marchedColumn.ts';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';
import { layersOfUniformClay } from './uniformClay.ts';

describe('university homework SHW12', () => {
  it('the effective stress at the middle of the clay is 58.0 kPa', () => {
    const layers = [
      { layer: 0, soil: 0, top: 0, base: 2 },
      { layer: 1, soil: 1, top: 2, base: 3.5 },
      { layer: 2, soil: 2, top: 3.5, base: 6 },
    ];
    const found = initialEffectiveStress(4.75, layers, [16.4, 20.1, 17.6], { depth: 2, baseExcessHead: 0 });
    expect(Math.abs(found - 58.0)).toBeLessThan(0.05);
  });

  it('the clay settles 191 mm under 140 kPa', () => {
    const layers = layersOfUniformClay({
      thickness: 2.5,
      initialStress: 58,
      compressionIndex: 0.315,
      recompressionIndex: 0.05,
      voidRatio: 1.2,
      cv: 5,
    });
    const { settlementAt } = marchedModel({ layers, loads: [{ pressure: 140 }], horizon: 50 });
    expect(Math.abs(1000 * settlementAt(50) - 191)).toBeLessThan(0.7);
  });
});

describe('question page, spacing of drains', () => {
  it('2.788 m gives 90 % in two years, within 0.01 m', () => {
    const degreeWith = (spacing: number) =>
      linearConsolidation({
        linear: [{ thickness: 5, cv: 1, horizontalRatio: 2 }],
        base: 'closed',
        drains: { pattern: 'triangular', spacing, diameter: 0.2, foot: 5 },
        horizon: 2,
      }).degreeAt(2);
    expect(degreeWith(2.788 - 0.01)).toBeGreaterThan(0.9);
    expect(degreeWith(2.788 + 0.01)).toBeLessThan(0.9);
  });

  it('vertical flow alone has then come to 0.3192', () => {
    const { degreeAt } = linearConsolidation({
      linear: [{ thickness: 5, cv: 1 }],
      base: 'closed',
      horizon: 2,
    });
    expect(Math.abs(degreeAt(2) - 0.3192)).toBeLessThan(ON_FINE_GRID);
  });
});

describe('question page, raft', () => {
  it('below the centre of 6.1 × 15.25 m the increase 4.58 m deep is 192 of 300 kPa', () => {
    const found = 300 * rectangleInfluence(-3.05, 3.05, { from: -7.625, to: 7.625 }, 0, 4.58);
    expect(Math.abs(found - 192)).toBeLessThan(3);
  });
});

describe('handbook, rate of consolidation', () => {
  const { degreeAt } = linearConsolidation({ linear: [{ thickness: 2, cv: 0.32 }], horizon: 4 });

  it('half of the consolidation takes 0.61 years', () => {
    expect(degreeAt(0.6)).toBeLessThan(0.5);
    expect(degreeAt(0.62)).toBeGreaterThan(0.5);
  });

  it('nine tenths take 2.65 years', () => {
    expect(degreeAt(2.64)).toBeLessThan(0.9);
    expect(degreeAt(2.66)).toBeGreaterThan(0.9);
  });
});
