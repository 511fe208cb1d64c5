import { describe, expect, it } from 'vitest';
import { bandFinding, estimateText, limitFinding, rangeFinding } from '../../../web/words/findingText.ts';

const subject = { label: 'settlement after handover at Pier east', unit: 'm' } as const;
const plain = (text: string) => text.replaceAll('\u202f', ' ');

describe('a finding', () => {
  it('says in how many of a hundred grounds a limit is passed', () => {
    const chance = { value: 0.31, low: 0.283, high: 0.338, above: 310, of: 1000 };
    expect(plain(limitFinding(subject, 0.1, chance))).toBe(
      'In 31 of 100 equally likely grounds, settlement after handover at Pier east passes 100 mm.',
    );
    expect(plain(bandFinding(chance, 10))).toBe('90 % band of this number: 28 to 34 of 100.');
  });

  it('says so when no ground passes it', () => {
    const chance = { value: 0, low: NaN, high: NaN, above: 0, of: 3000 };
    expect(plain(limitFinding(subject, 0.1, chance))).toBe(
      'Settlement after handover at Pier east passes 100 mm in fewer than 1 in 1,000 equally likely grounds.',
    );
  });

  it('says that there is no band where fewer than ten replicates stand behind it', () => {
    const chance = { value: 0.31, low: NaN, high: NaN, above: 31, of: 100 };
    expect(bandFinding(chance, 1)).toBe('No band yet: 1 replicate stands behind it, and a band needs 10.');
  });

  it('on a slope says steeper', () => {
    const chance = { value: 0.05, low: NaN, high: NaN, above: 50, of: 1000 };
    const slope = { label: 'slope between Pier and abutment', unit: 'm/m' } as const;
    expect(limitFinding(slope, 1 / 200, chance)).toBe(
      'In 5 of 100 equally likely grounds, slope between Pier and abutment is steeper than 1 in 200.',
    );
  });

  it('without a limit says where nine in ten grounds lie', () => {
    expect(
      plain(
        rangeFinding(subject, [
          { percent: 5, value: 0.05 },
          { percent: 50, value: 0.084 },
          { percent: 95, value: 0.13 },
        ]),
      ),
    ).toBe(
      'In 90 of 100 equally likely grounds, settlement after handover at Pier east lies between 50 and 130 mm; half of all lie above 84 mm.',
    );
  });

  it('gives an estimate with its band, and without one where there is none', () => {
    expect(plain(estimateText({ value: 0.084, low: 0.08, high: 0.0885 }, 'm'))).toBe('84 mm (80 to 89 mm)');
    expect(plain(estimateText({ value: 0.084, low: NaN, high: NaN }, 'm'))).toBe('84 mm');
  });
});
