import { pointerToken } from '../../shared/contracts/faults';
import type { PointerFault } from '../../shared/contracts/faults';

/** NUL, and halves of a character that stand alone: PostgreSQL keeps neither, in text or in JSON. */
const NEVER_KEPT = /\0|\p{Cs}/u;

/** Faults of texts, and of names of members, that could not be kept as they were sent. */
export function unkeptText(content: unknown, at = ''): PointerFault[] {
  if (typeof content === 'string') return NEVER_KEPT.test(content) ? [faultAt(at)] : [];
  if (typeof content !== 'object' || content === null) return [];
  return Object.entries(content).flatMap(([key, value]) => {
    if (NEVER_KEPT.test(key)) return [faultAt(at)];
    return unkeptText(value, `${at}/${pointerToken(key)}`);
  });
}

function faultAt(pointer: string): PointerFault {
  const message = 'The text holds a NUL or half a character, which cannot be kept.';
  return { pointer, value: null, expected: 'text of whole characters', message };
}

/** What is told of somebody's file, fit to be kept: signs that cannot be are shown as the one for such signs. */
export function fitToKeep<T>(value: T): T {
  if (typeof value === 'string') return value.replace(/\0|\p{Cs}/gu, '\uFFFD') as T;
  if (Array.isArray(value)) return value.map((item: unknown) => fitToKeep(item)) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, fitToKeep(item)])) as T;
}
