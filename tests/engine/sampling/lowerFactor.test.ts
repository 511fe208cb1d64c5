import { describe, it, expect } from 'vitest';
import { lowerFactor } from '../../../engine/sampling/lowerFactor.ts';

describe('lowerFactor', () => {
  it('multiplied by its transpose gives the matrix back', () => {
    const matrix = [
      [1, 0.8, 0.4],
      [0.8, 1, 0.3],
      [0.4, 0.3, 1],
    ];
    const factor = lowerFactor(matrix);
    for (let i = 0; i < 3; i++) {
      for (let j = 0; j <= i; j++) {
        let sum = 0;
        for (let k = 0; k <= j; k++) sum += factor[i][k] * factor[j][k];
        expect(sum).toBeCloseTo(matrix[i][j], 15);
      }
    }
  });

  it('refuses a matrix that is not positive definite', () => {
    const contradiction = [
      [1, 0.9, 0.9],
      [0.9, 1, -0.9],
      [0.9, -0.9, 1],
    ];
    expect(() => lowerFactor(contradiction)).toThrow(RangeError);
    expect(() => lowerFactor([[NaN]])).toThrow(RangeError);
  });
});
