import { complexSqrt, multiply, type Complex } from '../numerics/complex';
import { LIGHT_SPEED_M_PER_S } from './constants';
import type { PiTotals, SequenceConstants } from './types';

/** 20·log₁₀(e): decibels a neper. */
const DECIBEL_PER_NEPER = 20 * Math.LOG10E;

/** What follows from a circuit's constants; null where the constants leave it undefined. */
export interface Derived {
  /** √(x1/b1), lossless as findings use it, Ω. */
  surgeImpedanceOhm: number | null;
  /** ω/√(x1·b1) as a fraction of the speed of light, lossless. */
  waveSpeed: number | null;
  xOverR: number | null;
  x0OverX1: number | null;
  r0OverR1: number | null;
  b0OverB1: number | null;
  /** r0 − r1, Ω/km. */
  r0MinusR1: number | null;
  /** Surge impedance loading V²/Z_c, MW (null without a voltage). */
  surgeImpedanceLoadingMw: number | null;
  /** Three-phase charging V²·b1, Mvar/km. */
  chargingMvarPerKm: number | null;
  /** Propagation with losses: attenuation and phase of √((r1 + jx1)·jb1). */
  attenuationNeperPerKm: number | null;
  attenuationDecibelPerKm: number | null;
  phaseRadPerKm: number | null;
}

/** p/q, or null when that is no finite number. */
function quotient(p: number | undefined, q: number | undefined): number | null {
  if (p === undefined || q === undefined || q === 0) return null;
  const value = p / q;
  return Number.isFinite(value) ? value : null;
}

/** √v of a positive number, else null. */
function positiveRoot(v: number | null): number | null {
  return v !== null && v > 0 && Number.isFinite(v) ? Math.sqrt(v) : null;
}

/** γ = √(zy) per km, null when x1 or b1 is missing or not positive. */
function propagation(c: Partial<SequenceConstants>): Complex | null {
  const { r1 = 0, x1, b1 } = c;
  if (x1 === undefined || b1 === undefined || !(x1 > 0) || !(b1 > 0) || !Number.isFinite(r1 + x1 + b1))
    return null;
  return complexSqrt(multiply([r1, x1], [0, b1 * 1e-6]));
}

/**
 * Derived quantities of a circuit, from recomputed or declared constants alike (any may be missing).
 *
 * @param c r, x in Ω/km, b in µS/km
 * @param frequencyHz frequency, Hz
 * @param nominalKv phase-to-phase voltage, kV, for loading and charging
 * @example
 * derive({ x1: 0.488, b1: 3.371 }, 60).surgeImpedanceOhm // → 380.5
 * derive({ x1: 0.488 }, 60).waveSpeed // → null
 */
export function derive(c: Partial<SequenceConstants>, frequencyHz: number, nominalKv?: number): Derived {
  const omega = 2 * Math.PI * frequencyHz;
  const surge = positiveRoot(quotient((c.x1 ?? NaN) * 1e6, c.b1));
  const product = c.x1 !== undefined && c.b1 !== undefined ? c.x1 * c.b1 * 1e-12 : null;
  // Ω/km · µS/km · 1e−12 = s²ω²/m² in SI per metre.
  const slowness = positiveRoot(product);
  const gamma = propagation(c);
  const square = nominalKv !== undefined && nominalKv > 0 ? nominalKv * nominalKv : null;
  return {
    surgeImpedanceOhm: surge,
    waveSpeed: slowness === null ? null : omega / slowness / LIGHT_SPEED_M_PER_S,
    xOverR: quotient(c.x1, c.r1),
    x0OverX1: quotient(c.x0, c.x1),
    r0OverR1: quotient(c.r0, c.r1),
    b0OverB1: quotient(c.b0, c.b1),
    r0MinusR1: c.r0 === undefined || c.r1 === undefined ? null : c.r0 - c.r1,
    surgeImpedanceLoadingMw: square === null || surge === null ? null : square / surge,
    chargingMvarPerKm: square === null || c.b1 === undefined ? null : square * c.b1 * 1e-6,
    attenuationNeperPerKm: gamma === null ? null : gamma[0],
    attenuationDecibelPerKm: gamma === null ? null : gamma[0] * DECIBEL_PER_NEPER,
    phaseRadPerKm: gamma === null ? null : gamma[1],
  };
}

/**
 * Whole-line values per unit: Z_b = kV²/MVA, B_pu = B·Z_b.
 *
 * @param totals r, x in Ω, b in µS
 * @param baseMva three-phase base power, MVA
 * @param baseKv base voltage, phase to phase, kV
 * @returns the same names per unit, or null when a base is not positive
 * @example
 * perUnit({ r: 0, x: 58.35, b: 0, r0: 0, x0: 0, b0: 0 }, 100, 345)?.x // → 0.04902
 */
export function perUnit(totals: PiTotals, baseMva: number, baseKv: number): PiTotals | null {
  const base = (baseKv * baseKv) / baseMva;
  if (!(baseMva > 0) || !(baseKv > 0) || !Number.isFinite(base)) return null;
  const siemens = base * 1e-6;
  return {
    r: totals.r / base,
    x: totals.x / base,
    b: totals.b * siemens,
    r0: totals.r0 / base,
    x0: totals.x0 / base,
    b0: totals.b0 * siemens,
  };
}
