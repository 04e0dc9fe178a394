import type { BandParameter } from '../parameters';
import type { Band } from '../rule-set';

/** Furthest that a nominal voltage may lie from its class, as a share: beyond it no band is weighed. */
export const CLASS_REACH = 0.15;

/** Voltages that one class stands for besides its own name, kV. */
const ALIASES_KV: Readonly<Record<number, readonly number[]>> = { 400: [380] };

/**
 * Every nominal voltage that the class table names, at any frequency: the voltages that a base may have been taken from.
 *
 * @param bands all bands
 * @returns kV in rising order
 */
export function nominalVoltages(bands: readonly Band[]): number[] {
  const classes = new Set(bands.map(({ classKv }) => classKv));
  const aliases = [...classes].flatMap((classKv) => ALIASES_KV[classKv] ?? []);
  return [...new Set([...classes, ...aliases])].sort((a, b) => a - b);
}

/** The bands that a line is weighed against. */
export interface ClassMatch {
  classKv: number;
  /** True when the nominal voltage is the class's own (or one that the class stands for). */
  exact: boolean;
  bands: ReadonlyMap<BandParameter, Band>;
}

/**
 * The voltage class of a line: of the classes at its frequency the one that is nearest in ln(kV).
 *
 * @param bands all bands
 * @param nominalVoltageKv phase to phase
 * @param frequencyHz rated frequency
 * @returns null when the nearest is more than 15 % away
 */
export function matchClass(
  bands: readonly Band[],
  nominalVoltageKv: number,
  frequencyHz: number,
): ClassMatch | null {
  const atFrequency = bands.filter((band) => band.frequencyHz === frequencyHz);
  let classKv = NaN;
  let distance = Infinity;
  for (const band of atFrequency) {
    const away = Math.abs(Math.log(nominalVoltageKv / band.classKv));
    if (away < distance) {
      distance = away;
      classKv = band.classKv;
    }
  }
  if (!(distance <= Math.log(1 + CLASS_REACH))) return null;
  const own = atFrequency.filter((band) => band.classKv === classKv);
  return {
    classKv,
    exact: nominalVoltageKv === classKv || (ALIASES_KV[classKv] ?? []).includes(nominalVoltageKv),
    bands: new Map(own.map((band) => [band.parameter, band])),
  };
}
