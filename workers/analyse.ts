import { REALISATIONS_IN_REPLICATE } from '../engine/project/replicateSize.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import { ENGINE_VERSION } from '../engine/summary/engineVersion.ts';
import type { Summary } from '../engine/summary/summary.ts';
import { HELP, readCommandLine, type Command } from './commandLine.ts';
import type { StudyRequest } from './conductStudy.ts';
import { CALLED_WRONGLY, DONE, Ending, NOT_FINISHED, REFUSED } from './ending.ts';
import { listenForInterruption } from './interruption.ts';
import { joinReplicates } from './joinReplicates.ts';
import { nodeWorkers, usualNodeWorkers } from './nodeWorkers.ts';
import { outputFault } from './outputFolder.ts';
import { printable } from './printable.ts';
import { printedSummary } from './printedSummary.ts';
import { progressLine } from './progressLine.ts';
import { checkedModel, readProject } from './readProject.ts';
import { WorkerPool } from './workerPool.ts';
import { writeResults } from './writeResults.ts';

for (const stream of [process.stdout, process.stderr]) {
  stream.on('error', (error: NodeJS.ErrnoException) => {
    // a reader that goes away, such as `head`, is no fault
    if (error.code !== 'EPIPE') process.exitCode ??= NOT_FINISHED;
  });
}
const interruption = listenForInterruption();
const code = await main(process.argv.slice(2));
// what could not be printed has been noted by then
if (code !== DONE) process.exitCode = code;

async function main(words: readonly string[]): Promise<number> {
  const command = readCommandLine(words);
  try {
    if (command.kind === 'help') process.stdout.write(HELP);
    else if (command.kind === 'wrong') throw new Ending(CALLED_WRONGLY, `${command.sentence}; see --help.`);
    else {
      const fault = outputFault(command.out);
      if (fault !== null) throw new Ending(CALLED_WRONGLY, `${fault}.`);
      const summary = await (command.kind === 'join' ? join(command) : analyse(command));
      if (!command.quiet) process.stdout.write(printable(printedSummary(summary)));
    }
    return DONE;
  } catch (error) {
    const ending =
      error instanceof Ending ? error : new Ending(NOT_FINISHED, `Not finished: ${String(error)}`);
    process.stderr.write(printable(`${ending.message}\n`));
    return ending.code;
  }
}

async function analyse(command: Extract<Command, { kind: 'analyse' }>): Promise<Summary> {
  const text = await readProject(command.project, interruption);
  const model = checkedModel(text, command);
  const all = model.sampling.realisations / REALISATIONS_IN_REPLICATE;
  const [first, last] = command.replicates ?? [0, all - 1];
  if (last >= all) {
    const asked = `replicates ${first} to ${last} were asked for`;
    throw new Ending(CALLED_WRONGLY, `The study has ${all} replicates, 0 to ${all - 1}; ${asked}.`);
  }
  const replicates = Array.from({ length: last - first + 1 }, (_, i) => first + i);
  const isPart = command.replicates !== null;
  const kept = new Map<number, Realisations>();
  const keep = (realisations: Realisations) => {
    // a copy, because the original goes on to the worker that pools
    kept.set(realisations.replicate, structuredClone(realisations));
  };
  const request = isPart || command.everyRealisation ? { onReplicate: keep } : {};
  const size = command.workers ?? usualNodeWorkers();
  const summary = await study({ model, replicates, ...request }, size, command.quiet);
  const every = kept.size > 0 ? replicates.map((replicate) => kept.get(replicate)!) : null;
  await writeResults(command.out, { summary, every, toJoin: isPart ? text : null }, interruption);
  return summary;
}

async function join(command: Extract<Command, { kind: 'join' }>): Promise<Summary> {
  const joined = joinReplicates(command.folders, command.out);
  if (typeof joined === 'string') throw new Ending(REFUSED, `${joined}.`);
  if (joined.engineVersion !== ENGINE_VERSION) {
    const versions = `engine ${joined.engineVersion}; this is ${ENGINE_VERSION}`;
    throw new Ending(REFUSED, `The runs were made by ${versions}.`);
  }
  const model = checkedModel(joined.project, joined);
  if (model.digest !== joined.digest) {
    throw new Ending(REFUSED, 'The runs do not belong to the project that they hold.');
  }
  const replicates = joined.replicates.map(({ replicate }) => replicate);
  const given = new Map(joined.replicates.map((each) => [each.replicate, each]));
  const summary = await study({ model, replicates, given }, 1, command.quiet);
  const every = command.everyRealisation ? joined.replicates : null;
  await writeResults(command.out, { summary, every, toJoin: null }, interruption);
  return summary;
}

/**
 * Runs a study on worker threads.
 *
 * @throws Ending when it was interrupted or could not be finished
 */
async function study(request: StudyRequest, size: number, isQuiet: boolean): Promise<Summary> {
  const pool = new WorkerPool(nodeWorkers(new URL('./study.node.mjs', import.meta.url)), size);
  const line = progressLine(request.model, isQuiet ? null : process.stderr);
  const onTheWay = line.wantsChances ? 'chances' : 'nothing';
  const run = pool.start({ ...request, onTheWay, onProgress: line.show });
  interruption.onInterrupt = run.cancel;
  const end = await run.end;
  pool.dispose();
  line.clear();
  await interruption.check();
  if (end.kind === 'done') return end.summary;
  throw new Ending(NOT_FINISHED, `Not finished: ${end.kind === 'fault' ? end.message : end.kind}`);
}
