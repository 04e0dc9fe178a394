import type { Revision } from '../../entities/filed.entities';
import { stale } from '../../errors/problem';
import { findRevision, linesOfRevisions, type FiledLine } from '../../repositories/revision.repository';
import { joinWords } from '../../../shared/workflow/needs';
import type { Caller } from './caller';
import { filedRevision, type CaseFile } from './case-file';

export type LineChange = 'first' | 'new' | 'changed' | 'same';

/** How a line stands to the revision before. */
export function lineChange(before: readonly FiledLine[] | null, line: FiledLine): LineChange {
  if (before === null) return 'first';
  const known = before.find((other) => other.lineKey === line.lineKey);
  if (known === undefined) return 'new';
  return known.lineHash === line.lineHash ? 'same' : 'changed';
}

/** What changed from one revision to the next, in words: "L1 and L4 changed, L5 added". */
export function changeWords(before: readonly FiledLine[] | null, after: readonly FiledLine[]): string {
  if (before === null) return `first filing, ${after.length === 1 ? 'one line' : `${after.length} lines`}`;
  const keys = (change: LineChange) =>
    after.filter((line) => lineChange(before, line) === change).map((line) => line.lineKey);
  const removed = before.filter((b) => !after.some((a) => a.lineKey === b.lineKey)).map((b) => b.lineKey);
  const parts = [
    [keys('changed'), 'changed'],
    [keys('new'), 'added'],
    [removed, 'removed'],
  ] as const;
  const said = parts.filter(([list]) => list.length > 0).map(([list, word]) => `${shortList(list)} ${word}`);
  return said.length === 0 ? 'no line changed' : said.join(', ');
}

function shortList(keys: readonly string[]): string {
  const shown = keys.slice(0, 5);
  return joinWords(keys.length > 5 ? [...shown, `${keys.length - 5} more`] : shown);
}

/** Refuses a decision that was made on an older revision, and says what changed since. */
export async function requireRevision(caller: Caller, file: CaseFile, letter: string): Promise<Revision> {
  const current = filedRevision(file);
  if (current.letter === letter) return current;
  const { tx, ability } = caller;
  const named = await findRevision(tx.manager, ability, file.application.id, letter);
  const changed = [`Revision ${current.letter} was filed since.`];
  if (named !== null) {
    const lines = await linesOfRevisions(tx.manager, [named.id, current.id]);
    const words = changeWords(lines.get(named.id) ?? [], lines.get(current.id) ?? []);
    changed.push(`From ${named.letter} to ${current.letter}: ${words}.`);
  }
  throw stale(`Revision ${current.letter} is the current one; this was decided on revision ${letter}.`, {
    currentRevision: current.letter,
    currentVersion: file.round.version,
    changed,
  });
}
