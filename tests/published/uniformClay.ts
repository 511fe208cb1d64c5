import type { Plain, PlainCompressible } from '../engine/settlement/plainModel.ts';

/** A clay layer whose initial effective stress is one value, as worked examples take it at the middle of the layer. */
export interface UniformClay extends Omit<PlainCompressible, 'unitWeight'> {
  readonly thickness: number;
  /** σ'v0, kPa */
  readonly initialStress: number;
}

const WATER = 9.81;
/** Too stiff to settle. */
const RIGID = 1e12;

/** 1 m of rigid sand, as heavy as need be, over a clay as heavy as water, the water level at the ground. */
export function layersOfUniformClay(clay: UniformClay): Plain['layers'] {
  const { thickness, initialStress, ...soil } = clay;
  return [
    { thickness: 1, soil: { modulus: RIGID, unitWeight: initialStress + WATER } },
    { thickness, soil: { ...soil, unitWeight: WATER } },
  ];
}
