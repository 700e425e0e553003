import type { Complex } from 'complex.js';

/**
 * Solves A·x = b by Gaussian elimination with partial pivoting. A nodal matrix has a dozen rows at most; a matrix
 * library would weigh more than the whole page.
 *
 * @param a n rows of n; not changed
 * @param b n
 * @throws RangeError when the matrix is singular
 */
export function solveLinear(a: readonly (readonly Complex[])[], b: readonly Complex[]): Complex[] {
  const n = b.length;
  const rows = a.map((row, k) => [...row, b[k]!]);
  for (let column = 0; column < n; column += 1) {
    let pivot = column;
    for (let row = column + 1; row < n; row += 1) {
      if (rows[row]![column]!.abs() > rows[pivot]![column]!.abs()) pivot = row;
    }
    [rows[column], rows[pivot]] = [rows[pivot]!, rows[column]!];
    const head = rows[column]!;
    if (head[column]!.abs() === 0)
      throw new RangeError('solveLinear: the matrix is singular; check for a floating node');
    for (let row = column + 1; row < n; row += 1) {
      const factor = rows[row]![column]!.div(head[column]!);
      for (let k = column; k <= n; k += 1) rows[row]![k] = rows[row]![k]!.sub(factor.mul(head[k]!));
    }
  }
  const x = new Array<Complex>(n);
  for (let row = n - 1; row >= 0; row -= 1) {
    let sum = rows[row]![n]!;
    for (let k = row + 1; k < n; k += 1) sum = sum.sub(rows[row]![k]!.mul(x[k]!));
    x[row] = sum.div(rows[row]![row]!);
  }
  return x;
}
