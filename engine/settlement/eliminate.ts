/**
 * Solves a symmetric tridiagonal system in place for one right side, or for two (Thomas's algorithm; stable
 * because the diagonal outweighs its neighbours).
 *
 * @param offDiagonal entry i between rows i − 1 and i
 * @param diagonal on return the inverse of each pivot
 * @param rest right side, on return the answer
 * @param second another right side, or null
 */
export function eliminate(
  offDiagonal: Float64Array,
  diagonal: Float64Array,
  rest: Float64Array,
  second: Float64Array | null,
): void {
  const cells = diagonal.length;
  let inverse = 1 / diagonal[0];
  diagonal[0] = inverse;
  for (let i = 1; i < cells; i += 1) {
    const off = offDiagonal[i];
    const factor = off * inverse;
    inverse = 1 / (diagonal[i] - factor * off);
    diagonal[i] = inverse;
    rest[i] -= factor * rest[i - 1];
    if (second !== null) second[i] -= factor * second[i - 1];
  }
  let below = 0;
  let secondBelow = 0;
  let next = 0;
  for (let i = cells - 1; i >= 0; i -= 1) {
    inverse = diagonal[i];
    below = (rest[i] - next * below) * inverse;
    rest[i] = below;
    if (second !== null) {
      secondBelow = (second[i] - next * secondBelow) * inverse;
      second[i] = secondBelow;
    }
    next = offDiagonal[i];
  }
}
