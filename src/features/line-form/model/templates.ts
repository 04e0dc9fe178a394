import { PHASES, blankGroundWire, blankPhase } from './blank';
import { groundWiresOf, heightUnit, phasesOf, setGroundWires } from './edit';
import type { GroundWireForm, PhaseName, PositionForm, SectionForm } from './form-types';
import { convert } from './convert';
import { readNumber, writeNumber } from './number-text';

/**
 * Arrangements that fill the positions of a structure. Spacings and heights are round starting values
 * for the nominal voltage (common practice, no source): the applicant moves each to what was built.
 */
export type TemplateName = 'flat' | 'delta' | 'vertical' | 'double-vertical' | 'double-delta';

export interface Template {
  name: TemplateName;
  label: string;
  circuits: 1 | 2;
}

export const TEMPLATES: readonly Template[] = [
  { name: 'flat', label: 'Flat', circuits: 1 },
  { name: 'delta', label: 'Delta', circuits: 1 },
  { name: 'vertical', label: 'Vertical', circuits: 1 },
  { name: 'double-vertical', label: 'Double circuit, vertical', circuits: 2 },
  { name: 'double-delta', label: 'Double circuit, delta', circuits: 2 },
];

interface Place {
  circuit: number;
  phase: PhaseName;
  acrossM: number;
  heightM: number;
}

/** Phase spacing and lowest attachment that a structure of this voltage starts with, in metres. */
function sizes(nominalVoltageKv: number): { spacingM: number; lowestM: number; sagM: number } {
  if (nominalVoltageKv < 100) return { spacingM: 2.5, lowestM: 12, sagM: 3.5 };
  if (nominalVoltageKv < 180) return { spacingM: 4, lowestM: 15, sagM: 5 };
  if (nominalVoltageKv < 300) return { spacingM: 6, lowestM: 18, sagM: 7 };
  if (nominalVoltageKv < 430) return { spacingM: 9, lowestM: 22, sagM: 9 };
  return { spacingM: 11, lowestM: 26, sagM: 11 };
}

/** Multiples of the spacing: across and up, for phases a, b and c of each circuit. */
const SHAPES: Record<TemplateName, readonly (readonly [across: number, up: number][])[]> = {
  flat: [
    [
      [-1, 0],
      [0, 0],
      [1, 0],
    ],
  ],
  delta: [
    [
      [-0.7, 0],
      [0, 1],
      [0.7, 0],
    ],
  ],
  vertical: [
    [
      [0.5, 2],
      [0.5, 1],
      [0.5, 0],
    ],
  ],
  'double-vertical': [
    [
      [-0.8, 2],
      [-0.9, 1],
      [-0.8, 0],
    ],
    [
      [0.8, 0],
      [0.9, 1],
      [0.8, 2],
    ],
  ],
  'double-delta': [
    [
      [-1.6, 0],
      [-1.1, 1],
      [-0.6, 0],
    ],
    [
      [0.6, 0],
      [1.1, 1],
      [1.6, 0],
    ],
  ],
};

function placesOf(name: TemplateName, nominalVoltageKv: number): Place[] {
  const { spacingM, lowestM } = sizes(nominalVoltageKv);
  return SHAPES[name].flatMap((circuit, c) =>
    circuit.map(([across, up], i) => ({
      circuit: c + 1,
      phase: PHASES[i] ?? 'a',
      acrossM: across * spacingM,
      heightM: lowestM + up * spacingM,
    })),
  );
}

/** Where `count` ground wires hang over a set of phases: spread over the structure, above the highest. */
function shieldPlaces(places: readonly Place[], count: number, spacingM: number): [number, number][] {
  const top = Math.max(...places.map((p) => p.heightM));
  const half = Math.max(...places.map((p) => Math.abs(p.acrossM))) * 0.7;
  const heightM = top + 0.7 * spacingM;
  if (count === 1) return [[0, heightM]];
  return Array.from({ length: count }, (_, i) => [-half + (2 * half * i) / (count - 1), heightM]);
}

const inUnit = (metres: number, unit: string): { text: string; unit: string } => ({
  text: writeNumber(Number(convert(metres, 'm', unit).toFixed(2))),
  unit,
});

/** Fills the positions of a section from a template; conductors, bundles and their names stay. */
export function applyTemplate(
  section: SectionForm,
  name: TemplateName,
  nominalVoltageKv: number,
): SectionForm {
  const unit = heightUnit(section);
  const { spacingM, sagM } = sizes(nominalVoltageKv);
  const places = placesOf(name, nominalVoltageKv);
  const present = phasesOf(section);
  const phases = places.map((place): PositionForm => {
    const same = present.find((p) => p.circuit === place.circuit && p.phase === place.phase);
    return {
      ...(same ?? present[0] ?? blankPhase(place.circuit, place.phase, unit)),
      circuit: place.circuit,
      phase: place.phase,
      horizontalM: inUnit(place.acrossM, unit),
      attachmentHeightM: inUnit(place.heightM, unit),
      sagM: inUnit(sagM, unit),
    };
  });
  const wires = groundWiresOf(section);
  const shields = shieldPlaces(places, wires.length, spacingM).slice(0, wires.length);
  const grounds = shields.map((place, i) => hung(wires[i] ?? blankGroundWire(unit), place, sagM));
  return { ...section, positions: [...phases, ...grounds] };
}

/** A ground wire at a place over the phases; it sags less than they do. */
function hung(wire: GroundWireForm, [acrossM, heightM]: [number, number], phaseSagM: number): GroundWireForm {
  const { unit } = wire.attachmentHeightM;
  return {
    ...wire,
    horizontalM: inUnit(acrossM, unit),
    attachmentHeightM: inUnit(heightM, unit),
    sagM: inUnit(phaseSagM * 0.8, unit),
  };
}

const isBlank = ({ horizontalM, attachmentHeightM, sagM }: GroundWireForm): boolean =>
  [horizontalM, attachmentHeightM, sagM].every(({ text }) => text.trim() === '');

/** Where the phases hang, in metres; null while one of them lacks its place. */
function entered(section: SectionForm): Place[] | null {
  const places = phasesOf(section).map((p): Place | null => {
    const [across, height] = [readNumber(p.horizontalM.text), readNumber(p.attachmentHeightM.text)];
    if (across.kind !== 'number' || height.kind !== 'number') return null;
    return {
      circuit: p.circuit,
      phase: p.phase,
      acrossM: convert(across.value, p.horizontalM.unit, 'm'),
      heightM: convert(height.value, p.attachmentHeightM.unit, 'm'),
    };
  });
  const known = places.filter((p) => p !== null);
  return known.length === places.length && known.length > 0 ? known : null;
}

/**
 * As many ground wires as asked for. Where the phases hang already and the wires stand nowhere yet, they
 * begin over the phases, as a structure would fill them; wires that have a place keep it.
 */
export function hangGroundWires(section: SectionForm, count: number, nominalVoltageKv: number): SectionForm {
  const next = setGroundWires(section, count);
  const places = entered(next);
  const wires = groundWiresOf(next);
  if (!places || !wires.every(isBlank)) return next;
  const { spacingM, sagM } = sizes(nominalVoltageKv);
  const shields = shieldPlaces(places, count, spacingM).slice(0, count);
  const grounds = shields.map((place, i) => hung(wires[i] ?? blankGroundWire(), place, sagM));
  return { ...next, positions: [...phasesOf(next), ...grounds] };
}
