import { describe, it, expect } from 'vitest';
import { horizontalCorrelation } from '../../../engine/sampling/horizontalCorrelation.ts';
import { lowerFactor } from '../../../engine/sampling/lowerFactor.ts';
import { sitesAt, variationAlongSection } from '../../../engine/sampling/variationAlongSection.ts';

describe('sitesAt', () => {
  it('gives points at one x one site, in order of x', () => {
    expect(sitesAt([12, -3, 12, 0])).toEqual({ x: [-3, 0, 12], ofPoint: [2, 0, 2, 1] });
  });
});

describe('variationAlongSection', () => {
  it('is the Cholesky factor of the correlation matrix over the sites times the independent scores', () => {
    const x = [-4, 0, 1.5, 30, 31, 90];
    const scale = 25;
    const independent = x.map((_, i) => Float64Array.from([0.3, -1.2, 2.1], (score) => score * (i + 1) - i));
    const factor = lowerFactor(x.map((a) => x.map((b) => horizontalCorrelation(a - b, scale))));
    const varied = variationAlongSection(independent, x, scale);
    x.forEach((_, i) => {
      for (let r = 0; r < 3; r++) {
        const slow = factor[i].reduce((sum, entry, k) => sum + entry * independent[k][r], 0);
        expect(varied[i][r]).toBeCloseTo(slow, 11);
      }
    });
  });

  it('carries the same scores along the whole section when the scale is without bound', () => {
    const independent = [Float64Array.of(0.5, -2), Float64Array.of(1, 1)];
    const varied = variationAlongSection(independent, [0, 50], Infinity);
    expect(varied[1]).toEqual(varied[0]);
  });

  it('refuses another number of sites than of columns', () => {
    expect(() => variationAlongSection([Float64Array.of(1)], [0, 1], 10)).toThrow(RangeError);
  });
});
