import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runReplicate } from '../../engine/study.ts';
import { readReplicates, writtenReplicates, type ReplicateFile } from '../../workers/replicateFile.ts';
import { smallProject } from '../browser/smallProject.ts';
import { modelOf } from '../modelOf.ts';

const project = JSON.stringify(smallProject('invented, with a café in its name', 100));
const replicate = runReplicate(modelOf(project), 0);
// numbers that do not survive a text
replicate.settlement.set([-0, Infinity, -Infinity, NaN, 5e-324, 0.1 + 0.2]);
const file: ReplicateFile = {
  format: 'slow-ground-replicates',
  engineVersion: 'x',
  digest: '0'.repeat(32),
  seed: 9007199254740991,
  realisations: 100,
  project,
  replicates: [replicate],
};
const bytes = Buffer.concat([...writtenReplicates(file)]);

describe('the file that joining needs', () => {
  it('gives back every byte of what was written', () => {
    const read = readReplicates(bytes);
    expect(read).toEqual(file);
    expect(Object.is(read?.replicates[0].settlement[0], -0)).toBe(true);
  });

  it('is refused, and nothing is thrown, where any one byte of it differs or its end is missing', () => {
    const places = fc.nat(bytes.length - 1);
    fc.assert(
      fc.property(places, fc.integer({ min: 1, max: 255 }), (place, change) => {
        const damaged = Buffer.from(bytes);
        damaged[place] ^= change;
        expect(readReplicates(damaged)).toBe(null);
        expect(readReplicates(bytes.subarray(0, place))).toBe(null);
      }),
      { seed: 4, numRuns: 200 },
    );
  });
});
