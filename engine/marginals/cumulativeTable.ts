/** Distribution whose cumulative curve is straight between the points of a table. */
export interface CumulativeTable {
  readonly kind: 'table';
  readonly values: readonly number[];
  readonly cumulative: readonly number[];
}

export function makeTable(input: {
  readonly values: readonly number[];
  readonly cumulative: readonly number[];
}): CumulativeTable | string {
  const { values, cumulative } = input;
  if (values.length < 2) return 'a table needs at least two points';
  if (values.length !== cumulative.length)
    return 'values and cumulative must have as many entries as each other';
  if (![...values, ...cumulative].every(Number.isFinite)) return 'every entry must be a finite number';
  if (values.some((value, i) => i > 0 && !(value > values[i - 1]))) return 'the values must rise';
  if (cumulative.some((share, i) => i > 0 && share < cumulative[i - 1]))
    return 'the cumulative curve must not fall';
  if (cumulative[0] !== 0 || cumulative[cumulative.length - 1] !== 1) {
    return 'the cumulative curve must start at 0 and end at 1';
  }
  return { kind: 'table', values, cumulative };
}

export function tableQuantile({ values, cumulative }: CumulativeTable, p: number): number {
  let right = 1;
  // where the curve starts level, nothing lies below the end of that stretch
  while (cumulative[right] < p || cumulative[right] === 0) right += 1;
  const rise = cumulative[right] - cumulative[right - 1];
  const share = (p - cumulative[right - 1]) / rise;
  const width = values[right] - values[right - 1];
  return share < 0.5 ? values[right - 1] + share * width : values[right] - (1 - share) * width;
}

export function tableCumulative({ values, cumulative }: CumulativeTable, x: number): number {
  if (x <= values[0]) return 0;
  if (x >= values[values.length - 1]) return 1;
  let right = 1;
  while (values[right] < x) right += 1;
  const share = (x - values[right - 1]) / (values[right] - values[right - 1]);
  return cumulative[right - 1] + share * (cumulative[right] - cumulative[right - 1]);
}

export function tableDensity({ values, cumulative }: CumulativeTable, x: number): number {
  if (x < values[0] || x > values[values.length - 1]) return 0;
  let right = 1;
  while (right < values.length - 1 && values[right] < x) right += 1;
  return (cumulative[right] - cumulative[right - 1]) / (values[right] - values[right - 1]);
}

/** Each stretch is uniform: variance of its width w²/12, and its middle's distance from the mean. */
export function tableMoments({ values, cumulative }: CumulativeTable): {
  readonly mean: number;
  readonly deviation: number;
} {
  const stretches = values.slice(1).map((value, i) => ({
    share: cumulative[i + 1] - cumulative[i],
    middle: values[i] + 0.5 * (value - values[i]),
    width: value - values[i],
  }));
  const mean = stretches.reduce((sum, { share, middle }) => sum + share * middle, 0);
  const variance = stretches.reduce(
    (sum, { share, middle, width }) =>
      sum + share * ((width * width) / 12 + (middle - mean) * (middle - mean)),
    0,
  );
  return { mean, deviation: Math.sqrt(variance) };
}
