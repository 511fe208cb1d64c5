import type { Estimate, QuantitySummary, Summary } from '../engine/summary/summary.ts';

/**
 * The summary as it is written: units in the keys (m, years, m/year, m/m, shares), keys left out where there is
 * no number (a band with fewer than ten replicates behind it, a date that is not reached). Its shape:
 *
 *     { format, version, project, engine_version, model_digest, seed, realisations, replicates,
 *       limits: [{ name, result, place, limit_U, passes_share, passes_share_low, passes_share_high, above, of,
 *                  bound_when_none_share, convergence: [{ realisations, passes_share, half_width_share }] }],
 *       results: [{ id, label, unit, mean_U, mean_U_low, mean_U_high, deviation_U,
 *                   percentiles: [{ percent, value_U, value_U_low, value_U_high }], unresolved_above_U,
 *                   drivers: [{ input, rank_correlation, rank_regression, first_order_share }] }],
 *       settlement_with_time: [{ point, times_year, mean_m, percentiles: [{ percent, values_m, low_m, high_m }] }],
 *       central: [{ point, settlement_m }], numerical_error_m, numerical_error_share,
 *       counts, warnings, remarks, fill_placed_m3_per_m, fill_topping_up_m3_per_m }
 *
 * U is the unit of the result: m, m_per_year, year or m_per_m. A limit is `limit_U`.
 */
export function summaryFile(summary: Summary): string {
  const { model, provenance, numericalError } = summary;
  const points = model.points.map((point) => point.name);
  const file = {
    format: 'slow-ground-summary',
    version: 1,
    project: model.name,
    engine_version: provenance.engineVersion,
    model_digest: model.digest,
    seed: provenance.seed,
    realisations: provenance.realisations,
    replicates: provenance.replicates,
    limits: summary.limits.map((limit, i) => {
      const { name, result, value, point, pair } = model.limits[i];
      const unit = summary.quantities[limit.quantity].quantity.unit;
      return {
        name,
        result,
        place: pair >= 0 ? model.pairs[pair].name : points[point],
        [`limit_${unitKey(unit)}`]: value,
        ...estimate('passes_share', limit.chance),
        above: limit.above,
        of: limit.of,
        bound_when_none_share: limit.boundWhenNone,
        convergence: limit.convergence.map(({ realisations, chance, halfWidth }) => ({
          realisations,
          passes_share: chance,
          half_width_share: halfWidth,
        })),
      };
    }),
    results: summary.quantities.map(resultEntry(summary)),
    settlement_with_time: summary.timeBands.map(({ point, times, bands, mean }) => ({
      point: points[point],
      times_year: times,
      mean_m: mean,
      percentiles: bands.map(({ percent, values, low, high }) => ({
        percent,
        values_m: values,
        ...(low.every(Number.isFinite) ? { low_m: low, high_m: high } : {}),
      })),
    })),
    central: summary.central.map((settlement, point) => ({ point: points[point], settlement_m: settlement })),
    numerical_error_m: numericalError?.largest,
    numerical_error_share: numericalError?.relative,
    counts: summary.counts,
    warnings: summary.warnings,
    remarks: model.remarks.map(({ sentence }) => sentence),
    ...estimate('fill_placed_m3_per_m', summary.fillVolume.placed),
    ...estimate('fill_topping_up_m3_per_m', summary.fillVolume.topUp),
  };
  // numbers that JSON has no word for are left out
  const numbersOnly = (_key: string, value: unknown) =>
    typeof value === 'number' && !Number.isFinite(value) ? undefined : value;
  return `${JSON.stringify(file, numbersOnly, 1)}\n`;
}

/** A result with its unit in every key that holds a value of it. */
function resultEntry({ model }: Summary): (result: QuantitySummary) => object {
  return ({ quantity, mean, deviation, percentiles, exceedance, drivers }) => {
    const unit = unitKey(quantity.unit);
    return {
      id: quantity.id,
      label: quantity.label,
      unit: quantity.unit,
      ...estimate(`mean_${unit}`, mean),
      [`deviation_${unit}`]: deviation,
      percentiles: percentiles.map((each) => ({
        percent: each.percent,
        ...estimate(`value_${unit}`, each.estimate),
      })),
      [`unresolved_above_${unit}`]: exceedance.unresolvedAbove,
      drivers: drivers.map((driver) => ({
        input: model.inputs[driver.input].name,
        rank_correlation: driver.rankCorrelation,
        rank_regression: driver.rankRegression,
        first_order_share: driver.firstOrderShare,
      })),
    };
  };
}

function estimate(key: string, { value, low, high }: Estimate): Record<string, number> {
  return { [key]: value, [`${key}_low`]: low, [`${key}_high`]: high };
}

/** The unit of a quantity as it stands in keys. */
export function unitKey(unit: string): string {
  return unit.replaceAll('/', '_per_');
}
