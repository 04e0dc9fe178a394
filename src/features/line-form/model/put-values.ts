import { figure } from '#shared/format/numbers';
import { convert } from './convert';
import { getAt, setAt } from './edit';
import type { FormPath, LineForm, Typed } from './form-types';
import { MUTUAL_KEYS, SEQUENCE_KEYS } from './form-types';
import { writeNumber } from './number-text';
import { fieldLabel, fieldPointer, pointerOf } from './pointers';
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

const words = ({ text, unit }: Typed): string => (text ? `${text} ${unitLabel(unit)}`.trim() : 'empty');

function declaredPath(form: LineForm, key: string, circuit: number): FormPath | null {
  if ((MUTUAL_KEYS as readonly string[]).includes(key)) return ['declaredMutual', key];
  if (!(SEQUENCE_KEYS as readonly string[]).includes(key)) return null;
  const index = form.declared.findIndex((d) => d.circuit === circuit);
  return index < 0 ? null : ['declared', index, key];
}

function replace(put: Put, path: FormPath, value: number, unit: string): Put {
  const field = getAt(put.form, path);
  if (typeof field === 'string')
    return record(put, path, { text: field, unit: '' }, { text: writeNumber(value), unit: '' }, true);
  if (typeof field !== 'object' || field === null || !('text' in field)) return put;
  const before = field as Typed;
  const perLength = unit !== '';
  const shown = perLength || before.unit === 'm' ? value : convert(value, 'm', before.unit);
  const text = perLength ? figure(value, digitsOf(before.text)) : writeNumber(Number(shown.toPrecision(6)));
  return record(put, path, before, { ...before, text, unit: perLength ? unit : before.unit }, false);
}

function record(put: Put, path: FormPath, before: Typed, after: Typed, plain: boolean): Put {
  const pointer = pointerOf(path);
  const label = fieldLabel(put.form, pointer);
  return {
    form: setAt(put.form, path, plain ? after.text : after),
    values: [...put.values, { pointer, label, before: words(before), after: words(after) }],
  };
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
      if (path) put = replace(put, path, value, key.startsWith('b') ? 'uS/km' : 'ohm/km');
      continue;
    }
    const place = `${(correction.where ?? '').replace(/^\/lines\/\d+/, '')}`;
    const exact = place.endsWith(`/${key}`) ? place : `${place}/${key}`;
    const pointer = fieldPointer(form, exact);
    if (pointer === exact) put = replace(put, pointer.split('/').slice(1), value, '');
  }
  return put;
}
