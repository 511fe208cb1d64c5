import { describe, expect, it } from 'vitest';
import { sectionShape, stackAt, type Corner } from '../../../web/section/sectionShape.ts';
import { inventedModel } from '../invented/inventedModel.ts';

const shape = sectionShape(inventedModel);
const heightsAt = (corners: readonly Corner[], x: number) =>
  corners.filter((corner) => Math.abs(corner[0] - x) < 1e-3).map(([, height]) => height);

describe('the central section', () => {
  it('has its layer boundaries at the depths of the borings', () => {
    // crust 1.2 m; soft clay 3, 6.5 and 10 m at x -20, 0 and 30
    expect(heightsAt(shape.layers[1].corners, 0)).toEqual([-1.2, -7.7]);
    expect(heightsAt(shape.layers[1].corners, 30)).toEqual([-1.2, -11.2]);
    expect(heightsAt(shape.layers[2].corners, 30)).toEqual([-11.2, -14.2]);
  });

  it('reaches down to the deepest base and up to the top of the fill', () => {
    expect(shape.base).toBeCloseTo(-14.2, 12);
    expect(shape.top).toBe(7);
    expect(shape.water).toBeCloseTo(-0.8, 12);
  });

  it('puts a surcharge on the fill below it', () => {
    const heights = shape.lifts[1].corners.map(([, height]) => height);
    expect(Math.min(...heights)).toBeGreaterThan(4.9);
    expect(Math.max(...heights)).toBe(7);
  });

  it('keeps an upright face of the fill upright', () => {
    const left = heightsAt(shape.lifts[0].corners, -12);
    expect(Math.max(...left)).toBe(5);
    expect(Math.min(...left)).toBe(0);
  });

  it('leaves room beside everything that is drawn, and more level ground where asked', () => {
    for (const { x } of inventedModel.points) {
      expect(x).toBeGreaterThan(shape.from);
      expect(x).toBeLessThan(shape.to);
    }
    const wide = sectionShape(inventedModel, 6);
    expect(wide.to - wide.from).toBeCloseTo(6 * (7 + 14.2), 9);
  });

  it('adds up lifts that lie on each other', () => {
    const lift = { crestCentre: 0, crestWidth: 10, leftSlope: 2, rightSlope: 2, thickness: 3 };
    expect(stackAt([lift, lift], 0, 2)).toBe(6);
    expect(stackAt([lift, lift], 8, 2)).toBe(3); // halfway down a slope of 2 : 1
  });
});
