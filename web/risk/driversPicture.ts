import type { Model } from '../../engine/project/model.ts';
import type { Driver, QuantitySummary } from '../../engine/summary/summary.ts';
import type { BarPicture } from '../chart/chartPicture.ts';
import type { DataTable } from '../chart/dataTable.ts';
import { fileNameOf } from '../chart/saveFile.ts';
import { capital } from '../words/findingText.ts';
import { numberText } from '../words/numberText.ts';
import { plainSymbols } from '../words/symbolPieces.ts';

/** How the weight of an input is measured. */
export type DriverMeasure = 'rankCorrelation' | 'rankRegression' | 'firstOrderShare';

/** The inputs with the greatest weight first. */
export function sortedDrivers(drivers: readonly Driver[], by: DriverMeasure): Driver[] {
  return drivers
    .filter((driver) => Number.isFinite(driver[by]))
    .sort((a, b) => Math.abs(b[by]) - Math.abs(a[by]));
}

/** The heaviest inputs as bars. */
export function driversPicture(
  summary: QuantitySummary,
  model: Model,
  by: DriverMeasure,
  most: number,
): BarPicture {
  const shown = sortedDrivers(summary.drivers, by).slice(0, most);
  const share = by === 'firstOrderShare';
  return {
    axisTitle: AXIS_TITLES[by],
    from: share ? Math.min(0, ...shown.map((driver) => driver[by])) : -1,
    to: 1,
    bars: shown.map((driver) => ({
      label: plainSymbols(model.inputs[driver.input].label),
      value: driver[by],
    })),
  };
}

/** All inputs with all three measures. */
export function driversTable({ quantity, drivers }: QuantitySummary, model: Model): DataTable {
  const weight = (title: string, key: string) => ({
    title,
    key,
    text: (value: number) => numberText(value, 2),
  });
  return {
    fileName: `drivers-${fileNameOf(quantity.id)}`,
    columns: [
      { title: 'input', key: 'input', text: String },
      weight('rank correlation', 'rank_correlation'),
      weight('rank regression', 'rank_regression'),
      weight('share of the variance', 'first_order_share'),
    ],
    rows: sortedDrivers(drivers, 'rankCorrelation').map((driver) => [
      plainSymbols(model.inputs[driver.input].label),
      driver.rankCorrelation,
      driver.rankRegression,
      driver.firstOrderShare,
    ]),
  };
}

/** The finding: which input weighs most, and which way it works. */
export function driversFinding(
  { quantity, drivers }: QuantitySummary,
  model: Model,
  by: DriverMeasure,
): string {
  const [first, second] = sortedDrivers(drivers, by);
  if (!first) return `No uncertain input drives ${quantity.label}.`;
  const label = model.inputs[first.input].label;
  const name = plainSymbols(label) === label ? capital(label) : label;
  const size = numberText(first[by], 2);
  const weight = {
    rankCorrelation: `rank correlation ${size}`,
    rankRegression: `rank regression coefficient ${size}`,
    firstOrderShare: `share of the variance ${size}`,
  }[by];
  const next = second ? `, then ${model.inputs[second.input].label} (${numberText(second[by], 2)})` : '';
  return `${name} drives ${quantity.label} most (${weight})${next}.`;
}

const AXIS_TITLES: Readonly<Record<DriverMeasure, string>> = {
  rankCorrelation: 'rank correlation (Spearman)',
  rankRegression: 'standardised rank regression coefficient',
  firstOrderShare: 'first-order share of the variance',
};
