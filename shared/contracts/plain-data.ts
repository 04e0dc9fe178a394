/** What must hold of any data from outside before a schema looks at it: depth, size, finite numbers, harmless keys. */
import { inWords, pointerToken, shown } from './faults';
import type { PointerFault } from './faults';

/** Deepest nesting that is read; the filing format itself needs eight. */
export const MAX_DEPTH = 32;

const LIMITS = {
  /** Values in one thing that was sent, all levels together; a full line of the format has some 40,000. */
  values: 200_000,
};

/** Key that JavaScript gives a meaning of its own; data that carry it are not taken. */
export const FORBIDDEN_KEY = '__proto__';

/** The fault of a forbidden key at `pointer`. */
export function forbiddenKey(pointer: string): PointerFault {
  return {
    pointer,
    value: FORBIDDEN_KEY,
    expected: 'another name',
    message: `“${FORBIDDEN_KEY}” is a name that cannot be used.`,
  };
}

/** The fault of a number that is too large for a double, or not a number at all. */
export function notFinite(pointer: string, written: string): PointerFault {
  return {
    pointer,
    value: shown(written),
    expected: 'a finite number',
    message: `${inWords(written)} is not a number that can be reckoned with.`,
  };
}

/** The fault of data that nest too deeply. */
export function tooDeep(pointer: string): PointerFault {
  return {
    pointer,
    value: null,
    expected: `at most ${MAX_DEPTH} levels`,
    message: `Objects and lists are nested more than ${MAX_DEPTH} levels deep here.`,
  };
}

/** What data are in themselves, whatever their schema. */
export interface PlainData {
  faults: PointerFault[];
  /** False where they are too deep or too many to be looked into further. */
  readable: boolean;
}

/**
 * Looks at data before a schema does.
 * @param data anything that came from outside as JSON
 * @returns faults of numbers and keys, and whether a schema may look at the data
 */
export function plainData(data: unknown): PlainData {
  const out: PlainData = { faults: [], readable: true };
  let seen = 0;
  const visit = (value: unknown, at: string, depth: number): void => {
    seen += 1;
    if (seen > LIMITS.values) return;
    if (typeof value === 'number' && !Number.isFinite(value)) out.faults.push(notFinite(at, String(value)));
    if (typeof value !== 'object' || value === null) return;
    if (depth >= MAX_DEPTH) {
      out.faults.push(tooDeep(at));
      out.readable = false;
      return;
    }
    if (Array.isArray(value)) value.forEach((v, i) => visit(v, `${at}/${i}`, depth + 1));
    else
      for (const key of Object.keys(value)) {
        if (key === FORBIDDEN_KEY) out.faults.push(forbiddenKey(`${at}/${key}`));
        else visit((value as Record<string, unknown>)[key], `${at}/${pointerToken(key)}`, depth + 1);
      }
  };
  visit(data, '', 0);
  if (seen <= LIMITS.values) return out;
  const message = 'There is more here than one line can hold.';
  out.faults.push({ pointer: '', value: null, expected: `at most ${LIMITS.values} values`, message });
  return { ...out, readable: false };
}
