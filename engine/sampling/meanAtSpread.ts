import type { Marginal } from '../marginals/marginal.ts';
import { exp } from '../elementary.ts';
import { scoreBreaks, valueAtScore } from './valueAtScore.ts';

/**
 * Mean of F⁻¹(Φ(z)) for z normal of mean 0 and the given standard deviation s, by Gauss–Legendre
 * quadrature of 16 points in pieces of at most half a unit of t = z/s, from −8.5 to 8.5 (what lies outside
 * has a probability of 2e-17), divided wherever F⁻¹ has a bend:
 *
 *     ∫ F⁻¹(Φ(s t)) φ(t) dt
 *
 * @param marginal of bounded support, or with tails no heavier than a normal's
 * @param deviation s, 0 or more
 * @returns the mean, in the marginal's unit
 */
export function meanAtSpread(marginal: Marginal, deviation: number): number {
  const breaks = scoreBreaks(marginal).map((score) => score / deviation);
  const ends = pieceEnds(breaks.filter((t) => Math.abs(t) < FURTHEST));
  let sum = 0;
  let weight = 0;
  for (let i = 1; i < ends.length; i++) {
    const middle = (ends[i] + ends[i - 1]) / 2;
    const half = (ends[i] - ends[i - 1]) / 2;
    NODES.forEach((node, k) => {
      for (const t of [middle - half * node, middle + half * node]) {
        const share = half * WEIGHTS[k] * exp((-t * t) / 2);
        sum += share * valueAtScore(marginal, deviation * t);
        weight += share;
      }
    });
  }
  return sum / weight;
}

const FURTHEST = 8.5;

function pieceEnds(breaks: readonly number[]): number[] {
  const regular = Array.from({ length: 4 * FURTHEST + 1 }, (_, i) => i / 2 - FURTHEST);
  return [...new Set([...regular, ...breaks])].sort((a, b) => a - b);
}

/** Gauss–Legendre, 16 points: the positive nodes and their weights (Abramowitz & Stegun 1964, table 25.4). */
const NODES = [
  0.09501250983763744, 0.2816035507792589, 0.45801677765722737, 0.6178762444026438, 0.755404408355003,
  0.8656312023878318, 0.9445750230732326, 0.9894009349916499,
];
const WEIGHTS = [
  0.1894506104550685, 0.18260341504492358, 0.16915651939500254, 0.14959598881657674, 0.12462897125553388,
  0.09515851168249279, 0.062253523938647894, 0.027152459411754096,
];
