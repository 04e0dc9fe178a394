import type { CircuitReport, Finding, LineReport } from '#shared/checks/types';
import type { GradeCounts } from '../../../components/ui/grades';
import { balanceEntries, rowOf } from '../../../components/charts/balance-entries';
import type { BalanceEntry } from '../../../components/charts/balance-entry';

/** Every finding of a line, those of its circuits first. */
export const allFindings = (report: LineReport): Finding[] => [
  ...report.circuits.flatMap((c) => c.findings),
  ...report.findings,
];

/** How many findings there are of each grade; what only follows from another is not counted again. */
export function countFindings(report: LineReport): Required<GradeCounts> {
  const counts = { 'must-answer': 0, explain: 0, note: 0 };
  for (const finding of allFindings(report)) if (!finding.follows) counts[finding.grade] += 1;
  return counts;
}

/** The findings that stand inside a row of the balance, and those that stand by themselves. */
export function sortFindings(circuit: CircuitReport): { inRows: Finding[]; loose: Finding[] } {
  const own = circuit.findings.filter((f) => !f.follows);
  const hasRow = (f: Finding): boolean => rowOf(f.parameter) !== null;
  return { inRows: own.filter(hasRow), loose: own.filter((f) => !hasRow(f)) };
}

/** Whether a finding's group shows its causes at another finding. */
export function sharesCause(finding: Finding, report: LineReport): boolean {
  if (finding.causes.length > 0) return false;
  return allFindings(report).some((f) => f.group === finding.group && f.causes.length > 0);
}

/** The circuit's rows as the balance shows them. */
export const entriesOf = (circuit: CircuitReport): BalanceEntry[] => balanceEntries(circuit.values);
