import { createModifiedBessel, modifiedBessel } from '../numerics/bessel';
import { add, divide, multiply, scale, subtract, type Complex } from '../numerics/complex';
import { MU_0 } from './constants';

/** Room for the values at the outer and the inner radius. */
const outer = createModifiedBessel();
const inner = createModifiedBessel();

/** How a tube's internal impedance moves, Ω/km: with ln of its d.c. resistance, and of its outer radius (core and R_dc kept). */
export interface TubeSensitivity {
  byLogResistance: Complex;
  byLogRadius: Complex;
}

/** x·∂x and y·∂y of ln(x·N/D), and x·N/D itself, for N and D of `tubeImpedance`. */
function logDerivatives(x: Complex, y: Complex): { value: Complex; byX: Complex; byY: Complex } {
  modifiedBessel(x[0], x[1], outer);
  modifiedBessel(y[0], y[1], inner);
  const gap = 2 * (x[0] - y[0]);
  const decay: Complex = [Math.exp(-gap) * Math.cos(gap), -Math.exp(-gap) * Math.sin(gap)];
  const k0 = multiply(outer.k0, decay);
  const k1 = multiply(outer.k1, decay);
  // Wronskian relations among I₀, I₁, K₀, K₁ make every derivative of N and D one of these four combinations.
  const n = add(multiply(outer.i0, inner.k1), multiply(k0, inner.i1));
  const d = subtract(multiply(outer.i1, inner.k1), multiply(k1, inner.i1));
  const s = subtract(multiply(outer.i0, inner.k0), multiply(k0, inner.i0));
  const t = add(multiply(outer.i1, inner.k0), multiply(k1, inner.i0));
  const ratio = divide(n, d);
  return {
    value: multiply(x, ratio),
    byX: add([2, 0], multiply(x, subtract(divide(d, n), ratio))),
    byY: multiply(y, subtract(divide(t, d), divide(s, n))),
  };
}

/**
 * Analytic derivatives of `tubeImpedance`. A solid wire's impedance R_dc·q/2 with q = x·I₀(x)/I₁(x) does not move with
 * the radius (x depends on R_dc and ω alone) and moves by (q² − x²)·R_dc/4 with ln R_dc.
 *
 * @param dcOhmPerKm d.c. resistance at temperature, Ω/km
 * @param outerRadiusM outer radius, m
 * @param innerRadiusM radius of the core, m
 * @param omega angular frequency, rad/s
 */
export function tubeSensitivity(
  dcOhmPerKm: number,
  outerRadiusM: number,
  innerRadiusM: number,
  omega: number,
): TubeSensitivity {
  const a2 = outerRadiusM * outerRadiusM;
  const b2 = innerRadiusM * innerRadiusM;
  const resistivity = (dcOhmPerKm / 1000) * Math.PI * (a2 - b2);
  const diagonal = Math.sqrt((omega * MU_0) / (2 * resistivity));
  const x: Complex = [diagonal * outerRadiusM, diagonal * outerRadiusM];
  if (innerRadiusM === 0) {
    modifiedBessel(x[0], x[1], outer);
    const q = multiply(x, divide(outer.i0, outer.i1));
    return {
      byLogResistance: scale(subtract(multiply(q, q), multiply(x, x)), dcOhmPerKm / 4),
      byLogRadius: [0, 0],
    };
  }
  const { value, byX, byY } = logDerivatives(x, [diagonal * innerRadiusM, diagonal * innerRadiusM]);
  const z = scale(value, (dcOhmPerKm * (a2 - b2)) / (2 * a2));
  // With ln a at fixed b and R_dc: ln(area/a²) moves by 2β, ln x by −β and ln y by −(1 + β).
  const beta = b2 / (a2 - b2);
  const byRadius = subtract(subtract([2 * beta, 0], scale(byX, beta)), scale(byY, 1 + beta));
  return {
    byLogResistance: multiply(z, subtract([1, 0], scale(add(byX, byY), 0.5))),
    byLogRadius: multiply(z, byRadius),
  };
}
