/**
 * What becomes of findings: settled, waived or set aside, and carried over to the next revision only where code,
 * circuit and figures are equal.
 */

/** Grade of a finding. */
export type Grade = 'must-answer' | 'explain' | 'note';

/** What a reviewer may do with a finding. */
export type DispositionKind = 'settled' | 'waived' | 'set-aside';

/** The parts of a finding that make it the same from revision to revision. */
export interface FindingFigures {
  code: string;
  circuit: number | null;
  section: number | null;
  position: number | null;
  parameter: string | null;
  declared: number | null;
  recomputed: number | null;
}

/**
 * The text that a fingerprint is the hash of. Tolerance, grade and sentence are left out: a disposition stays with the
 * figures when only the rules' words or limits move. Figures count to nine significant digits, so that another
 * machine's last bits make no new finding.
 * @param lineKey the line's key
 * @param finding its parts
 * @returns one line of text; equal for equal findings
 */
export function fingerprintText(lineKey: string, finding: FindingFigures): string {
  return JSON.stringify([
    lineKey,
    finding.code,
    finding.circuit,
    finding.section,
    finding.position,
    finding.parameter,
    figure(finding.declared),
    figure(finding.recomputed),
  ]);
}

function figure(value: number | null): string | null {
  return value === null ? null : value.toPrecision(9);
}

/** A finding, or a disposition of one, by what makes it the same. */
export interface SameFinding {
  lineKey: string;
  fingerprint: string;
}

/** A disposition as far as carrying over needs it. */
export interface StandingDisposition extends SameFinding {
  kind: DispositionKind;
  /** The second reviewer's word, where there is one. */
  countersignId: string | null;
}

/** A finding as far as carrying over needs it. */
export interface GradedFinding extends SameFinding {
  grade: Grade;
}

/**
 * Tells whether a disposition is enough for a grade. A finding's figures may stay while new rules make a Must answer of
 * it: then setting aside is not enough any more, and a waiver needs the second reviewer.
 * @param disposition what stands, and whether it was countersigned
 * @param grade grade of the finding
 * @returns true where it goes on standing
 */
export function isEnoughFor(
  disposition: Pick<StandingDisposition, 'kind' | 'countersignId'>,
  grade: Grade,
): boolean {
  const { kind, countersignId } = disposition;
  if (kind === 'set-aside') return grade !== 'must-answer';
  return countersignId !== null || !needsCountersign(kind, grade);
}

/**
 * Picks the dispositions that hold for the next revision too.
 * @param before dispositions that stand on the revision before
 * @param findings findings of the new revision's governing run
 * @returns those whose finding is there again with equal code, circuit and figures, and that are enough for its grade
 */
export function carryOver<D extends StandingDisposition>(
  before: readonly D[],
  findings: readonly GradedFinding[],
): D[] {
  const grades = gradesOf(findings);
  return before.filter((d) => {
    const grade = grades.get(`${d.lineKey} ${d.fingerprint}`);
    return grade !== undefined && isEnoughFor(d, grade);
  });
}

/**
 * Picks the dispositions that stand no more once another run governs.
 * @param standing dispositions of the revision
 * @param findings findings of the run that governs from now on
 * @returns those that are not enough for the grade that their finding has now
 */
export function outgrown<D extends StandingDisposition>(
  standing: readonly D[],
  findings: readonly GradedFinding[],
): D[] {
  const grades = gradesOf(findings);
  return standing.filter((d) => {
    const grade = grades.get(`${d.lineKey} ${d.fingerprint}`);
    return grade !== undefined && !isEnoughFor(d, grade);
  });
}

function gradesOf(findings: readonly GradedFinding[]): Map<string, Grade> {
  return new Map(findings.map((f) => [`${f.lineKey} ${f.fingerprint}`, f.grade]));
}

/**
 * Decides whether a finding may be waived or set aside.
 * @param kind what is to be done with it
 * @param grade its grade
 * @param standing what stands already, if anything
 * @returns null when it may, else why not
 */
export function refuseDisposition(
  kind: 'waived' | 'set-aside',
  grade: Grade,
  standing: DispositionKind | null,
): string | null {
  if (standing !== null) return `It is ${standing === 'set-aside' ? 'set aside' : standing} already.`;
  if (kind === 'set-aside' && grade === 'must-answer') {
    return 'Only a Note or an Explain can be set aside; a Must answer is settled or waived.';
  }
  return null;
}

/**
 * Tells whether a second reviewer has to agree.
 * @param kind what is to be done with the finding
 * @param grade its grade
 * @returns true for waiving a Must answer
 */
export function needsCountersign(kind: DispositionKind, grade: Grade): boolean {
  return kind === 'waived' && grade === 'must-answer';
}

/**
 * Decides whether somebody may countersign.
 * @param proposedBy who proposed
 * @param userId who wants to decide
 * @returns null when they may, else why not
 */
export function refuseCountersign(proposedBy: string, userId: string): string | null {
  return proposedBy === userId ? 'A second reviewer decides on it, not the one who proposed it.' : null;
}

/** Rank of grades, worst first. */
export const GRADES: readonly Grade[] = ['must-answer', 'explain', 'note'];

/**
 * The worst of some grades.
 * @param grades grades
 * @returns the worst, or null when there are none
 */
export function worstGrade(grades: readonly Grade[]): Grade | null {
  return GRADES.find((g) => grades.includes(g)) ?? null;
}
