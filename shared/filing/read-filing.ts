/** From anything that came as JSON to a filing that the checks take, or every fault at once. */
import { inOrder, inWords, MAX_FAULTS, shown } from '../contracts/faults';
import type { PointerFault } from '../contracts/faults';
import type { FilingLine } from '../contracts/filing.generated';
import { schemaFaults } from '../contracts/schema-faults';
import { filingValidator, lineFaults } from '../contracts/validators';
import type { ConductorLibrary } from '../library/types';
import { withDefaults } from './defaults';
import { resolveLibrary } from './library-resolve';
import { lineRuleFaults } from './line-rules';
import { normaliseLine } from './normalise-line';
import { partialRuleFaults } from './partial-rules';
import type { NormalisedFiling, NormalisedLine, Notice, OwnerDefaults, WrittenDigits } from './types';

/** What a filing is read with. */
export interface ReadContext {
  library: ConductorLibrary;
  owner: OwnerDefaults;
  /** Digits as written, by JSON Pointer from what is read (the filing or the line). */
  written?: WrittenDigits;
}

/** What a single line is read with. */
export interface ReadLineContext extends ReadContext {
  /** JSON Pointer of the line in its filing; nothing when it stands alone. */
  pointer?: string;
  /** Pointers from the line of values that the owner's settings filled in before (a frozen line's). */
  assumed?: readonly string[];
}

/** What came of a filing. */
export type ReadFiling =
  | { ok: true; filing: NormalisedFiling; notices: Notice[] }
  | {
      ok: false;
      faults: PointerFault[];
      /** the lines without a fault, as a filing */ sound: NormalisedFiling;
    };

/** What came of a line. */
export type ReadLine =
  { ok: true; line: NormalisedLine; notices: Notice[] } | { ok: false; faults: PointerFault[] };

/** Pointers from the line turned into pointers from the filing. */
const moved = <T extends { pointer?: string }>(items: readonly T[], by: string): T[] =>
  items.map((item) => ({ ...item, pointer: `${by}${item.pointer ?? ''}` }));

/**
 * Reads one line.
 * @param json anything that came as JSON
 * @param context library, owner's defaults, digits as written
 * @returns the line ready for the checks; or every fault, by schema first, then by rules, then by what it comes to
 */
export function readLine(json: unknown, context: ReadLineContext): ReadLine {
  const pointer = context.pointer ?? '';
  const failed = (faults: readonly PointerFault[]): ReadLine => ({
    ok: false,
    faults: inOrder(moved(faults, pointer)),
  });
  const bySchema = lineFaults(json);
  if (bySchema.length > 0)
    return failed([...bySchema, ...partialRuleFaults(json, bySchema, context.library)]);
  const given = json as FilingLine;
  const resolved = resolveLibrary(given, context.library);
  const byRules = [...resolved.faults, ...lineRuleFaults(given)];
  if (byRules.length > 0) return failed(byRules);
  const filled = withDefaults(resolved.line, context.owner);
  const assumed = [...(context.assumed ?? []), ...filled.assumed];
  const normalised = normaliseLine(filled.line, { pointer, written: context.written ?? {}, assumed });
  if (normalised.faults.length > 0) return { ok: false, faults: inOrder(normalised.faults) };
  return {
    ok: true,
    line: normalised.line,
    notices: moved([...resolved.notices, ...filled.notices], pointer),
  };
}

/** Faults of what stands around the lines: the format, unknown keys, that there are lines. */
function frameFaults(json: unknown): PointerFault[] {
  if (typeof json === 'object' && json !== null && Array.isArray((json as { lines?: unknown }).lines)) {
    const { lines } = json as { lines: unknown[] };
    // Its own validator, with the lines themselves left out: they are looked at one by one.
    const frame = { ...json, lines: lines.slice(0, 0) };
    const faults = filingValidator(frame) ? [] : schemaFaults(filingValidator.errors ?? [], frame);
    const aside = lines.length > 0 ? faults.filter((f) => f.pointer !== '/lines') : faults;
    return lines.length > MAX_LINES ? [...aside, tooMany(lines.length)] : aside;
  }
  if (Array.isArray(json))
    return [
      {
        pointer: '',
        value: shown(json),
        expected: 'an object with "lines"',
        message: 'A filing is an object; put the list under "lines".',
      },
    ];
  return filingValidator(json) ? [] : schemaFaults(filingValidator.errors ?? [], json);
}

/** Lines in one filing. */
const MAX_LINES = 20_000;

/** The fault of a filing with more lines than are read. */
function tooMany(count: number): PointerFault {
  return {
    pointer: '/lines',
    value: `a list of ${count}`,
    expected: `at most ${MAX_LINES} lines`,
    message: `A filing holds at most ${MAX_LINES} lines.`,
  };
}

/** A name as it is compared: two lines that only differ in case, accents' form or blanks are the same to people. */
const comparable = (name: string) => name.normalize('NFKC').trim().replace(/\s+/g, ' ').toLowerCase();

/** Names that occur twice; the fault stands at the later line. */
function nameFaults(lines: readonly unknown[]): PointerFault[] {
  const first = new Map<string, number>();
  return lines.flatMap((line, i) => {
    const name = (line as { name?: unknown } | null)?.name;
    if (typeof name !== 'string') return [];
    const key = comparable(name);
    const before = first.get(key);
    if (before === undefined) first.set(key, i);
    if (before === undefined) return [];
    const message = `Lines ${before + 1} and ${i + 1} have the same name: ${inWords(name)}.`;
    return [{ pointer: `/lines/${i}/name`, value: shown(name), expected: 'each name once', message }];
  });
}

/** Digits as written, sorted to their lines, with pointers from the line. */
function writtenByLine(written: WrittenDigits): Map<number, Record<string, string>> {
  const out = new Map<number, Record<string, string>>();
  for (const [pointer, digits] of Object.entries(written)) {
    const m = /^\/lines\/(\d+)(\/.*)$/.exec(pointer);
    if (!m) continue;
    const index = Number(m[1]);
    const own = out.get(index) ?? {};
    own[m[2] ?? ''] = digits;
    out.set(index, own);
  }
  return out;
}

/** At most so many faults as are worth listing, and then that there are more. */
function capped(faults: readonly PointerFault[]): PointerFault[] {
  if (faults.length <= MAX_FAULTS) return [...faults];
  const message = `There are more faults than the ${MAX_FAULTS} listed here.`;
  return [
    ...faults.slice(0, MAX_FAULTS),
    { pointer: '', value: faults.length, expected: 'fewer faults', message },
  ];
}

/**
 * Reads a filing.
 * @param json anything that came as JSON
 * @param context library, owner's defaults, digits as written
 * @returns the filing ready for the checks, with notices of what was assumed; or every fault of every line
 */
export function readFiling(json: unknown, context: ReadContext): ReadFiling {
  const frame = frameFaults(json);
  const lines = (json as { lines?: unknown } | null)?.lines;
  if (!Array.isArray(lines) || lines.length > MAX_LINES)
    return { ok: false, faults: inOrder(frame), sound: { lines: [] } };
  const names = nameFaults(lines);
  const doubled = new Set(names.map((f) => f.pointer));
  const written = writtenByLine(context.written ?? {});
  const faults = [...frame, ...names];
  const notices: Notice[] = [];
  const sound: NormalisedLine[] = [];
  for (const [i, line] of lines.entries()) {
    if (faults.length > MAX_FAULTS) break;
    const read = readLine(line, { ...context, pointer: `/lines/${i}`, written: written.get(i) ?? {} });
    if (!read.ok) faults.push(...read.faults);
    else {
      notices.push(...read.notices);
      if (!doubled.has(`/lines/${i}/name`)) sound.push(read.line);
    }
  }
  if (faults.length > 0) return { ok: false, faults: capped(inOrder(faults)), sound: { lines: sound } };
  return { ok: true, filing: { lines: sound }, notices };
}
