/**
 * Vu & Wang, Vacuum preloading with vertical drains: theory and recent developments (citing Shang et al. 1998, Chu et al.
 * 2000): a vacuum of 80 kPa stands for 4.5 m of fill; read. 80/18 = 4.44 m at 18 kN/m³. Tolerance 0.1 m.
 */
import { describe, expect, it } from 'vitest';
import { marchedModel } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';

const clay = { compressionIndex: 0.8, recompressionIndex: 0.1, voidRatio: 2, unitWeight: 15.5, cv: 2 };
const given: Omit<Plain, 'lifts'> = {
  layers: [{ thickness: 8, soil: clay }],
  base: 'closed',
  drains: { spacing: 1, diameter: 0.066, foot: 8 },
  horizon: 10,
};
const resolution = { cells: 120, steps: 32 };

describe('Vu & Wang, vacuum as a height of fill', () => {
  it('80 kPa settle the ground as much as 4.5 m of fill of 18 kN/m³, within 0.1 m of fill', () => {
    const vacuum = marchedModel({ ...given, vacuum: { pressure: 80 } }, resolution).settlementAt(10);
    const fillOf = (thickness: number) =>
      marchedModel({ ...given, lifts: [{ thickness, unitWeight: 18 }] }, resolution).settlementAt(10);
    expect(fillOf(4.4)).toBeLessThan(vacuum);
    expect(fillOf(4.6)).toBeGreaterThan(vacuum);
  });
});
