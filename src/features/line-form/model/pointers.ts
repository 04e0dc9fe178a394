import type { FormPath, LineForm } from './form-types';
import { getAt } from './edit';

/** The id of the field that holds a place of the line; members and indices joined by dashes. */
export const fieldId = (pointer: string): string => `line${pointer.replace(/[^A-Za-z0-9-]+/g, '-')}`;

/** The pointer of a path of the form, written as JSON Pointer (RFC 6901). */
export const pointerOf = (path: FormPath): string =>
  path.map((step) => `/${String(step).replace(/~/g, '~0').replace(/\//g, '~1')}`).join('');

const steps = (pointer: string): string[] =>
  pointer
    .split('/')
    .slice(1)
    .map((s) => s.replace(/~1/g, '/').replace(/~0/g, '~'));

const isTyped = (node: unknown): boolean =>
  typeof node === 'object' && node !== null && 'text' in node && 'unit' in node;

const isField = (node: unknown): boolean =>
  typeof node === 'string' || typeof node === 'boolean' || isTyped(node);

/** Places that a fault may name although the form keeps them elsewhere. */
function placeInForm(pointer: string): string {
  return pointer
    .replace(/^(\/sections\/\d+\/perLength)\/(?=[rxb][01])/, '$1/0/')
    .replace(/^\/declaredMutual\/0/, '/declaredMutual')
    .replace(/\/(value|unit)$/, '');
}

/**
 * The field that a fault belongs to: the place itself where the form has a field for it, else the
 * nearest place above it. A fault always finds some field, at worst the line's name.
 */
export function fieldPointer(form: LineForm, pointer: string): string {
  const path = steps(placeInForm(pointer));
  for (let n = path.length; n > 0; n -= 1) {
    const head = path.slice(0, n);
    const node = getAt(form, head);
    if (isField(node)) return pointerOf(head);
    if (node !== undefined && n === path.length) return firstFieldBelow(form, head);
  }
  return '/name';
}

/** The field that a person would go to for a fault of a whole group: its first number, else its first text. */
function firstFieldBelow(form: LineForm, head: string[]): string {
  const node = getAt(form, head);
  if (typeof node !== 'object' || node === null) return '/name';
  if ('source' in node && node.source === 'library') return pointerOf([...head, 'library']);
  const members = Object.entries(node);
  const found = members.find(([, v]) => isTyped(v)) ?? members.find(([, v]) => isField(v));
  if (found) return pointerOf([...head, found[0]]);
  const inner = members[0];
  return inner === undefined ? '/name' : firstFieldBelow(form, [...head, inner[0]]);
}

const LABELS: Record<string, string> = {
  name: 'Name',
  from: 'From',
  to: 'To',
  nominalVoltageKv: 'Voltage',
  frequencyHz: 'Frequency',
  lengthKm: 'Length',
  earthResistivityOhmM: 'Earth resistivity',
  horizontalM: 'Across',
  attachmentHeightM: 'Height',
  sagM: 'Sag',
  bundleCount: 'Subconductors',
  bundleSpacingM: 'Bundle spacing',
  diameterMm: 'Diameter',
  coreDiameterMm: 'Core diameter',
  gmrMm: 'GMR',
  acResistanceOhmPerKm: 'A.C. resistance',
  dcResistance20OhmPerKm: 'D.C. resistance at 20 °C',
  temperatureC: 'Temperature',
  temperatureCoefficientPerK: 'Temperature coefficient',
  library: 'Conductor',
  ratingA: 'Rating',
  maxTemperatureC: 'Temperature of the rating',
  continuousA: 'Continuous rating',
  emergencyA: 'Short-time rating',
  season: 'Season',
  circuitId: 'Own name of the circuit',
  baseMva: 'Base power',
  baseKv: 'Base voltage',
  kind: 'Source of the values',
  status: 'State of the line',
  engineer: 'Engineer',
  date: 'Date',
};

const SEQUENCE = /^[rxb][01]m?$/;

/** How a position is called in sentences: "a", "a of circuit 2", "ground wire 1". */
export function positionName(form: LineForm, section: number, position: number): string {
  const positions = form.sections[section]?.positions ?? [];
  const at = positions[position];
  if (!at) return `position ${position + 1}`;
  if (at.kind === 'phase') return form.circuits === 2 ? `${at.phase}${at.circuit}` : at.phase;
  const ground = positions.slice(0, position + 1).filter((p) => p.kind === 'ground-wire').length;
  const several = positions.filter((p) => p.kind === 'ground-wire').length > 1;
  return several ? `ground wire ${ground}` : 'the ground wire';
}

/** The name of a field as the error summary says it: "Height of c", "X1", "GMR of phase". */
export function fieldLabel(form: LineForm, pointer: string): string {
  const path = steps(placeInForm(pointer));
  const last = path.at(-1) ?? '';
  const name = SEQUENCE.test(last) ? last.toUpperCase().replace('M', 'm') : (LABELS[last] ?? last);
  const section = path[0] === 'sections' ? Number(path[1]) : null;
  const inSection = section !== null && form.sections.length > 1 ? `, section ${section + 1}` : '';
  if (section !== null && path[2] === 'positions')
    return `${name} of ${positionName(form, section, Number(path[3]))}${inSection}`;
  if (section !== null && path[2] === 'conductors') return `${name} of ${path[3] ?? ''}${inSection}`;
  if (path[0] === 'declared' && form.circuits === 2) {
    const circuit = form.declared[Number(path[1])]?.circuit ?? Number(path[1]) + 1;
    return `${name} of circuit ${circuit}`;
  }
  return `${name}${inSection}`;
}
