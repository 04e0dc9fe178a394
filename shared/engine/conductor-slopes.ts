import { dcResistanceOhmPerKm } from './conductor';
import { ALUMINIUM_COEFFICIENT_PER_K, MU_0, RESISTANCE_REFERENCE_C } from './constants';
import { tubeSensitivity } from './tube-sensitivity';
import type { Complex } from '../numerics/complex';
import type { ConductorData } from './types';

/** How a wire's own elements move with its conductor's data, each per unit of the input's logarithm. */
export interface ConductorSlopes {
  /** Of Z_ii, Ω/km, by ln of the resistance. */
  byLogResistance: Complex;
  /** Of Z_ii, Ω/km, by ln of the diameter. */
  byLogDiameter: Complex;
  /** Of Z_ii, Ω/km, by ln of the GMR. */
  byLogGmr: Complex;
  /** ln of the resistance per kelvin. */
  logResistancePerK: number;
}

/** Relative growth of the resistance per kelvin at the conductor's temperature: α/(1 + α(T − 20 °C)). */
export function logResistancePerK(c: ConductorData): number {
  const alpha = c.temperatureCoefficientPerK ?? ALUMINIUM_COEFFICIENT_PER_K;
  return alpha / (1 + alpha * ((c.temperatureC ?? RESISTANCE_REFERENCE_C) - RESISTANCE_REFERENCE_C));
}

/**
 * Slopes of a wire's own impedance. Handbook: resistance and GMR stand by themselves, the diameter only matters for P.
 * Tube: the resistance moves the skin effect as well, the diameter both that and the field outside.
 *
 * @param c conductor, checked
 * @param omega angular frequency, rad/s
 */
export function conductorSlopes(c: ConductorData, omega: number): ConductorSlopes {
  const reactance = (1000 * omega * MU_0) / (2 * Math.PI);
  const perK = logResistancePerK(c);
  if (c.model === 'handbook') {
    return {
      byLogResistance: [c.acResistanceOhmPerKm ?? 0, 0],
      byLogDiameter: [0, 0],
      byLogGmr: [0, -reactance],
      logResistancePerK: perK,
    };
  }
  const tube = tubeSensitivity(
    dcResistanceOhmPerKm(c),
    c.diameterMm / 2000,
    (c.coreDiameterMm ?? 0) / 2000,
    omega,
  );
  return {
    byLogResistance: tube.byLogResistance,
    byLogDiameter: [tube.byLogRadius[0], tube.byLogRadius[1] - reactance],
    byLogGmr: [0, 0],
    logResistancePerK: perK,
  };
}

/** Whether two conductors are the same by their data; the name does not count. */
export function sameConductor(a: ConductorData, b: ConductorData): boolean {
  return (
    a === b ||
    (a.model === b.model &&
      a.diameterMm === b.diameterMm &&
      a.coreDiameterMm === b.coreDiameterMm &&
      a.gmrMm === b.gmrMm &&
      a.acResistanceOhmPerKm === b.acResistanceOhmPerKm &&
      a.dcResistance20OhmPerKm === b.dcResistance20OhmPerKm &&
      a.temperatureC === b.temperatureC &&
      a.temperatureCoefficientPerK === b.temperatureCoefficientPerK)
  );
}
