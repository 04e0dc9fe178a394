import type { Finding } from '#shared/contracts/api.generated';
import { GRADES } from '#shared/checks/types';

/** Where each finding of a line stands on its sheet. */
export interface ArrangedFindings {
  /** Findings inside a row's group, by the row's parameter. */
  rows: ReadonlyMap<string, readonly Finding[]>;
  /** Findings of the coupling of two circuits: under the table of mutuals. */
  coupling: readonly Finding[];
  /** Findings of the drawing, of sections and positions: under the structure. */
  drawing: readonly Finding[];
  /** All others: under the rows. */
  loose: readonly Finding[];
  /** Findings that carry the cause of their group on this sheet; the others of the group say "Same cause." */
  carriers: ReadonlySet<Finding>;
}

const COUPLING = new Set(['r0m', 'x0m', 'b0m']);

/** The first of each group that has causes, in the order in which the sheet shows them. */
function carriersOf(shown: readonly Finding[]): Set<Finding> {
  const groups = new Set<number>();
  return new Set(
    shown.filter((f) => {
      if (f.causes.length === 0 || f.follows !== null) return false;
      if (f.group === null) return true;
      if (groups.has(f.group)) return false;
      groups.add(f.group);
      return true;
    }),
  );
}

const byGrade = (a: Finding, b: Finding) =>
  Number(b.first) - Number(a.first) || GRADES.indexOf(a.grade) - GRADES.indexOf(b.grade);

/**
 * Arranges a line's findings for one circuit. What has no circuit belongs to the line and is shown with each.
 * Within a row the one that carries the cause stands first, then the heavier.
 */
export function arrangeFindings(
  findings: readonly Finding[],
  circuit: number,
  rowOf: (parameter: string) => string | null,
  rowOrder: readonly string[],
): ArrangedFindings {
  const own = findings.filter((f) => f.circuit === null || f.circuit === circuit);
  const rows = new Map<string, Finding[]>();
  const rest: Finding[] = [];
  for (const finding of own) {
    const row = finding.parameter === null ? null : rowOf(finding.parameter);
    if (row === null) rest.push(finding);
    else rows.set(row, [...(rows.get(row) ?? []), finding]);
  }
  for (const group of rows.values()) group.sort(byGrade);
  const isCoupling = (f: Finding) => f.parameter !== null && COUPLING.has(f.parameter);
  const coupling = rest.filter(isCoupling);
  const drawing = rest.filter((f) => f.family === 'drawing').sort(byGrade);
  const loose = rest.filter((f) => f.family !== 'drawing' && !isCoupling(f)).sort(byGrade);
  const inRows = rowOrder.flatMap((row) => rows.get(row) ?? []);
  const carriers = carriersOf([...inRows, ...loose, ...coupling, ...drawing]);
  return { rows, coupling, drawing, loose, carriers };
}

/** Findings that still ask for something, by grade; what follows from another value is not counted again. */
export function countStanding(findings: readonly Finding[]): Record<Finding['grade'], number> {
  const counts = { 'must-answer': 0, explain: 0, note: 0 };
  for (const f of findings) if (f.stands && f.follows === null) counts[f.grade] += 1;
  return counts;
}
