/**
 * Complex scalars as [real, imaginary], for the places where clarity counts more than speed; the hot loops work on
 * separate arrays of real and imaginary parts instead.
 */
export type Complex = readonly [number, number];

/** p + q. */
export function add(p: Complex, q: Complex): Complex {
  return [p[0] + q[0], p[1] + q[1]];
}

/** p − q. */
export function subtract(p: Complex, q: Complex): Complex {
  return [p[0] - q[0], p[1] - q[1]];
}

/** p · q. */
export function multiply(p: Complex, q: Complex): Complex {
  return [p[0] * q[0] - p[1] * q[1], p[0] * q[1] + p[1] * q[0]];
}

/** k · p with real k. */
export function scale(p: Complex, k: number): Complex {
  return [p[0] * k, p[1] * k];
}

/** p / q; q = 0 gives no finite number, callers rule it out. */
export function divide(p: Complex, q: Complex): Complex {
  const size = q[0] * q[0] + q[1] * q[1];
  return [(p[0] * q[0] + p[1] * q[1]) / size, (p[1] * q[0] - p[0] * q[1]) / size];
}

/** |p|. */
export function modulus(p: Complex): number {
  return Math.hypot(p[0], p[1]);
}

/** Principal square root (real part not negative), without cancellation in either part. */
export function complexSqrt(p: Complex): Complex {
  const re = Math.sqrt(0.5 * (modulus(p) + Math.abs(p[0])));
  if (re === 0) return [0, 0];
  const im = Math.abs(p[1]) / (2 * re);
  const sign = p[1] < 0 ? -1 : 1;
  return p[0] >= 0 ? [re, sign * im] : [im, sign * re];
}
