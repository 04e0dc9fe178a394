import type { Application } from '../entities/case.entities';
import type { Decision } from '../entities/review.entities';
import type { OverviewRow } from '../repositories/overview.repository';
import type { PeopleById, PersonName } from '../repositories/people-names.repository';
import type * as Api from '../../shared/contracts/api.generated';
import type { WorkCalendar } from '../../shared/workflow/calendar';
import { CAUTION } from '../../shared/workflow/caution';
import { worstGrade } from '../../shared/workflow/dispositions';
import { revisionLetter } from '../../shared/workflow/revision-letters';
import { readWindow, type WindowSpan } from '../../shared/workflow/windows';
import { instantOrNull, presentPerson } from './person.presenter';

/** What windows are read by: the present and the owner's calendar. */
export interface Reading {
  now: Date;
  calendar: WorkCalendar;
}

export function presentWindow(span: WindowSpan, { now, calendar }: Reading): Api.Window {
  const { used, total, left } = readWindow(span, now, calendar);
  return {
    kind: span.kind,
    openedAt: span.openedAt.toISOString(),
    dueAt: span.dueAt.toISOString(),
    closedAt: instantOrNull(span.closedAt),
    used,
    total,
    left,
  };
}

function spanOfRow(row: OverviewRow): WindowSpan | null {
  const { windowKind, windowOpenedAt, dueAt, windowDays } = row;
  if (windowKind === null || windowOpenedAt === null || dueAt === null) return null;
  return { kind: windowKind, openedAt: windowOpenedAt, dueAt, closedAt: null, totalDays: windowDays };
}

function presentCheck(row: OverviewRow): Api.CheckState | null {
  if (row.runOrdinal === null || row.runStatus === null) return null;
  return {
    run: row.runOrdinal,
    state: row.runStatus,
    lineCount: row.runLines,
    linesChecked: row.runLinesDone,
    startedAt: instantOrNull(row.runStartedAt),
    finishedAt: instantOrNull(row.runFinishedAt),
    failure: row.runFailure,
  };
}

function gradesOf(row: OverviewRow): Api.Grades | null {
  const { runStatus, mustAnswer, explain, note } = row;
  return runStatus === 'done' ? { mustAnswer, explain, note } : null;
}

/** The worst grade that still stands. */
export function worstOf(grades: Api.Grades | null): Api.ApplicationSummary['worstGrade'] {
  if (grades === null) return null;
  const { mustAnswer, explain, note } = grades;
  return worstGrade([
    ...(mustAnswer > 0 ? (['must-answer'] as const) : []),
    ...(explain > 0 ? (['explain'] as const) : []),
    ...(note > 0 ? (['note'] as const) : []),
  ]);
}

/** An application as lists and the queue show it. */
export function presentSummary(row: OverviewRow, reading: Reading): Api.ApplicationSummary {
  const span = spanOfRow(row);
  const grades = gradesOf(row);
  return {
    id: row.id,
    number: row.number,
    version: row.version,
    title: row.title,
    applicant: { id: row.orgId, name: row.applicant },
    connectionKind: row.connectionKind as Api.ApplicationSummary['connectionKind'],
    capacityMw: row.capacityMw,
    pointOfConnection: row.pointOfConnection,
    state: row.state,
    revision: row.revision,
    nextRevision: revisionLetter(row.revisionOrdinal + 1),
    voltagesKv: row.voltagesKv,
    lineCount: row.lineCount,
    totalLengthKm: row.totalKm,
    filedAt: instantOrNull(row.filedAt),
    filedBy: personOrNull(row.filedById, row.filedBy),
    reviewer: personOrNull(row.reviewerId, row.reviewer),
    dueAt: instantOrNull(row.dueAt),
    window: span === null ? null : presentWindow(span, reading),
    grades,
    worstGrade: worstOf(grades),
    check: presentCheck(row),
    openDiscrepancies: row.openDiscrepancies,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}

function personOrNull(id: string | null, name: string | null): Api.Person | null {
  return id === null || name === null ? null : { id, name };
}

/** What an application's page shows beyond the summary. */
export interface ApplicationDetail {
  application: Application;
  round: { ordinal: number; kind: 'first' | 'amendment'; reason: string | null };
  acceptedRevision: string | null;
  owner: PersonName;
  steps: Api.Step[];
  windows: WindowSpan[];
  decision: Api.Decision | null;
  countersigns: Api.Countersign[];
}

export function presentApplication(
  row: OverviewRow,
  detail: ApplicationDetail,
  reading: Reading,
): Api.Application {
  const { application } = detail;
  return {
    ...presentSummary(row, reading),
    contact: {
      name: application.contactName,
      email: application.contactEmail,
      phone: application.contactPhone === '' ? null : application.contactPhone,
    },
    round: detail.round,
    acceptedRevision: detail.acceptedRevision,
    owner: detail.owner,
    steps: detail.steps,
    windows: detail.windows.map((span) => presentWindow(span, reading)),
    decision: detail.decision,
    pendingCountersigns: detail.countersigns,
    caution: CAUTION,
  };
}

export function presentDecision(
  decision: Decision,
  letters: ReadonlyMap<string, string>,
  people: PeopleById,
  countersignedBy: string | null,
): Api.Decision {
  return {
    kind: decision.kind,
    revision: letters.get(decision.revisionId) ?? 'A',
    reason: decision.reason === '' ? null : decision.reason,
    conditions: decision.conditions,
    decidedAt: decision.decidedAt.toISOString(),
    decidedBy: presentPerson(people, decision.decidedBy),
    countersignedBy: countersignedBy === null ? null : presentPerson(people, countersignedBy),
    recordHash: decision.recordHash,
  };
}
