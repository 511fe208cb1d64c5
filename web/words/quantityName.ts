/** A kind of result by its name, without where; as along an axis. */
export function quantityName(kind: string): string {
  return NAMES[kind] ?? kind.replaceAll('_', ' ');
}

const NAMES: Readonly<Record<string, string>> = {
  settlement_at_horizon: 'settlement at the horizon',
  settlement_after_handover: 'settlement after handover',
  secondary_after_handover: 'secondary part of the settlement after handover',
  settlement_at_time: 'settlement at that date',
  settlement_still_to_come: 'settlement still to come',
  rate_at_handover: 'rate of settlement at handover',
  time_to_limit: 'date from which the settlement still to come is under its limit',
  time_to_degree: 'date at which the degree of consolidation is reached',
  top_up: 'thickness of topping up',
  differential_at_horizon: 'differential settlement at the horizon, either way',
  differential_after_handover: 'differential settlement after handover, either way',
  slope_at_horizon: 'slope at the horizon, either way',
  slope_after_handover: 'slope after handover, either way',
};
