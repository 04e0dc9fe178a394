import { createHash } from 'node:crypto';
import type { Finding, RunValue } from '../../entities/verdict.entities';
import type { RunHead } from '../../repositories/run.repository';
import type { CheckReport, Finding as Noticed } from '../../../shared/checks/types';
import { fingerprintText } from '../../../shared/workflow/dispositions';

export type FindingRow = Omit<Finding, 'id'>;

/** Findings of a report as rows, in its order: each line's circuits first, then what stands at the line. */
export function findingRows(
  run: Pick<RunHead, 'id' | 'orgId'>,
  lineKeys: readonly string[],
  report: CheckReport,
): FindingRow[] {
  const rows: FindingRow[] = [];
  const seen = new Map<string, number>();
  report.lines.forEach((line, i) => {
    const lineKey = lineKeys[i];
    if (lineKey === undefined) throw new Error('the report has more lines than the revision');
    const add = (finding: Noticed, circuit: number | null) =>
      rows.push(
        apart(
          rowOf(run, lineKey, { ...finding, circuit: finding.circuit ?? circuit ?? undefined }, rows.length),
          seen,
        ),
      );
    for (const circuit of line.circuits)
      for (const finding of circuit.findings) add(finding, circuit.circuit);
    for (const finding of line.findings) add(finding, null);
  });
  return rows;
}

/** Two findings of one place with equal figures are told apart by their order: each is disposed of by itself. */
function apart(row: FindingRow, seen: Map<string, number>): FindingRow {
  const before = seen.get(row.fingerprint) ?? 0;
  seen.set(row.fingerprint, before + 1);
  return before === 0 ? row : { ...row, fingerprint: digest(`${row.fingerprint} ${before + 1}`) };
}

const digest = (text: string) => createHash('sha256').update(text).digest('hex').slice(0, 32);

function rowOf(
  { id: runId, orgId }: Pick<RunHead, 'id' | 'orgId'>,
  lineKey: string,
  finding: Noticed,
  index: number,
): FindingRow {
  const figures = {
    code: finding.code,
    circuit: finding.circuit ?? null,
    section: finding.section ?? null,
    position: finding.position ?? null,
    parameter: finding.parameter ?? null,
    declared: finite(finding.declared),
    recomputed: finite(finding.recomputed),
  };
  return {
    ...figures,
    orgId,
    runId,
    ordinal: index + 1,
    lineKey,
    family: finding.family,
    grade: finding.grade,
    deviation: finite(finding.deviation),
    tolerance: finite(finding.tolerance),
    pointer: finding.where,
    message: finding.message,
    groupNumber: finding.group,
    causes: finding.causes,
    follows: finding.follows ?? null,
    fingerprint: digest(fingerprintText(lineKey, figures)),
  };
}

/** Weighed values of a report as rows. */
export function valueRows(
  run: Pick<RunHead, 'id' | 'orgId'>,
  lineKeys: readonly string[],
  report: CheckReport,
): RunValue[] {
  return report.lines.flatMap((line, i) =>
    line.circuits.flatMap(({ circuit, values }) =>
      values.map((value) => ({
        runId: run.id,
        lineKey: lineKeys[i] ?? '',
        circuit,
        parameter: value.parameter,
        orgId: run.orgId,
        declared: finite(value.declared),
        recomputed: finite(value.recomputed),
        low: finite(value.range?.[0]),
        high: finite(value.range?.[1]),
        tolerance: finite(value.tolerance),
      })),
    ),
  );
}

/** A column takes no infinities: a ratio to zero is left out. */
function finite(value: number | null | undefined): number | null {
  return value !== null && value !== undefined && Math.abs(value) <= 1e300 ? value : null;
}
