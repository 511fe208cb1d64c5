import type { QuantitySummary } from '../../engine/summary/summary.ts';
import type { DataTable } from '../chart/dataTable.ts';
import { fileNameOf } from '../chart/saveFile.ts';
import { sharePercentText } from '../words/chanceText.ts';
import { measure, measureText, type QuantityUnit } from '../words/measure.ts';

/** The exceedance curve as numbers: value, share of realisations above it, ends of the 90 % band. */
export function exceedanceTable({ quantity, exceedance }: QuantitySummary): DataTable {
  const share = (title: string, key: string) => ({ title, key, text: sharePercentText });
  const { values, shares, low, high } = exceedance;
  return {
    fileName: `exceedance-${fileNameOf(quantity.id)}`,
    columns: [
      {
        title: quantity.label,
        key: unitKey(quantity.kind, quantity.unit),
        text: (value) => measureText(measure(value, quantity.unit)),
      },
      share('grounds above it', 'share_above'),
      share('90 % band from', 'band_low'),
      share('to', 'band_high'),
    ],
    rows: values.map((value, i) => [value, shares[i], low[i], high[i]]),
  };
}

/** Name of a column with its unit: 'settlement_at_horizon_m'. */
export function unitKey(name: string, unit: QuantityUnit): string {
  const suffix = { m: 'm', 'm/year': 'm_per_year', year: 'years', 'm/m': 'm_per_m' }[unit];
  return `${name}_${suffix}`;
}
