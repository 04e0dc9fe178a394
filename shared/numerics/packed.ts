/**
 * Symmetric matrices kept as one triangle: row i holds the columns 0 … i, so element (i, j ≤ i) stands at
 * i(i+1)/2 + j and every row is contiguous. Complex matrices are two such arrays. All routines work in place
 * and allocate nothing.
 */

/** Position of the first element of row i. */
export function rowStart(i: number): number {
  return (i * (i + 1)) >> 1;
}

/** Length of the array that holds an n × n triangle. */
export function packedLength(n: number): number {
  return (n * (n + 1)) >> 1;
}

/**
 * Eliminates the rows n−1 … keep of a symmetric complex matrix (Schur complement on the rows below `keep`).
 * The eliminated rows keep the pivot and coefficients of their step, from which `backSubstitute` recovers them.
 *
 * @param re real parts, packed
 * @param im imaginary parts, packed
 * @param n order of the matrix
 * @param keep number of leading rows that stay
 * @returns largest diagonal element ÷ smallest pivot (a cheap estimate of the condition), Infinity when singular
 */
export function eliminateComplex(re: Float64Array, im: Float64Array, n: number, keep: number): number {
  let low = Infinity;
  let high = 0;
  for (let i = 0, e = 0; i < n; i++, e += i + 1) {
    const size = (re[e] as number) * (re[e] as number) + (im[e] as number) * (im[e] as number);
    high = size > high ? size : high;
  }
  for (let k = n - 1; k >= keep; k--) {
    const rowK = rowStart(k);
    const pr = re[rowK + k] as number;
    const pi = im[rowK + k] as number;
    const size = pr * pr + pi * pi;
    low = size < low ? size : low;
    if (!(size > 0)) return Infinity;
    const qr = pr / size;
    const qi = -pi / size;
    for (let i = 0; i < k; i++) {
      const ar = re[rowK + i] as number;
      const ai = im[rowK + i] as number;
      const fr = ar * qr - ai * qi;
      const fi = ar * qi + ai * qr;
      const rowI = rowStart(i);
      for (let j = 0; j <= i; j++) {
        const br = re[rowK + j] as number;
        const bi = im[rowK + j] as number;
        re[rowI + j] = (re[rowI + j] as number) - (fr * br - fi * bi);
        im[rowI + j] = (im[rowI + j] as number) - (fr * bi + fi * br);
      }
    }
  }
  return keep < n ? Math.sqrt(high / low) : 1;
}

/**
 * The same elimination for a symmetric real matrix.
 *
 * @returns largest diagonal element ÷ smallest pivot, Infinity when a pivot is not positive (not positive definite)
 */
export function eliminateReal(a: Float64Array, n: number, keep: number): number {
  let low = Infinity;
  let high = 0;
  for (let i = 0, e = 0; i < n; i++, e += i + 1) high = (a[e] as number) > high ? (a[e] as number) : high;
  for (let k = n - 1; k >= keep; k--) {
    const rowK = rowStart(k);
    const pivot = a[rowK + k] as number;
    low = pivot < low ? pivot : low;
    if (!(pivot > 0)) return Infinity;
    const inverse = 1 / pivot;
    for (let i = 0; i < k; i++) {
      const f = (a[rowK + i] as number) * inverse;
      const rowI = rowStart(i);
      for (let j = 0; j <= i; j++) a[rowI + j] = (a[rowI + j] as number) - f * (a[rowK + j] as number);
    }
  }
  return keep < n ? high / low : 1;
}

/**
 * Inverts a symmetric positive definite matrix of small order in place (sweep operator on one triangle).
 *
 * @returns largest ÷ smallest pivot met, Infinity when the matrix is not positive definite
 */
export function invertReal(a: Float64Array, n: number): number {
  let low = Infinity;
  let high = 0;
  for (let k = 0; k < n; k++) {
    const rowK = rowStart(k);
    const pivot = a[rowK + k] as number;
    low = pivot < low ? pivot : low;
    high = pivot > high ? pivot : high;
    if (!(pivot > 0)) return Infinity;
    sweepPivot(a, n, k, 1 / pivot);
  }
  const length = packedLength(n);
  for (let e = 0; e < length; e++) a[e] = -(a[e] as number);
  return high / low;
}

/** One step of the sweep: after all n steps the triangle holds the negated inverse. */
function sweepPivot(a: Float64Array, n: number, k: number, inverse: number): void {
  const rowK = rowStart(k);
  for (let i = 0; i < n; i++) {
    if (i === k) continue;
    const rowI = rowStart(i);
    const f = (i < k ? (a[rowK + i] as number) : (a[rowI + k] as number)) * inverse;
    for (let j = 0; j <= i; j++) {
      if (j === k) continue;
      const b = j < k ? (a[rowK + j] as number) : (a[rowStart(j) + k] as number);
      a[rowI + j] = (a[rowI + j] as number) - f * b;
    }
  }
  for (let i = 0; i < k; i++) a[rowK + i] = (a[rowK + i] as number) * inverse;
  for (let i = k + 1; i < n; i++) a[rowStart(i) + k] = (a[rowStart(i) + k] as number) * inverse;
  a[rowK + k] = -inverse;
}
