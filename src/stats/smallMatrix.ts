/** Square matrices of a few rows, as arrays of rows. */
export type Matrix = number[][];

export function zeros(size: number): Matrix {
  return Array.from({ length: size }, () => new Array<number>(size).fill(0));
}

/** Adds factor · v v′ to the matrix. */
export function addOuter(matrix: Matrix, v: readonly number[], factor: number): void {
  v.forEach((x, i) => {
    const row = matrix[i] as number[];
    v.forEach((y, j) => {
      row[j] = (row[j] as number) + factor * x * y;
    });
  });
}

export function addScaled(matrix: Matrix, other: Matrix, factor: number): void {
  matrix.forEach((row, i) => {
    row.forEach((value, j) => {
      row[j] = value + factor * ((other[i] as number[])[j] as number);
    });
  });
}

export function times(matrix: Matrix, v: readonly number[]): number[] {
  return matrix.map((row) => row.reduce((sum, value, j) => sum + value * (v[j] as number), 0));
}

export function dot(a: readonly number[], b: readonly number[]): number {
  return a.reduce((sum, value, i) => sum + value * (b[i] as number), 0);
}

/** Sum of the products of all entries: the trace of a b for symmetric matrices. */
export function traceOfProduct(a: Matrix, b: Matrix): number {
  return a.reduce((sum, row, i) => sum + dot(row, b[i] as number[]), 0);
}

/** Inverse and ln of the determinant of a positive definite matrix by Cholesky; undefined where it is not (nearly) one. */
export function invert(matrix: Matrix): { inverse: Matrix; logDeterminant: number } | undefined {
  const size = matrix.length;
  const lower = zeros(size);
  const at = (m: Matrix, i: number, j: number): number => (m[i] as number[])[j] as number;
  let logDeterminant = 0;
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = at(matrix, i, j);
      for (let k = 0; k < j; k++) sum -= at(lower, i, k) * at(lower, j, k);
      if (i === j) {
        if (!(sum > 1e-12 * at(matrix, i, i))) return undefined;
        logDeterminant += Math.log(sum);
        (lower[i] as number[])[i] = Math.sqrt(sum);
      } else (lower[i] as number[])[j] = sum / at(lower, j, j);
    }
  }
  const inverse = zeros(size);
  for (let column = 0; column < size; column++) {
    const x = new Array<number>(size).fill(0);
    for (let i = 0; i < size; i++) {
      let sum = i === column ? 1 : 0;
      for (let k = 0; k < i; k++) sum -= at(lower, i, k) * (x[k] as number);
      x[i] = sum / at(lower, i, i);
    }
    for (let i = size - 1; i >= 0; i--) {
      let sum = x[i] as number;
      for (let k = i + 1; k < size; k++) sum -= at(lower, k, i) * (x[k] as number);
      x[i] = sum / at(lower, i, i);
    }
    x.forEach((value, i) => {
      (inverse[i] as number[])[column] = value;
    });
  }
  return { inverse, logDeterminant };
}
