import { describe, expect, it } from 'vitest';
import { convergenceFinding, convergenceOf } from '../../../web/risk/convergencePicture.ts';
import { driversFinding, driversPicture, sortedDrivers } from '../../../web/risk/driversPicture.ts';
import { exceedancePicture, readExceedance, withLimits } from '../../../web/risk/exceedancePicture.ts';
import { exceedanceReading } from '../../../web/risk/exceedanceReading.ts';
import { readTime, timePicture } from '../../../web/risk/timePicture.ts';
import { inventedModel } from '../invented/inventedModel.ts';
import { inventedSummary } from '../invented/inventedSummary.ts';

const plain = (text: string) => text.replace(/[\u202f\u00a0]/g, ' ');
const [afterHandover, atHorizon] = inventedSummary.quantities;

describe('the picture of an exceedance curve', () => {
  const picture = exceedancePicture(afterHandover, [
    { name: 'Ride', value: 0.1, chance: inventedSummary.limits[0].chance },
  ]);
  const line = (name: string) => {
    const found = picture.series.find((series) => series.name === name);
    if (found?.kind !== 'line') throw new Error(`no line ${name}`);
    return found;
  };

  it('lies in mm and in grounds of a hundred', () => {
    expect(picture.x.from).toBe(0);
    expect(picture.x.to).toBeCloseTo(150, 9);
    expect(picture.marks[0]).toMatchObject({ axis: 'x', value: 100, ink: 'limit' });
    expect(line('exceedance').y[0]).toBe(100);
  });

  it('draws the tail apart from where fewer than ten realisations lie beyond', () => {
    const cut = afterHandover.exceedance.unresolvedAbove * 1000;
    const tail = line('unresolved tail');
    expect(tail.dashed).toBe(true);
    expect(Math.min(...tail.x)).toBeCloseTo(cut, 6);
    expect(Math.max(...line('exceedance').x)).toBeCloseTo(cut, 6);
  });

  it('is read as steps: a value keeps its share until the next', () => {
    const curve = {
      values: [1, 2, 3],
      shares: [0.6, 0.3, 0],
      low: [0.5, 0.2, 0],
      high: [0.7, 0.4, 0.1],
      unresolvedAbove: 3,
    };
    expect(readExceedance(curve, 0.5, 3).share).toBe(1);
    expect(readExceedance(curve, 2, 3).share).toBe(0.3);
    expect(readExceedance(curve, 2.99, 3).share).toBe(0.3);
  });

  it('is read straight between its points where it was thinned', () => {
    const curve = {
      values: [1, 2],
      shares: [0.6, 0.2],
      low: [0.5, 0.1],
      high: [0.7, 0.3],
      unresolvedAbove: 2,
    };
    const read = readExceedance(curve, 1.5, 1000);
    expect(read.share).toBeCloseTo(0.4, 12);
    expect(read.low).toBeCloseTo(0.3, 12);
    expect(readExceedance(curve, 2, 1000).share).toBe(0.2);
  });

  it('has the chance of passing a limit as a point of its own', () => {
    const curve = {
      values: [1, 2],
      shares: [0.6, 0.2],
      low: [0.5, 0.1],
      high: [0.7, 0.3],
      unresolvedAbove: 2,
    };
    const limit = { name: 'Ride', value: 1.5, chance: { value: 0.35, low: 0.3, high: 0.4 } };
    expect(withLimits(curve, [limit])).toMatchObject({ values: [1, 1.5, 2], shares: [0.6, 0.35, 0.2] });
    expect(readExceedance(withLimits(curve, [limit]), 1.5, 1000)).toEqual({
      share: 0.35,
      low: 0.3,
      high: 0.4,
    });
    expect(withLimits(curve, [{ ...limit, value: 3 }]).values).toEqual([1, 2]);
  });

  it('says when the tail it is read in is unresolved', () => {
    // even between 0 and 150 mm: two thirds of the way, a third lies above
    expect(plain(exceedanceReading(afterHandover, 0.1005, 1000))).toBe(
      'Above 101 mm: 33 of 100 grounds (90 % band 30 to 36 of 100).',
    );
    expect(exceedanceReading(afterHandover, 0.1493, 1000)).toContain('unresolved');
  });

  it('draws no band where there is none', () => {
    const { exceedance } = afterHandover;
    const none = exceedance.values.map(() => NaN);
    const bare = exceedancePicture(
      { ...afterHandover, exceedance: { ...exceedance, low: none, high: none } },
      [],
    );
    expect(bare.series.some((series) => series.kind === 'band')).toBe(false);
  });
});

describe('the picture of settlement with time', () => {
  it('puts the outer band first and lightest, and the middle as a line on top', () => {
    const { series, y, marks } = timePicture(inventedSummary.timeBands[2], inventedModel);
    expect(series.map(({ name }) => name)).toEqual(['P5 to P95', 'P25 to P75', 'P50']);
    expect(y.reversed).toBe(true);
    expect(marks[0]).toMatchObject({ value: 2, label: 'handover' });
  });

  it('is read between its times along a straight line', () => {
    const bands = {
      point: 0,
      times: [0, 2],
      bands: [{ percent: 50, values: [0, 0.1], low: [], high: [] }],
      mean: [0, 0.1],
    };
    expect(plain(readTime(bands, 1))).toBe('After 12 months: P50 50 mm.');
  });
});

describe('the drivers', () => {
  it('come by weight, whichever way they work', () => {
    expect(sortedDrivers(atHorizon.drivers, 'rankCorrelation').map(({ input }) => input)).toEqual([0, 1, 2]);
    expect(driversPicture(atHorizon, inventedModel, 'rankCorrelation', 2).bars).toHaveLength(2);
  });

  it('are named in the finding', () => {
    expect(driversFinding(atHorizon, inventedModel, 'rankCorrelation')).toBe(
      'Compression index of soft clay drives settlement at the horizon at Far end most (rank correlation 0.71), then overconsolidation ratio of soft clay (−0.42).',
    );
  });
});

describe('the convergence', () => {
  it('is of the chance where there is a limit and of the median where there is none', () => {
    expect(convergenceFinding(convergenceOf(afterHandover, inventedSummary.limits[0]))).toBe(
      'After 3,000 realisations, the 90 % band of the chance reaches 1.5 of 100 grounds to either side.',
    );
    expect(convergenceOf(afterHandover, null).of).toBe('the median');
    expect(convergenceFinding(convergenceOf(afterHandover, inventedSummary.limits[1]))).toContain(
      'from ten replicates',
    );
  });
});
