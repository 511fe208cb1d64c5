import type { Model } from '../../engine/project/model.ts';
import type { DrawnGround } from '../../engine/sampling/drawnGround.ts';
import { normalCumulative, normalQuantile } from '../../engine/marginals/standardNormal.ts';
import { varianceReduction } from '../../engine/sampling/varianceReduction.ts';
import { lognormalMarginal, uniformMarginal } from '../engine/sampling/inventedMarginals.ts';
import { evenThickness, inventedModel } from '../engine/sampling/inventedModel.ts';

/** How the two inputs of the closed-form settlement hang together and vary. */
export interface ClosedFormCase {
  readonly name: string;
  /** Rank correlation of stress and compression ratio. */
  readonly rank: number;
  /** Whether the compression ratio varies from place to place. */
  readonly varies: boolean;
}

export const CLOSED_FORM_CASES: readonly ClosedFormCase[] = [
  { name: 'independent inputs', rank: 0, varies: false },
  { name: 'correlated inputs', rank: -0.5, varies: false },
  { name: 'an input that varies from place to place', rank: 0, varies: true },
  { name: 'correlated inputs of which one varies', rank: -0.5, varies: true },
];

const THICKNESS = 8;
const LOAD = 60;
const LOWEST_STRESS = 20;
const HIGHEST_STRESS = 40;
const MEAN_RATIO = 0.25;
const VARIATION = 0.3;
const SPREAD = { share: 0.6, verticalScale: 1.5, horizontalScale: 40 };

/** A model, invented, whose inputs are the compression ratio (lognormal) and the initial stress (uniform, kPa). */
export function closedFormModel({ rank, varies }: ClosedFormCase, seed: number): Model {
  return inventedModel({
    inputs: [
      {
        name: 'ratio',
        marginal: lognormalMarginal(MEAN_RATIO, VARIATION),
        spread: varies ? SPREAD : undefined,
      },
      { name: 'stress', marginal: uniformMarginal(LOWEST_STRESS, HIGHEST_STRESS) },
    ],
    correlations: rank === 0 ? [] : [['stress', 'ratio', rank]],
    layers: [evenThickness(THICKNESS)],
    seed,
  });
}

/** S = H · CR · log((σ0 + Δσ)/σ0), m, of each realisation. */
export function closedFormSettlements({ inputs: [ratio, stress] }: DrawnGround): number[] {
  return Array.from(stress.values, (initial, r) => settlement(ratio.values[r], initial));
}

const settlement = (ratio: number, stress: number): number =>
  THICKNESS * ratio * Math.log10((stress + LOAD) / stress);

/**
 * Chance that the settlement passes a value, by the midpoint rule over the stress: given its score z2, the
 * score of the compression ratio is normal of mean r √(1 − v) z2, with r = 2 sin(πρ/6) for the shared part.
 */
export function chanceOfPassing(value: number, { rank, varies }: ClosedFormCase): number {
  const logVariance = Math.log(1 + VARIATION * VARIATION);
  const variance = varies
    ? 1 - SPREAD.share + SPREAD.share * varianceReduction(THICKNESS, SPREAD.verticalScale)
    : 1;
  const tie = 2 * Math.sin((Math.PI * rank) / 6) * Math.sqrt(varies ? 1 - SPREAD.share : 1);
  const logMean = Math.log(MEAN_RATIO) - (logVariance * variance) / 2;
  const cells = 1000;
  let sum = 0;
  for (let i = 0; i < cells; i++) {
    const p = (i + 0.5) / cells;
    const needed = Math.log(value / settlement(1, LOWEST_STRESS + (HIGHEST_STRESS - LOWEST_STRESS) * p));
    const score = (needed - logMean) / Math.sqrt(logVariance) - tie * normalQuantile(p);
    sum += normalCumulative(-score / Math.sqrt(variance - tie * tie));
  }
  return sum / cells;
}

/** Settlement that is passed with the given chance, by bisection. */
export function settlementPassedWith(chance: number, ofCase: ClosedFormCase): number {
  let [low, high] = [0.01, 20];
  for (let i = 0; i < 45; i++) {
    const middle = (low + high) / 2;
    if (chanceOfPassing(middle, ofCase) > chance) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Share of the variance of 'the settlement passes the value' that a Latin hypercube of two independent inputs
 * leaves when its strata are many: what is no sum of functions of one input (Stein 1987).
 */
export function shareLeftByStratification(value: number): number {
  const logVariance = Math.log(1 + VARIATION * VARIATION);
  const logMean = Math.log(MEAN_RATIO) - logVariance / 2;
  const cells = 4000;
  let [sum, ofStress, ofRatio] = [0, 0, 0];
  for (let i = 0; i < cells; i++) {
    const p = (i + 0.5) / cells;
    const stress = LOWEST_STRESS + (HIGHEST_STRESS - LOWEST_STRESS) * p;
    const givenStress = normalCumulative(
      (logMean - Math.log(value / settlement(1, stress))) / Math.sqrt(logVariance),
    );
    const ratio = Math.exp(logMean + Math.sqrt(logVariance) * normalQuantile(p));
    const stressNeeded = LOAD / (10 ** (value / (THICKNESS * ratio)) - 1);
    const below = (stressNeeded - LOWEST_STRESS) / (HIGHEST_STRESS - LOWEST_STRESS);
    sum += givenStress;
    ofStress += givenStress * givenStress;
    ofRatio += Math.min(Math.max(below, 0), 1) ** 2;
  }
  const chance = sum / cells;
  const additive = (ofStress + ofRatio) / cells - 2 * chance * chance;
  return 1 - additive / (chance * (1 - chance));
}
