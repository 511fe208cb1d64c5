import { describe, it, expect } from 'vitest';
import { mean as meanOf, sampleRankCorrelation } from 'simple-statistics';
import { quantile } from '../../../engine/marginals/marginal.ts';
import { randomStream } from '../../../engine/random/randomStream.ts';
import { drawGround } from '../../../engine/sampling/drawGround.ts';
import { latinHypercube } from '../../../engine/sampling/latinHypercube.ts';
import { varianceReduction } from '../../../engine/sampling/varianceReduction.ts';
import {
  lognormalMarginal,
  tableMarginal,
  triangularMarginal,
  uniformMarginal,
} from './inventedMarginals.ts';
import { evenThickness, fixedNumber, inventedModel, type InventedInput } from './inventedModel.ts';

const SPREAD = { share: 0.6, verticalScale: 1.5, horizontalScale: 40 };
const index: InventedInput = { name: 'index', marginal: lognormalMarginal(0.9, 0.3), spread: SPREAD };
const ratio: InventedInput = { name: 'void ratio', marginal: lognormalMarginal(1.8, 0.15), spread: SPREAD };
const weight: InventedInput = { name: 'weight', marginal: uniformMarginal(14, 17) };
const ocr: InventedInput = {
  name: 'ocr',
  marginal: triangularMarginal(1, 1.3, 2.4),
  spread: { ...SPREAD, horizontalScale: 90 },
};
const late: InventedInput = { name: 'late', marginal: lognormalMarginal(1, 0.5), spread: SPREAD };

const X = [0, 25, 60];
const TIED = [
  ['index', 'void ratio', 0.7],
  ['ocr', 'index', -0.4],
] as const;

describe('drawGround, its streams', () => {
  it('gives an input without spread or correlation the quantiles of its own hypercube column', () => {
    const model = inventedModel({ inputs: [index, weight], x: X, seed: 5 });
    const ground = drawGround(model, 7);
    const column = latinHypercube(randomStream(5, 'z', 'weight', 7), 100);
    expect(ground.inputs[1]).toEqual({
      varies: false,
      values: column.map((p) => quantile(weight.marginal, p)),
    });
  });

  it('leaves the values of all others as they were when an input is added, tied last or not at all', () => {
    const before = drawGround(
      inventedModel({ inputs: [index, ratio, weight, ocr], correlations: TIED, x: X }),
      3,
    );
    const after = drawGround(
      inventedModel({
        inputs: [index, ratio, weight, ocr, { ...weight, name: 'free' }, late],
        correlations: [...TIED, ['late', 'void ratio', 0.5], ['late', 'weight', 0]],
        x: X,
      }),
      3,
    );
    for (const place of [0, 1, 3]) expect(after.inputs[place]).toEqual(before.inputs[place]);
    const free = inventedModel({
      inputs: [{ ...weight, name: 'free' }, ratio, weight, ocr, index],
      correlations: TIED,
      x: X,
    });
    const moved = drawGround(free, 3);
    [4, 1, 2, 3].forEach((place, i) => expect(moved.inputs[place]).toEqual(before.inputs[i]));
  });

  it('leaves the others as they were when a tied input starts to vary from place to place', () => {
    const level = { ...index, spread: undefined };
    const inputs = [ratio, ocr];
    const steady = drawGround(inventedModel({ inputs: [level, ...inputs], correlations: TIED, x: X }), 0);
    const varying = drawGround(inventedModel({ inputs: [index, ...inputs], correlations: TIED, x: X }), 0);
    for (const place of [1, 2]) expect(varying.inputs[place]).toEqual(steady.inputs[place]);
    expect(varying.inputs[0]).not.toEqual(steady.inputs[0]);
  });

  it('gives a replicate the same bytes in any order, and in another copy of the model', () => {
    const invented = { inputs: [index, ratio, weight, ocr], correlations: TIED, x: X };
    const one = inventedModel(invented);
    const rising = [0, 1, 2].map((replicate) => drawGround(one, replicate));
    const copy = structuredClone(inventedModel(invented));
    const falling = [2, 1, 0].map((replicate) => drawGround(copy, replicate)).reverse();
    expect(falling).toEqual(rising);
    expect(rising[1].inputs[0]).not.toEqual(rising[0].inputs[0]);
  });

  it('changes with the seed', () => {
    const one = drawGround(inventedModel({ inputs: [weight], seed: 1 }), 0);
    const two = drawGround(inventedModel({ inputs: [weight], seed: 2 }), 0);
    expect(two.inputs[0]).not.toEqual(one.inputs[0]);
  });

  it('refuses a replicate or a count that is not a whole number', () => {
    const model = inventedModel({ inputs: [weight] });
    for (const replicate of [-1, 0.5, NaN]) expect(() => drawGround(model, replicate)).toThrow(RangeError);
    for (const count of [0, 1.5, NaN]) expect(() => drawGround(model, 0, count)).toThrow(RangeError);
  });
});

describe('drawGround, variation from place to place', () => {
  it('gives points at one x the same ground', () => {
    const values = drawGround(inventedModel({ inputs: [index], x: [8, 0, 8] }), 0).inputs[0].values;
    expect(values.slice(200, 300)).toEqual(values.slice(0, 100));
    expect(values.slice(100, 200)).not.toEqual(values.slice(0, 100));
  });

  it('changes nothing when a layer is cut in two', () => {
    const whole = inventedModel({ inputs: [index], x: X, layers: [evenThickness(6)] });
    const cut = inventedModel({ inputs: [index], x: X, layers: [evenThickness(2), evenThickness(4)] });
    expect(drawGround(cut, 0)).toEqual(drawGround(whole, 0));
  });

  it('averages over the mean of the thicknesses at the points', () => {
    const borings = { x: [0, 60], thickness: [0, 12] };
    const sloping = inventedModel({
      inputs: [index],
      x: [0, 30, 60],
      layers: [{ kind: 'borings', ...borings, factor: fixedNumber(1) }],
    });
    const even = inventedModel({ inputs: [index], x: [0, 30, 60], layers: [evenThickness(6)] });
    expect(drawGround(sloping, 0)).toEqual(drawGround(even, 0));
  });

  it('averages nothing where there is no thickness, or no vertical scale', () => {
    const none = inventedModel({ inputs: [index], x: X, layers: [evenThickness(0)] });
    const spread = { ...SPREAD, verticalScale: null };
    const noScale = inventedModel({ inputs: [{ ...index, spread }], x: X });
    expect(drawGround(none, 0)).toEqual(drawGround(noScale, 0));
  });

  it('refuses a vertical scale on a number that belongs to no soil', () => {
    const inputs = Array.from({ length: 9 }, (_, i): InventedInput => ({ ...index, name: `input ${i}` }));
    expect(() => drawGround(inventedModel({ inputs }), 0)).toThrow(RangeError);
  });

  it('has the stated variance, and the stated covariances between points and between parameters', () => {
    const replicates = 200;
    const model = inventedModel({
      inputs: [index, ocrLike()],
      correlations: [['index', 'ocr', 0.6]],
      x: X,
    });
    const columns = new Map<string, number[]>();
    for (let replicate = 0; replicate < replicates; replicate++) {
      const ground = drawGround(model, replicate);
      ground.inputs.forEach(({ values }, input) =>
        X.forEach((_, point) => {
          const key = `${input} ${point}`;
          const scores = Array.from(values.slice(point * 100, (point + 1) * 100), (value) => Math.log(value));
          columns.set(key, [...(columns.get(key) ?? []), ...scores]);
        }),
      );
    }
    const deviation = (input: number) => Math.sqrt(Math.log(1 + (input === 0 ? 0.3 : 0.2) ** 2));
    const covariance = (a: string, b: string): number => {
      const [u, v] = [columns.get(a)!, columns.get(b)!];
      const [mu, mv] = [meanOf(u), meanOf(v)];
      const sum = u.reduce((total, value, i) => total + (value - mu) * (v[i] - mv), 0);
      return sum / u.length / (deviation(Number(a[0])) * deviation(Number(b[0])));
    };
    const reduction = varianceReduction(6, 1.5);
    const total = 0.4 + 0.6 * reduction;
    const along = (distance: number, scale: number) =>
      0.4 + 0.6 * reduction * Math.exp((-2 * distance) / scale);
    // Five standard errors of a covariance of 20,000 pairs, of variances below 1: √((1 + ρ²)/N) at most.
    const tolerance = 5 * total * Math.sqrt(2 / (100 * replicates));
    const near = (found: number, wanted: number) => expect(Math.abs(found - wanted)).toBeLessThan(tolerance);
    near(covariance('0 0', '0 0'), total);
    near(covariance('1 2', '1 2'), total);
    near(covariance('0 0', '0 1'), along(25, 40));
    near(covariance('0 1', '0 2'), along(35, 40));
    near(covariance('0 0', '0 2'), along(60, 40));
    near(covariance('1 0', '1 2'), along(60, 90));
    // Between parameters at the first point: the linear correlation of the scores of a rank correlation of 0.6.
    near(covariance('0 0', '1 0'), 2 * Math.sin((Math.PI * 0.6) / 6) * total);
  });

  it('keeps the mean of the marginal where it is to, and lies nearer the median where not', () => {
    const marginal = lognormalMarginal(1, 0.6);
    const spread = { share: 1, verticalScale: 0.5, horizontalScale: 40 };
    const kept = pooled({ name: 'kept', marginal, spread, keepsMean: true });
    const free = pooled({ name: 'free', marginal, spread, keepsMean: false });
    const variance = varianceReduction(6, 0.5);
    const logVariance = Math.log(1 + 0.36);
    const error = 5 * Math.sqrt((Math.exp(logVariance * variance) - 1) / free.length);
    expect(Math.abs(meanOf(kept) - 1)).toBeLessThan(error);
    // exp(μ + σ² s²/2) with μ = −σ²/2.
    expect(Math.abs(meanOf(free) - Math.exp((-logVariance * (1 - variance)) / 2))).toBeLessThan(error);
    expect(1 - meanOf(free)).toBeGreaterThan(0.05);
  });

  it('cuts a bounded marginal at its limits again, and counts the values', () => {
    // Mostly near 1, else from 5 to 6: averaging lowers the mean, and the ratio carries values near 6 past it.
    const marginal = tableMarginal([1, 1.1, 5, 6], [0, 0.7, 0.72, 1]);
    const spread = { share: 0.5, verticalScale: 3, horizontalScale: 40 };
    const model = inventedModel({ inputs: [{ name: 'ocr', marginal, spread }], x: X });
    let cut = 0;
    let atLimit = 0;
    for (let replicate = 0; replicate < 20; replicate++) {
      const ground = drawGround(model, replicate);
      cut += ground.cutAtLimits;
      ground.inputs[0].values.forEach((value) => {
        expect(value >= 1 && value <= 6).toBe(true);
        if (value === 1 || value === 6) atLimit += 1;
      });
    }
    expect(cut).toBeGreaterThan(0);
    expect(cut).toBe(atLimit);
  });
});

describe('drawGround, dependence', () => {
  it('reaches the stated rank correlations of inputs without spread', () => {
    const level = (input: InventedInput): InventedInput => ({ ...input, spread: undefined });
    const model = inventedModel({
      inputs: [level(index), level(ratio), weight, level(ocr)],
      correlations: TIED,
    });
    const found: number[][] = [[], [], []];
    for (let replicate = 0; replicate < 100; replicate++) {
      const columns = drawGround(model, replicate).inputs.map(({ values }) => Array.from(values));
      found[0].push(sampleRankCorrelation(columns[0], columns[1]));
      found[1].push(sampleRankCorrelation(columns[3], columns[0]));
      found[2].push(sampleRankCorrelation(columns[1], columns[3]));
    }
    // Bias of Spearman's correlation at most 0.6/(n + 1) (Moran 1948), and four standard errors of the mean.
    const tolerance = 0.6 / 101 + 4 * Math.sqrt((1 - 9 / Math.PI ** 2) / 99 / 100);
    [0.7, -0.4, 0].forEach((wanted, i) =>
      expect(Math.abs(meanOf(found[i]) - wanted)).toBeLessThan(tolerance),
    );
  });

  it('keeps one value in each stratum of inputs that are tied', () => {
    const level = (input: InventedInput): InventedInput => ({ ...input, spread: undefined });
    const model = inventedModel({
      inputs: [level(index), level(ratio), weight],
      correlations: [['weight', 'index', 0.9]],
    });
    const strata = Array.from(drawGround(model, 4).inputs[2].values, (value) =>
      Math.floor(((value - 14) / 3) * 100),
    );
    expect(strata.sort((a, b) => a - b)).toEqual(Array.from({ length: 100 }, (_, i) => i));
  });
});

function ocrLike(): InventedInput {
  return {
    name: 'ocr',
    marginal: lognormalMarginal(2, 0.2),
    spread: { ...SPREAD, horizontalScale: 90 },
  };
}

function pooled(input: InventedInput): number[] {
  const model = inventedModel({ inputs: [input] });
  const values: number[] = [];
  for (let replicate = 0; replicate < 100; replicate++)
    values.push(...drawGround(model, replicate).inputs[0].values);
  return values;
}
