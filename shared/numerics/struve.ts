/**
 * F(u) = (π/2u)·[H₁(u) − Y₁(u)] − 1/u² = ∫₀^∞ e^(−ut) (√(1+t²) − t) dt, H₁ the Struve function and Y₁ the Bessel
 * function of the second kind (Abramowitz & Stegun 12.1, DLMF 11.2 and 11.5). The integral converges for Re u > 0;
 * beyond it the closed form is meant, cut along the negative real axis.
 *
 * Three regions, each good to some 1e-12 of |F|:
 * - |u| ≤ SERIES_LIMIT: power series of H₁ and Y₁ (cancellation grows like e^|u| and costs five digits at the border);
 * - |u| ≥ ASYMPTOTIC_LIMIT: 1/u − 1/u² + 1/u³ − 3/u⁵ + 45/u⁷ …, whose error near and beyond ±90° is e^(−|Im u|);
 * - between: the integral along a turned ray by Gauss–Laguerre quadrature, beyond 90° reflected by the connection
 *   formula H₁(u) − Y₁(u) = H₁(v) − Y₁(v) + 2i·H₁⁽²⁾(v) with v = −u.
 */

/** Euler's constant. */
const GAMMA = 0.5772156649015329;

/** Border of the power series. */
export const SERIES_LIMIT = 10;

/** Border of the asymptotic series. */
export const ASYMPTOTIC_LIMIT = 38;

/** Odd and even part of the power series with as many terms as |u| asks for. */
function series(re: number, im: number, out: Float64Array): void {
  const wr = re * re - im * im;
  const wi = 2 * re * im;
  const logR = 0.5 * Math.log(re * re + im * im) - Math.LN2;
  const logI = Math.atan2(im, re);
  // Struve part: u/3, then times −u²/((2k+3)(2k+5)).
  let ar = re / 3;
  let ai = im / 3;
  // Bessel part: 1/2, then times −u²/(4(k+1)(k+2)); psi is ½(ψ(k+1) + ψ(k+2)).
  let br = 0.5;
  let bi = 0;
  let psi = 0.5 - GAMMA;
  let sumR = 0;
  let sumI = 0;
  for (let k = 0; k < 200; k++) {
    const lr = psi - logR;
    sumR += ar + br * lr + bi * logI;
    sumI += ai + bi * lr - br * logI;
    const fa = -1 / ((2 * k + 3) * (2 * k + 5));
    const fb = -1 / (4 * (k + 1) * (k + 2));
    let t = (ar * wr - ai * wi) * fa;
    ai = (ar * wi + ai * wr) * fa;
    ar = t;
    t = (br * wr - bi * wi) * fb;
    bi = (br * wi + bi * wr) * fb;
    br = t;
    psi += 0.5 / (k + 1) + 0.5 / (k + 2);
    const small = Math.abs(ar) + Math.abs(ai) + (Math.abs(br) + Math.abs(bi)) * (Math.abs(lr) + 4);
    if (small < 1e-17 * (Math.abs(sumR) + Math.abs(sumI))) break;
  }
  out[0] = sumR;
  out[1] = sumI;
}

/** 1/u − 1/u² + Σ: the terms of √(1+t²) integrated one by one, up to the smallest. */
function asymptotic(re: number, im: number, out: Float64Array): void {
  const size = re * re + im * im;
  const vr = re / size;
  const vi = -im / size;
  const wr = vr * vr - vi * vi;
  const wi = 2 * vr * vi;
  let tr = vr;
  let ti = vi;
  let sumR = vr - wr;
  let sumI = vi - wi;
  for (let k = 1; k < 60; k++) {
    const factor = -(2 * k - 3) * (2 * k - 1);
    if (Math.abs(factor) > size) break;
    const t = (tr * wr - ti * wi) * factor;
    ti = (tr * wi + ti * wr) * factor;
    tr = t;
    sumR += tr;
    sumI += ti;
    if (Math.abs(tr) + Math.abs(ti) < 1e-17 * (Math.abs(sumR) + Math.abs(sumI))) break;
  }
  out[0] = sumR;
  out[1] = sumI;
}

/** Number of nodes of the quadrature; 24 leave 1e-13 at |u| = 10. */
const NODES = 24;
/** Turn of the ray where the branch point comes near, rad: 40°. */
const TURN = (40 * Math.PI) / 180;

/** Gauss–Laguerre nodes and weights by Newton's method on the three-term recurrence. */
function laguerreRule(n: number): { nodes: Float64Array; weights: Float64Array } {
  const nodes = new Float64Array(n);
  const weights = new Float64Array(n);
  let z = 0;
  for (let i = 0; i < n; i++) {
    // Starting guesses after Stroud and Secrest (1966).
    if (i === 0) z = 3 / (1 + 2.4 * n);
    else if (i === 1) z += 15 / (1 + 2.5 * n);
    else z += ((1 + 2.55 * (i - 1)) / (1.9 * (i - 1))) * (z - (nodes[i - 2] as number));
    let derivative = 1;
    let previous = 0;
    for (let step = 0; step < 100; step++) {
      let value = 1;
      previous = 0;
      for (let j = 0; j < n; j++) {
        const older = previous;
        previous = value;
        value = ((2 * j + 1 - z) * previous - j * older) / (j + 1);
      }
      derivative = (n * (value - previous)) / z;
      const move = value / derivative;
      z -= move;
      if (Math.abs(move) <= 1e-15 * z) break;
    }
    nodes[i] = z;
    weights[i] = -1 / (derivative * n * previous);
  }
  return { nodes, weights };
}

/** Nodes s and weights of ∫ e^(−s) g(s) ds along the ray at `angle`, as [s re, s im, weight re, weight im] a node. */
function rayRule(angle: number): Float64Array {
  const { nodes, weights } = laguerreRule(NODES);
  const rule = new Float64Array(4 * NODES);
  const slope = Math.tan(angle);
  for (let i = 0; i < NODES; i++) {
    const x = nodes[i] as number;
    const w = weights[i] as number;
    const cos = Math.cos(slope * x);
    const sin = Math.sin(slope * x);
    rule[4 * i] = x;
    rule[4 * i + 1] = slope * x;
    // w · (1 + j·slope) · e^(−j·slope·x)
    rule[4 * i + 2] = w * (cos + slope * sin);
    rule[4 * i + 3] = w * (slope * cos - sin);
  }
  return rule;
}

/** Rules along the positive axis and along the turned ray: [s re, s im, weight re, weight im] a node. */
export const STRAIGHT_RULE = rayRule(0);
export const TURNED_RULE = rayRule(TURN);

/** (1/u)·Σ w·(√(1+(s/u)²) − s/u) for −45° ≤ arg u ≤ 90°. */
function quadrature(re: number, im: number, out: Float64Array): void {
  // Above about 50° the branch point s = ju comes near the straight ray.
  const rule = im > 1.2 * re ? TURNED_RULE : STRAIGHT_RULE;
  const size = re * re + im * im;
  const vr = re / size;
  const vi = -im / size;
  let sumR = 0;
  let sumI = 0;
  for (let i = 0; i < rule.length; i += 4) {
    const sr = rule[i] as number;
    const si = rule[i + 1] as number;
    const tr = sr * vr - si * vi;
    const ti = sr * vi + si * vr;
    const ar = 1 + tr * tr - ti * ti;
    const ai = 2 * tr * ti;
    const mod = Math.sqrt(ar * ar + ai * ai);
    // Principal root; √(1+t²) − t is formed as 1/(√(1+t²) + t), which loses nothing for large t.
    const rr = Math.sqrt(0.5 * (mod + Math.abs(ar)));
    const ri = Math.abs(ai) / (2 * rr);
    const rootR = ar >= 0 ? rr : ri;
    const rootI = (ar >= 0 ? ri : rr) * (ai < 0 ? -1 : 1);
    const dr = rootR + tr;
    const di = rootI + ti;
    const d = 1 / (dr * dr + di * di);
    const gr = dr * d;
    const gi = -di * d;
    const wr = rule[i + 2] as number;
    const wi = rule[i + 3] as number;
    sumR += wr * gr - wi * gi;
    sumI += wr * gi + wi * gr;
  }
  out[0] = sumR * vr - sumI * vi;
  out[1] = sumR * vi + sumI * vr;
}

/** (π/u)·j·H₁⁽²⁾(−u) by Hankel's expansion, added to `out`: what the reflection from −u leaves. */
function addReflected(re: number, im: number, out: Float64Array): void {
  const vr = -re;
  const vi = -im;
  const size = vr * vr + vi * vi;
  const wr = vr / size;
  const wi = -vi / size;
  // Σ (−j)^k a_k / v^k with a_k = a_(k−1)·(4 − (2k−1)²)/(8k).
  let tr = 1;
  let ti = 0;
  let sumR = 1;
  let sumI = 0;
  for (let k = 1; k < 40; k++) {
    const factor = (4 - (2 * k - 1) * (2 * k - 1)) / (8 * k);
    if (factor * factor > size) break;
    const pr = tr * wr - ti * wi;
    const pi = tr * wi + ti * wr;
    tr = factor * pi;
    ti = -factor * pr;
    sumR += tr;
    sumI += ti;
  }
  // √(2/(πv))·e^(−j(v − 3π/4)), principal root.
  const modulus = Math.sqrt(size);
  const halfArg = -0.5 * Math.atan2(vi, vr);
  const scale = Math.sqrt(2 / (Math.PI * modulus)) * Math.exp(vi);
  const angle = halfArg - vr + 0.75 * Math.PI;
  const hr = scale * Math.cos(angle);
  const hi = scale * Math.sin(angle);
  const pr = sumR * hr - sumI * hi;
  const pi = sumR * hi + sumI * hr;
  // (π/2u)·2j·H = −(π/v)·j·H
  const qr = Math.PI * pi;
  const qi = -Math.PI * pr;
  out[0] = (out[0] as number) + qr * wr - qi * wi;
  out[1] = (out[1] as number) + qr * wi + qi * wr;
}

/** The middle region: arguments beyond 90° are reflected, those below the real axis conjugated where need be. */
function middle(re: number, im: number, out: Float64Array): void {
  if (im < 0) {
    middle(re, -im, out);
    out[1] = -(out[1] as number);
    return;
  }
  if (re >= 0) {
    quadrature(re, im, out);
    return;
  }
  // F(u) + 1/u² = −(F(v) + 1/v²) + (π/u)·j·H₁⁽²⁾(v), v = −u below the real axis: conjugate to reach the rule.
  quadrature(-re, im, out);
  const size = re * re + im * im;
  const vr = re / size;
  const vi = -im / size;
  out[0] = -(out[0] as number) - 2 * (vr * vr - vi * vi);
  out[1] = (out[1] as number) - 4 * vr * vi;
  addReflected(re, im, out);
}

/**
 * F(u) for complex u off the negative real axis.
 *
 * @param re real part of u
 * @param im imaginary part of u
 * @param out receives [Re F, Im F]
 */
export function struveKernel(re: number, im: number, out: Float64Array): void {
  const size = re * re + im * im;
  if (size <= SERIES_LIMIT * SERIES_LIMIT) series(re, im, out);
  else if (size >= ASYMPTOTIC_LIMIT * ASYMPTOTIC_LIMIT) asymptotic(re, im, out);
  else middle(re, im, out);
}
