import { describe, expect, it } from 'vitest';
import { clampSentences } from '../../../web/words/clampSentences.ts';
import { inventedSummary } from '../invented/inventedSummary.ts';

describe('what the engine had to clamp', () => {
  it('is said with how often, and what never happened is not said', () => {
    expect(clampSentences(inventedSummary.counts, 1000)).toEqual([
      'σ′_p lay below σ′_v0 in a cell and was raised to it: in 12 of 1,000 realisations.',
      'Drawn values were cut at the limits of their marginals: in 3 values.',
    ]);
  });
});
