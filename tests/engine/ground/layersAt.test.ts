import { describe, expect, it } from 'vitest';
import { layersAt } from '../../../engine/ground/layersAt.ts';
import type { Model } from '../../../engine/project/model.ts';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { realise } from '../../../engine/settlement/realise.ts';
import { fixed, plainModel, type Plain } from '../settlement/plainModel.ts';

const crust = { modulus: 20_000, unitWeight: 18 };
const clay = { compressionIndex: 0.6, recompressionIndex: 0.06, voidRatio: 1.8, unitWeight: 16, cv: 2 };
const sand = { modulus: 40_000, unitWeight: 19 };
const plain: Plain = {
  layers: [
    { thickness: 2, soil: crust },
    { thickness: 6, soil: clay },
    { thickness: 3, soil: sand },
  ],
  loads: [{ pressure: 40 }],
  horizon: 5,
  x: [-20, 0, 10, 30],
};

/** The clay given at two borings: nothing at x = 0, 6 m at x = 20. */
function thinning(): Model {
  const model = plainModel(plain);
  const [top, , base] = model.layers;
  const thickness = { kind: 'borings', x: [0, 20], thickness: [0, 6], factor: fixed(1) } as const;
  return { ...model, layers: [top, { name: 'clay', soil: 1, thickness }, base] };
}

describe('the layers under a point', () => {
  it('lie on each other from the ground down', () => {
    expect(layersAt(plainModel(plain), 0).map(({ top, base }) => [top, base])).toEqual([
      [0, 2],
      [2, 8],
      [8, 11],
    ]);
  });

  it('are straight between borings and level beyond them', () => {
    const baseOfClay = (x: number) => layersAt(thinning(), x)[1].base;
    expect(baseOfClay(10)).toBe(5);
    expect(baseOfClay(20)).toBe(8);
    expect(baseOfClay(100)).toBe(8);
  });

  it('leave out a layer that has thinned out, so that the settlement is that of the others alone', () => {
    const model = thinning();
    expect(layersAt(model, 0).map(({ layer }) => layer)).toEqual([0, 2]);
    const { settlement, historyTimes, count } = realise(model, centralGround(model));
    const last = (point: number) => settlement[((point + 1) * historyTimes.length - 1) * count];
    const stiffAlone = 40 * (2 / 20_000 + 3 / 40_000);
    expect(last(0)).toBeCloseTo(stiffAlone, 12);
    expect(last(1)).toBeCloseTo(stiffAlone, 12);
    expect(last(2)).toBeGreaterThan(10 * stiffAlone);
  });

  it('follow the value drawn for a thickness', () => {
    expect(layersAt(plainModel(plain), 0, (layer) => [1, 4, 2][layer])[2].base).toBe(7);
  });
});
