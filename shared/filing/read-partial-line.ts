/** What of a line that is still being written can be weighed: its parts that hold, and nothing in place of the others. */
import type { PointerFault } from '../contracts/faults';
import { pointerToken } from '../contracts/faults';
import type { FilingLine, Section } from '../contracts/filing.generated';
import { withDefaults } from './defaults';
import { resolveLibrary } from './library-resolve';
import { lineRuleFaults } from './line-rules';
import { normaliseLine } from './normalise-line';
import { holds, isObject } from './partial-rules';
import type { ReadContext } from './read-filing';
import type { DeclaredKey, NormalisedCircuit, NormalisedLine } from './types';

/** A line as far as it holds. */
export interface PartialLine {
  /** Sections that do not hold owe their geometry; declared values that do not hold are absent. */
  line: NormalisedLine;
  /** Indices of the sections whose geometry is whole. */
  whole: readonly number[];
}

type Json = Record<string, unknown>;
type Holds = (pointer: string) => boolean;

/** A line of which nothing has a length yet is reckoned by the kilometre: values per length do not depend on it. */
const PER_KILOMETRE = 1;

/** The members of an object at or below which nothing is at fault. */
function soundMembers(value: Json, at: string, ok: Holds): Json {
  return Object.fromEntries(Object.entries(value).filter(([key]) => ok(`${at}/${pointerToken(key)}`)));
}

/** Whether nothing but a section's length is missing or at fault. */
function isWhole(section: unknown, at: string, faults: readonly PointerFault[]): boolean {
  if (!isObject(section)) return false;
  const isThere = section['kind'] === 'cable' || Array.isArray(section['positions']);
  return isThere && holds(at, faults, [`${at}/lengthKm`]);
}

/** The sections as far as they hold, with whether the length of each is known. */
function soundSections(sections: readonly unknown[], faults: readonly PointerFault[]) {
  const lengthOf = (section: unknown, at: string): number | null => {
    const value = isObject(section) ? section['lengthKm'] : undefined;
    return typeof value === 'number' && holds(`${at}/lengthKm`, faults) ? value : null;
  };
  return sections.map((section, i) => {
    const at = `/sections/${i}`;
    const lengthKm = lengthOf(section, at);
    // Of one section alone the values per length are known before its length is.
    const whole = isWhole(section, at, faults) && (lengthKm !== null || sections.length === 1);
    const kept = whole ? (section as Json) : {};
    return { whole, lengthKm, section: { ...kept, lengthKm: lengthKm ?? PER_KILOMETRE } as Section };
  });
}

/** Whether a section is a cable whose values or length are not known: what share of the line it is, nobody can say. */
const isOpenCable = (section: unknown, known: boolean): boolean =>
  isObject(section) && section['kind'] === 'cable' && !known;

/** A circuit without the values of the whole line, which mean nothing before its length is known. */
function perLengthOnly(circuit: NormalisedCircuit): NormalisedCircuit {
  const entries = Object.entries(circuit.declared).filter(([, value]) => value.form === 'per-length');
  return { ...circuit, declared: Object.fromEntries(entries) as NormalisedCircuit['declared'] };
}

/** The declared circuits as far as they hold; null where one does not say which circuit it is of. */
function soundCircuits(declared: unknown, ok: Holds): Json[] | null {
  if (!Array.isArray(declared)) return null;
  const entries = declared.map((entry: unknown, i) => {
    const at = `/declared/${i}`;
    return isObject(entry) && ok(`${at}/circuit`) ? soundMembers(entry, at, ok) : null;
  });
  return entries.every((entry) => entry !== null) ? entries : null;
}

/** What a line is put together from. */
interface Parts {
  sections: ReturnType<typeof soundSections>;
  declared: Json[];
}

function partsOf(json: Json, faults: readonly PointerFault[]): Parts | null {
  const { sections, declared } = json;
  const ok: Holds = (pointer) => holds(pointer, faults);
  const stands = ok('/nominalVoltageKv') && ok('/frequencyHz') && Array.isArray(sections);
  const circuits = soundCircuits(declared, ok);
  if (!stands || circuits === null || faults.some((f) => ['', '/sections'].includes(f.pointer))) return null;
  const sound = soundSections(sections, faults);
  const isUnknown = sound.some(({ whole, lengthKm }, i) =>
    isOpenCable(sections[i], whole && lengthKm !== null),
  );
  return isUnknown ? null : { sections: sound, declared: circuits };
}

/**
 * Reads what can be weighed of a line that does not hold as a whole. Nothing is invented: a section is there with its
 * geometry or owes it, a declared value is there or is not.
 *
 * @param json the line as it came
 * @param faults what `readLine` found in it, pointers from the line
 * @param context library, owner's defaults, digits as written
 * @returns null while voltage, frequency or the circuits are not known, or nothing is there to be weighed
 */
export function readPartialLine(
  json: unknown,
  faults: readonly PointerFault[],
  context: ReadContext,
): PartialLine | null {
  const parts = isObject(json) ? partsOf(json, faults) : null;
  if (parts === null) return null;
  const { nominalVoltageKv, frequencyHz } = json as unknown as FilingLine;
  const given = {
    ...{ name: '', from: '', to: '', nominalVoltageKv, frequencyHz },
    sections: parts.sections.map(({ section }) => section),
    declared: parts.declared,
  } as unknown as FilingLine;
  const { line, faults: byLibrary } = resolveLibrary(given, context.library);
  if (byLibrary.length > 0 || lineRuleFaults(given).length > 0) return null;
  const filled = withDefaults(line, context.owner);
  const written = context.written ?? {};
  const normalised = normaliseLine(filled.line, { pointer: '', written, assumed: filled.assumed }).line;
  const lengthKnown = parts.sections.every(({ lengthKm }) => lengthKm !== null);
  const circuits = lengthKnown ? normalised.circuits : normalised.circuits.map(perLengthOnly);
  const whole = parts.sections.flatMap((part, i) => (part.whole ? [i] : []));
  const isEmpty = whole.length === 0 && circuits.every((c) => declaredKeys(c).length === 0);
  return isEmpty ? null : { line: { ...normalised, circuits, mutual: [] }, whole };
}

const declaredKeys = (circuit: NormalisedCircuit): DeclaredKey[] =>
  Object.keys(circuit.declared) as DeclaredKey[];
