import type { LimitSummary, QuantitySummary } from '../../engine/summary/summary.ts';
import type { ChartPicture } from '../chart/chartPicture.ts';
import { niceCeiling } from '../chart/niceAxis.ts';
import type { DataTable } from '../chart/dataTable.ts';
import { fileNameOf } from '../chart/saveFile.ts';
import { axisUnit, tickText } from '../words/axisUnit.ts';
import { measure, measureText, type QuantityUnit } from '../words/measure.ts';
import { enteredNumberText, numberText } from '../words/numberText.ts';

/** Half-width of a 90 % band after so many realisations, and of what. */
export interface Convergence {
  readonly of: string;
  readonly unit: QuantityUnit | 'share';
  readonly realisations: readonly number[];
  readonly halfWidth: readonly number[];
}

/** Of the chance where there is a limit, of the median where there is none. */
export function convergenceOf(summary: QuantitySummary, limit: LimitSummary | null): Convergence {
  const steps = limit ? limit.convergence : summary.convergence;
  return {
    of: limit ? 'the chance' : 'the median',
    unit: limit ? 'share' : summary.quantity.unit,
    realisations: steps.map(({ realisations }) => realisations),
    halfWidth: steps.map(({ halfWidth }) => halfWidth),
  };
}

/** The half-width falling with the number of realisations. */
export function convergencePicture(convergence: Convergence): ChartPicture {
  const { realisations, halfWidth } = convergence;
  const largest = Math.max(...halfWidth, 0);
  const unit =
    convergence.unit === 'share'
      ? { factor: 100, title: 'of 100 grounds' }
      : axisUnit(convergence.unit, largest);
  return {
    x: {
      title: 'realisations',
      from: 0,
      to: realisations[realisations.length - 1] ?? 1,
      reversed: false,
      tickText,
    },
    y: {
      title: `half-width (${unit.title})`,
      from: 0,
      to: niceCeiling(largest * unit.factor),
      reversed: false,
      tickText,
    },
    series: [
      {
        kind: 'line',
        name: 'half-width of the 90 % band',
        ink: 'probability',
        width: 2,
        dashed: false,
        stepped: false,
        x: realisations,
        y: halfWidth.map((value) => value * unit.factor),
      },
    ],
    marks: [],
  };
}

/** 'After 3,000 realisations the 90 % band of the chance is ± 1.4 of 100 grounds wide.' */
export function convergenceFinding({ of, unit, realisations, halfWidth }: Convergence): string {
  const last = realisations.length - 1;
  if (last < 0) return `The 90 % band of ${of} is shown from ten replicates of 100 realisations on.`;
  return `After ${numberText(realisations[last])} realisations, the 90 % band of ${of} reaches ${widthText(halfWidth[last], unit)} to either side.`;
}

export function convergenceTable({ of, unit, realisations, halfWidth }: Convergence, id: string): DataTable {
  return {
    fileName: `convergence-${fileNameOf(id)}`,
    columns: [
      { title: 'realisations', key: 'realisations', text: (value) => numberText(value) },
      {
        title: `half-width of the 90 % band of ${of}`,
        key: unit === 'share' ? 'half_width_share' : 'half_width',
        text: (value) => widthText(value, unit),
      },
    ],
    rows: realisations.map((count, i) => [count, halfWidth[i]]),
  };
}

function widthText(width: number, unit: QuantityUnit | 'share'): string {
  if (unit === 'share') return `${enteredNumberText(width * 100, width < 0.01 ? 2 : 1)} of 100 grounds`;
  if (unit === 'm') return `${enteredNumberText(width * 1000, 1)}\u202fmm`;
  if (unit === 'm/m') return `${enteredNumberText(width * 1000, 3)}\u202fmm per m`;
  return measureText(measure(width, unit));
}
