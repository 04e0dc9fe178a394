/** Dense complex matrices of small order, row by row, for work that is not in a hot loop. */
export interface DenseMatrix {
  n: number;
  re: Float64Array;
  im: Float64Array;
}

/** A zero matrix of order n. */
export function dense(n: number): DenseMatrix {
  return { n, re: new Float64Array(n * n), im: new Float64Array(n * n) };
}

/** The matrix with entries fill(i, j) = [re, im]. */
export function denseFrom(n: number, fill: (i: number, j: number) => readonly [number, number]): DenseMatrix {
  const m = dense(n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      const [re, im] = fill(i, j);
      m.re[i * n + j] = re;
      m.im[i * n + j] = im;
    }
  }
  return m;
}

/** p + k·q. */
export function denseAdd(p: DenseMatrix, q: DenseMatrix, k = 1): DenseMatrix {
  return {
    n: p.n,
    re: p.re.map((v, e) => v + k * (q.re[e] ?? 0)),
    im: p.im.map((v, e) => v + k * (q.im[e] ?? 0)),
  };
}

/** k · p. */
export function denseScale(p: DenseMatrix, k: number): DenseMatrix {
  return { n: p.n, re: p.re.map((v) => k * v), im: p.im.map((v) => k * v) };
}

/** p · q. */
export function denseMultiply(p: DenseMatrix, q: DenseMatrix): DenseMatrix {
  const { n } = p;
  const m = dense(n);
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < n; k++) {
      const ar = p.re[i * n + k] as number;
      const ai = p.im[i * n + k] as number;
      for (let j = 0; j < n; j++) {
        const br = q.re[k * n + j] as number;
        const bi = q.im[k * n + j] as number;
        const at = i * n + j;
        m.re[at] = (m.re[at] as number) + ar * br - ai * bi;
        m.im[at] = (m.im[at] as number) + ar * bi + ai * br;
      }
    }
  }
  return m;
}

/** Largest sum of moduli in a row: the ∞-norm. */
export function denseNorm(p: DenseMatrix): number {
  let norm = 0;
  for (let i = 0; i < p.n; i++) {
    let sum = 0;
    for (let j = 0; j < p.n; j++) sum += Math.hypot(p.re[i * p.n + j] as number, p.im[i * p.n + j] as number);
    norm = Math.max(norm, sum);
  }
  return norm;
}

/** Subtracts from row i the multiple of row k that clears its pivot column, in matrix and right-hand side alike. */
function clearRow(a: DenseMatrix, b: DenseMatrix, i: number, k: number, fr: number, fi: number): void {
  for (const m of [a, b]) {
    for (let j = 0; j < m.n; j++) {
      const br = m.re[k * m.n + j] as number;
      const bi = m.im[k * m.n + j] as number;
      const at = i * m.n + j;
      m.re[at] = (m.re[at] as number) - (fr * br - fi * bi);
      m.im[at] = (m.im[at] as number) - (fr * bi + fi * br);
    }
  }
}

/** Exchanges two rows. */
function swapRows(m: DenseMatrix, i: number, k: number): void {
  for (let j = 0; j < m.n; j++) {
    for (const part of [m.re, m.im]) {
      const keep = part[i * m.n + j] as number;
      part[i * m.n + j] = part[k * m.n + j] as number;
      part[k * m.n + j] = keep;
    }
  }
}

/** Row with the largest pivot of column k from row k down. */
function pivotRow(a: DenseMatrix, k: number): number {
  let best = k;
  let size = -1;
  for (let i = k; i < a.n; i++) {
    const here = Math.hypot(a.re[i * a.n + k] as number, a.im[i * a.n + k] as number);
    if (here > size) {
      size = here;
      best = i;
    }
  }
  return best;
}

/**
 * Solves A·X = B by Gauss–Jordan elimination with row pivoting.
 *
 * @returns X, or null when A is singular
 */
export function denseSolve(left: DenseMatrix, right: DenseMatrix): DenseMatrix | null {
  const a = denseScale(left, 1);
  const b = denseScale(right, 1);
  const { n } = a;
  for (let k = 0; k < n; k++) {
    const row = pivotRow(a, k);
    if (row !== k) {
      swapRows(a, row, k);
      swapRows(b, row, k);
    }
    const pr = a.re[k * n + k] as number;
    const pi = a.im[k * n + k] as number;
    const size = pr * pr + pi * pi;
    if (!(size > 0)) return null;
    // Row k divided by its pivot: take (1 − 1/pivot) of it off itself.
    clearRow(a, b, k, k, 1 - pr / size, pi / size);
    for (let i = 0; i < n; i++) {
      if (i !== k) clearRow(a, b, i, k, a.re[i * n + k] as number, a.im[i * n + k] as number);
    }
  }
  return b;
}

/**
 * exp(M) − 1 by Taylor series with scaling, undone by doubling E → 2E + E² (which keeps small differences exact).
 *
 * @param m square matrix
 */
export function denseExpm1(m: DenseMatrix): DenseMatrix {
  // A norm of ¼ lets sixteen terms reach 1e−24, and each doubling costs one product.
  const doublings = Math.max(0, Math.ceil(Math.log2(Math.max(denseNorm(m), 1e-300) / 0.25)));
  const small = denseScale(m, 2 ** -doublings);
  let term = small;
  let sum = small;
  for (let k = 2; k <= 16; k++) {
    term = denseScale(denseMultiply(term, small), 1 / k);
    sum = denseAdd(sum, term);
  }
  for (let k = 0; k < doublings; k++) sum = denseAdd(denseScale(sum, 2), denseMultiply(sum, sum));
  return sum;
}
