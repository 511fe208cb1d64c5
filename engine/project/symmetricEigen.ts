const MOST_SWEEPS = 50;

export interface SymmetricEigen {
  readonly values: Float64Array;
  /** vectors[i][k] is component i of the vector of value k. */
  readonly vectors: readonly Float64Array[];
}

/**
 * Eigenvalues and orthonormal eigenvectors of a symmetric matrix by cyclic Jacobi rotations (Golub & Van
 * Loan 1996, section 8.4), until what is left beside the diagonal is below 1e-14 of the whole.
 */
export function symmetricEigen(matrix: readonly ArrayLike<number>[]): SymmetricEigen {
  const size = matrix.length;
  const a = matrix.map((row) => Float64Array.from(row));
  const vectors = matrix.map((_, i) => Float64Array.from({ length: size }, (_, j) => (i === j ? 1 : 0)));
  const scale = a.reduce((sum, row) => row.reduce((part, value) => part + value * value, sum), 0);
  for (let sweep = 0; sweep < MOST_SWEEPS; sweep += 1) {
    let beside = 0;
    for (let p = 0; p < size; p += 1) for (let q = p + 1; q < size; q += 1) beside += a[p][q] * a[p][q];
    if (beside <= 1e-28 * scale) break;
    for (let p = 0; p < size; p += 1) for (let q = p + 1; q < size; q += 1) rotate(a, vectors, p, q);
  }
  return { values: Float64Array.from(a, (row, i) => row[i]), vectors };
}

/** One rotation that makes a[p][q] zero. */
function rotate(a: Float64Array[], vectors: Float64Array[], p: number, q: number): void {
  if (a[p][q] === 0) return;
  const theta = (a[q][q] - a[p][p]) / (2 * a[p][q]);
  const t = (theta < 0 ? -1 : 1) / (Math.abs(theta) + Math.sqrt(1 + theta * theta));
  const c = 1 / Math.sqrt(1 + t * t);
  const s = t * c;
  for (let k = 0; k < a.length; k += 1) {
    const [kp, kq] = [a[k][p], a[k][q]];
    a[k][p] = c * kp - s * kq;
    a[k][q] = s * kp + c * kq;
  }
  for (let k = 0; k < a.length; k += 1) {
    const [pk, qk] = [a[p][k], a[q][k]];
    a[p][k] = c * pk - s * qk;
    a[q][k] = s * pk + c * qk;
  }
  for (const row of vectors) {
    const [kp, kq] = [row[p], row[q]];
    row[p] = c * kp - s * kq;
    row[q] = s * kp + c * kq;
  }
}
