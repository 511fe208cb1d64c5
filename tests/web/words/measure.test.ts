import { describe, expect, it } from 'vitest';
import { durationText } from '../../../web/words/durationText.ts';
import {
  limitMeasure,
  measure,
  measureText,
  rangeText,
  settlementMeasure,
} from '../../../web/words/measure.ts';
import { enteredNumberText, numberText, significantNumberText } from '../../../web/words/numberText.ts';
import { slopeText } from '../../../web/words/slopeText.ts';

const plain = (text: string) => text.replaceAll('\u202f', ' ');

describe('a number', () => {
  it('has commas between its thousands and a true minus sign', () => {
    expect(numberText(1234567)).toBe('1,234,567');
    expect(numberText(-1234.5, 1)).toBe('−1,234.5');
  });

  it('is never minus zero', () => {
    expect(numberText(-0.2)).toBe('0');
    expect(numberText(-0, 2)).toBe('0.00');
  });

  it('keeps what was entered and nothing after it', () => {
    expect(enteredNumberText(0.1 + 0.2)).toBe('0.3');
    expect(enteredNumberText(100)).toBe('100');
    expect(enteredNumberText(12.5)).toBe('12.5');
  });

  it('is cut to significant digits', () => {
    expect(significantNumberText(123456)).toBe('123,000');
    expect(significantNumberText(0.0012345)).toBe('0.00123');
    expect(significantNumberText(0)).toBe('0');
  });
});

describe('a settlement', () => {
  it('is given to the mm under 1 m and to the cm above', () => {
    expect(plain(measureText(settlementMeasure(0.0844)))).toBe('84 mm');
    expect(plain(measureText(settlementMeasure(0.9994)))).toBe('999 mm');
    expect(plain(measureText(settlementMeasure(0.9996)))).toBe('1.00 m');
    expect(plain(measureText(settlementMeasure(1.234)))).toBe('1.23 m');
    expect(plain(measureText(settlementMeasure(-0.0121)))).toBe('−12 mm');
  });

  it('as a limit stays as it was entered', () => {
    expect(plain(measureText(limitMeasure(0.0255, 'm')))).toBe('25.5 mm');
    expect(plain(measureText(limitMeasure(0.1, 'm')))).toBe('100 mm');
    expect(plain(measureText(limitMeasure(1.25, 'm')))).toBe('1.25 m');
    expect(plain(measureText(limitMeasure(0.02, 'm/year')))).toBe('20 mm/year');
    expect(limitMeasure(1 / 300, 'm/m').number).toBe('1 in 300');
  });

  it('says the unit of a range once', () => {
    expect(plain(rangeText(measure(0.08, 'm'), measure(0.0949, 'm')))).toBe('80 to 95 mm');
    expect(plain(rangeText(measure(0.98, 'm'), measure(1.2, 'm')))).toBe('980 mm to 1.20 m');
  });
});

describe('a slope', () => {
  it('is 1 in N', () => {
    expect(slopeText(0.005)).toBe('1 in 200');
    expect(slopeText(-1 / 195.3)).toBe('−1 in 195');
    expect(slopeText(1 / 7.25)).toBe('1 in 7.3');
    expect(slopeText(1 / 1234)).toBe('1 in 1,230');
    expect(slopeText(0)).toBe('level');
  });
});

describe('a length of time', () => {
  it('is given in days, months or years by its size', () => {
    expect(plain(durationText(30 / 365.25))).toBe('30 days');
    expect(plain(durationText(1.5))).toBe('18 months');
    expect(plain(durationText(2.54))).toBe('2.5 years');
    expect(plain(durationText(30))).toBe('30 years');
    expect(plain(durationText(1 / 365.25))).toBe('1 day');
    expect(durationText(Infinity)).toBe('never');
  });
});

describe('a rate', () => {
  it('has tenths below 10 mm/year only', () => {
    expect(measure(0.0042, 'm/year')).toEqual({ number: '4.2', unit: 'mm/year' });
    expect(measure(0.0426, 'm/year')).toEqual({ number: '43', unit: 'mm/year' });
  });
});
