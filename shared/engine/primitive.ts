import { MU_0 } from './constants';
import { earthMean, earthScale } from './earth-return';
import type { Failure } from './types';
import { touching } from './wires';
import type { Workspace } from './workspace';

const mean = new Float64Array(2);

/**
 * Fills the primitive matrices of a section: one row a wire, images in the ground plane, Carson's earth return.
 *
 * Z_ij = j(ωμ₀/2π)·[ln(D_ij/d_ij) + F(u₊) + F(u₋)] (+ internal impedance on the diagonal), P_ij = ln(D_ij/d_ij) with
 * D the distance to the image and d to the wire (its radius on the diagonal); P in units of 1/(2πε₀).
 *
 * @param w workspace with its wires placed
 * @param omega angular frequency, rad/s
 * @param resistivityOhmM of the earth, Ω·m
 * @returns the failure of two wires that touch, or null
 */
export function fillPrimitive(w: Workspace, omega: number, resistivityOhmM: number): Failure | null {
  const { x, height, radius, internalR, internalX, zr, zi, p } = w;
  const scale = earthScale(omega, resistivityOhmM);
  const logScale = Math.log(scale);
  const reactance = (1000 * omega * MU_0) / (2 * Math.PI);
  let e = 0;
  for (let i = 0; i < w.wires; i++) {
    const xi = x[i] as number;
    const hi = height[i] as number;
    const ri = radius[i] as number;
    for (let j = 0; j < i; j++) {
      const dx = xi - (x[j] as number);
      const dh = hi - (height[j] as number);
      const sum = hi + (height[j] as number);
      const near2 = dx * dx + dh * dh;
      const reach = ri + (radius[j] as number);
      if (!(near2 >= reach * reach)) return touching(w, i, j, near2);
      const logFar = 0.5 * Math.log(dx * dx + sum * sum);
      const field = logFar - 0.5 * Math.log(near2);
      earthMean(scale * sum, scale * Math.abs(dx), logFar + logScale, mean);
      p[e] = field;
      zr[e] = -2 * reactance * (mean[1] as number);
      zi[e] = reactance * (field + 2 * (mean[0] as number));
      e += 1;
    }
    const logFar = Math.log(2 * hi);
    const field = logFar - Math.log(ri);
    earthMean(2 * scale * hi, 0, logFar + logScale, mean);
    p[e] = field;
    zr[e] = (internalR[i] as number) - 2 * reactance * (mean[1] as number);
    zi[e] = (internalX[i] as number) + reactance * (field + 2 * (mean[0] as number));
    e += 1;
  }
  return null;
}
