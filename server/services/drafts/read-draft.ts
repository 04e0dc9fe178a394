import { setImmediate } from 'node:timers/promises';
import type { Transaction } from '../../database/transaction';
import type { DraftLine, TypedField } from '../../entities/case.entities';
import { draftLines } from '../../repositories/draft.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import type { PointerFault } from '../../../shared/contracts/faults';
import { solveLine } from '../../../shared/engine/index';
import { readFiling, readLine, type ReadContext } from '../../../shared/filing/read-filing';
import type { NormalisedLine } from '../../../shared/filing/types';
import type { CaseFile } from '../cases/case-file';
import { lineHash } from '../filing/line-hash';
import { readingContext } from '../rules/reading-context';

/** The draft of the next revision, read as it would be filed. */
export interface ReadDraft {
  rows: DraftLine[];
  /** Lines without a fault, in filing order, ready for the checks. */
  lines: NormalisedLine[];
  /** What stands in the way of filing, with pointers within the filing. */
  faults: PointerFault[];
  /** The lines equal those of the latest revision. */
  unchanged: boolean;
}

const drafts = new WeakMap<CaseFile, Promise<ReadDraft>>();

/** Reads the whole draft of a round, once for each reading of its case. */
export function readDraft(tx: Transaction, file: CaseFile): Promise<ReadDraft> {
  const known = drafts.get(file) ?? readOnce(tx, file);
  drafts.set(file, known);
  return known;
}

async function readOnce(tx: Transaction, file: CaseFile): Promise<ReadDraft> {
  const rows = await draftLines(tx.manager, file.round.id);
  if (rows.length === 0) return { rows, lines: [], faults: [], unchanged: false };
  const context = await readingContext(tx.manager);
  const { lines, faults } = await readRows(rows, context);
  return {
    rows,
    lines,
    faults,
    unchanged: faults.length === 0 && (await isUnchanged(tx, file, rows, lines)),
  };
}

/** Key of the line that a fault of the draft is about. */
export function lineKeyOf(fault: PointerFault, rows: readonly DraftLine[]): string | undefined {
  return rows[Number(/^\/lines\/(\d+)/.exec(fault.pointer)?.[1] ?? -1)]?.lineKey;
}

/** Keys of the lines that cannot be filed yet. */
export function faultyLines({ faults, rows }: Pick<ReadDraft, 'faults' | 'rows'>): string[] {
  return [...new Set(faults.flatMap((fault) => lineKeyOf(fault, rows) ?? []))];
}

async function readRows(rows: readonly DraftLine[], context: ReadContext) {
  const json = { format: 'filing/1', lines: rows.map((row) => row.body) };
  const written = Object.assign(
    {},
    ...rows.map((row, i) => moveKeys(writtenDigits(row.asTyped, row.body), `/lines/${i}`)),
  ) as Record<string, string>;
  const read = readFiling(json, { ...context, written });
  const lines = [...(read.ok ? read.filing.lines : read.sound.lines)];
  const faults = read.ok ? [] : [...read.faults];
  return { lines, faults: [...faults, ...(await geometryOfAll(lines))] };
}

/** For how long the geometry of a large draft is solved before others' requests have their turn. */
const TURN_MS = 20;

async function geometryOfAll(lines: readonly NormalisedLine[]): Promise<PointerFault[]> {
  const faults: PointerFault[] = [];
  let since = performance.now();
  for (const line of lines) {
    faults.push(...geometryFaults(line));
    if (performance.now() - since < TURN_MS) continue;
    await setImmediate();
    since = performance.now();
  }
  return faults;
}

/** Reads one line of a draft; pointers count from the line. */
export function readDraftLine(
  row: Pick<DraftLine, 'body' | 'asTyped'>,
  context: ReadContext,
): { line: NormalisedLine | null; faults: PointerFault[] } {
  const read = readLine(row.body, { ...context, written: writtenDigits(row.asTyped, row.body) });
  if (!read.ok) return { line: null, faults: read.faults };
  return { line: read.line, faults: geometryFaults(read.line) };
}

/** Geometry that cannot be computed may be saved, and stands in the way of filing. */
function geometryFaults(line: NormalisedLine): PointerFault[] {
  if (line.engineInput === null) return [];
  const solved = solveLine(line.engineInput, line.frequencyHz);
  if (solved.ok) return [];
  const { section, position } = solved.where;
  const place = section === undefined ? '' : `/sections/${section}`;
  const pointer = `${line.pointer}${place}${position === undefined ? '' : `/positions/${position}`}`;
  return [
    {
      pointer,
      value: null,
      expected: 'geometry that can be computed',
      message: `The geometry cannot be computed: ${solved.detail}.`.replace(/\.\.$/, '.'),
    },
  ];
}

async function isUnchanged(
  tx: Transaction,
  file: CaseFile,
  rows: readonly DraftLine[],
  lines: readonly NormalisedLine[],
): Promise<boolean> {
  if (file.revision === null) return false;
  const before = await linesOfRevision(tx.manager, file.revision.id);
  const now = lines.map((line, i) => `${rows[i]?.lineKey} ${lineHash(line)}`);
  return before.map((line) => `${line.lineKey} ${line.lineHash}`).join('\n') === now.join('\n');
}

/** Digits as typed, where they are those of the number that stands in the line: "0.40" for 0.4. */
export function writtenDigits(
  asTyped: Readonly<Record<string, TypedField>>,
  body: unknown,
): Record<string, string> {
  const written: Record<string, string> = {};
  for (const [pointer, { text }] of Object.entries(asTyped)) {
    const digits = text.trim();
    const value = valueAt(body, pointer);
    if (typeof value === 'number' && /^-?\d/.test(digits) && Number(digits) === value)
      written[pointer] = digits;
  }
  return written;
}

/** What stands at a JSON Pointer, or nothing. */
export function valueAt(json: unknown, pointer: string): unknown {
  let at = json;
  for (const part of pointer.split('/').slice(1)) {
    const key = part.replaceAll('~1', '/').replaceAll('~0', '~');
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, key)) return undefined;
    at = (at as Record<string, unknown>)[key];
  }
  return at;
}

function moveKeys(written: Record<string, string>, by: string): Record<string, string> {
  return Object.fromEntries(Object.entries(written).map(([pointer, digits]) => [`${by}${pointer}`, digits]));
}
