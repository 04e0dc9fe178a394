/**
 * Two-ports of line sections, exact at their length. A two-port is kept as [A − 1, B; C, D − 1]: a short line's A is
 * so near to one that the difference, which makes the charging, would lose its digits.
 */

/** Complex number as [real, imaginary]. */
export type Complex = readonly [number, number];

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

function add(p: Complex, q: Complex): Complex {
  return [p[0] + q[0], p[1] + q[1]];
}

function multiply(p: Complex, q: Complex): Complex {
  return [p[0] * q[0] - p[1] * q[1], p[0] * q[1] + p[1] * q[0]];
}

function divide(p: Complex, q: Complex): Complex {
  const size = q[0] * q[0] + q[1] * q[1];
  return [(p[0] * q[0] + p[1] * q[1]) / size, (p[1] * q[0] - p[0] * q[1]) / size];
}

/** Principal square root. */
export function complexSqrt(p: Complex): Complex {
  const modulus = Math.hypot(p[0], p[1]);
  const re = Math.sqrt(0.5 * (modulus + Math.abs(p[0])));
  if (re === 0) return [0, 0];
  const im = Math.abs(p[1]) / (2 * re);
  const sign = p[1] < 0 ? -1 : 1;
  return p[0] >= 0 ? [re, sign * im] : [im, sign * re];
}

/** sinh(θ)/θ as a function of θ², even in θ, by series near zero. */
function sinhc(square: Complex): Complex {
  if (Math.hypot(square[0], square[1]) < 0.5) {
    let term: Complex = [1, 0];
    let sum: Complex = [1, 0];
    for (let k = 1; k < 12; k++) {
      const factor = 1 / (2 * k * (2 * k + 1));
      term = multiply(term, [square[0] * factor, square[1] * factor]);
      sum = add(sum, term);
    }
    return sum;
  }
  const theta = complexSqrt(square);
  const sinh: Complex = [Math.sinh(theta[0]) * Math.cos(theta[1]), Math.cosh(theta[0]) * Math.sin(theta[1])];
  return divide(sinh, theta);
}

/**
 * Exact two-port of a uniform line: cosh γl − 1 = 2·sinh²(γl/2), Z_c·sinh γl = zl·sinh(γl)/γl.
 *
 * @param z series impedance of the whole section, Ω
 * @param y shunt admittance of the whole section, S
 */
export function uniformTwoPort(z: Complex, y: Complex): TwoPort {
  const square = multiply(z, y);
  const whole = sinhc(square);
  const half = sinhc([square[0] / 4, square[1] / 4]);
  const product = multiply(square, multiply(half, half));
  const a: Complex = [product[0] / 2, product[1] / 2];
  return { a, b: multiply(z, whole), c: multiply(y, whole), d: a };
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
  return { z: t.b, yFrom: divide(t.d, t.b), yTo: divide(t.a, t.b) };
}
