/** What the headless command was asked for. */
export type Command =
  | { readonly kind: 'help' }
  | {
      readonly kind: 'analyse';
      /** Path of the project file, '-' for standard input. */
      readonly project: string;
      readonly out: string;
      readonly realisations: number | null;
      readonly seed: number | null;
      readonly workers: number | null;
      /** First and last replicate, counted from 0; null for all. */
      readonly replicates: readonly [number, number] | null;
      readonly everyRealisation: boolean;
      readonly quiet: boolean;
    }
  | {
      readonly kind: 'join';
      readonly folders: readonly string[];
      readonly out: string;
      readonly everyRealisation: boolean;
      readonly quiet: boolean;
    }
  /** Called wrongly, with what is right. */
  | { readonly kind: 'wrong'; readonly sentence: string };

export const HELP = `Slow Ground: chances of settlement of an embankment, from a project file

  npm run analyse -- project.json --out folder [options]
  npm run analyse -- - --out folder               the project from standard input
  npm run analyse -- --join a b … --out folder    joins runs over ranges of replicates

  --out folder          where the results are written (a new folder, or one written before)
  --realisations N      hundreds, instead of the file's own number
  --seed S              whole number, instead of the file's own
  --workers W           worker threads, instead of one a core
  --replicates A-B      only these replicates of 100, counted from 0; writes what joining needs
  --every-realisation   also writes every realisation with its inputs
  --quiet               prints nothing but faults
  --help                this text

Ends with 0 when done, 1 when the input was refused, 2 when called wrongly, 130 when interrupted, and 3 when
something else stood in the way, such as a full disk. The folder is written whole or not at all.
`;

const FLAGS = ['--every-realisation', '--quiet', '--help', '--join'] as const;
const WITH_VALUE = ['--out', '--realisations', '--seed', '--workers', '--replicates'] as const;

/** Reads the words of a command line. */
export function readCommandLine(words: readonly string[]): Command {
  const flags = new Set<string>();
  const values = new Map<string, string>();
  const paths: string[] = [];
  for (let i = 0; i < words.length; i += 1) {
    const word = words[i];
    if ((FLAGS as readonly string[]).includes(word)) flags.add(word);
    else if ((WITH_VALUE as readonly string[]).includes(word)) {
      i += 1;
      if (i >= words.length) return wrong(`${word} needs a value`);
      if (values.has(word)) return wrong(`${word} is given twice`);
      values.set(word, words[i]);
    } else if (word.startsWith('-') && word !== '-') return wrong(`${word} is not an option`);
    else paths.push(word);
  }
  if (flags.has('--help')) return { kind: 'help' };
  const out = values.get('--out');
  if (out === undefined || out === '') return wrong('--out is missing');
  const quiet = flags.has('--quiet');
  const everyRealisation = flags.has('--every-realisation');
  if (flags.has('--join')) {
    const needless = [...values.keys()].find((key) => key !== '--out');
    if (needless !== undefined) return wrong(`${needless} does not go with --join`);
    return paths.length === 0
      ? wrong('--join needs the folders to join')
      : { kind: 'join', folders: paths, out, everyRealisation, quiet };
  }
  if (paths.length !== 1)
    return wrong(paths.length === 0 ? 'the project file is missing' : 'more than one project file');
  const whole = (key: string, least: number) => {
    const text = values.get(key);
    if (text === undefined) return null;
    const number = Number(text);
    return /^\d+$/.test(text) && Number.isSafeInteger(number) && number >= least ? number : NaN;
  };
  const realisations = whole('--realisations', 100);
  if (realisations !== null && !(realisations % 100 === 0 && realisations <= 1_000_000)) {
    return wrong('--realisations needs hundreds from 100 to 1000000');
  }
  const seed = whole('--seed', 0);
  if (Number.isNaN(seed)) return wrong('--seed needs a whole number of 0 or more');
  const workers = whole('--workers', 1);
  if (workers !== null && !(workers <= 256)) return wrong('--workers needs a whole number from 1 to 256');
  const replicates = readRange(values.get('--replicates'));
  if (typeof replicates === 'string') return wrong(replicates);
  return {
    kind: 'analyse',
    project: paths[0],
    out,
    realisations,
    seed,
    workers,
    replicates,
    everyRealisation,
    quiet,
  };
}

function readRange(text: string | undefined): readonly [number, number] | null | string {
  if (text === undefined) return null;
  const match = /^(\d{1,6})-(\d{1,6})$/.exec(text);
  if (match === null) return '--replicates needs a range such as 0-24';
  const [first, last] = [Number(match[1]), Number(match[2])];
  return first <= last ? [first, last] : '--replicates needs a range that rises';
}

function wrong(sentence: string): Command {
  return { kind: 'wrong', sentence };
}
