/**
 * Davis & Raymond (1965), A non-linear theory of consolidation, Géotechnique 15(2):161–173. Normally consolidated clay,
 * m_v ∝ 1/σ′ and k ∝ m_v (Ck = Cc, c_v constant), small strains, one load at once on a uniform σ′v0: ln(σ′/σ′f) obeys
 * Terzaghi's equation. So the degree by settlement is Terzaghi's U whatever the load, and with R = σ′f/σ′v0
 *
 *     u/σ′f = 1 − R^(−s),  s = Σ (2/M) sin(MZ) exp(−M² Tv)
 *
 * Closed form, from memory; the series values of s are those printed beside the isochrones of Terzaghi 1923.
 * Small strains: Cc/(1 + e0) is 1e-4. Tolerance: 5e-4 of the final settlement and of σ′f for the numerical solution.
 */
import { describe, expect, it } from 'vitest';
import { marchedModel } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';
import { ON_FINE_GRID } from './linearConsolidation.ts';
import { layersOfUniformClay } from './uniformClay.ts';

/** Tv, U of Terzaghi's theory. */
const DEGREES: readonly (readonly [number, number])[] = [
  [0.02, 0.159577],
  [0.05, 0.252313],
  [0.1, 0.356823],
  [0.2, 0.504088],
  [0.3, 0.613236],
  [0.5, 0.76395],
  [0.848, 0.899979],
  [1.5, 0.979982],
];
/** Tv, s at Z = 0.5 and at the closed face. */
const SERIES: readonly (readonly [number, number, number])[] = [
  [0.05, 0.886152, 0.996869],
  [0.2, 0.553176, 0.772312],
  [0.5, 0.262188, 0.370777],
  [1.0, 0.076351, 0.107977],
];
const [INITIAL, CV, THICKNESS] = [50, 2, 3];
const yearsOf = (timeFactor: number) => (timeFactor * THICKNESS * THICKNESS) / CV;

function clayUnder(ratio: number, horizon: number): Plain {
  const voidRatio = 1;
  const compressionIndex = 1e-4 * (1 + voidRatio);
  return {
    layers: layersOfUniformClay({
      thickness: THICKNESS,
      initialStress: INITIAL,
      compressionIndex,
      recompressionIndex: compressionIndex,
      voidRatio,
      cv: CV,
      // k ∝ m_v: k falls by the factor σ′/σ′v0, that is with Ck = Cc, also at these small strains
    }),
    base: 'closed',
    loads: [{ pressure: (ratio - 1) * INITIAL }],
    horizon,
  };
}

describe.each([1.5, 4, 10])('Davis & Raymond 1965, σ′ grows %f times', (ratio) => {
  const { settlementAt } = marchedModel(clayUnder(ratio, yearsOf(2)));
  const final = THICKNESS * 1e-4 * Math.log10(ratio);
  it.each(DEGREES)(`at Tv = %f the degree by settlement is Terzaghi's %f`, (timeFactor, degree) => {
    expect(Math.abs(settlementAt(yearsOf(timeFactor)) / final - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(SERIES)(
    'at Tv = %f the pore pressure follows the logarithm of σ′, s = %f and %f',
    (timeFactor, middle, closed) => {
      const { column, track } = marchedModel(clayUnder(ratio, yearsOf(timeFactor)));
      const finalStress = ratio * INITIAL;
      const { middle: depths } = column.cells;
      const pore = track.final.stress.map(
        (stress, i) => column.law.initialStress[i] + column.loads[0].stress[i] - stress,
      );
      const at = (depth: number) => {
        const below = depths.findIndex((z) => z >= depth);
        const share = (depth - depths[below - 1]) / (depths[below] - depths[below - 1]);
        return pore[below - 1] + share * (pore[below] - pore[below - 1]);
      };
      const last = pore[depths.length - 1];
      expect(Math.abs(at(1 + 0.5 * THICKNESS) / finalStress - (1 - ratio ** -middle))).toBeLessThan(
        ON_FINE_GRID,
      );
      expect(Math.abs(last / finalStress - (1 - ratio ** -closed))).toBeLessThan(ON_FINE_GRID);
    },
  );
});
