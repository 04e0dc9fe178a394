import { MU_0 } from './constants';
import { earthMean, earthScale } from './earth-return';
import type { Failure } from './types';
import { touching } from './wires';
import type { Workspace } from './workspace';

const mean = new Float64Array(2);

/**
 * Fills what the wire pairs' places alone decide: Maxwell's potential coefficients P_ij = ln(D_ij/d_ij) in units of
 * 1/(2πε₀), D the distance to the image and d to the wire (its radius on the diagonal), and beside them height sums,
 * offsets and logarithms for the earth return. A frequency sweep does this once.
 *
 * @param w workspace with its wires placed
 * @returns the failure of two wires that touch, or null
 */
export function fillGeometry(w: Workspace): Failure | null {
  const { x, height, radius, sum, offset, logFar, field, p } = w;
  const n = w.wires;
  let e = 0;
  for (let i = 0; i < n; i++) {
    const xi = x[i] as number;
    const hi = height[i] as number;
    const ri = radius[i] as number;
    for (let j = 0; j < i; j++) {
      const hj = height[j] as number;
      const dx = xi - (x[j] as number);
      const dh = hi - hj;
      const near2 = dx * dx + dh * dh;
      const reach = ri + (radius[j] as number);
      if (!(near2 >= reach * reach)) return touching(w, i, j, near2);
      const h = hi + hj;
      const far = 0.5 * Math.log(dx * dx + h * h);
      sum[e] = h;
      offset[e] = dx;
      logFar[e] = far;
      field[e] = p[e] = far - 0.5 * Math.log(near2);
      e += 1;
    }
    const far = Math.log(2 * hi);
    sum[e] = 2 * hi;
    offset[e] = 0;
    logFar[e] = far;
    field[e] = p[e] = far - Math.log(ri);
    e += 1;
  }
  return null;
}

/** Relative difference below which two pairs count as hanging alike: rounding of the same drawing's coordinates. */
const ALIKE = 1e-13;

/**
 * Finds wire pairs that hang alike (same height sum and same offset either way), whose earth return is the same at
 * every frequency: bundles and mirrored structures are full of them. Worth its while before a sweep only.
 *
 * @param w workspace after `fillGeometry`; its `twin` receives the first pair alike, or the pair itself
 */
export function findTwins(w: Workspace): void {
  const { sum, offset, twin } = w;
  const count = (w.seriesWires * (w.seriesWires + 1)) >> 1;
  for (let e = 0; e < count; e++) {
    const h = sum[e] as number;
    const x = Math.abs(offset[e] as number);
    twin[e] = e;
    for (let k = 0; k < e; k++) {
      if (twin[k] !== k || Math.abs((sum[k] as number) - h) > ALIKE * h) continue;
      if (Math.abs(Math.abs(offset[k] as number) - x) > ALIKE * h) continue;
      twin[e] = k;
      break;
    }
  }
}

/**
 * Fills the primitive series impedance at one frequency:
 * Z_ij = j(ωμ₀/2π)·[ln(D_ij/d_ij) + F(u₊) + F(u₋)] in Ω/km, internal impedance on the diagonal.
 *
 * @param w workspace after `fillGeometry`
 * @param omega angular frequency, rad/s
 * @param resistivityOhmM of the earth, Ω·m
 * @param twins whether `findTwins` has been run: pairs alike are computed once then
 */
export function fillSeries(w: Workspace, omega: number, resistivityOhmM: number, twins = false): void {
  const { sum, offset, logFar, field, twin, zr, zi } = w;
  const scale = earthScale(omega, resistivityOhmM);
  const logScale = Math.log(scale);
  const reactance = (1000 * omega * MU_0) / (2 * Math.PI);
  const wires = w.seriesWires;
  const count = (wires * (wires + 1)) >> 1;
  for (let e = 0; e < count; e++) {
    const first = twins ? (twin[e] as number) : e;
    if (first < e) {
      zr[e] = zr[first] as number;
      zi[e] = (zi[first] as number) + reactance * ((field[e] as number) - (field[first] as number));
      continue;
    }
    earthMean(
      scale * (sum[e] as number),
      scale * (offset[e] as number),
      (logFar[e] as number) + logScale,
      mean,
    );
    zr[e] = -2 * reactance * (mean[1] as number);
    zi[e] = reactance * ((field[e] as number) + 2 * (mean[0] as number));
  }
  for (let i = 0, e = 0; i < wires; i++, e += i + 1) {
    zr[e] = (zr[e] as number) + (w.internalR[i] as number);
    zi[e] = (zi[e] as number) + (w.internalX[i] as number);
  }
}
