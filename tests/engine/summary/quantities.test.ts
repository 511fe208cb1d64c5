import { describe, expect, it } from 'vitest';
import { quantities } from '../../../engine/summary/quantities.ts';
import { quantityValues } from '../../../engine/summary/quantityValues.ts';
import { modelOf } from '../../modelOf.ts';
import { plainProject } from '../project/plainProject.ts';
import { inventedReplicate, settlementOf, summaryModel } from './inventedRealisations.ts';

const model = summaryModel();
const list = quantities(model);
const replicates = [inventedReplicate(model, 0), inventedReplicate(model, 1, 40)];
const place = (name: string) => model.points.findIndex((point) => point.name === name);
const valuesOf = (id: string) =>
  quantityValues(
    model,
    list.find((quantity) => quantity.id === id)!,
    replicates,
  );
/** A number of each realisation, read one by one. */
const oneByOne = (read: (of: (typeof replicates)[number], realisation: number) => number) =>
  replicates.flatMap((of) => Array.from({ length: of.count }, (_, r) => read(of, r)));

describe('the quantities of a model', () => {
  it('are those of each point that settles, then those of each pair', () => {
    const ofPoint = (name: string, stillToCome: readonly string[]) => [
      `settlement_at_horizon@${name}`,
      `settlement_after_handover@${name}`,
      `secondary_after_handover@${name}`,
      `settlement_at_time 0.5@${name}`,
      `settlement_at_time 10@${name}`,
      `rate_at_handover@${name}`,
      ...stillToCome.map((each) => `${each}@${name}`),
      `time_to_degree@${name}`,
      `top_up@${name}`,
    ];
    const ofPair = (name: string, kinds: readonly string[]) =>
      kinds.flatMap((kind) => [`${kind}_at_horizon@${name}`, `${kind}_after_handover@${name}`]);
    expect(list.map(({ id }) => id)).toEqual([
      // two dates and one more limit: each date and each limit once
      ...ofPoint('left', [
        'settlement_still_to_come 5',
        'time_to_limit 0.05',
        'settlement_still_to_come 8',
        'time_to_limit 0.02',
      ]),
      ...ofPoint('right', ['settlement_still_to_come 5', 'time_to_limit 0.05']),
      ...ofPoint('same place', []),
      // a pair at one x has a step and no slope
      ...ofPair('step', ['differential']),
      ...ofPair('slab', ['differential', 'slope']),
      ...ofPair('turned slab', ['differential', 'slope']),
      ...ofPair('span', ['differential', 'slope']),
    ]);
  });

  it('leave out what is not asked for', () => {
    const project = plainProject();
    project.fill.held_to_level = false;
    const kinds = quantities(modelOf(project)).map(({ kind }) => kind);
    expect(kinds).toEqual([
      'settlement_at_horizon',
      'settlement_after_handover',
      'secondary_after_handover',
      'rate_at_handover',
    ]);
  });
});

describe('the values of a quantity, read one by one', () => {
  const left = place('left');
  const right = place('right');

  it('are for a settlement the history at its date, and what comes after a date the rest to the horizon', () => {
    const at = (point: number, date: number) => oneByOne((of, r) => settlementOf(of, point, date, r));
    const after = (point: number, date: number) =>
      oneByOne((of, r) => settlementOf(of, point, 30, r) - settlementOf(of, point, date, r));
    expect([...valuesOf('settlement_at_horizon@left')]).toEqual(at(left, 30));
    expect([...valuesOf('settlement_at_time 0.5@right')]).toEqual(at(right, 0.5));
    expect([...valuesOf('settlement_after_handover@right')]).toEqual(after(right, 1));
    expect([...valuesOf('settlement_still_to_come 8@left')]).toEqual(after(left, 8));
  });

  it('are for a pair second minus first, and the slope that over the distance without its sign', () => {
    const apart = (of: (typeof replicates)[number], r: number, date: number) =>
      settlementOf(of, left, date, r) - settlementOf(of, right, date, r);
    expect([...valuesOf('differential_at_horizon@span')]).toEqual(oneByOne((of, r) => apart(of, r, 30)));
    const afterHandover = oneByOne((of, r) => (apart(of, r, 30) - apart(of, r, 1)) / 10);
    valuesOf('slope_after_handover@span').forEach((slope, i) =>
      expect(slope).toBeCloseTo(afterHandover[i], 15),
    );
    expect([...valuesOf('differential_at_horizon@turned slab')]).toEqual(
      oneByOne((of, r) => 0 - settlementOf(of, left, 30, r)),
    );
  });

  it('are for what the march reads off the column of the point', () => {
    const ofPoint = (
      column: 'rateAtHandover' | 'topUp' | 'timeToDegree' | 'secondaryAfterHandover',
      at: number,
    ) => oneByOne((of, r) => of[column][at * of.count + r]);
    expect([...valuesOf('rate_at_handover@right')]).toEqual(ofPoint('rateAtHandover', right));
    expect([...valuesOf('secondary_after_handover@left')]).toEqual(ofPoint('secondaryAfterHandover', left));
    expect([...valuesOf('top_up@left')]).toEqual(ofPoint('topUp', left));
    expect([...valuesOf('time_to_degree@right')]).toEqual(ofPoint('timeToDegree', right));
  });

  it('are for the time to a limit the column of that limit among those of its kind', () => {
    const ofLimit = (column: number) => oneByOne((of, r) => of.timeToLimit[column * of.count + r]);
    expect([...valuesOf('time_to_limit 0.05@left')]).toEqual(ofLimit(0));
    expect([...valuesOf('time_to_limit 0.05@right')]).toEqual(ofLimit(1));
    expect([...valuesOf('time_to_limit 0.02@left')]).toEqual(ofLimit(3));
  });

  it('are refused where the history does not hold the date', () => {
    const short = replicates.map((of) => ({
      ...of,
      historyTimes: of.historyTimes.map((time) => time + 0.01),
    }));
    expect(() => quantityValues(model, list[0], short)).toThrow('the history must hold year 30');
  });
});
