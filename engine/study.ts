import type { Model } from './project/model.ts';
import { REALISATIONS_IN_REPLICATE } from './project/replicateSize.ts';
import { centralGround } from './sampling/centralGround.ts';
import { drawGround } from './sampling/drawGround.ts';
import { realise, WORKING_RESOLUTION } from './settlement/realise.ts';
import type { Realisations } from './settlement/realisations.ts';
import { likelyToGovern, type LikelyToGovern } from './settlement/likelyToGovern.ts';
import type { NumericalError } from './summary/summary.ts';

/** How much finer cells and steps are cut to measure the numerical error of the central realisation. */
const FINER = 8;

/** One replicate: its ground is drawn and marched. Depends on the model, its seed and the number alone. */
export function runReplicate(model: Model, replicate: number): Realisations {
  return realise(model, drawGround(model, replicate, REALISATIONS_IN_REPLICATE));
}

/** What is found from the realisation with every input at the median of its marginal. */
export interface CentralFindings {
  /** Settlement of each point at each history time, m. */
  readonly central: readonly (readonly number[])[];
  readonly numericalError: NumericalError | null;
  /** What is not computed but likely to govern, in words. */
  readonly warnings: readonly string[];
}

/**
 * The central realisation with its numerical error: the largest difference, over all points and history
 * times, to a march with eight times as many cells and steps.
 */
export function centralStudy(model: Model): CentralFindings {
  const ground = centralGround(model);
  const working = realise(model, ground);
  const finer = realise(model, ground, {
    cells: FINER * WORKING_RESOLUTION.cells,
    steps: FINER * WORKING_RESOLUTION.steps,
  });
  const times = working.historyTimes.length;
  const central = model.points.map((_, point) => [
    ...working.settlement.subarray(point * times, (point + 1) * times),
  ]);
  let numericalError: NumericalError | null = null;
  central.forEach((history, point) => {
    const fine = finer.settlement.subarray(point * times, (point + 1) * times);
    const final = Math.max(...fine);
    if (!(final > 0)) return;
    const largest = Math.max(...history.map((value, t) => Math.abs(value - fine[t])));
    if (numericalError === null || largest / final > numericalError.relative) {
      numericalError = { largest, relative: largest / final };
    }
  });
  return { central, numericalError, warnings: notComputed(likelyToGovern(model, ground)) };
}

function notComputed({ stability, spreading, seepage }: LikelyToGovern): string[] {
  const warnings: string[] = [];
  if (stability) {
    warnings.push(
      'Stability during filling is likely to govern and is not checked here: 5.14 times the undrained strength ' +
        '0.22 σ′p of the soft soil is below 1.5 times the pressure of the fill.',
    );
  }
  if (spreading) {
    warnings.push(
      'Lateral spreading is likely to govern and is not computed: the base of the fill is narrower than four ' +
        'times the thickness of the soft soil.',
    );
  }
  if (seepage) {
    warnings.push(
      'Seepage and uplift are likely to govern and are not checked: the head at the base brings the effective ' +
        'stress below 5 kPa.',
    );
  }
  return warnings;
}
