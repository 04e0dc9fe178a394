import { ASYMPTOTIC_LIMIT, SERIES_LIMIT, STRAIGHT_RULE, TURNED_RULE } from './struve';

/**
 * F′(u) of the kernel in `struve.ts`, region by region the derivative of the same expressions:
 * −∫₀^∞ t e^(−ut) (√(1+t²) − t) dt. Sensitivities need it, a few digits less than F itself.
 */

const GAMMA = 0.5772156649015329;

/** Power series, derived term by term; what diverges at zero is −1/(2u). */
function series(re: number, im: number, out: Float64Array): void {
  const wr = re * re - im * im;
  const wi = 2 * re * im;
  const size = re * re + im * im;
  const logR = 0.5 * Math.log(size) - Math.LN2;
  const logI = Math.atan2(im, re);
  // a_k = A_k·u^(2k) and b_k = B_k·u^(2k−1) of the series of F, powers one lower than there.
  let ar = 1 / 3;
  let ai = 0;
  let br = 0.5 * (re / size);
  let bi = -0.5 * (im / size);
  let psi = 0.5 - GAMMA;
  let sumR = 0;
  let sumI = 0;
  for (let k = 0; k < 200; k++) {
    // (2k+1)·A_k·u^(2k) + B_k·u^(2k−1)·[2k(ψ_k − ln(u/2)) − 1]
    const lr = 2 * k * (psi - logR) - 1;
    const li = -2 * k * logI;
    sumR += (2 * k + 1) * ar + br * lr - bi * li;
    sumI += (2 * k + 1) * ai + bi * lr + br * li;
    const fa = -1 / ((2 * k + 3) * (2 * k + 5));
    const fb = -1 / (4 * (k + 1) * (k + 2));
    let t = (ar * wr - ai * wi) * fa;
    ai = (ar * wi + ai * wr) * fa;
    ar = t;
    t = (br * wr - bi * wi) * fb;
    bi = (br * wi + bi * wr) * fb;
    br = t;
    psi += 0.5 / (k + 1) + 0.5 / (k + 2);
    const tail =
      (2 * k + 3) *
      (Math.abs(ar) + Math.abs(ai) + (Math.abs(br) + Math.abs(bi)) * (Math.abs(psi - logR) + 4));
    if (tail < 1e-17 * (Math.abs(sumR) + Math.abs(sumI))) break;
  }
  out[0] = sumR;
  out[1] = sumI;
}

/** −1/u² + 2/u³ − 3/u⁴ + 15/u⁶ …, term by term. */
function asymptotic(re: number, im: number, out: Float64Array): void {
  const size = re * re + im * im;
  const vr = re / size;
  const vi = -im / size;
  const wr = vr * vr - vi * vi;
  const wi = 2 * vr * vi;
  let tr = vr;
  let ti = vi;
  // Σ −n·t_n/u, the common 1/u taken out until the end.
  let sumR = -vr + 2 * wr;
  let sumI = -vi + 2 * wi;
  for (let k = 1; k < 60; k++) {
    const factor = -(2 * k - 3) * (2 * k - 1);
    if (Math.abs(factor) > size) break;
    const t = (tr * wr - ti * wi) * factor;
    ti = (tr * wi + ti * wr) * factor;
    tr = t;
    sumR -= (2 * k + 1) * tr;
    sumI -= (2 * k + 1) * ti;
  }
  out[0] = sumR * vr - sumI * vi;
  out[1] = sumR * vi + sumI * vr;
}

/** −(1/u²)·Σ w·s·(√(1+(s/u)²) − s/u) for arguments from 0 to 90°. */
function quadrature(re: number, im: number, out: Float64Array): void {
  // The same nodes as F: the integrand only gains a factor −t = −s/u.
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
    const rr = Math.sqrt(0.5 * (mod + Math.abs(ar)));
    const ri = Math.abs(ai) / (2 * rr);
    // √(1+t²) + t, whose reciprocal is √(1+t²) − t without cancellation.
    const dr = (ar >= 0 ? rr : ri) + tr;
    const di = (ar >= 0 ? ri : rr) * (ai < 0 ? -1 : 1) + ti;
    const d = 1 / (dr * dr + di * di);
    const gr = (sr * dr + si * di) * d;
    const gi = (si * dr - sr * di) * d;
    const wr = rule[i + 2] as number;
    const wi = rule[i + 3] as number;
    sumR += wr * gr - wi * gi;
    sumI += wr * gi + wi * gr;
  }
  const qr = vr * vr - vi * vi;
  const qi = 2 * vr * vi;
  out[0] = -(sumR * qr - sumI * qi);
  out[1] = -(sumR * qi + sumI * qr);
}

/** Hankel's sum for H⁽²⁾ of order 0 or 1 without its common factor, into `out`. */
function hankel(fourNuSquared: number, wr: number, wi: number, out: Float64Array): void {
  let tr = 1;
  let ti = 0;
  let sumR = 1;
  let sumI = 0;
  const limit = 1 / (wr * wr + wi * wi);
  for (let k = 1; k < 40; k++) {
    const factor = (fourNuSquared - (2 * k - 1) * (2 * k - 1)) / (8 * k);
    // Cut at the smallest term, where |factor| reaches |v|.
    if (factor * factor > limit) break;
    const pr = tr * wr - ti * wi;
    const pi = tr * wi + ti * wr;
    tr = factor * pi;
    ti = -factor * pr;
    sumR += tr;
    sumI += ti;
  }
  out[0] = sumR;
  out[1] = sumI;
}

/** Room for the two Hankel sums. */
const h0 = new Float64Array(2);
const h1 = new Float64Array(2);

/** Beyond 90°: F′(u) = F′(v) + 4/u³ − (πj/u)·[H₀⁽²⁾(v) + 2H₁⁽²⁾(v)/u], v = −u. */
function reflected(re: number, im: number, out: Float64Array): void {
  quadrature(-re, im, out);
  out[1] = -(out[1] as number);
  const size = re * re + im * im;
  const wr = re / size;
  const wi = -im / size;
  const cubeR = wr * (wr * wr - 3 * wi * wi);
  const cubeI = wi * (3 * wr * wr - wi * wi);
  hankel(0, -wr, -wi, h0);
  hankel(4, -wr, -wi, h1);
  // H₁ stands a quarter turn ahead of H₀: H₁ ~ j·(…)·e^(−j(v − π/4)). Sum = S₀ + 2j·S₁/u.
  const br = (h0[0] as number) - 2 * ((h1[0] as number) * wi + (h1[1] as number) * wr);
  const bi = (h0[1] as number) + 2 * ((h1[0] as number) * wr - (h1[1] as number) * wi);
  // Both orders share √(2/(πv))·e^(−j(v − π/4)); v = −u, so e^(−jv) = e^(ju) decays with Im u.
  const scale = Math.PI * Math.sqrt(2 / (Math.PI * Math.sqrt(size))) * Math.exp(-im);
  const angle = -0.5 * Math.atan2(-im, -re) + re + 0.25 * Math.PI;
  // −j·e^(j·angle)
  const cr = scale * Math.sin(angle);
  const ci = -scale * Math.cos(angle);
  const pr = br * cr - bi * ci;
  const pi = br * ci + bi * cr;
  out[0] = (out[0] as number) + 4 * cubeR + pr * wr - pi * wi;
  out[1] = (out[1] as number) + 4 * cubeI + pr * wi + pi * wr;
}

/**
 * F′(u) for complex u off the negative real axis.
 *
 * @param re real part of u
 * @param im imaginary part of u
 * @param out receives [Re F′, Im F′]
 */
export function struveKernelDerivative(re: number, im: number, out: Float64Array): void {
  if (im < 0) {
    struveKernelDerivative(re, -im, out);
    out[1] = -(out[1] as number);
    return;
  }
  const size = re * re + im * im;
  if (size <= SERIES_LIMIT * SERIES_LIMIT) series(re, im, out);
  else if (size >= ASYMPTOTIC_LIMIT * ASYMPTOTIC_LIMIT) asymptotic(re, im, out);
  else if (re >= 0) quadrature(re, im, out);
  else reflected(re, im, out);
}
