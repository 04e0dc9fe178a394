import type { CheckReport, Finding } from './types';

/** A finding with the line that it belongs to. */
export interface LineFinding {
  line: string;
  finding: Finding;
}

/** What two runs of one filing differ in. */
export interface RunComparison {
  appeared: LineFinding[];
  gone: LineFinding[];
  /** Findings in both whose grade is another: of the earlier run and of the later. */
  regraded: { line: string; from: Finding; to: Finding }[];
  kept: number;
}

/**
 * What makes a finding the same from run to run: its code, its place and its declared figure. Recomputed figures and
 * tolerances may differ, since a new engine or new bands are why two runs are compared.
 */
export function identityOf({ line, finding }: LineFinding): string {
  const { code, parameter, circuit, section, position, declared } = finding;
  return JSON.stringify([
    line,
    code,
    parameter ?? null,
    circuit ?? null,
    section ?? null,
    position ?? null,
    declared ?? null,
  ]);
}

/**
 * Compares two runs, of one revision under two rule sets or engines, or of two revisions.
 *
 * @param earlier the run that governs
 * @param later the run made again
 */
export function compareRuns(
  earlier: Pick<CheckReport, 'lines'>,
  later: Pick<CheckReport, 'lines'>,
): RunComparison {
  const before = byIdentity(earlier);
  const after = byIdentity(later);
  const comparison: RunComparison = { appeared: [], gone: [], regraded: [], kept: 0 };
  for (const [key, from] of before) {
    const to = after.get(key);
    if (to === undefined) comparison.gone.push(from);
    else if (to.finding.grade === from.finding.grade) comparison.kept += 1;
    else comparison.regraded.push({ line: from.line, from: from.finding, to: to.finding });
  }
  for (const [key, to] of after) if (!before.has(key)) comparison.appeared.push(to);
  return comparison;
}

function byIdentity({ lines }: Pick<CheckReport, 'lines'>): Map<string, LineFinding> {
  const found = new Map<string, LineFinding>();
  for (const { name, circuits, findings } of lines) {
    for (const finding of [...circuits.flatMap((circuit) => circuit.findings), ...findings]) {
      const entry = { line: name, finding };
      found.set(identityOf(entry), entry);
    }
  }
  return found;
}
