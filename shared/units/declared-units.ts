/** The closed list of units that a declared value may stand in, and what one of each comes to. */
import { FACTORS } from './factors.generated';

/** Kind of quantity: what list of units holds, and what a pu value is a part of. */
export type QuantityKind = 'resistance' | 'reactance' | 'susceptance';

/** Whether a unit is per length or of the whole line. */
export type UnitForm = 'per-length' | 'whole-line';

/** What a conversion may need beside the unit. */
export interface ConversionContext {
  /** Hz, for units of inductance and capacitance. */
  frequencyHz: number;
  /** Nominal phase-to-phase voltage in kV, for Mvar. */
  nominalVoltageKv: number;
  /** Three-phase power base in MVA, for pu and %. */
  baseMva: number;
  /** Phase-to-phase voltage base in kV, for pu and %. */
  baseKv: number;
}

interface Unit {
  form: UnitForm;
  /** True where the value stands on baseMva and baseKv. */
  onBase?: true;
  /** What one of the unit comes to: Ω/km or Ω, µS/km or µS. */
  factor: (c: ConversionContext) => number;
}

const omega = (c: ConversionContext) => 2 * Math.PI * c.frequencyHz;
/** Ω: Z_b = kV² ÷ MVA. */
const baseOhm = (c: ConversionContext) => (c.baseKv * c.baseKv) / c.baseMva;
const fixed = (form: UnitForm, factor: number): Unit => ({ form, factor: () => factor });

function mapped(factors: Readonly<Record<string, number>>, of: (k: number, c: ConversionContext) => number) {
  const rows = Object.entries(factors).map(([name, k]): [string, Unit] => [
    name,
    { form: 'per-length', factor: (c) => of(k, c) },
  ]);
  return Object.fromEntries(rows);
}

const RESISTANCE: Readonly<Record<string, Unit>> = {
  ...mapped(FACTORS.perLengthImpedance, (k) => k),
  ohm: fixed('whole-line', 1),
  pu: { form: 'whole-line', onBase: true, factor: baseOhm },
  '%': { form: 'whole-line', onBase: true, factor: (c) => baseOhm(c) / 100 },
};

const UNITS: Readonly<Record<QuantityKind, Readonly<Record<string, Unit>>>> = {
  resistance: RESISTANCE,
  // X = ωL.
  reactance: { ...RESISTANCE, ...mapped(FACTORS.perLengthInductance, (k, c) => k * omega(c)) },
  susceptance: {
    ...mapped(FACTORS.perLengthSusceptance, (k) => k),
    uS: fixed('whole-line', 1),
    // B = ωC, in µS.
    ...mapped(FACTORS.perLengthCapacitance, (k, c) => k * omega(c) * 1e6),
    // B_pu = B·Z_b.
    pu: { form: 'whole-line', onBase: true, factor: (c) => 1e6 / baseOhm(c) },
    '%': { form: 'whole-line', onBase: true, factor: (c) => 1e4 / baseOhm(c) },
    // Three-phase charging at nominal voltage: Q = kV²·B.
    Mvar: { form: 'whole-line', factor: (c) => 1e6 / (c.nominalVoltageKv * c.nominalVoltageKv) },
  },
};

/** What a declared value comes to. */
export interface Converted {
  form: UnitForm;
  /** Ω/km or µS/km for a per-length unit, Ω or µS for a whole-line one. */
  si: number;
  /** What one of the unit comes to, always positive. */
  factor: number;
  /** True where the value stands on baseMva and baseKv. */
  onBase: boolean;
}

function unitOf(kind: QuantityKind, unit: string): Unit | undefined {
  const list = UNITS[kind];
  return Object.hasOwn(list, unit) ? list[unit] : undefined;
}

/** The units of a kind of quantity, in the order in which they are offered. */
export function unitsOf(kind: QuantityKind): string[] {
  return Object.keys(UNITS[kind]);
}

/** Whether a unit stands on a power and a voltage base (pu and %). */
export function isOnBase(kind: QuantityKind, unit: string): boolean {
  return unitOf(kind, unit)?.onBase === true;
}

/** Whether a unit is per length or of the whole line; null for one that is not in the list. */
export function formOf(kind: QuantityKind, unit: string): UnitForm | null {
  return unitOf(kind, unit)?.form ?? null;
}

/**
 * A declared value in SI.
 * @param kind quantity
 * @param value number in `unit`
 * @param unit one of `unitsOf(kind)`
 * @param context frequency (Hz), voltage (kV) and base (MVA, kV)
 * @returns Ω/km or Ω, µS/km or µS; null for a unit that is not in the list
 */
export function toSi(
  kind: QuantityKind,
  value: number,
  unit: string,
  context: ConversionContext,
): Converted | null {
  const found = unitOf(kind, unit);
  if (!found) return null;
  const factor = found.factor(context);
  return { form: found.form, si: value * factor, factor, onBase: found.onBase === true };
}

/**
 * An SI value in one of the declared units: the way back of `toSi`.
 * @param kind quantity
 * @param si Ω/km or Ω, µS/km or µS, in the form of the unit
 * @param unit one of `unitsOf(kind)`
 * @param context frequency (Hz), voltage (kV) and base (MVA, kV)
 * @returns the number in `unit`; null for a unit that is not in the list
 */
export function fromSi(
  kind: QuantityKind,
  si: number,
  unit: string,
  context: ConversionContext,
): number | null {
  const found = unitOf(kind, unit);
  return found ? si / found.factor(context) : null;
}
