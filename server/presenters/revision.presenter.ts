import type { Revision } from '../entities/filed.entities';
import type { PeopleById } from '../repositories/people-names.repository';
import type { FiledLine } from '../repositories/revision.repository';
import type { RunHead } from '../repositories/run.repository';
import type * as Api from '../../shared/contracts/api.generated';
import type { FilingLine } from '../../shared/contracts/filing.generated';
import type { LineSheet } from '../../shared/filing/types';
import { GRADES } from '../../shared/workflow/dispositions';
import { worstOf } from './application.presenter';
import { countGrades, stands, type FindingView } from './finding.presenter';
import { instantOrNull, presentPerson, presentPersonOrNull } from './person.presenter';

export function filedLineOf(line: Pick<FiledLine, 'body'>): FilingLine {
  return (line.body as unknown as LineSheet).line;
}

type LineHead = Pick<
  Api.LineSummary,
  | 'lineKey'
  | 'ordinal'
  | 'name'
  | 'from'
  | 'to'
  | 'nominalVoltageKv'
  | 'frequencyHz'
  | 'lengthKm'
  | 'circuitCount'
  | 'sectionCount'
  | 'conductors'
>;

/** What every list of lines says of one. */
export function presentLineHead(line: Omit<FiledLine, 'lineHash'>): LineHead {
  const filed = filedLineOf(line);
  return {
    lineKey: line.lineKey,
    ordinal: line.ordinal,
    name: line.name,
    from: filed.from,
    to: filed.to,
    nominalVoltageKv: line.nominalVoltageKv,
    frequencyHz: line.frequencyHz,
    lengthKm: line.lengthKm,
    circuitCount: circuitCount(filed),
    sectionCount: filed.sections.length,
    conductors: conductorWords(filed),
  };
}

/** Circuits of a line, by what is declared and by what hangs in its sections. */
export function circuitCount(line: FilingLine): number {
  const circuits = line.declared.map((declared) => declared.circuit);
  for (const section of line.sections) {
    if (!('positions' in section) || section.positions === undefined) continue;
    for (const position of section.positions) if ('circuit' in position) circuits.push(position.circuit ?? 1);
  }
  return Math.min(2, Math.max(1, ...circuits));
}

/** Phase conductors in words: "2 × Drake"; "cable"; "no geometry". */
export function conductorWords(line: FilingLine): string {
  const words = line.sections.flatMap((section) => {
    if (section.kind === 'cable') return ['cable'];
    if (!('positions' in section) || section.positions === undefined) return ['no geometry'];
    return section.positions.flatMap((position) => {
      if (!('phase' in position)) return [];
      const conductor = section.conductors?.[position.conductor];
      const name =
        conductor !== undefined && 'name' in conductor && conductor.name
          ? conductor.name
          : position.conductor;
      const count = position.bundleCount ?? 1;
      return [count > 1 ? `${count} × ${name}` : name];
    });
  });
  return [...new Set(words)].join(', ').slice(0, 300);
}

export function presentLineSummary(
  line: FiledLine,
  change: Api.LineSummary['change'],
  views: readonly FindingView[] | null,
  label: (parameter: string) => string,
): Api.LineSummary {
  const grades = views === null ? null : countGrades(views);
  return {
    ...presentLineHead(line),
    grades,
    worstGrade: worstOf(grades),
    marks: views === null ? [] : marksOf(views, label),
    change,
  };
}

const SHOWN_MARKS = 50;

/** One mark a matter, what stands and is worst first. */
function marksOf(
  views: readonly FindingView[],
  label: (parameter: string) => string,
): Api.LineSummary['marks'] {
  const marks = views
    .filter((view) => view.finding.follows === null)
    .map((view) => ({
      parameter: view.finding.parameter,
      code: view.finding.code,
      grade: view.finding.grade,
      stands: stands(view),
      words: wordsOf(view, label),
    }));
  const seen = new Set<string>();
  return marks
    .sort((a, b) => Number(b.stands) - Number(a.stands) || GRADES.indexOf(a.grade) - GRADES.indexOf(b.grade))
    .filter((mark) => !seen.has(mark.words) && seen.add(mark.words))
    .slice(0, SHOWN_MARKS);
}

const DONE_WORDS = { settled: 'settled', waived: 'waived', 'set-aside': 'set aside' } as const;

function wordsOf({ finding, disposition }: FindingView, label: (parameter: string) => string): string {
  const what =
    finding.parameter === null
      ? finding.code.replace(/^[a-z]+\./, '').replaceAll('-', ' ')
      : label(finding.parameter);
  return (disposition === null ? what : `${what} ${DONE_WORDS[disposition.kind]}`).slice(0, 60);
}

/** A revision's own words and hash. */
export interface RevisionHead {
  revision: Revision;
  round: number;
  change: string;
  current: boolean;
}

function presentHead({ revision, round, change, current }: RevisionHead, people: PeopleById) {
  const note = (revision.particulars as { note?: unknown }).note;
  return {
    letter: revision.letter,
    ordinal: revision.ordinal,
    round,
    filedAt: revision.filedAt.toISOString(),
    filedBy: presentPerson(people, revision.filedBy),
    contentHash: revision.contentHash,
    change: change.slice(0, 600),
    note: typeof note === 'string' ? note : null,
    current,
  };
}

export function presentRevisionSummary(
  head: RevisionHead,
  lines: readonly FiledLine[],
  people: PeopleById,
): Api.RevisionSummary {
  return {
    ...presentHead(head, people),
    lineCount: lines.length,
    totalLengthKm: lines.reduce((sum, line) => sum + line.lengthKm, 0),
  };
}

export function presentRevision(
  head: RevisionHead,
  people: PeopleById,
  parts: Pick<Api.Revision, 'lines' | 'removed' | 'runs' | 'run' | 'findings' | 'caution'>,
): Api.Revision {
  return { ...presentHead(head, people), ...parts };
}

export function presentRun(
  run: RunHead,
  ruleSetVersion: number | null,
  grades: Api.Grades | null,
  people: PeopleById,
): Api.Run {
  return {
    ordinal: run.ordinal,
    state: run.status,
    governing: run.governing,
    engine: run.engineVersion,
    ruleSet: ruleSetVersion === null ? null : String(ruleSetVersion),
    reason: run.requestedBy === null ? 'filing' : 'again',
    requestedBy: presentPersonOrNull(people, run.requestedBy),
    createdAt: run.queuedAt.toISOString(),
    finishedAt: instantOrNull(run.finishedAt),
    lineCount: run.linesTotal,
    linesChecked: run.linesDone,
    grades,
    failure: run.failure,
  };
}
