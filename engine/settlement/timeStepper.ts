import { STRAIGHT_BELOW } from '../ground/compressionLaw.ts';
import type { Column } from './column.ts';
import { stateAtRest, type ColumnState } from './columnState.ts';
import { endStep, solveStep, stepScratch } from './step.ts';
import type { TotalStress } from './stressState.ts';

/** Share of its σ' that the first iterate of a step may take from a cell. */
const LARGEST_PREDICTED_FALL = 0.5;
/** Ratio of a step to the one before above which the formula of second order is not stable (1 + √2). */
const LARGEST_RATIO = 2.4;
/** How far u may leave the range that it can have, as a share of the largest load. */
const RANGE_TOLERANCE = 2e-3;

/** Carries a column's state from step to step. */
export interface TimeStepper {
  readonly state: ColumnState;
  /** Lets a change of load act at once; the steps that follow start afresh. */
  readonly startAfresh: (total: TotalStress) => void;
  /** One step of `duration` years to a total stress; `steady` where that is the one of the step before. */
  readonly advance: (total: TotalStress, duration: number, steady: boolean) => void;
  /** Steps whose iteration did not close. */
  notClosed: number;
}

/**
 * Steps of the backward differentiation formula of second order with unequal lengths. With ω the ratio of a
 * step to the one before,
 *
 *     ε − ε_n − ω²/(1+2ω) (ε_n − ε_(n−1)) = (1+ω)/(1+2ω) Δt · out
 *
 * (Hairer, Nørsett & Wanner 1993, section III.5). The first step after a change of load is one of backward
 * Euler, which forgets what a sudden load leaves behind; so are those more than 2.4 times as long as the one
 * before. So is a step whose excess pore pressures would leave
 * the range that the ones before, the boundaries and the change of load allow (the maximum principle):
 * overshooting σ' would be compression that never comes back. A step's first iterate goes on straight from the
 * two before.
 */
export function timeStepper(column: Column): TimeStepper {
  const state = stateAtRest(column);
  const { strain, stress } = state;
  const cells = strain.length;
  const scratch = stepScratch(cells);
  const array = () => new Float64Array(cells);
  const [before, lastStrain, lastStress, lastBase] = [array(), array(), array(), array()];
  const [allowed, found]: PoreRange[] = [
    { low: 0, high: 0 },
    { low: 0, high: 0 },
  ];
  let lastDuration = 0;

  const take = (total: TotalStress, duration: number) =>
    solveStep(column, total, before, duration, state, scratch);

  const stepper: TimeStepper = {
    state,
    notClosed: 0,
    startAfresh(total) {
      before.set(strain);
      if (!take(total, 0)) stepper.notClosed += 1;
      endStep(column, state);
      lastDuration = 0;
      lastBase.set(total.base);
      poreRange(column, total, state, found);
    },
    advance(total, duration, steady) {
      const ratio = lastDuration > 0 ? duration / lastDuration : Infinity;
      const omega = ratio <= LARGEST_RATIO ? ratio : 0;
      const carried = (omega * omega) / (1 + 2 * omega);
      const lastSettlement = state.settlement;
      allowed.low = found.low;
      allowed.high = found.high;
      if (!steady) widenByLoad(total, lastBase, allowed);
      for (let i = 0; i < cells; i += 1) {
        const strainNow = strain[i];
        before[i] = strainNow + carried * (strainNow - lastStrain[i]);
        lastStrain[i] = strainNow;
        const stressNow = stress[i];
        const fall = LARGEST_PREDICTED_FALL * Math.max(stressNow, STRAIGHT_BELOW);
        stress[i] = stressNow + Math.max(omega * (stressNow - lastStress[i]), -fall);
        lastStress[i] = stressNow;
      }
      let closed = take(total, ((1 + omega) / (1 + 2 * omega)) * duration);
      poreRange(column, total, state, found);
      if (omega > 0 && leavesRange(total, state.settlement - lastSettlement, found, allowed)) {
        before.set(lastStrain);
        strain.set(lastStrain);
        stress.set(lastStress);
        state.settlement = lastSettlement;
        closed = take(total, duration);
        poreRange(column, total, state, found);
      }
      endStep(column, state);
      if (!closed) stepper.notClosed += 1;
      if (!steady) lastBase.set(total.base);
      lastDuration = duration;
    },
  };
  return stepper;
}

interface PoreRange {
  low: number;
  high: number;
}

/** Lowest and highest u of the column, its drained boundaries and drains included, kPa. */
function poreRange(column: Column, total: TotalStress, state: ColumnState, range: PoreRange): void {
  const { free } = column;
  const { base, slope } = total;
  const { stress, settlement } = state;
  let low = -total.vacuum;
  let high = 0;
  for (let i = 0; i < free.length; i += 1) {
    if (free[i] === 1) continue;
    const pore = base[i] + slope[i] * settlement - stress[i];
    if (pore < low) low = pore;
    if (pore > high) high = pore;
  }
  range.low = low;
  range.high = high;
}

/** Widens the range by what the change of load since the last step can do. */
function widenByLoad(total: TotalStress, lastBase: Float64Array, range: PoreRange): void {
  const { base } = total;
  let fall = 0;
  let rise = 0;
  for (let i = 0; i < lastBase.length; i += 1) {
    const change = base[i] - lastBase[i];
    if (change < fall) fall = change;
    if (change > rise) rise = change;
  }
  range.low += fall;
  range.high += rise;
}

/** Whether u has left the allowed range by more than what the settlement of the step changes. */
function leavesRange(total: TotalStress, sunk: number, found: PoreRange, allowed: PoreRange): boolean {
  const { slope } = total;
  let tolerance = RANGE_TOLERANCE * total.largestLoad;
  if (total.coupled) {
    let steepest = 0;
    for (let i = 0; i < slope.length; i += 1) steepest = Math.max(steepest, Math.abs(slope[i]));
    tolerance += steepest * Math.abs(sunk);
  }
  return found.low < allowed.low - tolerance || found.high > allowed.high + tolerance;
}
