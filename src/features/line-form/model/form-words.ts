import { figure, THIN_SPACE } from '#shared/format/numbers';
import { convert } from './convert';
import { heightUnit } from './edit';
import type { LineForm } from './form-types';
import { digitsTyped } from './number-text';
import { positionName } from './pointers';

const POSITION = /\bposition (\d+) \((?:phase [abc] of circuit \d|a ground wire)\)/gi;
const METRES = /(\d+(?:\.\d+)?)[ \u2009]m(?![\w²³·/])/g;

/** A message with the names that the form has for its positions: "phase a", not "position 1 (phase a of circuit 1)". */
function named(form: LineForm, section: number, message: string): string {
  return message.replace(POSITION, (found, index: string) => {
    const at = form.sections[section]?.positions[Number(index) - 1];
    if (!at) return found;
    const name = positionName(form, section, Number(index) - 1);
    const words = at.kind === 'phase' ? `phase ${name}` : name;
    return found.startsWith('P') ? words.charAt(0).toUpperCase() + words.slice(1) : words;
  });
}

/** Lengths in feet, in as many digits, where the form's are in feet. */
function inFeet(message: string): string {
  return message.replace(METRES, (_, text: string) => {
    const feet = figure(convert(Number(text), 'm', 'ft'), Math.max(2, digitsTyped(text)));
    return `${feet}${THIN_SPACE}ft`;
  });
}

/** What the check says of a section's geometry, by the names and in the unit of the form. */
export function inFormWords(form: LineForm, section: number, message: string): string {
  const words = named(form, section, message);
  const at = form.sections[section];
  return at && heightUnit(at) === 'ft' ? inFeet(words) : words;
}

const SECTION = /\/sections\/(\d+)\/positions\//;
const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * An outcome of the check with every message about a section's positions in the words of the form. Causes keep
 * theirs: they speak of units themselves.
 */
export function outcomeInFormWords<T>(form: LineForm, outcome: T): T {
  if (Array.isArray(outcome)) return outcome.map((item: unknown) => outcomeInFormWords(form, item)) as T;
  if (!isRecord(outcome)) return outcome;
  const entries = Object.entries(outcome).map(([key, value]) => [key, outcomeInFormWords(form, value)]);
  const copy = Object.fromEntries(entries) as Record<string, unknown>;
  const { where, message } = copy;
  const section = typeof where === 'string' ? SECTION.exec(where)?.[1] : undefined;
  if (section !== undefined && typeof message === 'string')
    copy['message'] = inFormWords(form, Number(section), message);
  return copy as T;
}
