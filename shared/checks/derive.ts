import { LIGHT_SPEED_M_PER_S } from '../engine/constants';
import type { SequenceConstants } from '../engine/types';
import type { BandParameter } from './parameters';
import type { RecomputedValues } from './types';

/** Some or all of the six constants: Ω/km and µS/km. */
export type PartialConstants = Partial<SequenceConstants>;

/**
 * Lossless surge impedance √(x/b).
 *
 * @param x1 Ω/km
 * @param b1 µS/km
 * @returns Ω; NaN unless both are of one sign
 */
export function surgeImpedanceOhm(x1: number, b1: number): number {
  return Math.sqrt(x1 / (b1 * 1e-6));
}

/**
 * Lossless wave speed ω/√(x·b) as a fraction of light's.
 *
 * @param x1 Ω/km
 * @param b1 µS/km
 * @param frequencyHz rated frequency
 * @returns ratio; NaN unless both are of one sign
 */
export function waveSpeed(x1: number, b1: number, frequencyHz: number): number {
  const kilometresPerSecond = (2 * Math.PI * frequencyHz) / Math.sqrt(x1 * b1 * 1e-6);
  return (kilometresPerSecond * 1000) / LIGHT_SPEED_M_PER_S;
}

/** The six constants with surge impedance (Ω) and wave speed (fraction of light's) beside them. */
export function withDerived(constants: SequenceConstants, frequencyHz: number): RecomputedValues {
  const { r1, x1, b1, r0, x0, b0 } = constants;
  return {
    r1,
    x1,
    b1,
    r0,
    x0,
    b0,
    surgeImpedanceOhm: surgeImpedanceOhm(x1, b1),
    waveSpeed: waveSpeed(x1, b1, frequencyHz),
  };
}

type Formula = (values: PartialConstants, frequencyHz: number) => number | undefined;

const ratio = (top?: number, bottom?: number): number | undefined =>
  top === undefined || bottom === undefined || bottom === 0 ? undefined : top / bottom;

const bothPositive = (values: PartialConstants): values is PartialConstants & { x1: number; b1: number } =>
  values.x1 !== undefined && values.b1 !== undefined && values.x1 > 0 && values.b1 > 0;

const FORMULAS: Readonly<Record<BandParameter, Formula>> = {
  r1: (values) => values.r1,
  x1: (values) => values.x1,
  b1: (values) => values.b1,
  x0: (values) => values.x0,
  b0: (values) => values.b0,
  r0MinusR1: ({ r0, r1 }) => (r0 === undefined || r1 === undefined ? undefined : r0 - r1),
  x1OverR1: ({ x1, r1 }) => ratio(x1, r1),
  x0OverX1: ({ x0, x1 }) => ratio(x0, x1),
  r0OverR1: ({ r0, r1 }) => ratio(r0, r1),
  b0OverB1: ({ b0, b1 }) => ratio(b0, b1),
  surgeImpedanceOhm: (values) => (bothPositive(values) ? surgeImpedanceOhm(values.x1, values.b1) : undefined),
  waveSpeed: (values, frequencyHz) =>
    bothPositive(values) ? waveSpeed(values.x1, values.b1, frequencyHz) : undefined,
};

/**
 * The value of a band's parameter, from whatever constants are at hand.
 *
 * @param parameter the band's parameter
 * @param values constants, Ω/km and µS/km
 * @param frequencyHz rated frequency
 * @returns undefined where a constant is missing or the value has no meaning (a square root of a negative)
 */
export function bandValue(
  parameter: BandParameter,
  values: PartialConstants,
  frequencyHz: number,
): number | undefined {
  return FORMULAS[parameter](values, frequencyHz);
}
