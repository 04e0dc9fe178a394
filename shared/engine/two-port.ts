/**
 * Two-ports of line sections, exact at their length. A two-port is kept as [A − 1, B; C, D − 1]: a short line's A is
 * so near to one that the difference, which makes the charging, would lose its digits.
 */
import { add, complexSqrt, divide, multiply, type Complex } from '../numerics/complex';

/** A − 1, B in Ω, C in S, D − 1. */
export interface TwoPort {
  a: Complex;
  b: Complex;
  c: Complex;
  d: Complex;
}

/** The pi of a two-port: series impedance in Ω and the two legs in S. */
export interface Pi {
  z: Complex;
  yFrom: Complex;
  yTo: Complex;
}

/** Nothing in series: the cascade's neutral element. */
export const THROUGH: TwoPort = { a: [0, 0], b: [0, 0], c: [0, 0], d: [0, 0] };

/** sinh(θ)/θ from θ² = (re, im) in closed form, for long lines and high frequencies. */
function sinhcClosed(re: number, im: number, out: Float64Array): void {
  const theta = complexSqrt([re, im]);
  const sinh: Complex = [Math.sinh(theta[0]) * Math.cos(theta[1]), Math.cosh(theta[0]) * Math.sin(theta[1])];
  const value = divide(sinh, theta);
  out[0] = value[0];
  out[1] = value[1];
}

/** sinh(θ)/θ as a function of θ² = (re, im), even in θ: by series near zero, where lines of real length lie. */
function sinhc(re: number, im: number, out: Float64Array): void {
  const size = Math.abs(re) + Math.abs(im);
  if (size > 0.5) {
    sinhcClosed(re, im, out);
    return;
  }
  let tr = 1;
  let ti = 0;
  let sumR = 1;
  let sumI = 0;
  for (let k = 1, bound = 1; k < 12 && bound > 1e-17; k++) {
    const factor = 1 / (2 * k * (2 * k + 1));
    const t = (tr * re - ti * im) * factor;
    ti = (tr * im + ti * re) * factor;
    tr = t;
    bound *= size * factor;
    sumR += tr;
    sumI += ti;
  }
  out[0] = sumR;
  out[1] = sumI;
}

const scratch = new Float64Array(2);

/**
 * Exact two-port of a uniform line: cosh γl − 1 = 2·sinh²(γl/2), Z_c·sinh γl = zl·sinh(γl)/γl.
 *
 * @param z series impedance of the whole section, Ω
 * @param y shunt admittance of the whole section, S
 */
export function uniformTwoPort(z: Complex, y: Complex): TwoPort {
  const sr = z[0] * y[0] - z[1] * y[1];
  const si = z[0] * y[1] + z[1] * y[0];
  sinhc(sr, si, scratch);
  const wr = scratch[0] as number;
  const wi = scratch[1] as number;
  sinhc(sr / 4, si / 4, scratch);
  const hr = scratch[0] as number;
  const hi = scratch[1] as number;
  const qr = (hr * hr - hi * hi) / 2;
  const qi = hr * hi;
  const a: Complex = [sr * qr - si * qi, sr * qi + si * qr];
  return {
    a,
    b: [z[0] * wr - z[1] * wi, z[0] * wi + z[1] * wr],
    c: [y[0] * wr - y[1] * wi, y[0] * wi + y[1] * wr],
    d: a,
  };
}

/** Two two-ports in series, `first` at the sending end. */
export function cascade(first: TwoPort, next: TwoPort): TwoPort {
  return {
    a: add(add(first.a, next.a), add(multiply(first.a, next.a), multiply(first.b, next.c))),
    b: add(add(first.b, next.b), add(multiply(first.a, next.b), multiply(first.b, next.d))),
    c: add(add(first.c, next.c), add(multiply(first.c, next.a), multiply(first.d, next.c))),
    d: add(add(first.d, next.d), add(multiply(first.c, next.b), multiply(first.d, next.d))),
  };
}

/** The pi with the same behaviour at its ends: Z = B, legs (D − 1)/B and (A − 1)/B. */
export function equivalentPi(t: TwoPort): Pi {
  // No series impedance at all (a cable declared so): the legs only exist as their sum, shared out evenly.
  if (t.b[0] === 0 && t.b[1] === 0)
    return { z: t.b, yFrom: [t.c[0] / 2, t.c[1] / 2], yTo: [t.c[0] / 2, t.c[1] / 2] };
  return { z: t.b, yFrom: divide(t.d, t.b), yTo: divide(t.a, t.b) };
}
