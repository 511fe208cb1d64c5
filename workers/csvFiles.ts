import type { Model } from '../engine/project/model.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import { quantities } from '../engine/summary/quantities.ts';
import { quantityValues } from '../engine/summary/quantityValues.ts';
import type { Summary } from '../engine/summary/summary.ts';
import { unitKey } from './summaryFile.ts';

/** Rows of text cells as CSV (RFC 4180), with a comma and a decimal point. */
function csv(rows: readonly (readonly (string | number)[])[]): string {
  return rows.map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}

function cell(value: string | number): string {
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  // a text that a spreadsheet would take for a formula stays a text
  const text = /^[=+\-@\t]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

/** Exceedance curves of all results. */
export function exceedanceCsv(summary: Summary): string {
  const rows: (string | number)[][] = [
    ['result', 'unit', 'value', 'share_above', 'share_low', 'share_high', 'resolved'],
  ];
  for (const { quantity, exceedance } of summary.quantities) {
    exceedance.values.forEach((value, i) => {
      const isResolved = value < exceedance.unresolvedAbove ? 'yes' : 'no';
      rows.push([
        quantity.id,
        quantity.unit,
        value,
        exceedance.shares[i],
        exceedance.low[i],
        exceedance.high[i],
        isResolved,
      ]);
    });
  }
  return csv(rows);
}

/** Percentiles of the settlement of each point with time. */
export function settlementWithTimeCsv(summary: Summary): string {
  const percents = summary.model.results.percentiles;
  const rows: (string | number)[][] = [
    ['point', 'time_year', 'mean_m', ...percents.flatMap((p) => [`p${p}_m`, `p${p}_low_m`, `p${p}_high_m`])],
  ];
  for (const { point, times, bands, mean } of summary.timeBands) {
    times.forEach((time, t) => {
      const values = bands.flatMap(({ values: own, low, high }) => [own[t], low[t], high[t]]);
      rows.push([summary.model.points[point].name, time, mean[t], ...values]);
    });
  }
  return csv(rows);
}

/** Every realisation with its inputs and results, a replicate at a time; the first piece is the header. */
export function* realisationsCsv(model: Model, replicates: readonly Realisations[]): Generator<string> {
  const list = quantities(model);
  const inputNames = model.inputs.flatMap((input) =>
    input.spread === null ? [input.name] : model.points.map((point) => `${input.name}@${point.name}`),
  );
  const resultNames = list.map((quantity) => `${quantity.id} ${unitKey(quantity.unit)}`);
  yield csv([['replicate', 'realisation', ...inputNames, ...resultNames]]);
  for (const replicate of [...replicates].sort((a, b) => a.replicate - b.replicate)) {
    const { count } = replicate;
    const columns = [
      ...replicate.inputs.flatMap((values) =>
        Array.from({ length: values.length / count }, (_, place) =>
          values.subarray(place * count, (place + 1) * count),
        ),
      ),
      ...list.map((quantity) => quantityValues(model, quantity, [replicate])),
    ];
    const rows = Array.from({ length: count }, (_, r) => [
      replicate.replicate,
      r,
      ...columns.map((column) => column[r]),
    ]);
    yield csv(rows);
  }
}
