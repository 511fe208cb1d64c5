/** The next number of 1, 2, 2.5 or 5 times a power of ten that is not below a positive one. */
export function niceCeiling(value: number): number {
  if (!(value > 0) || !Number.isFinite(value)) return 1;
  const power = 10 ** Math.floor(Math.log10(value));
  const step = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10].find((factor) => factor * power >= value * (1 - 1e-9));
  return (step ?? 10) * power;
}
