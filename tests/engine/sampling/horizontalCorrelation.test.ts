import { describe, it, expect } from 'vitest';
import { horizontalCorrelation } from '../../../engine/sampling/horizontalCorrelation.ts';

describe('horizontalCorrelation', () => {
  it('refuses a scale of 0 and a distance that is not a number', () => {
    expect(() => horizontalCorrelation(1, 0)).toThrow(RangeError);
    expect(() => horizontalCorrelation(NaN, 1)).toThrow(RangeError);
  });
});
