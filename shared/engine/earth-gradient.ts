import { struveKernelDerivative } from '../numerics/struve-derivative';
import { CARSON_LIMIT, EVEN, ODD, PSI, TERMS } from './earth-return';

const scratch = new Float64Array(2);

/**
 * Gradient of ln D + F(u₊) + F(u₋), all that the place of a wire pair adds to its impedance beside −ln d. In Carson's
 * series the term 1/D of the image cancels against the first of the earth return exactly, and is left out of both.
 *
 * @param h height sum × √(ωμ₀/ρ), positive
 * @param x horizontal distance × √(ωμ₀/ρ), either sign
 * @param logD natural logarithm of √(h² + x²)
 * @param out receives [∂h re, ∂h im, ∂x re, ∂x im] in these scaled coordinates
 */
export function earthGradient(h: number, x: number, logD: number, out: Float64Array): void {
  const d2 = h * h + x * x;
  if (d2 > CARSON_LIMIT * CARSON_LIMIT) closedForm(h, x, d2, out);
  else carsonSeries(h, x, logD, out);
}

/** F′ at both arguments: ∂h = √j·(F′₊ + F′₋), ∂x = j√j·(F′₊ − F′₋), and the image's own part. */
function closedForm(h: number, x: number, d2: number, out: Float64Array): void {
  const c = Math.SQRT1_2;
  struveKernelDerivative(c * (h - x), c * (h + x), scratch);
  const pr = scratch[0] as number;
  const pi = scratch[1] as number;
  struveKernelDerivative(c * (h + x), c * (h - x), scratch);
  const qr = scratch[0] as number;
  const qi = scratch[1] as number;
  out[0] = c * (pr + qr - pi - qi) + h / d2;
  out[1] = c * (pr + qr + pi + qi);
  out[2] = -c * (pr - qr + pi - qi) + x / d2;
  out[3] = c * (pr - qr - pi + qi);
}

/**
 * Carson's series derived term by term: with θ = arg(h + jx), both arguments together make the powers Dⁿ·cos nθ for ∂h
 * and Dⁿ·sin nθ for ∂x, all real, and the phases are those of √j.
 */
function carsonSeries(h: number, x: number, logD: number, out: Float64Array): void {
  const theta = x === 0 ? 0 : Math.atan2(x, h);
  const log = logD - Math.LN2;
  let hr = 0;
  let hi = 0;
  let xr = 0;
  let xi = 0;
  // D^n cos nθ and D^n sin nθ for n = 2k (odd part) and n = 2k − 1 (even part).
  let evenC = 1;
  let evenS = 0;
  let oddC = 0;
  let oddS = 0;
  for (let k = 0; k < TERMS; k++) {
    const a = (2 * k + 1) * (ODD[k] as number) * Math.SQRT1_2;
    const b = EVEN[k] as number;
    const real = 2 * k * ((PSI[k] as number) - log) - 1;
    const quarter = (-k * Math.PI) / 2;
    // √j·j^k on the odd part, j^k on the even one; k = 0 of the even part cancels the image.
    const bracket = k === 0 ? 0 : b;
    const uh = bracket * (oddC * real + 2 * k * theta * oddS);
    const vh = bracket * oddC * quarter;
    const ux = bracket * (-oddS * real + 2 * k * theta * oddC);
    const vx = -bracket * oddS * quarter;
    const ph = a * evenC + uh;
    const qh = a * evenC + vh;
    const px = -a * evenS + ux;
    const qx = -a * evenS + vx;
    // Multiply by j^k without multiplying: swap parts on odd k, signs every second time.
    const flip = (k & 2) === 0 ? 1 : -1;
    if ((k & 1) === 0) {
      hr += flip * ph;
      hi += flip * qh;
      xr += flip * px;
      xi += flip * qx;
    } else {
      hr -= flip * qh;
      hi += flip * ph;
      xr -= flip * qx;
      xi += flip * px;
    }
    oddC = evenC * h - evenS * x;
    oddS = evenC * x + evenS * h;
    evenC = oddC * h - oddS * x;
    evenS = oddC * x + oddS * h;
    if ((Math.abs(oddC) + Math.abs(oddS)) * Math.abs(b) < 1e-10) break;
  }
  out[0] = 2 * hr;
  out[1] = 2 * hi;
  out[2] = 2 * xr;
  out[3] = 2 * xi;
}
