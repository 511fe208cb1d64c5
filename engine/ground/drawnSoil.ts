import { drawnValue, type DrawnGround } from '../sampling/drawnGround.ts';
import type { CompressibleSoil, IndexOrRatio, Preconsolidation, Soil } from '../project/soil.ts';
import { metresPerYear } from '../units.ts';

/** A soil's parameters in one realisation at one point, in engine units. */
export type DrawnSoil =
  | DrawnCompressibleSoil
  | { readonly behaviour: 'stiff_free_draining'; readonly unitWeight: number; readonly modulus: number }
  | {
      readonly behaviour: 'stiff_poorly_draining';
      readonly unitWeight: number;
      readonly modulus: number;
      /** m²/year */
      readonly verticalCoefficient: number;
      readonly horizontalRatio: number;
    };

export interface DrawnCompressibleSoil {
  readonly behaviour: 'compressible';
  readonly unitWeight: number;
  readonly compressionIndex: number;
  readonly recompressionIndex: number;
  /** Cr was drawn above Cc and set to it. */
  readonly recompressionSetToCompression: boolean;
  readonly swellingIndex: number;
  readonly initialVoidRatio: number;
  readonly preconsolidation: DrawnPreconsolidation;
  /** c_v of virgin compression, m²/year; NaN where k0 is given. */
  readonly verticalCoefficient: number;
  /** k at e0, m/year; NaN where c_v is given. */
  readonly initialPermeability: number;
  readonly permeabilityIndex: number;
  readonly horizontalRatio: number;
  readonly preYieldFactor: number;
  /** Cα, 0 where none is given. */
  readonly secondaryIndex: number;
}

export type DrawnPreconsolidation =
  | { readonly kind: 'ocr'; readonly ocr: number }
  | { readonly kind: 'pop'; readonly pop: number }
  | { readonly kind: 'profile'; readonly upperDepth: number; readonly upper: number; readonly slope: number };

/** Share of e0 that Ck is where k0 is given without it (Tavenas et al. 1983). */
const PERMEABILITY_INDEX_OVER_VOID_RATIO = 0.5;

export function drawnSoil(soil: Soil, ground: DrawnGround, point: number, realisation: number): DrawnSoil {
  const value = (number: Parameters<typeof drawnValue>[1]) => drawnValue(ground, number, point, realisation);
  const unitWeight = value(soil.unitWeight);
  if (soil.behaviour === 'stiff_free_draining') {
    return { behaviour: soil.behaviour, unitWeight, modulus: value(soil.modulus) };
  }
  if (soil.behaviour === 'stiff_poorly_draining') {
    return {
      behaviour: soil.behaviour,
      unitWeight,
      modulus: value(soil.modulus),
      verticalCoefficient: value(soil.verticalCoefficient),
      horizontalRatio: value(soil.horizontalRatio),
    };
  }
  return compressible(soil, unitWeight, value);
}

function compressible(
  soil: CompressibleSoil,
  unitWeight: number,
  value: (number: CompressibleSoil['compressionIndex']) => number,
): DrawnCompressibleSoil {
  const compressionIndex = value(soil.compressionIndex);
  const initialVoidRatio = value(soil.initialVoidRatio);
  const index = (given: IndexOrRatio) =>
    value(given.number) * (given.given === 'ratio' ? compressionIndex : 1);
  const recompressionDrawn = index(soil.recompression);
  const recompressionIndex = Math.min(recompressionDrawn, compressionIndex);
  const law = soil.permeability;
  const givenIndex = law.permeabilityIndex === null ? NaN : value(law.permeabilityIndex);
  const usualIndex =
    law.kind === 'cv' ? compressionIndex : PERMEABILITY_INDEX_OVER_VOID_RATIO * initialVoidRatio;
  return {
    behaviour: 'compressible',
    unitWeight,
    compressionIndex,
    recompressionIndex,
    recompressionSetToCompression: recompressionDrawn > compressionIndex,
    swellingIndex:
      soil.swelling === null ? recompressionIndex : Math.min(index(soil.swelling), compressionIndex),
    initialVoidRatio,
    preconsolidation: preconsolidation(soil.preconsolidation, value),
    verticalCoefficient: law.kind === 'cv' ? value(law.verticalCoefficient) : NaN,
    initialPermeability: law.kind === 'k0' ? metresPerYear(value(law.permeability)) : NaN,
    permeabilityIndex: givenIndex > 0 ? givenIndex : usualIndex,
    horizontalRatio: value(soil.horizontalRatio),
    preYieldFactor: value(soil.preYieldFactor),
    secondaryIndex: soil.secondary === null ? 0 : index(soil.secondary),
  };
}

function preconsolidation(
  given: Preconsolidation,
  value: (number: CompressibleSoil['compressionIndex']) => number,
): DrawnPreconsolidation {
  if (given.kind === 'ocr') return { kind: 'ocr', ocr: value(given.ocr) };
  if (given.kind === 'pop') return { kind: 'pop', pop: value(given.pop) };
  const upper = value(given.upper.stress);
  const slope = (value(given.lower.stress) - upper) / (given.lower.depth - given.upper.depth);
  return { kind: 'profile', upperDepth: given.upper.depth, upper, slope };
}

/** σ'p before it is raised to σ'v0, kPa, from σ'v0 before any standing fill (kPa) and depth (m). */
export function preconsolidationStress(
  given: DrawnPreconsolidation,
  initialStress: number,
  depth: number,
): number {
  if (given.kind === 'ocr') return given.ocr * initialStress;
  if (given.kind === 'pop') return initialStress + given.pop;
  return given.upper + given.slope * (depth - given.upperDepth);
}
