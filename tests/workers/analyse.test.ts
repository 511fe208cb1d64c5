import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { smallProject } from '../browser/smallProject.ts';
import { BuiltCommand, ended, type Ended } from './builtCommand.ts';

let command: BuiltCommand;
const at = (...names: string[]) => join(command.folder, ...names);
const PLAIN_FILES = ['exceedance.csv', 'settlement-with-time.csv', 'summary.json'];

beforeAll(async () => {
  command = await BuiltCommand.build();
  writeFileSync(at('small.json'), JSON.stringify(smallProject('invented small project', 300)));
});
afterAll(() => command.remove());

/** Starts a run and interrupts it; again, and later, where it had not begun to listen. */
async function interruptedRun(words: readonly string[]): Promise<Ended> {
  for (let wait = 2000; ; wait *= 2) {
    const child = command.start(words);
    const end = ended(child);
    await new Promise((resolve) => setTimeout(resolve, wait));
    child.kill('SIGINT');
    const how = await end;
    if (how.code !== null || wait > 10_000) return how;
  }
}

describe('the headless command', () => {
  it('writes a summary without null, and prints one that a person can read', async () => {
    const { code, out, err } = await command.run(['small.json', '--out', 'deep/down/plain']);
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(readdirSync(at('deep/down/plain')).sort()).toEqual(PLAIN_FILES);
    expect(command.names).toEqual(['deep', 'small.json']);
    const text = readFileSync(at('deep/down/plain/summary.json'), 'utf8');
    expect(text).not.toMatch(/null|NaN|Infinity/);
    const summary = JSON.parse(text);
    expect(summary).toMatchObject({ format: 'slow-ground-summary', seed: 11, realisations: 300 });
    const [ride] = summary.limits;
    expect(ride).toMatchObject({ name: 'ride', place: 'crest', limit_m: 0.1, of: 300 });
    expect(ride.passes_share).toBeCloseTo(ride.above / 300, 12);
    expect(Object.keys(summary.results[0])).toContain('mean_m');
    expect(out).toMatch(
      /In \d+ of 100 equally likely grounds, settlement after handover at crest passes 100\u202fmm\./,
    );
    expect(out).toContain('No band yet: 3 replicates stand behind it, and a band needs 10.');
    expect(out).toMatch(/Driven by .*, .*, .*\./);
    expect(out).toMatch(/settlement at the horizon at crest: \d+\u202fmm \(\d+\u202fmm to [\d.]+\u202fm+\)/);
    expect(out).toContain('Numerical error of the central realisation');
    expect(out).toContain('do not replace it; local codes govern');
    expect(out).not.toMatch(/\b(0|100)[ \u202f]?%/);
  });

  it('gives the bytes of one run when runs over ranges of replicates are joined', async () => {
    const part = (range: string, out: string, ...more: string[]) =>
      command.run(['small.json', '--replicates', range, '--out', out, '--quiet', ...more]);
    const runs = [
      command.run(['small.json', '--out', 'whole', '--every-realisation', '--quiet', '--workers', '2']),
      part('1-2', 'b', '--workers', '2'),
      part('0-0', 'a'),
      part('0-0', 'seed', '--seed', '12'),
    ];
    for (const run of runs) expect(await run).toEqual({ code: 0, out: '', err: '' });
    expect(readdirSync(at('a')).sort()).toEqual(
      [...PLAIN_FILES, 'realisations.csv', 'replicates.bin'].sort(),
    );

    expect((await command.run(['--join', 'b', 'a', '--out', 'c', '--every-realisation'])).code).toBe(0);
    const files = readdirSync(at('whole')).sort();
    expect(readdirSync(at('c')).sort()).toEqual(files);
    expect(files).toEqual([...PLAIN_FILES, 'realisations.csv'].sort());
    for (const file of files) {
      expect(readFileSync(at('c', file)).equals(readFileSync(at('whole', file))), file).toBe(true);
    }
    const lines = readFileSync(at('c', 'realisations.csv'), 'utf8').trimEnd().split('\r\n');
    expect(lines).toHaveLength(301);

    const refused = async (words: string[]) => {
      const { code, err, out } = await command.run(['--join', ...words, '--out', 'd']);
      expect({ code, out, exists: existsSync(at('d')) }).toEqual({ code: 1, out: '', exists: false });
      return err;
    };
    expect(await refused(['a'])).toBe('replicate 1 of 3 is in none of the runs.\n');
    expect(await refused(['a', 'b', 'a'])).toBe('replicate 0 is in two of the runs.\n');
    expect(await refused(['seed', 'b'])).toBe('seed and b are of different seeds.\n');
    expect(await refused(['whole', 'b'])).toContain('runs to join are made with --replicates');
    mkdirSync(at('damaged'));
    const bytes = readFileSync(at('a', 'replicates.bin'));
    writeFileSync(at('damaged', 'replicates.bin'), bytes.subarray(0, bytes.length - 3));
    expect(await refused(['damaged', 'b'])).toContain('is damaged, or no file of replicates');
    const otherwise = (name: string, from: string, to: string) => {
      mkdirSync(at(name));
      const changed = Buffer.from(bytes.subarray(0, -32).toString('latin1').replace(from, to), 'latin1');
      const hash = createHash('sha256').update(changed).digest();
      writeFileSync(at(name, 'replicates.bin'), Buffer.concat([changed, hash]));
    };
    otherwise('model', '"digest":"', '"digest":"0');
    expect(await refused(['model', 'b'])).toBe('model and b are of different models.\n');
    otherwise('version', '"engineVersion":"', '"engineVersion":"9');
    expect(await refused(['version', 'b'])).toBe('version and b are of different versions of the engine.\n');
    otherwise('other', '\\"thickness_m\\":4', '\\"thickness_m\\":5');
    expect(await refused(['other', 'b'])).toBe('The runs do not belong to the project that they hold.\n');
    const itself = await command.run(['--join', 'a', 'b', '--out', 'a']);
    expect(itself.code).toBe(1);
    expect(existsSync(at('a', 'replicates.bin'))).toBe(true);
  });

  it('reads standard input, and overwrites only what it wrote itself', async () => {
    const text = JSON.stringify(smallProject('invented project on standard input', 100));
    mkdirSync(at('used'));
    expect(await command.run(['-', '--out', 'used', '--quiet'], text)).toEqual({ code: 0, out: '', err: '' });
    writeFileSync(at('used', 'exceedance.csv'), 'of yesterday');
    expect((await command.run(['-', '--out', 'used', '--quiet', '--seed', '5'], text)).code).toBe(0);
    expect(readFileSync(at('used', 'exceedance.csv'), 'utf8')).not.toBe('of yesterday');
    expect(JSON.parse(readFileSync(at('used', 'summary.json'), 'utf8')).seed).toBe(5);
    writeFileSync(at('used', 'letter.txt'), 'mine');
    const { code, err } = await command.run(['-', '--out', 'used'], text);
    expect({ code, err }).toEqual({
      code: 2,
      err: 'used holds letter.txt, which this command did not write; name another folder.\n',
    });
    expect(readFileSync(at('used', 'letter.txt'), 'utf8')).toBe('mine');
  });

  it('ends well when nobody reads what it prints', async () => {
    const child = command.start(['small.json', '--realisations', '100', '--out', 'unread']);
    child.stdout?.destroy();
    expect(await ended(child)).toEqual({ code: 0, out: '', err: '' });
    expect(readdirSync(at('unread')).sort()).toEqual(PLAIN_FILES);
  });

  it('refuses a damaged project with every fault, and writes nothing', async () => {
    const project = smallProject('invented damaged project', 300);
    const damaged = { ...project, colour: 'red', water: { depth_m: 'deep' }, layers: [] };
    const { code, out, err } = await command.run(['-', '--out', 'refused'], JSON.stringify(damaged));
    expect({ code, out }).toEqual({ code: 1, out: '' });
    for (const pointer of ['/colour', '/water/depth_m', '/layers']) expect(err).toContain(`[${pointer}]`);
    expect(err).not.toMatch(/\bat .*:\d+:\d+/);
    expect(existsSync(at('refused'))).toBe(false);
  });

  it.each([
    ['nothing', '', 'nothing'],
    ['what is not JSON', '{"a": \u0007', 'not JSON'],
    [
      'a text that is not UTF-8',
      Buffer.from([0x7b, 0xff, 0xfe]),
      'standard input: it is not a text in UTF-8.',
    ],
    ['more than 20 MB', `{"notes": "${'x'.repeat(21_000_000)}"}`, '20 MB'],
  ])('refuses %s with exit code 1', async (_, input, said) => {
    const { code, err } = await command.run(['-', '--out', 'refused'], input);
    expect({ code, exists: existsSync(at('refused')) }).toEqual({ code: 1, exists: false });
    expect(err).toContain(said);
  });

  it.each([
    ['missing.json', 'missing.json: there is no such file.\n'],
    ['deep', 'deep: that is a folder.\n'],
  ])('refuses the path %s with exit code 1', async (path, said) => {
    mkdirSync(at('deep'), { recursive: true });
    expect(await command.run([path, '--out', 'refused'])).toEqual({ code: 1, out: '', err: said });
  });

  it.each([
    [[], '--out is missing'],
    [['small.json'], '--out is missing'],
    [['--out', 'x'], 'the project file is missing'],
    [['small.json', '--out', 'x', '--realisations', '250'], '--realisations needs hundreds'],
    [['small.json', '--out', 'x', '--replicates', '2-7'], 'The study has 3 replicates, 0 to 2'],
    [['small.json', '--out', 'small.json/x'], 'cannot be made in it'],
    [['small.json', '--out', 'small.json'], 'cannot be used as a folder of results'],
  ])('ends with 2 when it is called as %j', async (words, said) => {
    const { code, out, err } = await command.run(words);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toContain(said);
  });

  it('prints how it is used', async () => {
    const { code, out } = await command.run(['--help']);
    expect(code).toBe(0);
    expect(out).toContain('npm run analyse -- project.json --out folder');
  });

  it('ends with 130 when interrupted, and leaves nothing behind', async () => {
    const points = Array.from({ length: 20 }, (_, i) => ({ name: `p${i}`, x_m: i / 2 }));
    const long = { ...smallProject('invented long project', 100_000), points, pairs: [], limits: [] };
    writeFileSync(at('long.json'), JSON.stringify(long));
    const before = command.names;
    const interrupted = { code: 130, out: '', err: 'Interrupted; nothing was written.\n' };
    const [running, waiting] = await Promise.all([
      interruptedRun(['long.json', '--out', 'interrupted']),
      interruptedRun(['-', '--out', 'interrupted']),
    ]);
    expect(running).toEqual(interrupted);
    expect(waiting).toEqual(interrupted);
    expect(command.names).toEqual(before);
  });
});
