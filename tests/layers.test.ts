import { describe, expect, it } from 'vitest';
import { importsOf, placeOf, sourceFiles, type SourceFile } from './sourceFiles.ts';

/**
 * Who may import whom. A place of the engine may import places of the ranks before it; ground, load and drainage
 * share a rank and may import each other without going round in circles.
 */
const RANKS: readonly (readonly string[])[] = [
  ['engine/units', 'engine/elementary'],
  ['engine/random', 'engine/marginals'],
  ['engine/project'],
  ['engine/sampling'],
  ['engine/ground', 'engine/load', 'engine/drainage'],
  ['engine/settlement'],
  ['engine/summary'],
  ['engine/study'],
];
const ENGINE_PACKAGES = ['simple-statistics'];
/** What the page may read of the engine. */
const WEB_MAY_READ = [
  'engine/project',
  'engine/summary',
  'engine/units',
  'engine/ground',
  'engine/load',
  'engine/drainage',
];
const LONGEST_FILE = 250;

function rankOf(place: string): number {
  return RANKS.findIndex((rank) => rank.includes(place));
}

/** What is wrong with a file's imports, in words. */
function wrongImports({ path, imports }: SourceFile): string[] {
  return imports.flatMap((target) => {
    const reason = path.startsWith('engine/')
      ? wrongInEngine(path, target)
      : path.startsWith('web/')
        ? wrongInWeb(path, target)
        : wrongInWorkers(target);
    return reason === null ? [] : [`${path} imports ${target}: ${reason}`];
  });
}

function wrongInEngine(path: string, target: string): string | null {
  if (!target.startsWith('engine/')) {
    return ENGINE_PACKAGES.includes(target)
      ? null
      : 'the engine imports only the engine and its few packages';
  }
  const [from, to] = [placeOf(path), placeOf(target)];
  if (rankOf(from) < 0 || rankOf(to) < 0) return 'a place without a rank';
  if (from === to) return null;
  return rankOf(to) < rankOf(from) || (rankOf(to) === rankOf(from) && rankOf(from) === 4)
    ? null
    : 'against the order of the engine';
}

function wrongInWeb(path: string, target: string): string | null {
  const place = placeOf(path);
  if (target.startsWith('workers/')) {
    return place === 'web/state' || path === 'web/App.svelte' ? null : 'only web/state and App touch workers';
  }
  if ((place === 'web/chart' || place === 'web/words') && /^(engine|web)\//.test(target)) {
    return placeOf(target) === place || placeOf(target) === 'engine/units'
      ? null
      : 'chart and words know units alone';
  }
  if (target.startsWith('engine/')) {
    return WEB_MAY_READ.includes(placeOf(target))
      ? null
      : 'sampling and settlement run in a worker or not at all';
  }
  return /^tests\//.test(target) ? 'a test' : null;
}

function wrongInWorkers(target: string): string | null {
  if (target.startsWith('web/')) return placeOf(target) === 'web/words' ? null : 'of the page only its words';
  return /^tests\//.test(target) ? 'a test' : null;
}

const files = sourceFiles('engine', 'web', 'workers');

describe('the house', () => {
  it('has no import that goes the wrong way', () => {
    expect(files.length).toBeGreaterThan(100);
    expect(files.flatMap(wrongImports)).toEqual([]);
  });

  it('has no circle of imports between files of the engine', () => {
    const imports = new Map(
      files.map(({ path, imports: own }) => [path, own.filter((name) => name.startsWith('engine/'))]),
    );
    const done = new Set<string>();
    const circles: string[] = [];
    const visit = (path: string, way: readonly string[]) => {
      if (way.includes(path)) circles.push([...way.slice(way.indexOf(path)), path].join(' → '));
      if (done.has(path) || way.includes(path)) return;
      for (const target of imports.get(path) ?? []) visit(target, [...way, path]);
      done.add(path);
    };
    for (const path of imports.keys()) visit(path, []);
    expect(circles).toEqual([]);
  });

  it('has no barrel, no drawer for odds and ends, and no file past 250 lines', () => {
    const names = files
      .map(({ path }) => path)
      .filter((path) => /\/(index|utils|helpers|common|types)\.ts$/.test(path));
    expect(names).toEqual([]);
    expect(
      files.filter(({ text }) => text.split('\n').length - 1 > LONGEST_FILE).map(({ path }) => path),
    ).toEqual([]);
  });
});

describe('the rule itself', () => {
  const judged = (path: string, text: string) => wrongImports({ path, text, imports: importsOf(path, text) });

  it.each([
    ['engine/project/x.ts', "import { drawGround } from '../sampling/drawGround.ts';"],
    ['engine/random/x.ts', "import type { Marginal } from '../marginals/marginal.ts';"],
    ['engine/load/x.ts', "import { readFileSync } from 'node:fs';"],
    ['engine/summary/x.ts', "import { runReplicate } from '../study.ts';"],
    ['web/risk/x.ts', "import { march } from '../../engine/settlement/march.ts';"],
    ['web/risk/x.ts', "const later = await import('../../workers/workerPool.ts');"],
    ['web/words/x.ts', "import type { Summary } from '../../engine/summary/summary.ts';"],
    ['workers/x.ts', "import { Chart } from '../web/chart/chart.ts';"],
  ])('refuses, in %s: %s', (path, text) => {
    expect(judged(path, text)).toHaveLength(1);
  });

  it('allows what goes the right way', () => {
    expect(judged('engine/settlement/x.ts', "import { cells } from '../ground/cells.ts';")).toEqual([]);
    expect(judged('engine/ground/x.ts', "import { stripStress } from '../load/stressIncrease.ts';")).toEqual(
      [],
    );
    expect(judged('web/state/x.ts', "import { WorkerPool } from '../../workers/workerPool.ts';")).toEqual([]);
  });
});
