import { describe, expect, it } from 'vitest';
import { checkProject } from '../../../engine/project/checkProject.ts';
import {
  correlationOfScores,
  firstBreakingPair,
  isPositiveDefinite,
  linkedTo,
} from '../../../engine/project/correlationMatrix.ts';
import {
  nearestCorrelationMatrix,
  nearestRankCorrelations,
} from '../../../engine/project/nearestCorrelation.ts';
import { symmetricEigen } from '../../../engine/project/symmetricEigen.ts';
import { plainProject } from './plainProject.ts';

const pair = (first: number, second: number, rank: number) => ({ first, second, rank });

describe('the matrix of the scores', () => {
  it('has 2 sin(πρ/6) for a rank correlation ρ', () => {
    const { inputs, matrix } = correlationOfScores([pair(4, 2, 0.5), pair(2, 7, -1 / 3)]);
    expect(inputs).toEqual([4, 2, 7]);
    expect(matrix[0][1]).toBeCloseTo(2 * Math.sin(Math.PI / 12), 14);
    expect(matrix[2][1]).toBeCloseTo(-2 * Math.sin(Math.PI / 18), 14);
    expect(matrix[0][2]).toBe(0);
  });

  it('is positive definite exactly where its determinant says so, for three inputs', () => {
    for (let a = -0.95; a < 1; a += 0.19) {
      for (let b = -0.95; b < 1; b += 0.19) {
        const determinant = 1 + 2 * a * b * 0.6 - a * a - b * b - 0.36;
        if (Math.abs(determinant) < 1e-6) continue;
        const matrix = [
          [1, a, b],
          [a, 1, 0.6],
          [b, 0.6, 1],
        ];
        expect(isPositiveDefinite(matrix)).toBe(determinant > 0);
      }
    }
  });
});

describe('the pair that breaks a matrix', () => {
  it('is the first whose addition does so', () => {
    const list = [pair(5, 6, 0.2), pair(0, 1, 0.9), pair(1, 2, 0.9), pair(0, 2, 0.1), pair(3, 4, 0.5)];
    expect(firstBreakingPair(list)).toBe(2);
    expect(firstBreakingPair([pair(0, 1, 0.6), pair(1, 2, 0.6), pair(0, 2, -0.9)])).toBe(2);
  });

  it('is none in a matrix that is right', () => {
    expect(firstBreakingPair([pair(0, 1, 0.7), pair(1, 2, 0.5), pair(0, 2, 0.4)])).toBe(-1);
  });

  it('is offered with those that hang together with it', () => {
    const list = [pair(5, 6, 0.2), pair(0, 1, 0.9), pair(6, 7, 0.1), pair(1, 2, 0.9)];
    expect(linkedTo(list, 3)).toEqual([pair(0, 1, 0.9), pair(1, 2, 0.9)]);
  });
});

describe('the eigenvalues of a symmetric matrix', () => {
  it('and their vectors give the matrix back', () => {
    const matrix = Array.from({ length: 7 }, (_, i) =>
      Array.from({ length: 7 }, (_, j) => Math.cos(i * j + i + j)),
    );
    const { values, vectors } = symmetricEigen(matrix);
    matrix.forEach((row, i) =>
      row.forEach((value, j) => {
        const sum = values.reduce(
          (part, eigenvalue, k) => part + eigenvalue * vectors[i][k] * vectors[j][k],
          0,
        );
        expect(sum).toBeCloseTo(value, 12);
      }),
    );
  });
});

describe('the nearest correlation matrix', () => {
  // Higham (2002), section 4: [1 1 0; 1 1 1; 0 1 1] → 1, 0.7607, 0.1573, printed to four digits (value from memory)
  it('is that of the published example', () => {
    const nearest = nearestCorrelationMatrix(
      [
        [1, 1, 0],
        [1, 1, 1],
        [0, 1, 1],
      ],
      0,
    );
    expect(nearest[0][1]).toBeCloseTo(0.7607, 4);
    expect(nearest[1][2]).toBeCloseTo(0.7607, 4);
    expect(nearest[0][2]).toBeCloseTo(0.1573, 4);
  });

  it('is the matrix itself where that is right already', () => {
    const matrix = [
      [1, 0.5, 0.2],
      [0.5, 1, 0.3],
      [0.2, 0.3, 1],
    ];
    expect(nearestCorrelationMatrix(matrix, 0).map((row) => [...row])).toEqual(
      matrix.map((row) => row.map((value) => expect.closeTo(value, 12))),
    );
  });

  it('is nearer than any other right matrix of three inputs on a fine grid', () => {
    const wanted = [0.9, 0.9, 0.1];
    const distance = ([a, b, c]: number[]) =>
      (a - wanted[0]) ** 2 + (b - wanted[1]) ** 2 + (c - wanted[2]) ** 2;
    const nearest = nearestCorrelationMatrix(
      [
        [1, 0.9, 0.1],
        [0.9, 1, 0.9],
        [0.1, 0.9, 1],
      ],
      0,
    );
    const found = distance([nearest[0][1], nearest[1][2], nearest[0][2]]);
    let best = Infinity;
    for (let a = -1; a <= 1; a += 0.02) {
      for (let b = -1; b <= 1; b += 0.02) {
        for (let c = -1; c <= 1; c += 0.02) {
          if (1 + 2 * a * b * c - a * a - b * b - c * c >= 0) best = Math.min(best, distance([a, b, c]));
        }
      }
    }
    expect(found).toBeLessThanOrEqual(best + 1e-9);
  });

  it('is offered to two decimals, and then passes', () => {
    const list = [pair(0, 1, 0.9), pair(1, 2, 0.9), pair(0, 2, -0.5), pair(2, 3, 0.8), pair(3, 0, 0.6)];
    const offered = nearestRankCorrelations(list)!;
    expect(firstBreakingPair(offered)).toBe(-1);
    for (const { rank } of offered) expect(Math.round(rank * 100) / 100).toBe(rank);
  });
});

describe('rank correlations of a project', () => {
  const withCorrelations = (...correlations: [string, string, number][]) => {
    const project = plainProject();
    project.rank_correlations = correlations.map(([first, second, rank]) => ({
      between: [`soil/clay/${first}`, `soil/clay/${second}`],
      rank_correlation: rank,
    }));
    return checkProject(JSON.stringify(project));
  };
  const [cc, e0, cv] = ['compression_index', 'initial_void_ratio', 'cv'];

  it('are refused with the pair that breaks the matrix, and what could be', () => {
    const checked = withCorrelations([cc, e0, 0.9], [e0, cv, 0.9], [cc, cv, -0.6]);
    if (checked.ok) throw new Error('it was accepted');
    expect(checked.faults).toHaveLength(1);
    expect(checked.faults[0].pointer).toBe('/rank_correlations/1');
    const offered = [
      ...checked.faults[0].right.matchAll(/soil\/clay\/(\w+) with soil\/clay\/(\w+) (-?[\d.]+)/g),
    ];
    expect(offered.length).toBeGreaterThanOrEqual(2);
    const again = withCorrelations(
      ...offered.map(([, a, b, rank]): [string, string, number] => [a, b, Number(rank)]),
    );
    expect(again.ok).toBe(true);
  });

  it('are refused for an input that is fixed, one that is not there, one twice and a pair twice', () => {
    for (const list of [
      [[cc, 'unit_weight', 0.3]],
      [[cc, 'initial_void_rato', 0.3]],
      [[cc, cc, 0.3]],
      [
        [cc, e0, 0.3],
        [e0, cc, 0.3],
      ],
      [[cc, e0, 1]],
    ] as [string, string, number][][]) {
      const checked = withCorrelations(...list);
      expect(checked.ok ? 0 : checked.faults.length).toBe(1);
    }
  });
});
