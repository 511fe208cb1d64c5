import { median } from '../marginals/marginal.ts';
import type { Model } from '../project/model.ts';
import type { UncertainNumber } from '../project/uncertainNumber.ts';
import { RATE_PERIOD } from './settlementHistory.ts';
import { dateAt, SAME_DATE } from './timeGrid.ts';

/** History times aimed at between the events of a programme. */
const TIMES = 80;
const FEWEST_BETWEEN_EVENTS = 4;

/**
 * Dates at which every realisation's settlement is kept, years, rising, none beyond the horizon: the events
 * of the central programme, about 80 between them that lie denser after each, and all dates that a result is
 * asked for.
 */
export function historyTimes(model: Model): Float64Array {
  const { horizon } = model;
  const events = centralEvents(model);
  const between = Math.max(FEWEST_BETWEEN_EVENTS, Math.round(TIMES / Math.max(1, events.length - 1)));
  const times = [...events];
  for (let i = 1; i < events.length; i += 1) {
    const [start, end] = [events[i - 1], events[i]];
    const since = start - events[0];
    const power = since > 0 && end - start > since ? 3 : 2;
    const interval = { start, end, steps: between, power };
    for (let j = 1; j < between; j += 1) times.push(dateAt(interval, j / between));
  }
  times.push(...model.outputTimes, model.handover, model.handover + RATE_PERIOD, horizon);
  times.push(...model.limits.map((limit) => limit.date));
  const rising = times.filter((time) => time <= horizon).sort((a, b) => a - b);
  return Float64Array.from(rising.filter((time, i) => i === 0 || time - rising[i - 1] > SAME_DATE));
}

/** Dates of the central programme, from time zero to the horizon. */
function centralEvents(model: Model): number[] {
  const dates: number[] = [model.horizon];
  const add = (...numbers: readonly UncertainNumber[]) => {
    dates.push(...numbers.map((number) => median(number.marginal)));
  };
  for (const lift of model.lifts) {
    if (lift.placing !== null) add(lift.placing.start, lift.placing.end);
    if (lift.removal !== null) add(lift.removal.start, lift.removal.end);
  }
  for (const load of model.surfaceLoads) add(load.start, ...(load.end === null ? [] : [load.end]));
  if (model.vacuum !== null) add(model.vacuum.start, model.vacuum.end);
  const within = dates.filter((date) => date <= model.horizon).sort((a, b) => a - b);
  return within.filter((date, i) => i === 0 || date - within[i - 1] > SAME_DATE);
}
