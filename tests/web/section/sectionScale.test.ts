import { describe, expect, it } from 'vitest';
import { drainLines } from '../../../web/section/drainLines.ts';
import { nameRows } from '../../../web/section/nameRows.ts';
import { MARGINS, sectionScale, ticks } from '../../../web/section/sectionScale.ts';

const shape = { from: 0, to: 100, top: 5, base: -15, water: 0, layers: [], lifts: [] };

describe('the scale of the section', () => {
  it('is the same both ways where the height allows it', () => {
    const scale = sectionScale(shape, 1000 + MARGINS.left + MARGINS.right, 150, 400, 50);
    expect(scale.exaggeration).toBe(1);
    expect(scale.x(10) - scale.x(0)).toBeCloseTo(100, 9);
    expect(scale.y(0) - scale.y(10)).toBeCloseTo(100, 9);
    expect(scale.height).toBeCloseTo(200 + 50 + MARGINS.bottom, 9);
  });

  it('stretches heights, and says how much, where the section would be a thread', () => {
    const scale = sectionScale({ ...shape, to: 1000 }, 1000 + MARGINS.left + MARGINS.right, 150, 400, 50);
    expect(scale.exaggeration).toBe(8); // 20 m at 1 px/m is 20 px; 8 is the least listed that reaches 150 px
    expect(scale.y(0) - scale.y(10)).toBeCloseTo(8 * (scale.x(10) - scale.x(0)), 9);
  });

  it('is made smaller, not squeezed, where the section would be too high', () => {
    const scale = sectionScale({ ...shape, to: 20 }, 1000, 150, 400, 50);
    expect(scale.exaggeration).toBe(1);
    expect(scale.height).toBeCloseTo(400 + 50 + MARGINS.bottom, 9);
  });

  it('has ticks at round numbers that keep apart', () => {
    expect(ticks(-23, 41, 10, 64)).toEqual([-20, -10, 0, 10, 20, 30, 40]);
  });
});

describe('the drains drawn', () => {
  it('are all of them where there is room', () => {
    const drains = { spacing: 2, from: 0, to: 10 } as Parameters<typeof drainLines>[0];
    expect(drainLines(drains, -50, 50, 1)).toEqual({ x: [0, 2, 4, 6, 8, 10], every: 1 });
  });

  it('are every fifth where they would touch, and end with the drawing where they go on', () => {
    const drains = { spacing: 1, from: -Infinity, to: Infinity } as Parameters<typeof drainLines>[0];
    const lines = drainLines(drains, 0, 20, 3);
    expect(lines.every).toBe(5);
    expect(lines.x).toEqual([0, 5, 10, 15, 20]);
  });
});

describe('names above their marks', () => {
  it('stand in one row where they are apart and in two where they would touch', () => {
    expect(
      nameRows(
        [
          { x: 50, width: 40 },
          { x: 200, width: 40 },
        ],
        400,
      ).map(({ row }) => row),
    ).toEqual([0, 0]);
    expect(
      nameRows(
        [
          { x: 50, width: 80 },
          { x: 90, width: 80 },
        ],
        400,
      ).map(({ row }) => row),
    ).toEqual([0, 1]);
  });

  it('are left out where three rows do not hold them, and the marks stay', () => {
    const crowd = Array.from({ length: 5 }, (_, i) => ({ x: 100 + i, width: 60 }));
    expect(nameRows(crowd, 400).map(({ row }) => row)).toEqual([0, 1, 2, -1, -1]);
  });

  it('stay inside the drawing', () => {
    expect(nameRows([{ x: 395, width: 60 }], 400)[0].x).toBe(370);
  });
});
