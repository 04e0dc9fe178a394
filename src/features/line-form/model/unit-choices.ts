import type { SequenceKey, MutualKey } from './form-types';

/** One unit of a chooser: the name in the filing format and the sign that people read. */
export interface UnitChoice {
  unit: string;
  label: string;
}

const choices = (...pairs: [string, string][]): readonly UnitChoice[] =>
  pairs.map(([unit, label]) => ({ unit, label }));

export const SPAN_UNITS = choices(['km', 'km'], ['mi', 'mi'], ['m', 'm'], ['ft', 'ft']);
export const HEIGHT_UNITS = choices(['m', 'm'], ['ft', 'ft']);
export const SPACING_UNITS = choices(['m', 'm'], ['mm', 'mm'], ['cm', 'cm'], ['in', 'in'], ['ft', 'ft']);
export const DIAMETER_UNITS = choices(['mm', 'mm'], ['in', 'in'], ['cm', 'cm']);
export const GMR_UNITS = choices(['mm', 'mm'], ['in', 'in'], ['ft', 'ft'], ['cm', 'cm']);
export const AREA_UNITS = choices(['mm2', 'mm²'], ['kcmil', 'kcmil']);
export const WIRE_RESISTANCE_UNITS = choices(['ohm/km', 'Ω/km'], ['ohm/mi', 'Ω/mi'], ['ohm/kft', 'Ω/kft']);

const RESISTANCE = choices(
  ['ohm/km', 'Ω/km'],
  ['ohm/mi', 'Ω/mi'],
  ['ohm/kft', 'Ω/kft'],
  ['ohm', 'Ω, whole line'],
  ['pu', 'per unit'],
  ['%', '%'],
);
const REACTANCE = [...RESISTANCE, ...choices(['mH/km', 'mH/km'], ['mH/mi', 'mH/mi'])];
const SUSCEPTANCE = choices(
  ['uS/km', 'µS/km'],
  ['uS/mi', 'µS/mi'],
  ['uS', 'µS, whole line'],
  ['nF/km', 'nF/km'],
  ['nF/mi', 'nF/mi'],
  ['uF/km', 'µF/km'],
  ['pu', 'per unit'],
  ['%', '%'],
  ['Mvar', 'Mvar'],
);

/** The units that a declared value may be given in, by its parameter. */
export function declaredUnits(key: SequenceKey | MutualKey): readonly UnitChoice[] {
  if (key.startsWith('r')) return RESISTANCE;
  return key.startsWith('x') ? REACTANCE : SUSCEPTANCE;
}

/** Whether a declared value in this unit stands on a base power and a base voltage. */
export const needsBase = (unit: string): boolean => unit === 'pu' || unit === '%';

/** The sign that people read for a unit of the filing format. */
export function unitLabel(unit: string): string {
  const all = [...REACTANCE, ...SUSCEPTANCE, ...SPAN_UNITS, ...SPACING_UNITS];
  return all.find((c) => c.unit === unit)?.label ?? unit;
}
