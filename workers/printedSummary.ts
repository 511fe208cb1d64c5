import type { QuantitySummary, Summary } from '../engine/summary/summary.ts';
import { clampSentences } from '../web/words/clampSentences.ts';
import { bandFinding, limitFinding } from '../web/words/findingText.ts';
import { measure, measureText } from '../web/words/measure.ts';
import { numberText, significantNumberText } from '../web/words/numberText.ts';

/** Results whose distribution is printed; the dates in between are in the files. */
const PRINTED = new Set([
  'settlement_at_horizon',
  'settlement_after_handover',
  'settlement_still_to_come',
  'time_to_limit',
  'time_to_degree',
  'rate_at_handover',
  'top_up',
  'differential_at_horizon',
  'differential_after_handover',
  'slope_after_handover',
]);
const MOST_DRIVERS = 3;

/** The summary that a person reads in the terminal. */
export function printedSummary(summary: Summary): string {
  const { model, provenance } = summary;
  const lines = [model.name, ''];
  summary.limits.forEach((limit, i) => {
    const { quantity, drivers } = summary.quantities[limit.quantity];
    const chance = { ...limit.chance, above: limit.above, of: limit.of };
    lines.push(limitFinding(quantity, model.limits[i].value, chance));
    lines.push(`  ${bandFinding(chance, provenance.replicates.length)}`);
    const main = mainDrivers(summary, drivers);
    if (main !== '') lines.push(`  Driven by ${main}.`);
  });
  if (summary.limits.length > 0) lines.push('');
  lines.push('median (P5 to P95)');
  for (const each of summary.quantities) {
    if (PRINTED.has(each.quantity.kind)) lines.push(`  ${each.quantity.label}: ${spreadText(each)}`);
  }
  lines.push('', ...closing(summary));
  return `${lines.join('\n')}\n`;
}

function spreadText({ quantity, percentiles }: QuantitySummary): string {
  const at = (percent: number) => percentiles.find((each) => each.percent === percent)?.estimate.value;
  const text = (value: number | undefined) => {
    if (value === undefined) return '–';
    return Number.isFinite(value) ? measureText(measure(value, quantity.unit)) : 'not by the horizon';
  };
  const [first, last] = [percentiles[0], percentiles[percentiles.length - 1]];
  if (at(5) !== undefined && at(95) !== undefined)
    return `${text(at(50))} (${text(at(5))} to ${text(at(95))})`;
  return `${text(at(50))} (P${first.percent} ${text(first.estimate.value)}, P${last.percent} ${text(last.estimate.value)})`;
}

function mainDrivers(summary: Summary, drivers: QuantitySummary['drivers']): string {
  return [...drivers]
    .filter(({ rankCorrelation }) => Number.isFinite(rankCorrelation))
    .sort((a, b) => Math.abs(b.rankCorrelation) - Math.abs(a.rankCorrelation))
    .slice(0, MOST_DRIVERS)
    .map(({ input, rankCorrelation }) => {
      const sign = rankCorrelation > 0 ? '+' : '';
      return `${summary.model.inputs[input].label} (rank correlation ${sign}${numberText(rankCorrelation, 2)})`;
    })
    .join(', ');
}

function closing(summary: Summary): string[] {
  const { provenance, numericalError, counts, model } = summary;
  const lines = [
    `${numberText(provenance.realisations)} realisations, seed ${provenance.seed}, engine ${provenance.engineVersion}.`,
  ];
  if (numericalError !== null) {
    const share = significantNumberText(100 * numericalError.relative, 2);
    const amount = measureText(measure(numericalError.largest, 'm'));
    lines.push(`Numerical error of the central realisation: ${share} % of its final settlement (${amount}).`);
  }
  lines.push(
    ...clampSentences(counts, provenance.realisations),
    ...summary.warnings,
    ...model.remarks.map(({ sentence }) => sentence),
  );
  lines.push(
    'Results support a licensed engineer’s judgement and do not replace it; local codes govern. Stability during ' +
      'filling, lateral spreading, seepage under artesian heads and seismic settlement are not computed.',
  );
  return lines;
}
