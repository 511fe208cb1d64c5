import { describe, expect, it } from 'vitest';
import {
  compressibilityAt,
  firstLoadingStrain,
  strainAt,
  type CompressionLaw,
} from '../../../engine/ground/compressionLaw.ts';

/** One cell: σ'v0 = 40, σ'p = 80 kPa, Cr = 0.06, Cs = 0.04, Cc = 0.6 over 1 + e0 = 3. */
const law: CompressionLaw = {
  initialStress: Float64Array.of(40),
  yieldStress: Float64Array.of(80),
  logInitial: Float64Array.of(Math.log(40)),
  logYield: Float64Array.of(Math.log(80)),
  strainAtYield: Float64Array.of(0.02 * Math.log10(2)),
  compression: Float64Array.of(0.2 / Math.LN10),
  recompression: Float64Array.of(0.02 / Math.LN10),
  swelling: Float64Array.of(0.04 / 3 / Math.LN10),
  modulus: Float64Array.of(0),
};

describe('the compression law', () => {
  it('runs on Cr up to σ′p and on Cc from there on', () => {
    expect(firstLoadingStrain(law, 0, 60)).toBeCloseTo(0.02 * Math.log10(60 / 40), 14);
    expect(firstLoadingStrain(law, 0, 200)).toBeCloseTo(
      0.02 * Math.log10(2) + 0.2 * Math.log10(200 / 80),
      14,
    );
  });

  it('unloads on Cs from the largest stress so far', () => {
    const atLargest = firstLoadingStrain(law, 0, 160);
    expect(strainAt(law, 0, 50, 160)).toBeCloseTo(atLargest - (0.04 / 3) * Math.log10(160 / 50), 14);
  });

  it('reloads on Cs up to the largest stress so far, also below σ′p, then on Cr to σ′p, then on Cc', () => {
    const largest = 60;
    const slopeBetween = (from: number, to: number, soFar: number) =>
      (strainAt(law, 0, to, Math.max(soFar, to)) - strainAt(law, 0, from, soFar)) / Math.log10(to / from);
    expect(slopeBetween(45, 59, largest)).toBeCloseTo(0.04 / 3, 12);
    expect(slopeBetween(60, 79, largest)).toBeCloseTo(0.02, 12);
    expect(slopeBetween(80, 120, 80)).toBeCloseTo(0.2, 12);
  });

  it('has the slope of its strain as compressibility on every branch', () => {
    for (const [stress, largest] of [
      [60, 40],
      [120, 80],
      [50, 160],
      [0.5, 160],
    ]) {
      const h = 1e-5;
      const rising = (at: number) => strainAt(law, 0, at, Math.max(largest, largest < stress ? at : largest));
      const slope = (rising(stress + h) - rising(stress - h)) / (2 * h);
      expect(
        compressibilityAt(law, 0, stress, Math.min(largest, largest < stress ? 0 : largest)),
      ).toBeCloseTo(slope, 8);
    }
  });

  it('goes on straight below 1 kPa without a step, so that a vanishing stress swells by a finite amount', () => {
    expect(strainAt(law, 0, 1 - 1e-9, 160)).toBeCloseTo(strainAt(law, 0, 1 + 1e-9, 160), 9);
    expect(strainAt(law, 0, 0, 160)).toBeCloseTo(strainAt(law, 0, 1, 160) - 0.04 / 3 / Math.LN10, 12);
  });

  it('is Δσ over the modulus in a stiff cell', () => {
    const stiff = { ...law, modulus: Float64Array.of(5000) };
    expect(strainAt(stiff, 0, 90, 90)).toBe(0.01);
    expect(compressibilityAt(stiff, 0, 90, 90)).toBe(1 / 5000);
  });
});
