import type { Model } from '../project/model.ts';
import type { Quantity, QuantityKind } from './summary.ts';

/** Every single number of a realisation of which a distribution is reported, points before pairs. */
export function quantities(model: Model): Quantity[] {
  return [...ofPoints(model), ...ofPairs(model)];
}

function ofPoints(model: Model): Quantity[] {
  return model.points.flatMap((point, index) => {
    if (point.fixed) return [];
    const about = (kind: QuantityKind, words: string, unit: Quantity['unit'], date = NaN): Quantity => ({
      kind,
      id: `${kind}${Number.isNaN(date) ? '' : ` ${date}`}@${point.name}`,
      label: `${words} at ${point.name}`,
      unit,
      point: index,
      pair: -1,
      date,
    });
    const stillToCome = model.limits.filter(
      (limit) => limit.result === 'settlement_still_to_come' && limit.point === index,
    );
    return distinct([
      about('settlement_at_horizon', 'settlement at the horizon', 'm'),
      about('settlement_after_handover', 'settlement after handover', 'm'),
      about('secondary_after_handover', 'secondary settlement after handover', 'm'),
      ...model.outputTimes.map((date) =>
        about('settlement_at_time', `settlement at year ${date}`, 'm', date),
      ),
      about('rate_at_handover', 'rate of settlement at handover', 'm/year'),
      ...stillToCome.flatMap((limit) => [
        about('settlement_still_to_come', `settlement still to come at year ${limit.date}`, 'm', limit.date),
        {
          ...about(
            'time_to_limit',
            `date from which at most ${millimetres(limit.value)} mm is still to come`,
            'year',
          ),
          id: `time_to_limit ${limit.value}@${point.name}`,
        },
      ]),
      ...(model.results.degreeOfConsolidation === null
        ? []
        : [
            about(
              'time_to_degree',
              `date of a degree of consolidation of ${model.results.degreeOfConsolidation}`,
              'year',
            ),
          ]),
      ...(model.couplings.heldUntil === null ? [] : [about('top_up', 'thickness of topping up', 'm')]),
    ]);
  });
}

function ofPairs(model: Model): Quantity[] {
  return model.pairs.flatMap((pair, index) => {
    const about = (kind: QuantityKind, words: string, unit: Quantity['unit']): Quantity => ({
      kind,
      id: `${kind}@${pair.name}`,
      label: `${words} from ${model.points[pair.first].name} to ${model.points[pair.second].name}`,
      unit,
      point: -1,
      pair: index,
      date: NaN,
    });
    const differentials = [
      about('differential_at_horizon', 'differential settlement at the horizon', 'm'),
      about('differential_after_handover', 'differential settlement after handover', 'm'),
    ];
    // a pair at one x has a step and no slope
    if (model.points[pair.first].x === model.points[pair.second].x) return differentials;
    return [
      ...differentials,
      about('slope_at_horizon', 'slope at the horizon', 'm/m'),
      about('slope_after_handover', 'slope after handover', 'm/m'),
    ];
  });
}

function distinct(list: readonly Quantity[]): Quantity[] {
  const seen = new Set<string>();
  return list.filter(({ id }) => !seen.has(id) && seen.add(id));
}

function millimetres(metres: number): number {
  return Number((1000 * metres).toPrecision(6));
}
