import type { DeclaredValue } from '../../filing/types';
import type { LineParameter, MutualParameter } from '../parameters';

/** A constant that can be declared, of a circuit or of a pair. */
export type DeclaredParameter = LineParameter | MutualParameter;

/** Values by constant, Ω/km and µS/km. */
export type Values = Partial<Record<DeclaredParameter, number>>;

/** The largest residual with which a cause is offered. */
export const TIGHT = 0.01;

/** One declared constant that causes are sought for. */
export interface Target {
  parameter: DeclaredParameter;
  value: DeclaredValue;
  /** Declared, Ω/km or µS/km. */
  declared: number;
  /** Beyond tolerance: a cause must explain it. */
  violated: boolean;
  /** Half a unit of the last digit ÷ recomputed. */
  rounding: number;
  /** Equivalent pi ÷ nominal, for whole-line values, which may be either; 1 for the rest. */
  formRatio: number;
}

/** What a search for causes stands on: one circuit, or one pair of circuits. */
export interface Problem {
  targets: readonly Target[];
  /** What the filed geometry gives. */
  base: Values;
  lengthKm: number;
  frequencyHz: number;
  nominalVoltageKv: number;
  /** Nominal voltages of the class table, kV. */
  classesKv: readonly number[];
}

/** True for a susceptance. */
export function isShunt(parameter: DeclaredParameter): boolean {
  return parameter.startsWith('b');
}

/** True for a resistance. */
export function isResistance(parameter: DeclaredParameter): boolean {
  return parameter.startsWith('r');
}

/** The signed remaining difference ÷ reference; of a whole-line value the smaller of its two forms'. */
export function residual(target: Target, value: number, reference: number | undefined): number {
  if (reference === undefined || reference === 0) return Infinity;
  const plain = (value - reference) / reference;
  if (target.formRatio === 1) return plain;
  const exact = value / (reference * target.formRatio) - 1;
  return Math.abs(exact) < Math.abs(plain) ? exact : plain;
}

/** Ω/km (µS/km) that one unit of the number as declared stands for. */
export function unitFactor(target: Target): number {
  return target.value.value === 0 ? 0 : target.value.perKm / target.value.value;
}
