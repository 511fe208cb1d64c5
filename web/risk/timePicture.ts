import type { Model } from '../../engine/project/model.ts';
import type { TimeBands } from '../../engine/summary/summary.ts';
import type { ChartPicture, Mark, Series } from '../chart/chartPicture.ts';
import { niceCeiling } from '../chart/niceAxis.ts';
import type { DataTable } from '../chart/dataTable.ts';
import { fileNameOf } from '../chart/saveFile.ts';
import { axisUnit, tickText } from '../words/axisUnit.ts';
import { durationText } from '../words/durationText.ts';
import { limitMeasure, measure, measureText } from '../words/measure.ts';
import { enteredNumberText } from '../words/numberText.ts';

/** Settlement growing downwards with time: percentile bands from light to strong, the middle one a line, handover marked. */
export function timePicture(bands: TimeBands, model: Model): ChartPicture {
  const all = bands.bands.flatMap(({ values }) => values);
  const limits = horizonLimits(bands, model);
  const furthest = Math.max(...all, ...limits.map((value) => value * 1.05), 1e-3);
  const unit = axisUnit('m', furthest);
  const lowest = Math.min(0, ...all) * unit.factor;
  return {
    x: { title: 'years', from: Math.min(bands.times[0], 0), to: model.horizon, reversed: false, tickText },
    y: {
      title: `settlement (${unit.title})`,
      from: lowest < 0 ? -niceCeiling(-lowest) : 0,
      to: niceCeiling(furthest * unit.factor),
      reversed: true,
      tickText,
    },
    series: bandSeries(bands, unit.factor),
    marks: [
      { axis: 'x', value: model.handover, label: 'handover', ink: 'plain', dashed: true },
      ...limits.map((value) => limitMark(value, unit.factor)),
    ],
  };
}

/** The percentile bands as a table, a row for each date. */
export function timeTable({ times, bands, mean }: TimeBands, point: string): DataTable {
  const settlement = (value: number) => measureText(measure(value, 'm'));
  return {
    fileName: `settlement-with-time-${fileNameOf(point)}`,
    columns: [
      { title: 'date (years)', key: 'date_years', text: (value) => enteredNumberText(value, 2) },
      ...bands.map(({ percent }) => ({
        title: `P${enteredNumberText(percent)}`,
        key: `p${enteredNumberText(percent)}_m`,
        text: settlement,
      })),
      { title: 'mean', key: 'mean_m', text: settlement },
    ],
    rows: times.map((time, i) => [time, ...bands.map(({ values }) => values[i]), mean[i]]),
  };
}

/** What the bands say at a date. */
export function readTime({ times, bands }: TimeBands, date: number): string {
  const at = bands.map(({ percent, values }) => {
    const text = measureText(measure(between(times, values, date), 'm'));
    return `P${enteredNumberText(percent)}\u00a0${text}`;
  });
  return `After ${durationText(date)}: ${at.join(', ')}.`;
}

/** Limits on the whole settlement of the point; one on a part of it has no place on this drawing. */
function horizonLimits({ point }: TimeBands, model: Model): number[] {
  return model.limits
    .filter((limit) => limit.result === 'settlement_at_horizon' && limit.point === point)
    .map(({ value }) => value);
}

function limitMark(value: number, factor: number): Mark {
  const label = `limit ${measureText(limitMeasure(value, 'm'))}`;
  return { axis: 'y', value: value * factor, label, ink: 'limit', dashed: false };
}

function bandSeries({ times, bands }: TimeBands, factor: number): Series[] {
  const x = times;
  const scaled = (values: readonly number[]) => values.map((value) => value * factor);
  const pairs = Math.floor(bands.length / 2);
  const series: Series[] = [];
  for (let i = 0; i < pairs; i += 1) {
    const [inner, outer] = [bands[i], bands[bands.length - 1 - i]];
    const name = `P${inner.percent} to P${outer.percent}`;
    const strength = 0.16 + (0.22 * (i + 1)) / pairs;
    series.push({
      kind: 'band',
      name,
      ink: 'probability',
      strength,
      stepped: false,
      x,
      low: scaled(inner.values),
      high: scaled(outer.values),
    });
  }
  if (bands.length % 2 === 1) {
    const middle = bands[pairs];
    series.push({
      kind: 'line',
      name: `P${middle.percent}`,
      ink: 'probability',
      width: 2,
      dashed: false,
      stepped: false,
      x,
      y: scaled(middle.values),
    });
  }
  return series;
}

function between(times: readonly number[], values: readonly number[], date: number): number {
  const right = times.findIndex((time) => time >= date);
  if (right < 0) return values[values.length - 1];
  if (right === 0) return values[0];
  const share = (date - times[right - 1]) / (times[right] - times[right - 1]);
  return values[right - 1] + share * (values[right] - values[right - 1]);
}
