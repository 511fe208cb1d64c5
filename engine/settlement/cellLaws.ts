import { exp, ln } from '../elementary.ts';
import type { Cells } from '../ground/cells.ts';
import type { CompressionLaw } from '../ground/compressionLaw.ts';
import { preconsolidationStress, type DrawnCompressibleSoil, type DrawnSoil } from '../ground/drawnSoil.ts';
import type { PermeabilityLaw } from '../ground/permeabilityLaw.ts';
import { WATER_UNIT_WEIGHT } from '../units.ts';

const LN10 = ln(10);
/** Least void ratio that flow is computed with. */
const LEAST_VOID_RATIO = 0.1;

export interface CellLaws {
  readonly compression: CompressionLaw;
  readonly permeability: PermeabilityLaw;
  /** 1 + e0; 0 in a stiff cell. */
  readonly initialVolume: Float64Array;
  /** σ'p was raised to σ'v0 in some cell. */
  readonly preconsolidationRaised: boolean;
}

/**
 * The laws of section 3 and 4 for each cell of a column.
 *
 * @param before σ'v0 before any standing fill, kPa, to which OCR and POP refer
 * @param standing stress of the standing fill, kPa
 * @param rateFactor factor on the rate of consolidation, which multiplies every k
 */
export function cellLaws(
  cells: Cells,
  soils: readonly DrawnSoil[],
  before: Float64Array,
  standing: Float64Array,
  rateFactor: number,
): CellLaws {
  const count = before.length;
  const column = () => new Float64Array(count);
  const compression: CompressionLaw = {
    initialStress: before.map((stress, i) => stress + standing[i]),
    yieldStress: column().fill(Infinity),
    logInitial: column(),
    logYield: column(),
    strainAtYield: column(),
    compression: column(),
    recompression: column(),
    swelling: column(),
    modulus: column(),
  };
  const permeability: PermeabilityLaw = {
    atYield: column(),
    strainAtYield: compression.strainAtYield,
    sensitivity: column(),
    preYieldFactor: column().fill(1),
    yieldStress: compression.yieldStress,
    followsStress: new Uint8Array(count),
    leastVolume: column(),
    horizontalRatio: column().fill(1),
  };
  const initialVolume = column();
  let preconsolidationRaised = false;
  for (let i = 0; i < count; i += 1) {
    const soil = soils[cells.part[i]];
    if (soil.behaviour !== 'compressible') {
      compression.modulus[i] = soil.modulus;
      if (soil.behaviour === 'stiff_poorly_draining') {
        permeability.atYield[i] = (rateFactor * soil.verticalCoefficient * WATER_UNIT_WEIGHT) / soil.modulus;
        permeability.horizontalRatio[i] = soil.horizontalRatio;
      }
      continue;
    }
    const found = preconsolidationStress(soil.preconsolidation, before[i], cells.middle[i]);
    if (found < before[i]) preconsolidationRaised = true;
    setCompression(compression, i, soil, Math.max(found, compression.initialStress[i]));
    setPermeability(permeability, compression, i, soil, rateFactor);
    initialVolume[i] = 1 + soil.initialVoidRatio;
  }
  return { compression, permeability, initialVolume, preconsolidationRaised };
}

function setCompression(
  law: CompressionLaw,
  i: number,
  soil: DrawnCompressibleSoil,
  yieldStress: number,
): void {
  const toStrain = 1 / ((1 + soil.initialVoidRatio) * LN10);
  law.yieldStress[i] = yieldStress;
  law.logInitial[i] = ln(law.initialStress[i]);
  law.logYield[i] = ln(yieldStress);
  law.strainAtYield[i] = soil.recompressionIndex * toStrain * (law.logYield[i] - law.logInitial[i]);
  law.compression[i] = soil.compressionIndex * toStrain;
  law.recompression[i] = soil.recompressionIndex * toStrain;
  law.swelling[i] = soil.swellingIndex * toStrain;
}

/** k_y = c_v γw Cc/(ln 10 (1 + e0) σ'p), or k0 carried from e0 to e_y. */
function setPermeability(
  permeability: PermeabilityLaw,
  compression: CompressionLaw,
  i: number,
  soil: DrawnCompressibleSoil,
  rateFactor: number,
): void {
  const yieldStress = compression.yieldStress[i];
  const sensitivity = ((1 + soil.initialVoidRatio) * LN10) / soil.permeabilityIndex;
  const strainAtYield = compression.strainAtYield[i];
  const atYield = Number.isNaN(soil.initialPermeability)
    ? (soil.verticalCoefficient * WATER_UNIT_WEIGHT * compression.compression[i]) / yieldStress
    : soil.initialPermeability * exp(-sensitivity * strainAtYield);
  permeability.atYield[i] = rateFactor * atYield;
  permeability.sensitivity[i] = sensitivity;
  permeability.preYieldFactor[i] = soil.preYieldFactor;
  permeability.followsStress[i] = soil.permeabilityIndex === soil.compressionIndex ? 1 : 0;
  permeability.leastVolume[i] = (1 + LEAST_VOID_RATIO) / (1 + soil.initialVoidRatio);
  permeability.horizontalRatio[i] = soil.horizontalRatio;
}
