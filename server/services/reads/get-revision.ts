import type { Revision } from '../../entities/filed.entities';
import { notFound } from '../../errors/problem';
import { namesOf } from '../../repositories/people-names.repository';
import {
  linesOfRevision,
  linesOfRevisions,
  listRevisions as findRevisions,
  revisionBefore,
  revisionLetters,
  type FiledLine,
} from '../../repositories/revision.repository';
import { findRound } from '../../repositories/application.repository';
import { ruleSetById } from '../../repositories/rule-set.repository';
import { governingRun, lineReport, listRuns, type RunHead } from '../../repositories/run.repository';
import {
  countGrades,
  peopleInViews,
  presentFinding,
  type FindingView,
} from '../../presenters/finding.presenter';
import { presentPrevious, presentSheet } from '../../presenters/line-sheet.presenter';
import {
  filedLineOf,
  presentLineHead,
  presentLineSummary,
  presentRevision,
  presentRevisionSummary,
  presentRun,
} from '../../presenters/revision.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Finding as Noticed, LineReport } from '../../../shared/checks/types';
import { CAUTION } from '../../../shared/workflow/caution';
import { GRADES } from '../../../shared/workflow/dispositions';
import type { Caller } from '../cases/caller';
import { readCase, type CaseFile } from '../cases/case-file';
import { changeWords, lineChange } from '../cases/revision-changes';
import { findingViews } from '../findings/finding-views';
import { parameterLabel } from '../findings/finding-names';
import { revisionOf } from '../review/check-again';

/** Revisions of an application, newest first. */
export async function listRevisions(caller: Caller, reference: string): Promise<Api.RevisionList> {
  const { tx, ability } = caller;
  const file = await readCase(caller, reference);
  const revisions = await findRevisions(tx.manager, ability, file.application.id);
  const lines = await linesOfRevisions(
    tx.manager,
    revisions.map((r) => r.id),
  );
  const people = await namesOf(
    tx.manager,
    revisions.map((r) => r.filedBy),
  );
  const items: Api.RevisionSummary[] = [];
  for (const [i, revision] of revisions.entries()) {
    const own = lines.get(revision.id) ?? [];
    const older = revisions[i + 1];
    const change = changeWords(older === undefined ? null : (lines.get(older.id) ?? []), own);
    items.push(presentRevisionSummary(await headOf(caller, file, revision, change), own, people));
  }
  return { items };
}

async function headOf({ tx }: Caller, file: CaseFile, revision: Revision, change: string) {
  const round = await findRound(tx.manager, revision.roundId);
  return { revision, round: round?.ordinal ?? 1, change, current: file.revision?.id === revision.id };
}

async function linesBefore({ tx }: Caller, revision: Revision): Promise<FiledLine[] | null> {
  const before = await revisionBefore(tx.manager, revision);
  return before === null ? null : linesOfRevision(tx.manager, before.id);
}

/** A revision with its lines, its check and what became of each finding. */
export async function getRevision(caller: Caller, reference: string, letter: string): Promise<Api.Revision> {
  const { tx } = caller;
  const file = await readCase(caller, reference);
  const revision = await revisionOf(caller, file, letter);
  const lines = await linesOfRevision(tx.manager, revision.id);
  const before = await linesBefore(caller, revision);
  const runs = await listRuns(tx.manager, revision.id);
  const governing = runs.find((run) => run.governing) ?? null;
  const views = governing?.status === 'done' ? await findingViews(caller, revision, governing.id) : null;
  const people = await namesOf(tx.manager, [
    revision.filedBy,
    ...runs.map((run) => run.requestedBy),
    ...peopleInViews(views ?? []),
  ]);
  const letters = await revisionLetters(tx.manager, file.application.id);
  const presented: Api.Run[] = [];
  for (const run of runs) {
    presented.push(await presentOwnRun(caller, run, run.governing ? views : null, people));
  }
  const head = await headOf(caller, file, revision, changeWords(before, lines));
  return presentRevision(head, people, {
    lines: lines.map((line) =>
      presentLineSummary(line, lineChange(before, line), viewsOfLine(views, line.lineKey), parameterLabel),
    ),
    removed: (before ?? []).filter((b) => !lines.some((l) => l.lineKey === b.lineKey)).map((b) => b.name),
    runs: presented,
    run: presented.find((run) => run.governing) ?? null,
    findings: worstFirst(views ?? []).map((view) => presentFinding(view, { people, letters })),
    caution: CAUTION,
  });
}

function viewsOfLine(views: readonly FindingView[] | null, lineKey: string): FindingView[] | null {
  return views === null ? null : views.filter((view) => view.finding.lineKey === lineKey);
}

export function worstFirst(views: readonly FindingView[]): FindingView[] {
  const rank = (view: FindingView) => GRADES.indexOf(view.finding.grade);
  return [...views].sort((a, b) => rank(a) - rank(b) || a.finding.ordinal - b.finding.ordinal);
}

/** A run with the version of its rule set. */
export async function presentOwnRun(
  { tx }: Caller,
  run: RunHead,
  views: readonly FindingView[] | null,
  people: Awaited<ReturnType<typeof namesOf>>,
): Promise<Api.Run> {
  const { version } = await ruleSetById(tx.manager, run.ruleSetId);
  return presentRun(run, version, views === null ? null : countGrades(views), people);
}

/** A line of a revision with its balance rows, findings and geometry. */
export async function getRevisionLine(
  caller: Caller,
  reference: string,
  letter: string,
  lineKey: string,
): Promise<Api.RevisionLine> {
  const { tx } = caller;
  const file = await readCase(caller, reference);
  const revision = await revisionOf(caller, file, letter);
  const lines = await linesOfRevision(tx.manager, revision.id);
  const line = lines.find((l) => l.lineKey === lineKey);
  if (line === undefined) throw notFound();
  const run = await governingRun(tx.manager, revision.id);
  const checked = run?.status === 'done' ? run : null;
  const report = checked === null ? null : await lineReport(tx.manager, checked.id, line.ordinal - 1);
  const views = checked === null ? [] : await findingViews(caller, revision, checked.id, lineKey);
  const people = await namesOf(tx.manager, [run?.requestedBy, ...peopleInViews(views)]);
  const letters = await revisionLetters(tx.manager, file.application.id);
  const tolerances = report === null ? [] : noticedOf(report).map((finding) => finding.toleranceOf ?? null);
  const findings = views.map((view, i) => presentFinding(view, { people, letters }, tolerances[i] ?? null));
  const before = await linesBefore(caller, revision);
  return {
    ...presentLineHead(line),
    revision: revision.letter,
    change: lineChange(before, line),
    line: { ...filedLineOf(line) },
    lineHash: line.lineHash,
    run: run === null ? null : await presentOwnRun(caller, run, checked === null ? null : views, people),
    ...presentSheet(report, filedLineOf(line), await sourcesOf(caller, run, report, line)),
    findings: findings.sort((a, b) => GRADES.indexOf(a.grade) - GRADES.indexOf(b.grade)),
    previous: await previousOf(caller, revision, lineKey),
  };
}

/** Findings of a line's report in the order in which they became rows. */
function noticedOf(report: LineReport): Noticed[] {
  return [...report.circuits.flatMap((circuit) => circuit.findings), ...report.findings];
}

/** Sources of the bands that a line was weighed against. */
async function sourcesOf(
  { tx }: Caller,
  run: RunHead | null,
  report: LineReport | null,
  line: FiledLine,
): Promise<(parameter: string) => string | null> {
  if (run === null || report === null) return () => null;
  const { rules } = await ruleSetById(tx.manager, run.ruleSetId);
  const bands = rules.bands.filter(
    (band) => band.classKv === report.bandClassKv && band.frequencyHz === line.frequencyHz,
  );
  const sources = new Map(bands.map((band) => [band.parameter as string, band.source]));
  // bands stand on R0 less R1, rows on R0 itself
  return (parameter) => sources.get(parameter === 'r0' ? 'r0MinusR1' : parameter)?.slice(0, 600) ?? null;
}

async function previousOf(
  { tx }: Caller,
  revision: Revision,
  lineKey: string,
): Promise<Api.RevisionLine['previous']> {
  const before = await revisionBefore(tx.manager, revision);
  if (before === null) return null;
  const index = (await linesOfRevision(tx.manager, before.id)).findIndex((l) => l.lineKey === lineKey);
  const run = await governingRun(tx.manager, before.id);
  if (index < 0 || run?.status !== 'done') return null;
  const report = await lineReport(tx.manager, run.id, index);
  return report === null ? null : presentPrevious(report);
}
