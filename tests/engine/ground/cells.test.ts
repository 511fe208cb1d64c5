import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { cells } from '../../../engine/ground/cells.ts';

const BASE_DRAINED = true;

/** Layers of the given thicknesses. */
function layersOf(thicknesses: readonly number[]) {
  let top = 0;
  return thicknesses.map((thickness, i) => {
    const layer = { layer: i, soil: i, top, base: top + thickness };
    top += thickness;
    return layer;
  });
}

describe('the cells of a column', () => {
  it('fill the column without gaps and end at every layer face and drain end', () => {
    const thickness = fc.double({ min: 0.05, max: 20, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(thickness, fc.boolean()), { minLength: 1, maxLength: 8 }),
        fc.double({ min: 0.1, max: 60, noNaN: true }),
        (layers, cut) => {
          const made = layersOf(layers.map(([of]) => of));
          const free = layers.map(([, isFree]) => isFree);
          const column = cells(made, free, [cut], 60, BASE_DRAINED);
          const { top, middle, thickness: of } = column;
          let depth = 0;
          top.forEach((upper, i) => {
            expect(upper).toBeCloseTo(depth, 9);
            expect(of[i]).toBeGreaterThan(0);
            expect(middle[i]).toBeCloseTo(upper + 0.5 * of[i], 9);
            depth = upper + of[i];
          });
          const base = made[made.length - 1].base;
          expect(depth).toBeCloseTo(base, 9);
          const faces = [...made.map((layer) => layer.top), ...(cut < base ? [cut] : [])];
          for (const face of faces) {
            expect(Math.min(...top.map((upper) => Math.abs(upper - face)))).toBeLessThan(1e-9);
          }
        },
      ),
      { seed: 4711, numRuns: 200 },
    );
  });

  it('lie in the layer that they are said to lie in', () => {
    const made = layersOf([2, 3, 0.2, 4]);
    const { middle, part } = cells(made, [true, false, true, false], [], 60, BASE_DRAINED);
    middle.forEach((z, i) => {
      expect(z).toBeGreaterThan(made[part[i]].top);
      expect(z).toBeLessThan(made[part[i]].base);
    });
  });

  it('are thinnest at a drained face and even towards a closed one', () => {
    const { thickness } = cells(layersOf([10]), [false], [], 60, !BASE_DRAINED);
    for (let i = 1; i < thickness.length; i += 1) expect(thickness[i]).toBeGreaterThan(thickness[i - 1]);
    expect(thickness[0]).toBeLessThan(0.3 * (10 / thickness.length));
  });

  it('are refused when fewer than 8 are aimed at', () => {
    expect(() => cells(layersOf([1]), [false], [], 7, BASE_DRAINED)).toThrow(RangeError);
    expect(() => cells(layersOf([1]), [false], [], NaN, BASE_DRAINED)).toThrow(RangeError);
  });
});
