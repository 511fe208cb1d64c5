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
  while (right < cumulative.length - 1 && cumulative[right] < p) right += 1;
  const rise = cumulative[right] - cumulative[right - 1];
  const share = rise > 0 ? (p - cumulative[right - 1]) / rise : 0;
  return values[right - 1] + Math.max(0, Math.min(1, share)) * (values[right] - values[right - 1]);
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

/** Each stretch is uniform: its mean is its middle, its mean square (a² + ab + b²)/3. */
export function tableMoments({ values, cumulative }: CumulativeTable): {
  readonly mean: number;
  readonly deviation: number;
} {
  let mean = 0;
  let square = 0;
  for (let i = 1; i < values.length; i += 1) {
    const share = cumulative[i] - cumulative[i - 1];
    const [a, b] = [values[i - 1], values[i]];
    mean += (share * (a + b)) / 2;
    square += (share * (a * a + a * b + b * b)) / 3;
  }
  return { mean, deviation: Math.sqrt(Math.max(0, square - mean * mean)) };
}
