/**
 * Two-ports of line sections, exact at their length. A two-port is kept as [A − 1, B; C, D − 1]: a short line's A is
 * so near to one that the difference, which makes the charging, would lose its digits.
 */
import { add, complexSqrt, divide, modulus, multiply, type Complex } from '../numerics/complex';

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

/** sinh(θ)/θ as a function of θ², even in θ, by series near zero. */
function sinhc(square: Complex): Complex {
  if (modulus(square) < 0.5) {
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
  // No series impedance at all (a cable declared so): the legs only exist as their sum, shared out evenly.
  if (modulus(t.b) === 0) return { z: t.b, yFrom: [t.c[0] / 2, t.c[1] / 2], yTo: [t.c[0] / 2, t.c[1] / 2] };
  return { z: t.b, yFrom: divide(t.d, t.b), yTo: divide(t.a, t.b) };
}
