import { describe, it, expect } from 'vitest';
import { sampleCorrelation } from 'simple-statistics';
import { hashOf, randomStream, xoshiro128 } from '../../../engine/random/randomStream.ts';

/** xoshiro128** as its authors define it (Blackman & Vigna 2018), in whole numbers of any size. */
function* slowXoshiro(start: readonly bigint[]): Generator<number> {
  const s = [...start];
  const cut = (value: bigint) => value & 0xffffffffn;
  const rotated = (value: bigint, bits: bigint) => cut((value << bits) | (value >> (32n - bits)));
  for (;;) {
    yield Number(cut(rotated(cut(s[1] * 5n), 7n) * 9n));
    const t = cut(s[1] << 9n);
    s[2] ^= s[0];
    s[3] ^= s[1];
    s[1] ^= s[2];
    s[0] ^= s[3];
    s[2] ^= t;
    s[3] = rotated(s[3], 11n);
  }
}

const draws = (count: number, make: (i: number) => number) =>
  Array.from({ length: count }, (_, i) => make(i));

describe('xoshiro128**', () => {
  it('starts 11520, 0, 5927040 from the state 1, 2, 3, 4 (published test vector, value from memory)', () => {
    const { word } = xoshiro128([1, 2, 3, 4]);
    expect([word(), word(), word()]).toEqual([11520, 0, 5927040]);
  });

  it('gives the same 10,000 words as its definition from five states', () => {
    for (const state of [[1, 2, 3, 4], [0xffffffff, 0, 0, 0], hashOf('a'), hashOf('b'), hashOf('')]) {
      const [a, b, c, d] = state.map((word) => word >>> 0);
      const { word } = xoshiro128([a, b, c, d]);
      const words: number[] = [];
      const slow = slowXoshiro([a, b, c, d].map(BigInt));
      for (let i = 0; i < 10_000; i += 1) words.push(word());
      for (const fast of words) if (fast !== slow.next().value) throw new Error('a word differs');
    }
  });
});

describe('randomStream', () => {
  it('gives the same numbers for the same seed and path, and others for any change in them', () => {
    const first = (...path: (string | number)[]) => randomStream(3, ...path).next();
    expect(first('z', 'Cc', 7)).toBe(first('z', 'Cc', 7));
    const others = [
      randomStream(4, 'z', 'Cc', 7).next(),
      first('w', 'Cc', 7),
      first('z', 'Cr', 7),
      first('z', 'Cc', 8),
      first('z', 'Cc', '7'),
      first('z', 'Cc7'),
      first('zCc', 7),
      first('Cc', 'z', 7),
      first('z', 'Cc'),
    ];
    expect(new Set([...others, first('z', 'Cc', 7)]).size).toBe(others.length + 1);
  });

  it('stays above 0 and below 1', () => {
    const stream = randomStream(1, 'range');
    for (let i = 0; i < 100_000; i += 1) {
      const u = stream.next();
      if (!(u > 0 && u < 1)) throw new Error(`got ${u}`);
    }
  });

  it('refuses a seed that is not a whole number of 0 or more', () => {
    for (const seed of [-1, 0.5, NaN, 2 ** 53]) expect(() => randomStream(seed)).toThrow(RangeError);
  });

  const count = 20_000;
  const families: readonly (readonly [string, (i: number) => number])[] = [
    ['first draws of neighbouring seeds', (i) => randomStream(i, 'z').next()],
    ['first draws of neighbouring replicates', (i) => randomStream(1, 'z', 'Cc', i).next()],
    ['first draws of inputs named alike', (i) => randomStream(1, 'z', `soil ${i} Cc`, 0).next()],
    [
      'draws of one stream',
      (
        (stream) => () =>
          stream.next()
      )(randomStream(8, 'one')),
    ],
  ];
  for (const [name, make] of families) {
    it(`${name} are uniform: chi-square over 100 classes between the 0.1 % and 99.95 % points of 99`, () => {
      const classes = new Array<number>(100).fill(0);
      for (const u of draws(count, make)) classes[Math.floor(100 * u)] += 1;
      const chiSquare = classes.reduce((sum, n) => sum + (n - count / 100) ** 2 / (count / 100), 0);
      expect(chiSquare).toBeLessThan(151.9);
      expect(chiSquare).toBeGreaterThan(61.1);
    });

    it(`${name} are uncorrelated at lags of 1, 2, 3 and 100, within four standard errors`, () => {
      const list = draws(count + 100, make);
      for (const lag of [1, 2, 3, 100]) {
        const r = sampleCorrelation(list.slice(0, count), list.slice(lag, lag + count));
        expect(Math.abs(r), `lag ${lag}`).toBeLessThan(4 / Math.sqrt(count));
      }
    });
  }

  it('streams of two inputs are uncorrelated along their course', () => {
    const [a, b] = [randomStream(1, 'z', 'Cc', 0), randomStream(1, 'z', 'Cr', 0)];
    const r = sampleCorrelation(draws(count, a.next), draws(count, b.next));
    expect(Math.abs(r)).toBeLessThan(4 / Math.sqrt(count));
  });
});

describe('hashOf', () => {
  it('turns over half of all 128 bits when one letter changes, each of them by itself', () => {
    const turned = new Array<number>(128).fill(0);
    const trials = 2000;
    for (let i = 0; i < trials; i += 1) {
      const [a, b] = [hashOf(`number:${i}`), hashOf(`number:${i}\u0000`.slice(0, -1) + '!')];
      const [c, d] = [hashOf(`${i} soft clay`), hashOf(`${i} soft claz`)];
      for (let bit = 0; bit < 128; bit += 1) {
        turned[bit] +=
          (((a[bit >> 5] ^ b[bit >> 5]) >>> (bit & 31)) & 1) +
          (((c[bit >> 5] ^ d[bit >> 5]) >>> (bit & 31)) & 1);
      }
    }
    // 4000 tosses: standard error 31.6; five of them over 128 bits
    for (const times of turned) expect(Math.abs(times - trials)).toBeLessThan(158);
  });
});
