import type { LineForm } from './form-types';
import { pathOf, positionName } from './pointers';
import { putCorrection } from './put-values';
import type { Correction, PutValue } from './put-values';

/** What a field is called in the middle of a sentence, alone and counted. */
const NOUNS: Readonly<Record<string, readonly [one: string, many: string]>> = {
  horizontalM: ['offset', 'offsets'],
  attachmentHeightM: ['height', 'heights'],
  sagM: ['sag', 'sags'],
  bundleCount: ['number of subconductors', 'numbers of subconductors'],
  bundleSpacingM: ['bundle spacing', 'bundle spacings'],
  diameterMm: ['diameter', 'diameters'],
  coreDiameterMm: ['core diameter', 'core diameters'],
  gmrMm: ['GMR', 'GMRs'],
};

function list(items: readonly string[]): string {
  const last = items.at(-1) ?? '';
  return items.length > 1 ? `${items.slice(0, -1).join(', ')} and ${last}` : last;
}

/** The field alone: "the height", "X1". */
function noun(pointer: string): string {
  const key = pathOf(pointer).at(-1) ?? '';
  const found = NOUNS[key];
  return found ? `the ${found[0]}` : key.charAt(0).toUpperCase() + key.slice(1);
}

/** What it is a field of: "c", "ground wire 1", "conductor phase"; nothing for a value of the only circuit. */
function owner(form: LineForm, [part, index, kind, name]: readonly string[]): string | null {
  if (part === 'declared' && form.circuits === 2)
    return `circuit ${form.declared[Number(index)]?.circuit ?? Number(index) + 1}`;
  if (kind === 'positions') return positionName(form, Number(index), Number(name));
  if (kind !== 'conductors') return null;
  if (name === 'phase') return 'the phase conductor';
  return name === 'ground' ? 'the ground wire' : `conductor “${name ?? ''}”`;
}

/** A field with its place, as it stands in the middle of a sentence: "the height of c", "X1". */
export function fieldPhrase(form: LineForm, pointer: string): string {
  const path = pathOf(pointer);
  const of = owner(form, path);
  const place =
    path[0] === 'sections' && form.sections.length > 1 ? ` in section ${Number(path[1]) + 1}` : '';
  return `${noun(pointer)}${of ? ` of ${of}` : ''}${place}`;
}

/** Values of one kind of field together, in the order in which the kinds come. */
function byNoun(values: readonly PutValue[]): PutValue[][] {
  const nouns = [...new Set(values.map(({ pointer }) => noun(pointer)))];
  return nouns.map((name) => values.filter(({ pointer }) => noun(pointer) === name));
}

const isOneText = (group: readonly PutValue[]): boolean => new Set(group.map((v) => v.after)).size === 1;

/** A group by its number: "5 heights"; a declared value by its name. */
function counted(group: readonly PutValue[]): string {
  const pointer = group[0]?.pointer ?? '';
  const found = NOUNS[pathOf(pointer).at(-1) ?? ''];
  return found ? `${group.length} ${found[group.length === 1 ? 0 : 1]}` : noun(pointer);
}

/**
 * What the button of a correction says: the very texts that it puts into which fields.
 *
 * @returns null where the form has no field for it, or it would change nothing
 */
export function putWords(form: LineForm, correction: Correction, circuit: number): string | null {
  const { values } = putCorrection(form, correction, circuit);
  const [first] = values;
  if (!first) return null;
  if (values.length === 1) return `Put ${first.after} into ${fieldPhrase(form, first.pointer)}`;
  const groups = byNoun(values);
  if (groups.length <= 2 && groups.every(isOneText))
    return `Put ${list(groups.map(([v]) => (v ? `${v.after} into ${noun(v.pointer)}` : '')))}`;
  if (correction.in === 'declared') return `Put ${values.length} values into ${list(groups.map(counted))}`;
  return `Put in ${list(groups.map(counted))}`;
}
