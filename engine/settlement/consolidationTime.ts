import { firstLoadingStrain } from '../ground/compressionLaw.ts';
import { WATER_UNIT_WEIGHT } from '../units.ts';
import type { Column } from './column.ts';

/**
 * A time in which the softer part of a column consolidates, years: the shortest over its strata of
 * (Σ h m_v)(Σ h/k_v) γw / 4 for flow to both ends and m_v γw μ de²/(8 k_h) for flow to drains, leaving out
 * strata with less than a tenth of the compression. Only where to put time steps depends on it.
 */
export function consolidationTime(column: Column): number {
  const { cells, law, permeability, free, drains } = column;
  const full = law.initialStress.slice();
  for (const load of column.loads) {
    if (load.kind !== 'standing') for (let i = 0; i < full.length; i += 1) full[i] += load.stress[i];
  }
  let stratum = { compression: 0, softness: 0, resistance: 0, radial: 0 };
  const strata: (typeof stratum)[] = [];
  let inside = false;
  for (let i = 0; i < full.length; i += 1) {
    if (free[i] === 1) {
      inside = false;
      continue;
    }
    if (!inside) {
      stratum = { compression: 0, softness: 0, resistance: 0, radial: 0 };
      strata.push(stratum);
      inside = true;
    }
    const thickness = cells.thickness[i];
    const increase = Math.max(full[i] - law.initialStress[i], 1e-3 * law.initialStress[i]);
    const stress = law.initialStress[i] + increase;
    const strain = law.modulus[i] > 0 ? increase / law.modulus[i] : firstLoadingStrain(law, i, stress);
    const softness = strain / increase;
    stratum.compression += thickness * strain;
    stratum.softness += thickness * softness;
    stratum.resistance += thickness / permeability.atYield[i];
    if (drains !== null && drains.reached[i] > 0) {
      const horizontal = permeability.atYield[i] * permeability.horizontalRatio[i];
      stratum.radial += (thickness * drains.conductance * horizontal) / drains.factor;
    }
  }
  const whole = strata.reduce((sum, { compression }) => sum + compression, 0);
  const times = strata
    .filter(({ compression }) => compression >= 0.1 * whole)
    .map(({ softness, resistance, radial }) => {
      const vertical = 0.25 * softness * resistance * WATER_UNIT_WEIGHT;
      return radial > 0 ? 1 / (1 / vertical + radial / softness) : vertical;
    });
  const shortest = Math.min(...times);
  return shortest < Infinity && shortest > 0 ? shortest : 1;
}
