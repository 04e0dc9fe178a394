/**
 * Modified Bessel functions I₀, I₁, K₀, K₁ of complex argument with positive real part, scaled so that nothing
 * overflows: I by e^(−z), K by e^(+z). Sources: DLMF 10.25, 10.31, 10.40 and, for K between the series and the
 * asymptotic region, Steed's continued fraction CF2 (Temme 1975).
 */

/** The four scaled values, as [re, im] pairs. */
export interface ModifiedBessel {
  i0: [number, number];
  i1: [number, number];
  k0: [number, number];
  k1: [number, number];
}

/** Room for one evaluation. */
export function createModifiedBessel(): ModifiedBessel {
  return { i0: [0, 0], i1: [0, 0], k0: [0, 0], k1: [0, 0] };
}

const GAMMA = 0.5772156649015329;
/** Above this the series of I loses more than two digits and the asymptotic one is good to 1e-16. */
const I_SERIES_LIMIT = 20;
/** Up to this K is taken from its logarithmic series. */
const K_SERIES_LIMIT = 2;

/** I₀ and I₁ by their power series, times e^(−z). */
function seriesI(zr: number, zi: number, out: ModifiedBessel): void {
  const wr = (zr * zr - zi * zi) / 4;
  const wi = (zr * zi) / 2;
  // t_k = (z²/4)^k/(k!)²; I₀ sums them, I₁ sums t_k/(k+1) and carries z/2.
  let tr = 1;
  let ti = 0;
  let a = 1;
  let b = 0;
  let c = 1;
  let d = 0;
  for (let k = 1; k < 100; k++) {
    const nr = (tr * wr - ti * wi) / (k * k);
    ti = (tr * wi + ti * wr) / (k * k);
    tr = nr;
    a += tr;
    b += ti;
    c += tr / (k + 1);
    d += ti / (k + 1);
    if (Math.abs(tr) + Math.abs(ti) < 1e-18 * (Math.abs(a) + Math.abs(b))) break;
  }
  const scale = Math.exp(-zr);
  const cos = scale * Math.cos(zi);
  const sin = -scale * Math.sin(zi);
  out.i0[0] = a * cos - b * sin;
  out.i0[1] = a * sin + b * cos;
  // I₁ carries the factor z/2.
  const hr = (c * zr - d * zi) / 2;
  const hi = (c * zi + d * zr) / 2;
  out.i1[0] = hr * cos - hi * sin;
  out.i1[1] = hr * sin + hi * cos;
}

/** Hankel's sum Σ s^k a_k(ν)/z^k with s = ±1, into `out`. */
function hankelSum(fourNuSquared: number, sign: number, vr: number, vi: number, out: [number, number]): void {
  let tr = 1;
  let ti = 0;
  let sumR = 1;
  let sumI = 0;
  for (let k = 1; k < 40; k++) {
    const factor = (sign * (fourNuSquared - (2 * k - 1) * (2 * k - 1))) / (8 * k);
    const nr = (tr * vr - ti * vi) * factor;
    const ni = (tr * vi + ti * vr) * factor;
    // An asymptotic series is cut at its smallest term.
    if (Math.abs(nr) + Math.abs(ni) > Math.abs(tr) + Math.abs(ti)) break;
    tr = nr;
    ti = ni;
    sumR += tr;
    sumI += ti;
    if (Math.abs(tr) + Math.abs(ti) < 1e-18) break;
  }
  out[0] = sumR;
  out[1] = sumI;
}

/** I by its asymptotic expansion; the part e^(−2z) that it leaves out is below 1e-12 of the value here. */
function asymptoticI(zr: number, zi: number, out: ModifiedBessel): void {
  const size = zr * zr + zi * zi;
  const vr = zr / size;
  const vi = -zi / size;
  hankelSum(0, -1, vr, vi, out.i0);
  hankelSum(4, -1, vr, vi, out.i1);
  // Common factor 1/√(2πz), principal root.
  const root = 1 / Math.sqrt(2 * Math.PI * Math.sqrt(size));
  const angle = -0.5 * Math.atan2(zi, zr);
  rotate(out.i0, root * Math.cos(angle), root * Math.sin(angle));
  rotate(out.i1, root * Math.cos(angle), root * Math.sin(angle));
}

/** value ← value · (cr + j·ci). */
function rotate(value: [number, number], cr: number, ci: number): void {
  const re = value[0] * cr - value[1] * ci;
  value[1] = value[0] * ci + value[1] * cr;
  value[0] = re;
}

/** K₀ and K₁ by their series around zero, times e^z (DLMF 10.31.1–2). */
function seriesK(zr: number, zi: number, out: ModifiedBessel): void {
  const wr = (zr * zr - zi * zi) / 4;
  const wi = (zr * zi) / 2;
  const size = zr * zr + zi * zi;
  const lr = 0.5 * Math.log(size) - Math.LN2;
  const li = Math.atan2(zi, zr);
  let tr = 1;
  let ti = 0;
  // ψ(1) = −γ, and ψ(k+1) = ψ(k) + 1/k on the way.
  let psi = -GAMMA;
  let ar = psi - lr;
  let ai = -li;
  let br = 0;
  let bi = 0;
  for (let k = 0; k < 40; k++) {
    // K₁ = 1/z + (z/2) Σ t/(k+1) · (ln(z/2) − ½ψ(k+1) − ½ψ(k+2)); K₀ = Σ t·(ψ(k+1) − ln(z/2)).
    const mean = psi + 0.5 / (k + 1);
    br += (tr * (lr - mean) - ti * li) / (k + 1);
    bi += (tr * li + ti * (lr - mean)) / (k + 1);
    const n = (k + 1) * (k + 1);
    const nr = (tr * wr - ti * wi) / n;
    ti = (tr * wi + ti * wr) / n;
    tr = nr;
    psi += 1 / (k + 1);
    ar += tr * (psi - lr) + ti * li;
    ai += ti * (psi - lr) - tr * li;
    if (Math.abs(tr) + Math.abs(ti) < 1e-19) break;
  }
  const scale = Math.exp(zr);
  const cos = scale * Math.cos(zi);
  const sin = scale * Math.sin(zi);
  out.k0[0] = ar;
  out.k0[1] = ai;
  rotate(out.k0, cos, sin);
  out.k1[0] = zr / size + (br * zr - bi * zi) / 2;
  out.k1[1] = -zi / size + (br * zi + bi * zr) / 2;
  rotate(out.k1, cos, sin);
}

/** K₀ and K₁ by Steed's algorithm for Temme's continued fraction, times e^z; |z| > 2, |arg z| well below 90°. */
function fractionK(zr: number, zi: number, out: ModifiedBessel): void {
  // Complex b, d, h, delta; real a, c, q of the algorithm keep their names, all with ν = 0.
  let b: [number, number] = [2 * (1 + zr), 2 * zi];
  let d = reciprocal(b[0], b[1]);
  let h: [number, number] = [d[0], d[1]];
  let delta: [number, number] = [d[0], d[1]];
  let q1: [number, number] = [0, 0];
  let q2: [number, number] = [1, 0];
  let a = -0.25;
  let c = 0.25;
  let q: [number, number] = [0.25, 0];
  let s: [number, number] = [1 + q[0] * delta[0] - q[1] * delta[1], q[0] * delta[1] + q[1] * delta[0]];
  for (let i = 2; i <= 500; i++) {
    // a_i = −(i − ½)², and c_i carries the ratio of successive q.
    a -= 2 * (i - 1);
    c = (-a * c) / i;
    const next: [number, number] = [
      (q1[0] - (b[0] * q2[0] - b[1] * q2[1])) / a,
      (q1[1] - (b[0] * q2[1] + b[1] * q2[0])) / a,
    ];
    q1 = q2;
    q2 = next;
    q = [q[0] + c * next[0], q[1] + c * next[1]];
    b = [b[0] + 2, b[1]];
    d = reciprocal(b[0] + a * d[0], b[1] + a * d[1]);
    // Steed: the denominators' reciprocal d is updated, the fraction grows by (b·d − 1) times its last step.
    const fr = b[0] * d[0] - b[1] * d[1] - 1;
    const fi = b[0] * d[1] + b[1] * d[0];
    delta = [fr * delta[0] - fi * delta[1], fr * delta[1] + fi * delta[0]];
    h = [h[0] + delta[0], h[1] + delta[1]];
    const ds: [number, number] = [q[0] * delta[0] - q[1] * delta[1], q[0] * delta[1] + q[1] * delta[0]];
    s = [s[0] + ds[0], s[1] + ds[1]];
    if (Math.abs(ds[0]) + Math.abs(ds[1]) < 1e-17 * (Math.abs(s[0]) + Math.abs(s[1]))) break;
  }
  // K₀ = √(π/(2z))/s; K₁ = K₀·(z + ½ − h/4·…)/z with h scaled by ¼.
  const inverse = reciprocal(s[0], s[1]);
  const modulus = Math.sqrt(zr * zr + zi * zi);
  const root = Math.sqrt(Math.PI / (2 * modulus));
  const angle = -0.5 * Math.atan2(zi, zr);
  out.k0[0] = inverse[0];
  out.k0[1] = inverse[1];
  rotate(out.k0, root * Math.cos(angle), root * Math.sin(angle));
  const v = reciprocal(zr, zi);
  const gr = zr + 0.5 - 0.25 * h[0];
  const gi = zi - 0.25 * h[1];
  out.k1[0] = out.k0[0];
  out.k1[1] = out.k0[1];
  rotate(out.k1, gr * v[0] - gi * v[1], gr * v[1] + gi * v[0]);
}

/** 1/(re + j·im). */
function reciprocal(re: number, im: number): [number, number] {
  const size = re * re + im * im;
  return [re / size, -im / size];
}

/**
 * I₀, I₁ (times e^(−z)) and K₀, K₁ (times e^z).
 *
 * @param zr real part of z, positive
 * @param zi imaginary part of z, |zi| ≤ zr (the diagonal is where skin effect lives)
 * @param out receives the four values
 */
export function modifiedBessel(zr: number, zi: number, out: ModifiedBessel): void {
  const modulus = Math.sqrt(zr * zr + zi * zi);
  if (modulus <= I_SERIES_LIMIT) seriesI(zr, zi, out);
  else asymptoticI(zr, zi, out);
  if (modulus <= K_SERIES_LIMIT) seriesK(zr, zi, out);
  else fractionK(zr, zi, out);
}
