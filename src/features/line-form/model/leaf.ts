import type { AsTyped, KeptText, Typed } from './form-types';
import { readNumber, writeNumber } from './number-text';
import { convert } from './convert';

/** A text that is no number, at its place in the line. */
export interface TextFault {
  pointer: string;
  value: string;
  expected: string;
  message: string;
}

/** Collects what a walk over the form finds beside the line. */
export interface Gathered {
  asTyped: AsTyped;
  faults: TextFault[];
}

/** A field as it is kept beside the number: its text, and its unit where the filing's is another. */
const keep = (field: Typed, unit: string): KeptText =>
  field.unit === unit ? { text: field.text } : { text: field.text, unit: field.unit };

/**
 * The number of a field in the filing's unit, or undefined while the field is empty or is no number.
 * What the number alone would lose (unit, trailing zeros, a slip of the pen) goes to `gathered`.
 */
export function numberOf(
  field: Typed,
  unit: string,
  pointer: string,
  gathered: Gathered,
): number | undefined {
  const reading = readNumber(field.text);
  if (reading.kind === 'empty') {
    if (field.unit !== unit) gathered.asTyped[pointer] = keep(field, unit);
    return undefined;
  }
  if (reading.kind === 'fault') {
    gathered.asTyped[pointer] = keep(field, unit);
    const { expected, message } = reading;
    gathered.faults.push({ pointer, value: field.text, expected, message });
    return undefined;
  }
  const value = field.unit === unit ? reading.value : convert(reading.value, field.unit, unit);
  if (field.unit !== unit || field.text !== writeNumber(value)) gathered.asTyped[pointer] = keep(field, unit);
  return value;
}

/** Whether a kept text still says the same as the number in the line (an import may have replaced it). */
function agrees(kept: Typed, value: number, unit: string): boolean {
  const reading = readNumber(kept.text);
  if (reading.kind !== 'number') return false;
  const si = kept.unit === unit ? reading.value : convert(reading.value, kept.unit, unit);
  return Math.abs(si - value) <= 1e-12 * Math.max(Math.abs(si), Math.abs(value));
}

/** The field for a number of the line, with the text as it was typed where that still holds. */
export function fieldOf(
  value: unknown,
  unit: string,
  units: readonly string[],
  kept: KeptText | undefined,
): Typed {
  const known = kept?.unit !== undefined && units.includes(kept.unit) ? kept.unit : unit;
  const typed: Typed | null = kept ? { text: kept.text, unit: known } : null;
  if (typeof value !== 'number') return typed ?? { text: '', unit };
  if (typed && agrees(typed, value, unit)) return typed;
  return { text: writeNumber(value), unit };
}
