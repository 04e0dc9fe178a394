import type { ReactNode } from 'react';
import type { Finding, RevisionLine } from '#shared/contracts/api.generated';
import { THIN_SPACE } from '#shared/format/numbers';
import type { BalanceEntry, RowFinding } from '../../../components/charts/balance-entry';
import { BalanceTable } from '../../../components/charts/balance-table';
import { FindingSays } from '../../../components/charts/finding-says';
import { GradeTally } from '../../../components/ui/grade-counts';
import {
  BALANCE_ROWS,
  balanceEntries,
  parameterName,
  rowOf,
} from '../../../components/charts/balance-entries';
import { arrangeFindings, countStanding } from '../model/arrange-findings';
import { causeLines, dispositionWords, settledRemark } from '../model/finding-words';
import { LooseFindings } from './loose-findings';

/** What can be done with a finding, given by the page that the sheet stands on. */
export type FindingActions = (finding: Finding) => ReactNode;

interface BalanceSectionProps {
  line: RevisionLine;
  circuit: number;
  findingActions?: FindingActions;
}

/** The balance rows of one circuit with their findings, and the findings that belong to no row. */
export function BalanceSection({ line, circuit, findingActions }: BalanceSectionProps) {
  const arranged = arrangeFindings(line.findings, circuit, rowOf, BALANCE_ROWS);
  const values = line.values.filter((v) => v.circuit === circuit);
  const entries = balanceEntries(
    values.map((v) => ({ ...v, range: v.low === null || v.high === null ? null : [v.low, v.high] })),
  ).map((entry) =>
    withFindings(entry, arranged.rows.get(entry.key) ?? [], arranged.carriers, findingActions),
  );
  const own = line.findings.filter((f) => f.circuit === null || f.circuit === circuit);
  const followers = values.filter((v) => v.follows !== null && rowOf(v.parameter) === v.parameter);
  const inBalance = entries.filter((e) => e.grade === 'in-balance').length;
  return (
    <div id="balance">
      <GradeTally
        counts={countStanding(own)}
        inBalance={inBalance}
        follows={followWords(followers.map((v) => v.follows ?? ''))}
      />
      {entries.length > 0 && (
        <BalanceTable
          label={`Declared, recomputed and typical values of ${line.name}, circuit ${circuit}`}
          scaleLabel={scaleLabel(line.bandClassKv)}
          entries={entries}
        />
      )}
      <LooseFindings findings={arranged.loose} carriers={arranged.carriers} actions={findingActions} />
    </div>
  );
}

function scaleLabel(classKv: number | null): string {
  return classKv === null ? 'Scale' : `Scale: outer limits of ${classKv}${THIN_SPACE}kV`;
}

function followWords(parameters: readonly string[]): string | undefined {
  if (parameters.length === 0) return undefined;
  const from = [...new Set(parameters)].map(parameterName).join(' and ');
  return `${parameters.length} ${parameters.length === 1 ? 'follows' : 'follow'} from ${from}`;
}

/** A row with its findings inside: settled ones keep their shape in outline, and say how they were settled. */
function withFindings(
  entry: BalanceEntry,
  findings: readonly Finding[],
  carriers: ReadonlySet<Finding>,
  actions: FindingActions | undefined,
): BalanceEntry {
  const counted = findings.filter((f) => f.follows === null);
  const remark = settledRemark(counted);
  return {
    ...entry,
    settled: remark !== undefined,
    remark: remark ?? entry.remark,
    findings: findings.map((finding) => rowFinding(finding, carriers.has(finding), actions)),
  };
}

function rowFinding(finding: Finding, carries: boolean, actions: FindingActions | undefined): RowFinding {
  const done = dispositionWords(finding);
  return {
    key: finding.fingerprint,
    grade: finding.grade,
    settled: !finding.stands,
    says: <FindingSays message={finding.message} />,
    causes: [...causeLines(finding, carries), ...(done ? [done] : [])],
    acts: actions?.(finding),
  };
}
