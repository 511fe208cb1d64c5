import { describe, expect, it } from 'vitest';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { fillVolumes } from '../../../engine/settlement/fillVolumes.ts';
import { plainModel } from './plainModel.ts';

const model = plainModel({
  layers: [{ thickness: 4, soil: { modulus: 1000 } }],
  lifts: [
    { thickness: 1, crestWidth: 10, slope: 2, standing: true },
    { thickness: 2, crestWidth: 10, slope: 2, placing: [0, 1] },
  ],
  x: [-4, 4],
  horizon: 10,
});

describe('the volumes of fill', () => {
  it('of the lifts are those of their trapezoids, what stands already left out', () => {
    // (10 + 18)/2 · 2
    const [placed] = fillVolumes(model, centralGround(model), 0, new Float64Array(2));
    expect(placed).toBeCloseTo(28, 12);
  });

  it('of the topping up run straight between the points and to nothing at the toes', () => {
    // toes at ±9: two triangles 5 m wide and 0.3 m high, and 8 m of 0.3 m
    const [, toppingUp] = fillVolumes(model, centralGround(model), 0, Float64Array.of(0.3, 0.3));
    expect(toppingUp).toBeCloseTo(2 * 0.5 * 5 * 0.3 + 8 * 0.3, 12);
  });
});
