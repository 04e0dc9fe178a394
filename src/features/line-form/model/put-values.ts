import { figure, THIN_SPACE } from '#shared/format/numbers';
import { convert } from './convert';
import { getAt, setAt } from './edit';
import type { FormPath, LineForm, PhaseForm, Typed } from './form-types';
import { MUTUAL_KEYS, SEQUENCE_KEYS } from './form-types';
import { writeNumber } from './number-text';
import { fieldLabel, fieldPointer, pathOf, pointerOf } from './pointers';
import { unitLabel } from './unit-choices';

/** A correction that the check offers, as far as the form needs it. */
export interface Correction {
  in: 'declared' | 'geometry';
  corrected: Readonly<Record<string, number>>;
  /** JSON Pointer of the place of a slip in the geometry. */
  where?: string;
}

/** One value put in: what stood there and what stands there now. */
export interface PutValue {
  pointer: string;
  label: string;
  before: string;
  after: string;
}

export interface Put {
  form: LineForm;
  values: PutValue[];
}

const LEAST_DIGITS = 3;

/** Significant digits of a text, so that a correction is written no finer than what it replaces, but for three. */
function digitsOf(text: string): number {
  const digits = text.replace(/e.*$/i, '').replace(/[^\d]/g, '').replace(/^0+/, '').length;
  return Math.min(6, Math.max(LEAST_DIGITS, digits));
}

const words = ({ text, unit }: Typed): string =>
  text ? [text, unitLabel(unit)].filter(Boolean).join(THIN_SPACE) : 'empty';

function declaredPath(form: LineForm, key: string, circuit: number): FormPath | null {
  if ((MUTUAL_KEYS as readonly string[]).includes(key)) return ['declaredMutual', key];
  if (!(SEQUENCE_KEYS as readonly string[]).includes(key)) return null;
  const index = form.declared.findIndex((d) => d.circuit === circuit);
  return index < 0 ? null : ['declared', index, key];
}

/** The unit in which the check gives an entry of the geometry. */
const unitOfEntry = (key: string): string => (key.endsWith('Mm') ? 'mm' : 'm');

const LENGTH_DIGITS = 6;

/** A length of the geometry as the form writes it: its own digits, three at least. */
function lengthText(value: number): string {
  return figure(value, digitsOf(String(Number(value.toPrecision(LENGTH_DIGITS)))));
}

/** Puts a declared value in, per kilometre. */
function replaceDeclared(put: Put, path: FormPath, value: number, unit: string): Put {
  const before = getAt(put.form, path) as Typed;
  return record(put, path, before, { ...before, text: figure(value, digitsOf(before.text)), unit });
}

/** Puts an entry of the geometry in, in the unit that its field is written in. */
function replaceEntry(put: Put, path: FormPath, value: number): Put {
  const field = getAt(put.form, path);
  if (typeof field === 'string')
    return record(put, path, { text: field, unit: '' }, { text: writeNumber(value), unit: '' });
  if (typeof field !== 'object' || field === null || !('text' in field)) return put;
  const before = field as Typed;
  const shown = convert(value, unitOfEntry(String(path.at(-1))), before.unit);
  return Number.isFinite(shown) ? record(put, path, before, { ...before, text: lengthText(shown) }) : put;
}

function record(put: Put, path: FormPath, before: Typed, after: Typed): Put {
  const plain = typeof getAt(put.form, path) === 'string';
  const pointer = pointerOf(path);
  const label = fieldLabel(put.form, pointer);
  return {
    form: setAt(put.form, path, plain ? after.text : after),
    values: [...put.values, { pointer, label, before: words(before), after: words(after) }],
  };
}

/** Whether two phases carry the same bundle, as typed. */
const sameBundle = (a: PhaseForm, b: PhaseForm): boolean =>
  a.bundleCount === b.bundleCount && same(a.bundleSpacingM, b.bundleSpacingM);

const same = (a: Typed, b: Typed): boolean => a.text === b.text && a.unit === b.unit;

/**
 * Every field that a correction of one field is of: a bundle is that of all phases that carry it, a conductor that
 * of all sections that name it with the same value. A coordinate is of its position alone.
 */
function alike(form: LineForm, path: readonly string[]): FormPath[] {
  const [, at, kind, name, key = ''] = path;
  const section = form.sections[Number(at)];
  if (kind === 'positions' && key.startsWith('bundle')) {
    const own = section?.positions[Number(name)];
    if (own?.kind !== 'phase') return [];
    return form.sections.flatMap((s, i) =>
      s.positions.flatMap((p, j): FormPath[] =>
        p.kind === 'phase' && sameBundle(p, own) ? [['sections', i, 'positions', j, key]] : [],
      ),
    );
  }
  if (kind !== 'conductors') return [path];
  const own = getAt(form, path) as Typed;
  return form.sections.flatMap((s, i): FormPath[] => {
    const other = getAt(s.conductors[name ?? ''], [key]) as Typed | undefined;
    return other && same(other, own) ? [['sections', i, 'conductors', name ?? '', key]] : [];
  });
}

/** The corrected values that are numbers, as their fields stand on the page. */
function inFieldOrder(corrected: Correction['corrected']): [string, number][] {
  const order: readonly string[] = ['r1', 'r0', 'x1', 'x0', 'b1', 'b0', ...MUTUAL_KEYS];
  const rank = (key: string): number => (order.includes(key) ? order.indexOf(key) : order.length);
  return Object.entries(corrected)
    .filter(([, value]) => Number.isFinite(value))
    .sort(([a], [b]) => rank(a) - rank(b));
}

/** Puts a correction into the form: declared values in Ω/km and µS/km, entries of the geometry in their own unit. */
export function putCorrection(form: LineForm, correction: Correction, circuit: number): Put {
  let put: Put = { form, values: [] };
  for (const [key, value] of inFieldOrder(correction.corrected)) {
    if (correction.in === 'declared') {
      const path = declaredPath(form, key, circuit);
      if (path) put = replaceDeclared(put, path, value, key.startsWith('b') ? 'uS/km' : 'ohm/km');
      continue;
    }
    const place = `${(correction.where ?? '').replace(/^\/lines\/\d+/, '')}`;
    const exact = place.endsWith(`/${key}`) ? place : `${place}/${key}`;
    if (fieldPointer(form, exact) !== exact) continue;
    for (const path of alike(form, pathOf(exact))) put = replaceEntry(put, path, value);
  }
  return put;
}
