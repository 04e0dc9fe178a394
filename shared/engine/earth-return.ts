import { struveKernel } from '../numerics/struve';
import { MU_0 } from './constants';

/**
 * Carson's earth return (Carson 1926): the mean ½[F(u₊) + F(u₋)] of the closed form, u± = √(jωμ₀/ρ)·(H ± jx).
 *
 * Left out is the displacement current in the earth, which is fair while ωε ≪ 1/ρ: with ε_r = 10 the neglected
 * share ωερ is 1 % at f = 18 MHz ÷ (ρ/Ωm) — 180 kHz at 100 Ω·m, 18 kHz at 1,000 Ω·m, 1.8 kHz at 10,000 Ω·m — and
 * stops being fair an order of magnitude above. At power frequency it is below 4e-4 for every soil up to 10,000 Ω·m. The
 * wave along the line is also taken as quasi-TEM, which wants heights far below a quarter wavelength (1 MHz: 75 m).
 */

/**
 * |u| up to which Carson's real series is used: it shares all logarithms between u₊ and u₋ and costs half of two
 * complex series. Beyond it, cancellation would eat the digits (see `struve.ts`).
 */
export const CARSON_LIMIT = 8;

const scratch = new Float64Array(2);

/** Coefficients of Carson's series: A_k of u^(2k+1), B_k of u^(2k), and ψ_k beside ln(u/2). */
export const TERMS = 40;
export const ODD = new Float64Array(TERMS);
export const EVEN = new Float64Array(TERMS);
export const PSI = new Float64Array(TERMS);
for (let k = 0, a = 1 / 3, b = 0.5, psi = 0.5 - 0.5772156649015329; k < TERMS; k++) {
  ODD[k] = a;
  EVEN[k] = b;
  PSI[k] = psi;
  a *= -1 / ((2 * k + 3) * (2 * k + 5));
  b *= -1 / (4 * (k + 1) * (k + 2));
  psi += 0.5 / (k + 1) + 0.5 / (k + 2);
}

/**
 * Scale of the earth: √(ωμ₀/ρ).
 *
 * @returns 1/m
 */
export function earthScale(omega: number, resistivityOhmM: number): number {
  return Math.sqrt((omega * MU_0) / resistivityOhmM);
}

/**
 * ½[F(u₊) + F(u₋)] for scaled height sum and offset. For small |u| Carson's series, in which u₊ and u₋ add up to
 * real polynomials of D·cos nθ and D·sin nθ; else both values of the closed form.
 *
 * @param h height sum × √(ωμ₀/ρ), dimensionless, positive
 * @param x horizontal distance × √(ωμ₀/ρ), dimensionless
 * @param logD natural logarithm of √(h² + x²)
 * @param out receives [Re, Im]; the impedance term is (jωμ₀/π) times it
 */
export function earthMean(h: number, x: number, logD: number, out: Float64Array): void {
  const d2 = h * h + x * x;
  if (d2 > CARSON_LIMIT * CARSON_LIMIT) {
    const c = Math.SQRT1_2;
    struveKernel(c * (h - x), c * (h + x), scratch);
    if (x === 0) {
      out[0] = scratch[0] as number;
      out[1] = scratch[1] as number;
      return;
    }
    const re = scratch[0] as number;
    const im = scratch[1] as number;
    struveKernel(c * (h + x), c * (h - x), scratch);
    out[0] = 0.5 * (re + (scratch[0] as number));
    out[1] = 0.5 * (im + (scratch[1] as number));
    return;
  }
  const theta = x === 0 ? 0 : Math.atan2(x, h);
  const log = logD - Math.LN2;
  let re = 0;
  let im = 0;
  // (h + jx)^n as cos and sin parts, and j^n times √j on the odd ones.
  let cosR = 1;
  let sinR = 0;
  for (let k = 0; k < TERMS; k++) {
    const e = EVEN[k] as number;
    // Even power 2k, phase j^k: real part of the bracket and its −jπ/4.
    const real = e * (((PSI[k] as number) - log) * cosR + theta * sinR);
    const imag = -e * cosR * (Math.PI / 4);
    const oddC = cosR * h - sinR * x;
    const odd = (ODD[k] as number) * oddC * Math.SQRT1_2;
    switch (k & 3) {
      case 0:
        re += real + odd;
        im += imag + odd;
        break;
      case 1:
        re += -imag - odd;
        im += real + odd;
        break;
      case 2:
        re += -real - odd;
        im += -imag - odd;
        break;
      default:
        re += imag + odd;
        im += -real - odd;
    }
    const oddS = cosR * x + sinR * h;
    cosR = oddC * h - oddS * x;
    sinR = oddC * x + oddS * h;
    if ((Math.abs(cosR) + Math.abs(sinR)) * Math.abs(e) < 1e-13) break;
  }
  out[0] = re;
  out[1] = im;
}
