/** Copies the data of library conductors into a filing, so that what is frozen holds all that it was judged by. */
import { inWords, pointerToken, shown } from '../contracts/faults';
import type { PointerFault } from '../contracts/faults';
import type { Conductor, FilingLine, Section } from '../contracts/filing.generated';
import { closestNames, nearestNames } from '../contracts/nearest';
import { handbookData, handbookLacks, isChoosable } from '../library/handbook-data';
import type { ConductorLibrary, LibraryConductor } from '../library/types';
import type { Notice } from './types';

/** A line whose conductors all carry their data; or the faults of those that cannot. */
export interface Resolved {
  line: FilingLine;
  faults: PointerFault[];
  notices: Notice[];
}

/** Libraries are looked up for every conductor of every line: one index a library. */
const indices = new WeakMap<ConductorLibrary, Map<string, LibraryConductor>>();

function indexOf(library: ConductorLibrary): Map<string, LibraryConductor> {
  const known = indices.get(library);
  if (known) return known;
  const index = new Map(library.conductors.map((c) => [c.name.normalize('NFC'), c]));
  indices.set(library, index);
  return index;
}

/** Names that a filing may use: rows that lack data are no help as a suggestion. */
function choosableNames(library: ConductorLibrary): string[] {
  return library.conductors.filter(isChoosable).map((c) => c.name);
}

/** The fault of a name that the library does not have, with the nearest that it has. */
function unknown(name: string, pointer: string, library: ConductorLibrary): PointerFault {
  const names = choosableNames(library);
  const near = nearestNames(name, names);
  const closest = near.length > 0 ? near : closestNames(name, names);
  const list = closest.join(', ');
  const hint =
    near.length > 0
      ? ` The nearest ${near.length === 1 ? 'is' : 'are'} ${list}.`
      : `${list && ` No name comes near; closest in spelling are ${list}.`} Give its data instead.`;
  const expected = list ? `a conductor of the library, such as ${list}` : 'a conductor of the library';
  return {
    pointer,
    value: shown(name),
    expected,
    message: `The library has no conductor ${inWords(name)}.${hint}`,
  };
}

/** The fault of a row that lacks what the model needs. */
function incomplete(row: LibraryConductor, pointer: string): PointerFault {
  const lacks = handbookLacks(row).join(' and ');
  return {
    pointer,
    value: row.name,
    expected: 'a conductor whose row is complete, or the data themselves',
    message: `The library’s row of ${row.name} lacks ${lacks}, so it cannot be chosen. Give its data instead.`,
  };
}

/**
 * The fault of a conductor that names the library wrongly.
 * @param c a conductor that holds by schema
 * @param pointer JSON Pointer of the conductor
 * @returns nothing when its data are given, or the library has them
 */
export function libraryFaults(c: Conductor, pointer: string, library: ConductorLibrary): PointerFault[] {
  if (c.library === undefined) return [];
  const row = indexOf(library).get(c.library.normalize('NFC'));
  const at = `${pointer}/library`;
  if (!row) return [unknown(c.library, at, library)];
  return isChoosable(row) ? [] : [incomplete(row, at)];
}

/** Looks up one conductor; faults and notices go to `out`. */
function resolve(c: Conductor, pointer: string, library: ConductorLibrary, out: Resolved): Conductor {
  const row = c.library === undefined ? undefined : indexOf(library).get(c.library.normalize('NFC'));
  const data = row && handbookData(row, c.temperatureC ?? 20);
  out.faults.push(...libraryFaults(c, pointer, library));
  if (!data) return c;
  const message = `The data of ${row.name} at ${data.temperatureC}\u2009°C are copied from library ${library.version}.`;
  out.notices.push({ code: 'library-copied', pointer, message });
  return data;
}

/**
 * Replaces every `{ library, temperatureC }` of a line by the library's data.
 * @param line a line that holds by schema
 * @param library the library's current version
 * @returns the line with data; faults name unknown conductors (with the nearest names) and rows that lack data
 */
export function resolveLibrary(line: FilingLine, library: ConductorLibrary): Resolved {
  const out: Resolved = { line, faults: [], notices: [] };
  const sections = line.sections.map((s, i): Section => {
    if (!s.conductors) return s;
    const rows = Object.entries(s.conductors).map(([key, c]): [string, Conductor] => {
      return [key, resolve(c, `/sections/${i}/conductors/${pointerToken(key)}`, library, out)];
    });
    return { ...s, conductors: Object.fromEntries(rows) };
  });
  return { ...out, line: { ...line, sections } };
}
