import { readFileSync } from 'node:fs';
import { checkProject } from '../../engine/project/checkProject.ts';
import { drawGround } from '../../engine/sampling/drawGround.ts';
import { runReplicate } from '../../engine/study.ts';
import { gridDeviations } from '../gridDeviations.ts';

/**
 * `npm run bench`: columns a second on one worker for the demo, with every coupling on, and the accuracy that
 * goes with it, measured in the same run. Ends with 1 when the accuracy or the speed is not met.
 */
const LEAST_COLUMNS_A_SECOND = 1000;
const ROUNDS = 7;
const REPLICATES_A_ROUND = 3;
const REALISATIONS_OF_ACCURACY = 50;

const checked = checkProject(readFileSync('public/demo/approach-embankment.json', 'utf8'));
if (!checked.ok) throw new Error('the demo is refused');
const { model } = checked;
const settling = model.points.filter((point) => !point.fixed).length;

runReplicate(model, 0);
const speeds: number[] = [];
for (let round = 0; round < ROUNDS; round += 1) {
  const start = performance.now();
  for (let replicate = 0; replicate < REPLICATES_A_ROUND; replicate += 1) runReplicate(model, replicate);
  const seconds = (performance.now() - start) / 1000;
  speeds.push((REPLICATES_A_ROUND * 100 * settling) / seconds);
}
speeds.sort((a, b) => a - b);
const median = speeds[speeds.length >> 1];

const deviations = gridDeviations(model, drawGround(model, 0, REALISATIONS_OF_ACCURACY), 10).sort(
  (a, b) => a - b,
);
const within = deviations.filter((deviation) => deviation <= 0.005).length / deviations.length;
const largest = deviations[deviations.length - 1];

console.log(
  `rounds: slowest ${speeds[0].toFixed(0)}, fastest ${speeds[speeds.length - 1].toFixed(0)} columns a second`,
);
console.log(
  `accuracy against a ten times finer grid and step, ${deviations.length} columns: ` +
    `median ${(100 * deviations[deviations.length >> 1]).toFixed(3)} %, largest ${(100 * largest).toFixed(3)} % ` +
    `of the final settlement; ${(100 * within).toFixed(0)} of 100 within 0.5 %`,
);
console.log(`columns a second on one worker: ${median.toFixed(0)}`);
const accurate = within >= 0.95 && largest <= 0.01;
if (!accurate) console.error('the required accuracy is not met');
if (median < LEAST_COLUMNS_A_SECOND) console.error(`fewer than ${LEAST_COLUMNS_A_SECOND} columns a second`);
process.exitCode = accurate && median >= LEAST_COLUMNS_A_SECOND ? 0 : 1;
