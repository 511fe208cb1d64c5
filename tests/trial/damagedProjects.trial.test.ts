import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkProject, type CheckResult } from '../../engine/project/checkProject.ts';
import { centralGround } from '../../engine/sampling/centralGround.ts';
import { realise } from '../../engine/settlement/realise.ts';
import { damagedProject } from '../engine/project/damagedProjects.ts';
import { fullProject, plainProject } from '../engine/project/plainProject.ts';
import { trialSize } from './trialSize.ts';

const SEED = 20_262;
/** Of 100,000 texts: two thirds damaged in their values, a third in their letters. */
const VALUES = trialSize(67_000);
const LETTERS = trialSize(33_000);
/** Coarse: whether results are finite is asked, not whether they are exact. */
const COARSE = { cells: 16, steps: 6 };

/** What a check must give, whatever the text: faults that say something, or a model with finite results. */
function expectSound(checked: CheckResult): void {
  if (checked.ok) {
    const { settlement, historyTimes } = realise(checked.model, centralGround(checked.model), COARSE);
    expect(historyTimes.every(Number.isFinite)).toBe(true);
    expect(settlement.every(Number.isFinite)).toBe(true);
    return;
  }
  expect(checked.faults.length).toBeGreaterThan(0);
  for (const { pointer, path, found, right } of checked.faults) {
    if (path === '' || found === '' || right === '' || !(pointer === '' || pointer.startsWith('/'))) {
      expect.fail(`a fault without words: ${JSON.stringify({ pointer, path, found, right })}`);
    }
  }
}

/** A text with a few stretches taken out, put in twice, or replaced by what JSON is made of. */
const damagedText = fc
  .tuple(
    fc.boolean(),
    fc.array(
      fc.record({
        at: fc.double({ min: 0, max: 1, noNaN: true }),
        length: fc.nat(30),
        by: fc.oneof(
          fc.constantFrom(
            '',
            '{',
            '}',
            '[',
            ']',
            ',',
            ':',
            '"',
            '\\',
            'null',
            '-',
            '1e999',
            '-0',
            '.',
            'NaN',
            '\u0000',
          ),
          fc.constantFrom('"__proto__":1,', '"constructor":{},', '[[[[', '9'.repeat(400), '\ud800', 'true'),
          fc.string({ maxLength: 5 }),
        ),
        kind: fc.constantFrom('replaced', 'doubled', 'put in'),
      }),
      { minLength: 1, maxLength: 3 },
    ),
  )
  .map(([isFull, cuts]) => {
    let text = JSON.stringify(isFull ? fullProject() : plainProject());
    for (const { at, length, by, kind } of cuts) {
      const start = Math.floor(at * text.length);
      const stretch = text.slice(start, start + length);
      const rest = text.slice(start + length);
      text =
        text.slice(0, start) +
        (kind === 'replaced' ? by : kind === 'doubled' ? stretch + stretch : by + stretch) +
        rest;
    }
    return text;
  });

describe('a damaged project text is refused or has finite results, and never throws', () => {
  let accepted = 0;
  let refused = 0;
  const judge = (text: string) => {
    const checked = checkProject(text);
    expectSound(checked);
    if (checked.ok) accepted += 1;
    else refused += 1;
  };

  it(`in ${VALUES} projects whose values and keys are changed`, { timeout: 3_600_000 }, () => {
    fc.assert(
      fc.property(damagedProject(3), ({ project }) => judge(JSON.stringify(project))),
      { seed: SEED, numRuns: VALUES },
    );
  });

  it(`in ${LETTERS} texts whose letters are changed`, { timeout: 3_600_000 }, () => {
    fc.assert(
      fc.property(damagedText, (text) => judge(text)),
      { seed: SEED + 1, numRuns: LETTERS },
    );
  });

  it('of which a tenth at least are accepted, and half at least refused', () => {
    expect(accepted).toBeGreaterThan((VALUES + LETTERS) / 10);
    expect(refused).toBeGreaterThan((VALUES + LETTERS) / 2);
  });
});
