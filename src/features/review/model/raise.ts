import type { Finding, RaiseDiscrepancyRequest } from '#shared/contracts/api.generated';
import { GRADES } from '#shared/checks/types';

export interface RaiseDraft {
  title: string;
  question: string;
  wanted: string;
  lineKeys: string[];
  fingerprints: string[];
}

const MOST_TITLE = 200;

const unique = (values: readonly string[]) => [...new Set(values)];

const joined = (words: readonly string[]) =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;

const firstSentence = (message: string) => `${message.split(/: |\. /)[0]?.replace(/\.$/, '') ?? message}.`;

/** What a finding is about: its own value, and the others that its likeliest cause explains with it. */
const aboutOf = ({ parameter, causes }: Finding): string[] =>
  parameter === null ? [] : [parameter, ...(causes[0]?.explains ?? [])];

/** "X1 of L1", "X1 and B1 of L1 and L3"; for findings without a parameter the place alone. */
function titleOf(findings: readonly Finding[], nameOf: (parameter: string) => string): string {
  const names = unique(findings.flatMap(aboutOf).map(nameOf));
  const lines = joined(unique(findings.map((f) => f.lineKey)));
  return (names.length > 0 ? `${joined(names)} of ${lines}` : `Drawing of ${lines}`).slice(0, MOST_TITLE);
}

/** What would settle it, by the worst grade: a must-answer wants a corrected value, an explain a reason. */
function wantedOf(findings: readonly Finding[]): string {
  const worst = GRADES.find((grade) => findings.some((f) => f.grade === grade));
  if (worst === 'must-answer')
    return 'A corrected value, or the measurement or calculation that it rests on.';
  return 'A sentence that says what makes this line differ.';
}

/** A discrepancy as it begins, from the findings chosen: the reviewer goes on writing from here. */
export function draftFrom(findings: readonly Finding[], nameOf: (parameter: string) => string): RaiseDraft {
  const matters = findings.filter((f) => f.follows === null);
  const causes = matters.flatMap((f) => (f.causes[0] ? [f.causes[0].sentence] : []));
  return {
    title: findings.length > 0 ? titleOf(matters.length > 0 ? matters : findings, nameOf) : '',
    question: [...matters.map((f) => firstSentence(f.message)), ...unique(causes)].join(' '),
    wanted: findings.length > 0 ? wantedOf(matters) : '',
    lineKeys: unique(findings.map((f) => f.lineKey)),
    fingerprints: unique(findings.map((f) => f.fingerprint)),
  };
}

/** Faults of a draft by field, for the form. */
export function raiseFaults(draft: RaiseDraft): { field: 'title' | 'question'; message: string }[] {
  return [
    ...(draft.title.trim() === '' ? [{ field: 'title' as const, message: 'Say what it is about.' }] : []),
    ...(draft.question.trim() === ''
      ? [{ field: 'question' as const, message: 'Say which value is questioned, and why.' }]
      : []),
  ];
}

/** The draft as the API takes it, raised on the revision that was read. */
export function raiseRequest(draft: RaiseDraft, revision: string): RaiseDiscrepancyRequest {
  const wanted = draft.wanted.trim();
  return {
    revision,
    title: draft.title.trim(),
    question: draft.question.trim(),
    ...(wanted === '' ? {} : { wanted }),
    ...(draft.fingerprints.length > 0 ? { fingerprints: draft.fingerprints } : {}),
    ...(draft.lineKeys.length > 0 ? { lineKeys: draft.lineKeys } : {}),
  };
}
