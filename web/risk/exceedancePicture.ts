import type { ExceedanceCurve, QuantitySummary } from '../../engine/summary/summary.ts';
import type { ChartPicture, Mark } from '../chart/chartPicture.ts';
import { niceCeiling } from '../chart/niceAxis.ts';
import { axisUnit, tickText, type AxisUnit } from '../words/axisUnit.ts';
import { capital, type BandedValue } from '../words/findingText.ts';
import { limitMeasure, measureText } from '../words/measure.ts';
import { quantityName } from '../words/quantityName.ts';

/** A limit on the quantity of a curve, in the quantity's unit. */
export interface CurveLimit {
  readonly name: string;
  readonly value: number;
  /** Chance of passing it, 0–1, with its band. */
  readonly chance: BandedValue;
}

/** The exceedance curve with its band, the unresolved tail drawn apart, and the limits as upright lines. */
export function exceedancePicture(summary: QuantitySummary, limits: readonly CurveLimit[]): ChartPicture {
  const { quantity, exceedance } = summary;
  const { from, to, factor, title } = exceedanceAxis(summary, limits);
  const { values, shares, low, high } = withEnds(exceedance, from, to);
  const x = values.map((value) => value * factor);
  const inHundred = (list: readonly number[]) => list.map((share) => share * 100);
  const firstOfTail = values.findIndex((value) => value >= exceedance.unresolvedAbove);
  const cut = firstOfTail < 0 ? values.length : firstOfTail;
  const banded = low.some((share) => Number.isFinite(share));
  const line = { kind: 'line', ink: 'probability', stepped: true } as const;
  return {
    x: {
      title: `${capital(quantityName(quantity.kind))} (${title})`,
      from: from * factor,
      to: to * factor,
      reversed: false,
      tickText,
    },
    y: { title: 'grounds of 100 in which it is passed', from: 0, to: 100, reversed: false, tickText },
    series: [
      ...(banded
        ? [
            {
              kind: 'band',
              name: '90 % band',
              ink: 'probability',
              strength: 0.28,
              stepped: true,
              x,
              low: inHundred(low),
              high: inHundred(high),
            } as const,
          ]
        : []),
      {
        ...line,
        name: 'exceedance',
        width: 2,
        dashed: false,
        x: x.slice(0, cut + 1),
        y: inHundred(shares).slice(0, cut + 1),
      },
      {
        ...line,
        name: 'unresolved tail',
        width: 1.5,
        dashed: true,
        x: x.slice(cut),
        y: inHundred(shares).slice(cut),
      },
    ],
    marks: limits.map(({ value }): Mark => {
      const label = `limit ${measureText(limitMeasure(value, quantity.unit))}`;
      return { axis: 'x', value: value * factor, label, ink: 'limit', dashed: false };
    }),
  };
}

/** Ends of the value axis in the quantity's unit, and the factor and name of the unit along it. */
export function exceedanceAxis(
  { quantity, exceedance }: QuantitySummary,
  limits: readonly CurveLimit[],
): { from: number; to: number } & AxisUnit {
  const { from, to } = valueRange(exceedance, limits);
  return { from, to, ...axisUnit(quantity.unit, to) };
}

/**
 * Share of realisations above a value with its band. A curve with a point for each realisation is read off its
 * steps; one that was thinned, straight between its points.
 *
 * @param realisations behind the curve
 */
export function readExceedance(curve: ExceedanceCurve, value: number, realisations: number) {
  const { values, shares, low, high } = curve;
  let step = -1;
  while (step + 1 < values.length && values[step + 1] <= value) step += 1;
  if (step < 0) return { share: 1, low: NaN, high: NaN };
  const isThinned = realisations > values.length && step + 1 < values.length;
  const along = isThinned ? (value - values[step]) / (values[step + 1] - values[step]) : 0;
  const read = (list: readonly number[]) =>
    along > 0 ? list[step] + along * (list[step + 1] - list[step]) : list[step];
  return { share: read(shares), low: read(low), high: read(high) };
}

/** The curve with the chance of passing each limit as a point of its own, which thinning may have left out. */
export function withLimits(curve: ExceedanceCurve, limits: readonly CurveLimit[]): ExceedanceCurve {
  const points = curve.values.map((value, i) => ({
    value,
    share: curve.shares[i],
    low: curve.low[i],
    high: curve.high[i],
  }));
  for (const { value, chance } of limits) {
    if (curve.values.includes(value)) continue;
    const place = points.findIndex((point) => point.value > value);
    if (place > 0)
      points.splice(place, 0, { value, share: chance.value, low: chance.low, high: chance.high });
  }
  return {
    ...curve,
    values: points.map((point) => point.value),
    shares: points.map((point) => point.share),
    low: points.map((point) => point.low),
    high: points.map((point) => point.high),
  };
}

function valueRange(curve: ExceedanceCurve, limits: readonly CurveLimit[]): { from: number; to: number } {
  const finite = curve.values.filter((value) => Number.isFinite(value));
  const reached = finite.length > 0 ? finite[finite.length - 1] : 1;
  const furthest = Math.max(reached, ...limits.map(({ value }) => value * 1.08));
  const lowest = Math.min(0, finite[0] ?? 0);
  return { from: lowest < 0 ? -niceCeiling(-lowest) : 0, to: niceCeiling(furthest > 0 ? furthest : 1e-3) };
}

/** The curve carried on to both ends of the axis: all grounds lie above its first value, as many as at the last beyond it. */
function withEnds(curve: ExceedanceCurve, from: number, to: number) {
  const count = curve.values.filter((value) => Number.isFinite(value) && value <= to).length;
  const carried = (list: readonly number[], first: number, last: number) => [
    first,
    ...list.slice(0, count),
    last,
  ];
  const end = Math.max(0, count - 1);
  return {
    values: carried(curve.values, from, to),
    shares: carried(curve.shares, 1, curve.shares[end] ?? 1),
    low: carried(curve.low, curve.low[0] ?? NaN, curve.low[end] ?? NaN),
    high: carried(curve.high, curve.high[0] ?? NaN, curve.high[end] ?? NaN),
  };
}
