/** A fault of something that was sent: where it sits, what is there, what is wanted, and one sentence. */

/** A fault at a JSON Pointer. */
export interface PointerFault {
  pointer: string;
  /** What is there, cut to a readable length; null where nothing is there. */
  value: unknown;
  /** What is wanted. */
  expected: string;
  /** The fault as a sentence. */
  message: string;
}

/** A fault in a cell of a table; the header is row 1. */
export interface CellFault {
  row: number;
  /** Name of the column; empty when the whole row is meant. */
  column: string;
  value: unknown;
  expected: string;
  message: string;
}

/** A fault of whatever was sent: of JSON by pointer, of a table by row and column. */
export type Fault = PointerFault | CellFault;

/** Faults that are listed of one thing that was sent; beyond it one last fault says that there are more. */
export const MAX_FAULTS = 5000;

/** Characters of a text that a fault repeats: enough to find it again, too few to fill a page. */
const SHOWN_LENGTH = 80;

/**
 * A value as a fault shows it: short texts, numbers and booleans as they are, all else in words.
 * A number that JSON cannot hold is shown as its name.
 */
export function shown(value: unknown): unknown {
  if (value === undefined || value === null) return null;
  if (typeof value === 'string') {
    const text = value.replace(/\p{Cc}|\p{Cs}|[\u200B-\u200F\u2028-\u202E\u2060-\u2069\uFEFF]/gu, (c) => {
      return `\\u${(c.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;
    });
    return text.length > SHOWN_LENGTH ? `${text.slice(0, SHOWN_LENGTH)}…` : text;
  }
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  if (typeof value === 'boolean') return value;
  if (Array.isArray(value)) return `a list of ${value.length}`;
  return 'an object';
}

/** A value as it stands in a sentence: texts in quotes, the minus sign a true one. */
export function inWords(value: unknown): string {
  const short = shown(value);
  if (short === null) return 'nothing';
  if (typeof value === 'string') return `“${String(short)}”`;
  if (typeof value === 'number') return numberInWords(value);
  return String(short);
}

/** A number in a sentence, with the true minus sign (U+2212) and narrow no-break spaces between thousands. */
export function numberInWords(value: number): string {
  const text = String(value).replace('-', '\u2212');
  return text.replace(/^(\u2212?)(\d{4,})(?=\.|$)/, (_, sign: string, digits: string) => {
    return sign + digits.replace(/\B(?=(\d{3})+$)/g, '\u202f');
  });
}

/** JSON Pointer token: `~` and `/` escaped after RFC 6901. */
export function pointerToken(key: string | number): string {
  return String(key).replaceAll('~', '~0').replaceAll('/', '~1');
}

/** The tokens of a JSON Pointer, unescaped. */
export function pointerTokens(pointer: string): string[] {
  return pointer
    .split('/')
    .slice(1)
    .map((t) => t.replaceAll('~1', '/').replaceAll('~0', '~'));
}

/** The value that a JSON Pointer names in `data`, or undefined. Inherited properties are not looked at. */
export function valueAt(data: unknown, pointer: string): unknown {
  let here: unknown = data;
  for (const token of pointerTokens(pointer)) {
    if (typeof here !== 'object' || here === null || !Object.hasOwn(here, token)) return undefined;
    here = (here as Record<string, unknown>)[token];
  }
  return here;
}

/** The faults in the order of their pointers, indices by number; one pointer keeps its first fault only. */
export function inOrder(faults: readonly PointerFault[]): PointerFault[] {
  const first = new Map<string, PointerFault>();
  for (const f of faults) if (!first.has(f.pointer)) first.set(f.pointer, f);
  const keyed = [...first.values()].map((fault) => ({ fault, tokens: pointerTokens(fault.pointer) }));
  keyed.sort((a, b) => {
    for (let i = 0; i < Math.min(a.tokens.length, b.tokens.length); i++) {
      const [s, t] = [a.tokens[i] ?? '', b.tokens[i] ?? ''];
      if (s === t) continue;
      const byNumber = Number(s) - Number(t);
      return byNumber || (s < t ? -1 : 1);
    }
    return a.tokens.length - b.tokens.length;
  });
  return keyed.map((k) => k.fault);
}
