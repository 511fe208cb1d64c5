import { describe, expect, it } from 'vitest';
import { readCommandLine } from '../../workers/commandLine.ts';

const read = (line: string) => readCommandLine(line.split(' ').filter((word) => word !== ''));

describe('the command line', () => {
  it('takes options in any order', () => {
    const words =
      '--seed 5 - --quiet --replicates 0-24 --out o --workers 3 --every-realisation --realisations 5000';
    expect(read(words)).toEqual({
      kind: 'analyse',
      project: '-',
      out: 'o',
      realisations: 5000,
      seed: 5,
      workers: 3,
      replicates: [0, 24],
      everyRealisation: true,
      quiet: true,
    });
  });

  it('leaves to the file and the machine what is not said', () => {
    expect(read('p.json --out o')).toMatchObject({
      realisations: null,
      seed: null,
      workers: null,
      replicates: null,
      everyRealisation: false,
      quiet: false,
    });
  });

  it('joins folders', () => {
    expect(read('--join a b c --out d --every-realisation')).toEqual({
      kind: 'join',
      folders: ['a', 'b', 'c'],
      out: 'd',
      everyRealisation: true,
      quiet: false,
    });
  });

  it.each([
    ['p.json --out', '--out needs a value'],
    ['p.json --out o --out u', '--out is given twice'],
    ['p.json --out o --ot u', '--ot is not an option'],
    ['p.json q.json --out o', 'more than one project file'],
    ['p.json --out o --realisations 1e3', '--realisations needs hundreds from 100 to 1000000'],
    ['p.json --out o --realisations 1000100', '--realisations needs hundreds from 100 to 1000000'],
    ['p.json --out o --seed -1', '--seed needs a whole number of 0 or more'],
    ['p.json --out o --seed 9007199254740993', '--seed needs a whole number of 0 or more'],
    ['p.json --out o --workers 0', '--workers needs a whole number from 1 to 256'],
    ['p.json --out o --replicates 5', '--replicates needs a range such as 0-24'],
    ['p.json --out o --replicates 5-4', '--replicates needs a range that rises'],
    ['--join --out o', '--join needs the folders to join'],
    ['--join a --seed 4 --out o', '--seed does not go with --join'],
  ])('is called wrongly as %s', (line, sentence) => {
    expect(read(line)).toEqual({ kind: 'wrong', sentence });
  });
});
