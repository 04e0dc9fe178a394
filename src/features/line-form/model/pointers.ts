import type { FormPath, LineForm } from './form-types';
import { getAt } from './edit';

/** The id of the field that holds a place of the line; members and indices joined by dashes. */
export const fieldId = (pointer: string): string => `line${pointer.replace(/[^A-Za-z0-9-]+/g, '-')}`;

/** The pointer of a path of the form, written as JSON Pointer (RFC 6901). */
export const pointerOf = (path: FormPath): string =>
  path.map((step) => `/${String(step).replace(/~/g, '~0').replace(/\//g, '~1')}`).join('');

/** The path that a JSON Pointer names. */
export const pathOf = (pointer: string): string[] =>
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
  const path = pathOf(placeInForm(pointer));
  for (let n = path.length; n > 0; n -= 1) {
    const head = path.slice(0, n);
    const node = getAt(form, head);
    if (isField(node)) return pointerOf(head);
    if (node !== undefined && n === path.length) return firstFieldBelow(form, head);
  }
  return '/name';
}

const BUNDLE = /^\/sections\/(\d+)\/positions\/\d+\/(bundleCount|bundleSpacingM)$/;

/** The field that the page shows for a field of the form: a bundle is entered once for all phases of its section. */
export function shownPointer(form: LineForm, pointer: string): string {
  const [, section, key] = BUNDLE.exec(pointer) ?? [];
  if (section === undefined || key === undefined) return pointer;
  const first = form.sections[Number(section)]?.positions.findIndex((p) => p.kind === 'phase') ?? -1;
  return first < 0 ? pointer : `/sections/${section}/positions/${first}/${key}`;
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

/** How a position is called in sentences: "a", "2a", "ground wire 1". */
export function positionName(form: LineForm, section: number, position: number): string {
  const positions = form.sections[section]?.positions ?? [];
  const at = positions[position];
  if (!at) return `position ${position + 1}`;
  if (at.kind === 'phase') return form.circuits === 2 ? `${at.circuit}${at.phase}` : at.phase;
  const ground = positions.slice(0, position + 1).filter((p) => p.kind === 'ground-wire').length;
  const several = positions.filter((p) => p.kind === 'ground-wire').length > 1;
  return several ? `ground wire ${ground}` : 'the ground wire';
}

/** Where a field stands when its own name does not say it: "Height of c", "Section 2", "Circuit 2". */
function placeWords(form: LineForm, path: readonly string[]): string {
  const section = path[0] === 'sections' ? Number(path[1]) : null;
  const inSection = section !== null && form.sections.length > 1 ? `Section ${section + 1}` : '';
  if (section !== null && path[2] === 'positions' && !BUNDLE.test(pointerOf(path))) {
    const name = positionName(form, section, Number(path[3]));
    const words = /^(the )?ground/.test(name) ? name.replace(/^(the )?g/, 'G') : `Phase ${name}`;
    return inSection ? `${inSection}, ${words.charAt(0).toLowerCase()}${words.slice(1)}` : words;
  }
  if (section !== null && path[2] === 'conductors') {
    const words = `Conductor “${path[3] ?? ''}”`;
    return inSection ? `${inSection}, ${words.toLowerCase()}` : words;
  }
  if (path[0] === 'declared' && form.circuits === 2) {
    const circuit = form.declared[Number(path[1])]?.circuit ?? Number(path[1]) + 1;
    return `Circuit ${circuit}`;
  }
  return inSection;
}

/** The name of a field as sentences use it: "Height", "X1", "GMR". */
function fieldName(path: readonly string[]): string {
  const last = path.at(-1) ?? '';
  return SEQUENCE.test(last) ? last.toUpperCase().replace('M', 'm') : (LABELS[last] ?? last);
}

/** The name of a field with its place: "Phase c: Height", "X1". */
export function fieldLabel(form: LineForm, pointer: string): string {
  const path = pathOf(placeInForm(pointer));
  const place = placeWords(form, path);
  const name = fieldName(path);
  return place ? `${place}: ${name}` : name;
}

/** A fault as the error summary says it: its sentence, after its place where the sentence does not name one. */
export function faultSentence(form: LineForm, pointer: string, message: string): string {
  const path = pathOf(placeInForm(pointer));
  const place = placeWords(form, path);
  if (place) return `${place}: ${message}`;
  const name = fieldName(path);
  return message.startsWith(name) ? message : `${name}: ${message}`;
}

/** In which order the form's parts stand on the page. */
const ORDER = [
  'name',
  'from',
  'to',
  'nominalVoltageKv',
  'frequencyHz',
  'declared',
  'declaredMutual',
  'sections',
  'kind',
  'lengthKm',
  'perLength',
  'positions',
  'horizontalM',
  'attachmentHeightM',
  'sagM',
  'conductors',
  'library',
  'model',
  'diameterMm',
  'r1',
  'r0',
  'x1',
  'x0',
  'b1',
  'b0',
];

function rank(step: string): number {
  if (/^\d+$/.test(step)) return Number(step);
  const at = ORDER.indexOf(step);
  return at < 0 ? ORDER.length : at;
}

/** Sorts pointers as their fields stand on the page. */
export function inFormOrder(a: string, b: string): number {
  const [left, right] = [pathOf(a), pathOf(b)];
  for (let i = 0; i < Math.max(left.length, right.length); i += 1) {
    const difference = rank(left[i] ?? '') - rank(right[i] ?? '');
    if (difference !== 0) return difference;
  }
  return 0;
}
