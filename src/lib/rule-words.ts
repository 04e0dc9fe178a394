import { figure, THIN_SPACE } from '#shared/format/numbers';

const TOLERANCE_ORDER = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0', 'r0m', 'x0m', 'b0m'];

const UNCERTAINTIES: readonly { key: string; label: string; unit: 'm' | 'K' | 'share' | 'factor' }[] = [
  { key: 'heightM', label: 'Heights', unit: 'm' },
  { key: 'sagM', label: 'Sags', unit: 'm' },
  { key: 'offsetM', label: 'Offsets', unit: 'm' },
  { key: 'diameterRelative', label: 'Diameters', unit: 'share' },
  { key: 'gmrRelative', label: 'GMR', unit: 'share' },
  { key: 'acResistanceRelative', label: 'A.c. resistance', unit: 'share' },
  { key: 'temperatureK', label: 'Conductor temperature', unit: 'K' },
  { key: 'groundWireResistanceRelative', label: 'Ground wire resistance', unit: 'share' },
  { key: 'earthResistivityFactor', label: 'Earth resistivity', unit: 'factor' },
];

/** A share as per cent without needless digits: 0.015 → "1.5 %". */
export function shareText(share: number): string {
  return `${trimmed(share * 100)}${THIN_SPACE}%`;
}

const trimmed = (value: number) =>
  figure(value, 3)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '');

export interface ToleranceRow {
  parameter: string;
  relative: number;
  cap: number;
}

const isTolerance = (value: unknown): value is { relative: number; cap: number } =>
  typeof value === 'object' && value !== null && 'relative' in value && 'cap' in value;

/** The tolerances of a rule set in the order in which values are always listed. */
export function toleranceRows(tolerances: Readonly<Record<string, unknown>>): ToleranceRow[] {
  return TOLERANCE_ORDER.flatMap((parameter) => {
    const value = tolerances[parameter];
    return isTolerance(value) ? [{ parameter, relative: value.relative, cap: value.cap }] : [];
  });
}

export interface UncertaintyRow {
  key: string;
  label: string;
  unit: 'm' | 'K' | 'share' | 'factor';
  value: number;
  /** "± 0.3 m", "× or ÷ 3". */
  text: string;
}

function uncertaintyText(value: number, unit: UncertaintyRow['unit']): string {
  if (unit === 'factor') return `× or ÷ ${trimmed(value)}`;
  return unit === 'share' ? `± ${shareText(value)}` : `± ${trimmed(value)}${THIN_SPACE}${unit}`;
}

/** How exactly each input is known, in words and figures. */
export function uncertaintyRows(uncertainties: Readonly<Record<string, unknown>>): UncertaintyRow[] {
  return UNCERTAINTIES.flatMap(({ key, label, unit }) => {
    const value = uncertainties[key];
    return typeof value === 'number' ? [{ key, label, unit, value, text: uncertaintyText(value, unit) }] : [];
  });
}
