import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { centralGround } from '../../engine/sampling/centralGround.ts';
import { realise, WORKING_RESOLUTION } from '../../engine/settlement/realise.ts';
import { modelOf } from '../modelOf.ts';
import { projectFromScenario, type Scenario } from './projectFromScenario.ts';

/**
 * Four whole problems against an independent implementation of the same method statement (two numerical
 * approaches in another language that agree to 0.05 % of the final settlement).
 */
interface Answer {
  points: Record<string, { times: { time_year: number; settlement_m: number; topup_thickness_m: number }[] }>;
}

const names = ['single_nc_wide', 'crust_nc_trapezoid', 'cv_contrast_staged', 'seam_submerged_held'];
const finer = { cells: 4 * WORKING_RESOLUTION.cells, steps: 4 * WORKING_RESOLUTION.steps };

function read<T>(file: string): T {
  return JSON.parse(readFileSync(new URL(file, import.meta.url), 'utf8')) as T;
}

/** Largest deviation at any listed time of any point, as a share of that point's final settlement. */
function largestDeviation(name: string, resolution: typeof WORKING_RESOLUTION): number {
  const scenario = read<Scenario>(`${name}.json`);
  const { points } = read<Answer>(`${name}.answer.json`);
  const model = modelOf(projectFromScenario(scenario));
  const result = realise(model, centralGround(model), resolution);
  const dates = [...result.historyTimes];
  let largest = 0;
  model.points.forEach((point, index) => {
    const { times } = points[point.name];
    const final = Math.max(...times.map((time) => time.settlement_m));
    for (const { time_year, settlement_m } of times) {
      const at = dates.findIndex((date) => Math.abs(date - time_year) < 1e-6);
      const found = result.settlement[index * dates.length + at];
      largest = Math.max(largest, Math.abs(found - settlement_m) / final);
    }
  });
  return largest;
}

describe.each(names)('the problem %s', (name) => {
  it('is met within 1 % of the final settlement at every listed time on the working grid', () => {
    expect(largestDeviation(name, WORKING_RESOLUTION)).toBeLessThan(0.01);
  });

  it('is met within 0.3 % with cells and steps four times finer', () => {
    expect(largestDeviation(name, finer)).toBeLessThan(0.003);
  });
});

describe('topping up in the problem seam_submerged_held', () => {
  it('comes to the settlement reached when holding ends, within 1 %', () => {
    const scenario = read<Scenario>('seam_submerged_held.json');
    const answer = read<Answer>('seam_submerged_held.answer.json');
    const model = modelOf(projectFromScenario(scenario));
    const { topUp } = realise(model, centralGround(model));
    model.points.forEach((point, index) => {
      const { times } = answer.points[point.name];
      const expected = times[times.length - 1].topup_thickness_m;
      expect(Math.abs(topUp[index] - expected) / expected).toBeLessThan(0.01);
    });
  });
});
