import type { Column } from './column.ts';
import type { Track } from './track.ts';
import type { ClampCounts } from './realisations.ts';

/** Strain above which the result carries a warning. */
const LARGE_STRAIN = 0.3;
/** Void ratio below which a cell is outside the law. */
const LEAST_VOID_RATIO = 0.1;

type Clamp = Exclude<keyof ClampCounts, 'cutAtLimits' | 'stepsNotClosed'>;

/** Counts in how many realisations, at any of the points, something was clamped or left the law. */
export interface ClampTally {
  readonly add: (realisation: number, column: Column, track: Track) => void;
  /** @param cutAtLimits values that the sampling cut at their marginal's limits */
  readonly counts: (cutAtLimits: number) => ClampCounts;
}

export function clampTally(): ClampTally {
  const realisations: Record<Clamp, Set<number>> = {
    preconsolidationRaised: new Set(),
    recompressionSetToCompression: new Set(),
    voidRatioBelowTenth: new Set(),
    strainAboveThirtyPercent: new Set(),
    initialStressAtFloor: new Set(),
    vacuumDrainsCrossSeam: new Set(),
    datesPutInOrder: new Set(),
    smearReachesInfluence: new Set(),
    effectiveStressVanished: new Set(),
  };
  let stepsNotClosed = 0;
  const note = (clamp: Clamp, realisation: number, happened: boolean) => {
    if (happened) realisations[clamp].add(realisation);
  };
  return {
    add(realisation, column, track) {
      for (const [clamp, happened] of Object.entries(column.clamps))
        note(clamp as Clamp, realisation, happened);
      note('voidRatioBelowTenth', realisation, track.leastVoidRatio < LEAST_VOID_RATIO);
      note('strainAboveThirtyPercent', realisation, track.largestStrain > LARGE_STRAIN);
      note('effectiveStressVanished', realisation, track.final.swelledStraight);
      stepsNotClosed += track.notClosed;
    },
    counts: (cutAtLimits) => ({
      preconsolidationRaised: realisations.preconsolidationRaised.size,
      recompressionSetToCompression: realisations.recompressionSetToCompression.size,
      voidRatioBelowTenth: realisations.voidRatioBelowTenth.size,
      strainAboveThirtyPercent: realisations.strainAboveThirtyPercent.size,
      initialStressAtFloor: realisations.initialStressAtFloor.size,
      vacuumDrainsCrossSeam: realisations.vacuumDrainsCrossSeam.size,
      datesPutInOrder: realisations.datesPutInOrder.size,
      smearReachesInfluence: realisations.smearReachesInfluence.size,
      effectiveStressVanished: realisations.effectiveStressVanished.size,
      cutAtLimits,
      stepsNotClosed,
    }),
  };
}
