import type { CircuitReport, Finding, LineReport } from '#shared/checks/types';
import type { GradeCounts } from '../../../components/ui/grades';
import { balanceEntries, balanceOrder, rowOf } from '../../../components/charts/balance-entries';
import type { BalanceEntry } from '../../../components/charts/balance-entry';
import type { CheckOutcome, Preview } from '../worker/messages';

/** The check of the line, or of what holds in it; null while there is nothing to weigh. */
export function reportIn(outcome: CheckOutcome | null): LineReport | null {
  if (!outcome) return null;
  return outcome.kind === 'report' ? outcome.report : (outcome.preview?.report ?? null);
}

/** Of which sections the recomputed side speaks, where it does not speak of all: "section 1 of 2". */
export function partWords({ whole, sections }: Preview): string | null {
  if (whole.length === 0 || whole.length === sections) return null;
  const numbers = whole.map((i) => i + 1);
  const last = numbers.pop();
  const list = numbers.length > 0 ? `${numbers.join(', ')} and ${last}` : `${last}`;
  return `section${numbers.length > 0 ? 's' : ''} ${list} of ${sections}`;
}

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

/** Where a finding stands on the page: its row, or after all rows. */
const placeOf = (finding: Finding): number => balanceOrder(rowOf(finding.parameter) ?? '');

/** The finding of a group that shows its causes: the uppermost one that has any. */
function carrierOf(group: number, report: LineReport): Finding | undefined {
  const withCauses = allFindings(report).filter(
    (f) => f.group === group && f.causes.length > 0 && !f.follows,
  );
  return withCauses.sort((x, y) => placeOf(x) - placeOf(y))[0];
}

/** Whether a finding's causes are shown at another finding of its group. */
export function sharesCause(finding: Finding, report: LineReport): boolean {
  const carrier = carrierOf(finding.group, report);
  return carrier !== undefined && carrier !== finding;
}

/** The circuit's rows as the balance shows them. */
export const entriesOf = (circuit: CircuitReport): BalanceEntry[] => balanceEntries(circuit.values);
