import { describe, it, expect } from 'vitest';
import { Decimal } from 'decimal.js';
import { atan, cos, exp, exp10, ln, log10, pow, sin } from '../../engine/elementary.ts';
import { randomStream } from '../../engine/random/randomStream.ts';
import { trialSize } from './trialSize.ts';
import {
  atanTwo,
  exp10Two,
  expTwo,
  lnTwo,
  log10Two,
  plus,
  powTwo,
  sinCosTwo,
  unitsInLastPlace,
  type Two,
} from './twoPartReference.ts';

const ARGUMENTS = trialSize(1_000_000);
/** decimal.js takes a tenth of a millisecond and more for each. */
const IN_DECIMAL = trialSize(20_000);
const SEED = 754;

const Long = Decimal.clone({ precision: 60 });

/** All binary digits of a number: decimal.js by itself takes the shortest text that reads back as it. */
function inFull(value: number): Decimal {
  const exponent = value === 0 ? 0 : Math.max(-1022, Math.floor(Math.log2(Math.abs(value)))) - 52;
  const half = Math.trunc(exponent / 2);
  const whole = value / 2 ** half / 2 ** (exponent - half);
  if (!Number.isSafeInteger(whole)) throw new Error(`no whole mantissa in ${value}`);
  return new Long(2).pow(exponent).times(whole);
}

interface Case {
  readonly name: string;
  readonly ours: (x: number) => number;
  readonly exact: (x: number) => Two;
  readonly decimal: (x: number) => Decimal;
  /** An argument from two uniform numbers: of them the second chooses the range. */
  readonly argument: (u: number, v: number) => number;
}

const between = (u: number, low: number, high: number) => low + u * (high - low);
/** A positive number of random size and random digits. */
const ofAnySize = (u: number, v: number, bits: number) => (1 + u) * 2 ** Math.floor(between(v, -bits, bits));

const cases: readonly Case[] = [
  {
    name: 'exp',
    ours: exp,
    exact: (x) => expTwo([x, 0]),
    decimal: (x) => inFull(x).exp(),
    argument: (u, v) => (v < 0.3 ? between(u, -1, 1) : v < 0.7 ? between(u, -40, 40) : between(u, -660, 709)),
  },
  {
    name: 'ln',
    ours: ln,
    exact: lnTwo,
    decimal: (x) => inFull(x).ln(),
    argument: (u, v) =>
      v < 0.2
        ? between(u, 0.99, 1.01)
        : v < 0.4
          ? between(u, 0.5, 2)
          : ofAnySize(u, (v - 0.4) / 0.6, v < 0.7 ? 12 : 900),
  },
  {
    name: 'log10',
    ours: log10,
    exact: log10Two,
    decimal: (x) => inFull(x).log(10),
    argument: (u, v) => (v < 0.3 ? between(u, 0.5, 2) : ofAnySize(u, (v - 0.3) / 0.7, v < 0.7 ? 12 : 900)),
  },
  {
    name: 'exp10',
    ours: exp10,
    exact: exp10Two,
    decimal: (x) => new Long(10).pow(inFull(x)),
    argument: (u, v) => (v < 0.5 ? between(u, -3, 3) : between(u, -285, 308)),
  },
  {
    name: 'pow with the exponent 2.3',
    ours: (x) => pow(x, 2.3),
    exact: (x) => powTwo(x, 2.3),
    decimal: (x) => inFull(x).pow(inFull(2.3)),
    argument: (u, v) => (v < 0.5 ? between(u, 0.01, 10) : ofAnySize(u, 2 * v - 1, 400)),
  },
  {
    name: 'pow near 1 with the exponent −54,321.7',
    ours: (x) => pow(x, -54321.7),
    exact: (x) => powTwo(x, -54321.7),
    decimal: (x) => inFull(x).pow(inFull(-54321.7)),
    argument: (u) => between(u, 0.988, 1.012),
  },
  {
    name: 'atan',
    ours: atan,
    exact: atanTwo,
    decimal: (x) => inFull(x).atan(),
    argument: (u, v) =>
      v < 0.6 ? between(u, -3, 3) : (u < 0.5 ? -1 : 1) * ofAnySize(u, (v - 0.6) / 0.4, 40),
  },
  {
    name: 'sin',
    ours: sin,
    exact: (x) => sinCosTwo([x, 0])[0],
    decimal: (x) => inFull(x).sin(),
    argument: (u, v) => nearMultiple(u, v, Math.PI),
  },
  {
    name: 'cos',
    ours: cos,
    exact: (x) => sinCosTwo([x, 0])[1],
    decimal: (x) => inFull(x).cos(),
    argument: (u, v) => nearMultiple(u, v, Math.PI) + (v > 0.9 ? Math.PI / 2 : 0),
  },
];

/** Small, up to 99,990, or next to a zero of the sine. */
function nearMultiple(u: number, v: number, step: number): number {
  if (v < 0.4) return between(u, -4, 4);
  return v < 0.9 ? between(u, -99_990, 99_990) : (1 + Math.floor(u * 31_000)) * step;
}

describe(`elementary functions over ${ARGUMENTS} arguments each`, () => {
  for (const { name, ours, exact, argument } of cases) {
    it(
      `${name} stays within 1 unit in the last place of a slow sum in twice the digits`,
      { timeout: 120_000 },
      () => {
        const stream = randomStream(SEED, name);
        let worst = 0;
        let at = NaN;
        for (let i = 0; i < ARGUMENTS; i += 1) {
          const x = argument(stream.next(), stream.next());
          const away = unitsInLastPlace(ours(x), exact(x));
          if (!(away <= worst)) [worst, at] = [away, x];
        }
        expect(worst, `at ${at}`).toBeLessThan(1);
      },
    );
  }
});

describe(`elementary functions and their yardstick over ${IN_DECIMAL} arguments each`, () => {
  for (const { name, ours, exact, decimal, argument } of cases) {
    it(
      `${name} stays within 1 unit in the last place of decimal.js, and the slow sum within 1e-22`,
      { timeout: 120_000 },
      () => {
        const stream = randomStream(SEED + 1, name);
        let worst = 0;
        let worstOfSlow = 0;
        for (let i = 0; i < IN_DECIMAL; i += 1) {
          const x = argument(stream.next(), stream.next());
          const digits = decimal(x);
          const high = digits.toNumber();
          const asTwo: Two = [high, digits.minus(inFull(high)).toNumber()];
          const slow = exact(x);
          const apart = plus(slow, [-asTwo[0], -asTwo[1]]);
          worst = Math.max(worst, unitsInLastPlace(ours(x), asTwo));
          worstOfSlow = Math.max(worstOfSlow, Math.abs((apart[0] + apart[1]) / high));
        }
        expect(worst).toBeLessThan(1);
        expect(worstOfSlow).toBeLessThan(1e-22);
      },
    );
  }
});
