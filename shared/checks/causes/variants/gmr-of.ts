import type { ConductorData } from '../../../engine/index';

/**
 * GMR of a conductor: as filed, else that of a tube carrying its current evenly.
 *
 * @param conductor handbook or tube data
 * @returns mm
 * @see any text on inductance: ln(GMR) = ln r − q⁴/(r²−q²)²·ln(r/q) + (3q²−r²)/(4(r²−q²)), core radius q
 */
export function gmrOf(conductor: ConductorData): number {
  const outer = conductor.diameterMm / 2;
  if (conductor.gmrMm !== undefined && conductor.model === 'handbook') return conductor.gmrMm;
  const core = (conductor.coreDiameterMm ?? 0) / 2;
  if (core <= 0 || core >= outer) return outer * Math.exp(-0.25);
  const area = outer ** 2 - core ** 2;
  const exponent =
    (-(core ** 4) / area ** 2) * Math.log(outer / core) + (3 * core ** 2 - outer ** 2) / (4 * area);
  return outer * Math.exp(exponent);
}
