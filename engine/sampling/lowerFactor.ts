/**
 * Lower-triangular Cholesky factor P of a correlation matrix C = P P', row by row: a row depends on the rows
 * before it alone.
 *
 * @param matrix symmetric and positive definite, its diagonal 1
 * @returns row i, of i + 1 entries
 * @throws RangeError when the matrix is not positive definite
 */
export function lowerFactor(matrix: readonly ArrayLike<number>[]): Float64Array[] {
  const factor: Float64Array[] = [];
  matrix.forEach((wanted, i) => {
    const row = new Float64Array(i + 1);
    for (let j = 0; j <= i; j++) {
      let rest = wanted[j];
      for (let k = 0; k < j; k++) rest -= row[k] * (j === i ? row[k] : factor[j][k]);
      if (j < i) row[j] = rest / factor[j][j];
      else if (rest > 0) row[i] = Math.sqrt(rest);
      else
        throw new RangeError(
          `lowerFactor: matrix must be positive definite, got a pivot of ${rest} in row ${i}`,
        );
    }
    factor.push(row);
  });
  return factor;
}
