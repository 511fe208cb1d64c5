import { horizontalCorrelation } from './horizontalCorrelation.ts';

/** The different positions of the points along the section, and which of them each point has. */
export interface Sites {
  /** Rising, each once, m. */
  readonly x: readonly number[];
  /** Place in `x` of each point, in the model's order. */
  readonly ofPoint: readonly number[];
}

/** Sites of points at the given positions; points at one x share a site, and so their ground. */
export function sitesAt(positions: readonly number[]): Sites {
  const x = [...new Set(positions)].sort((a, b) => a - b);
  return { x, ofPoint: positions.map((position) => x.indexOf(position)) };
}

/**
 * Turns columns that are independent from site to site into columns w that are correlated between sites by
 * exp(−2|Δx|/θh): w = L ε with L the lower-triangular Cholesky factor over the sites in order of x. For this
 * correlation, which has no memory beyond the neighbour, it is the recursion
 *
 *     w_1 = ε_1,   w_i = ρ_i w_(i−1) + √(1 − ρ_i²) ε_i,   ρ_i = exp(−2 (x_i − x_(i−1))/θh)
 *
 * @param independent ε: a column of standard normal scores for each site, all realisations of a replicate
 * @param sites positions, rising, m; as many as columns
 * @param scale horizontal scale of fluctuation θh, m, above 0
 * @returns w: a column for each site
 * @throws RangeError when there are not as many sites as columns
 */
export function variationAlongSection(
  independent: readonly Float64Array[],
  sites: readonly number[],
  scale: number,
): Float64Array[] {
  if (!(independent.length === sites.length)) {
    throw new RangeError(`variationAlongSection: sites must be ${independent.length}, got ${sites.length}`);
  }
  const varied: Float64Array[] = [];
  independent.forEach((own, i) => {
    if (i === 0) return void varied.push(Float64Array.from(own));
    const carried = horizontalCorrelation(sites[i] - sites[i - 1], scale);
    const fresh = Math.sqrt(1 - carried * carried);
    const before = varied[i - 1];
    varied.push(own.map((score, r) => carried * before[r] + fresh * score));
  });
  return varied;
}
