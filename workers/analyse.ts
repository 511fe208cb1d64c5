import { readFileSync } from 'node:fs';
import { checkProject } from '../engine/project/checkProject.ts';
import { faultSentence } from '../engine/project/fault.ts';
import type { Model } from '../engine/project/model.ts';
import { REALISATIONS_IN_REPLICATE } from '../engine/project/replicateSize.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import { ENGINE_VERSION } from '../engine/summary/engineVersion.ts';
import type { Summary } from '../engine/summary/summary.ts';
import { HELP, readCommandLine, type Command } from './commandLine.ts';
import { exceedanceCsv, realisationsCsv, settlementWithTimeCsv } from './csvFiles.ts';
import { joinReplicates } from './joinReplicates.ts';
import { nodeWorkers, usualNodeWorkers } from './nodeWorkers.ts';
import { outputFault, outputFolder } from './outputFolder.ts';
import { printedSummary } from './printedSummary.ts';
import { progressLine } from './progressLine.ts';
import { writtenReplicates } from './replicateFile.ts';
import { summariseAll } from './summariseAll.ts';
import { summaryFile } from './summaryFile.ts';
import { WorkerPool } from './workerPool.ts';

/** How the command ends. */
const DONE = 0;
const REFUSED = 1;
const CALLED_WRONGLY = 2;
const INTERRUPTED = 130;

/** A reason to end that has been put in words. */
class Ending extends Error {
  readonly code: number;
  constructor(code: number, sentence: string) {
    super(sentence);
    this.code = code;
  }
}

// a reader that goes away, such as `head`, is no fault
for (const stream of [process.stdout, process.stderr]) {
  stream.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
  });
}

process.exitCode = await main(process.argv.slice(2));

async function main(words: readonly string[]): Promise<number> {
  const command = readCommandLine(words);
  try {
    switch (command.kind) {
      case 'help':
        process.stdout.write(HELP);
        return DONE;
      case 'wrong':
        throw new Ending(CALLED_WRONGLY, `${command.sentence}; see --help`);
      case 'join':
        return join(command);
      case 'analyse':
        return await analyse(command);
    }
  } catch (error) {
    if (!(error instanceof Ending)) throw error;
    process.stderr.write(`${error.message}\n`);
    return error.code;
  }
}

async function analyse(command: Extract<Command, { kind: 'analyse' }>): Promise<number> {
  const fault = outputFault(command.out);
  if (fault !== null) throw new Ending(CALLED_WRONGLY, fault);
  const text = readProject(command.project);
  const model = withSampling(checkedModel(text), command.realisations, command.seed);
  const all = model.sampling.realisations / REALISATIONS_IN_REPLICATE;
  const [first, last] = command.replicates ?? [0, all - 1];
  if (last >= all) {
    throw new Ending(
      CALLED_WRONGLY,
      `the study has ${all} replicates, 0 to ${all - 1}; asked for ${first}-${last}`,
    );
  }
  const isPart = command.replicates !== null;
  const kept: Realisations[] | null = isPart || command.everyRealisation ? [] : null;
  const summary = await study(model, first, last, command, kept);
  if (summary === null) return INTERRUPTED;
  writeResults(command.out, summary, isPart || command.everyRealisation ? kept : null, isPart ? text : null);
  if (!command.quiet) process.stdout.write(printedSummary(summary));
  return DONE;
}

/** Runs the replicates; null when interrupted. */
async function study(
  model: Model,
  first: number,
  last: number,
  command: Extract<Command, { kind: 'analyse' }>,
  kept: Realisations[] | null,
): Promise<Summary | null> {
  const pool = new WorkerPool(
    nodeWorkers(new URL('./study.node.mjs', import.meta.url)),
    command.workers ?? usualNodeWorkers(),
  );
  const line = progressLine(model, command.quiet ? null : process.stderr);
  const run = pool.start({
    model,
    replicates: Array.from({ length: last - first + 1 }, (_, i) => first + i),
    onTheWay: line.wantsChances ? 'chances' : 'nothing',
    onProgress: line.show,
    // a copy, because the original goes on to the worker that pools
    ...(kept === null
      ? {}
      : { onReplicate: (realisations: Realisations) => kept.push(structuredClone(realisations)) }),
  });
  const interrupt = () => run.cancel();
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, interrupt);
  const end = await run.end;
  pool.dispose();
  line.clear();
  if (end.kind === 'fault') throw new Error(end.message);
  return end.kind === 'done' ? end.summary : null;
}

function join(command: Extract<Command, { kind: 'join' }>): number {
  const fault = outputFault(command.out);
  if (fault !== null) throw new Ending(CALLED_WRONGLY, fault);
  const joined = joinReplicates(command.folders);
  if (typeof joined === 'string') throw new Ending(REFUSED, joined);
  const model = withSampling(checkedModel(joined.project), joined.realisations, joined.seed);
  if (model.digest !== joined.digest || joined.engineVersion !== ENGINE_VERSION) {
    throw new Ending(
      REFUSED,
      `the runs were made by engine ${joined.engineVersion}; this is ${ENGINE_VERSION}`,
    );
  }
  const summary = summariseAll(model, joined.replicates);
  writeResults(command.out, summary, joined.replicates, null);
  if (!command.quiet) process.stdout.write(printedSummary(summary));
  return DONE;
}

function readProject(path: string): string {
  try {
    return readFileSync(path === '-' ? 0 : path, 'utf8');
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    const why =
      code === 'ENOENT'
        ? 'there is no such file'
        : code === 'EISDIR'
          ? 'that is a folder'
          : 'it cannot be read';
    throw new Ending(REFUSED, `${path === '-' ? 'standard input' : path}: ${why}`);
  }
}

function checkedModel(text: string): Model {
  const checked = checkProject(text);
  if (checked.ok) return checked.model;
  const count = checked.faults.length;
  const lines = checked.faults.map(
    (each) => `  ${faultSentence(each)}${each.pointer === '' ? '' : ` [${each.pointer}]`}`,
  );
  throw new Ending(
    REFUSED,
    [`The project was refused: ${count === 1 ? 'one fault' : `${count} faults`}.`, ...lines].join('\n'),
  );
}

function withSampling(model: Model, realisations: number | null, seed: number | null): Model {
  return {
    ...model,
    sampling: {
      realisations: realisations ?? model.sampling.realisations,
      seed: seed ?? model.sampling.seed,
    },
  };
}

/** Writes all files, or none. */
function writeResults(
  out: string,
  summary: Summary,
  every: readonly Realisations[] | null,
  partOfProject: string | null,
): void {
  const { model } = summary;
  const folder = outputFolder(out);
  try {
    folder.write('summary.json', [summaryFile(summary)]);
    folder.write('exceedance.csv', [exceedanceCsv(summary)]);
    folder.write('settlement-with-time.csv', [settlementWithTimeCsv(summary)]);
    if (every !== null) folder.write('realisations.csv', realisationsCsv(model, every));
    if (every !== null && partOfProject !== null) {
      const file = {
        format: 'slow-ground-replicates',
        engineVersion: ENGINE_VERSION,
        digest: model.digest,
        seed: model.sampling.seed,
        realisations: model.sampling.realisations,
        project: partOfProject,
        replicates: [...every].sort((a, b) => a.replicate - b.replicate),
      } as const;
      folder.write('replicates.bin', writtenReplicates(file));
    }
    folder.publish();
  } catch (error) {
    folder.discard();
    throw new Ending(REFUSED, `the results could not be written to ${out}: ${(error as Error).message}`);
  }
}
