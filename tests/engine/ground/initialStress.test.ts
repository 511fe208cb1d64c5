import { describe, expect, it } from 'vitest';
import { initialEffectiveStress, initialPorePressure } from '../../../engine/ground/initialStress.ts';
import { columnOf } from '../settlement/marchedColumn.ts';

const layers = [
  { layer: 0, soil: 0, top: 0, base: 2 },
  { layer: 1, soil: 1, top: 2, base: 10 },
];
const unitWeights = [18, 15];
const WATER = 9.81;

describe('the initial effective stress', () => {
  it('is the weight above less the hydrostatic pressure below the water level', () => {
    const water = { depth: 1, baseExcessHead: 0 };
    expect(initialEffectiveStress(0.5, layers, unitWeights, water)).toBeCloseTo(9, 12);
    expect(initialEffectiveStress(6, layers, unitWeights, water)).toBeCloseTo(
      2 * 18 + 4 * 15 - 5 * WATER,
      12,
    );
  });

  it('loses an excess head at the base in proportion to the depth below the water level', () => {
    const still = { depth: 1, baseExcessHead: 0 };
    const artesian = { depth: 1, baseExcessHead: 1.5 };
    const lost = (z: number) =>
      initialEffectiveStress(z, layers, unitWeights, still) -
      initialEffectiveStress(z, layers, unitWeights, artesian);
    expect(lost(1)).toBe(0);
    expect(lost(5.5)).toBeCloseTo(0.75 * WATER, 12);
    expect(lost(10)).toBeCloseTo(1.5 * WATER, 12);
  });

  it('grows with an under-drained base', () => {
    const under = { depth: 1, baseExcessHead: -2 };
    expect(initialPorePressure(10, 10, under)).toBeCloseTo(7 * WATER, 12);
  });

  it('does not depend on how deep the water stands above the ground', () => {
    const at = (height: number) =>
      initialEffectiveStress(4, layers, unitWeights, { depth: -height, baseExcessHead: 0 });
    expect(at(3)).toBeCloseTo(at(0), 10);
  });

  it('is held at 1 kPa in the column, and said', () => {
    const light = { compressionIndex: 1, recompressionIndex: 0.1, voidRatio: 4, unitWeight: 9.9 };
    const column = columnOf(
      { layers: [{ thickness: 4, soil: light }], loads: [{ pressure: 5 }], horizon: 1 },
      { cells: 16, steps: 8 },
    );
    expect(Math.min(...column.law.initialStress)).toBe(1);
    expect(column.clamps.initialStressAtFloor).toBe(true);
  });
});
