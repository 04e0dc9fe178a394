import type { CircuitReport, LineReport } from '#shared/checks/types';
import { BalanceTable } from '../../../components/charts/balance-table';
import type { BalanceEntry, RowFinding } from '../../../components/charts/balance-entry';
import { CauseLine, LooseFinding } from '../../../components/charts/cause-line';
import { FindingSays } from '../../../components/charts/finding-says';
import { Notice } from '../../../components/feedback/notice';
import { SkeletonLines } from '../../../components/feedback/skeleton';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { FINDING_GRADES, countWords } from '../../../components/ui/grades';
import { Sheet } from '../../../components/ui/sheet';
import { rowOf } from '../../../components/charts/balance-entries';
import type { LiveCheck } from '../hooks/use-live-check';
import {
  countFindings,
  entriesOf,
  partWords,
  reportIn,
  sharesCause,
  sortFindings,
} from '../model/report-view';
import type { Preview } from '../worker/messages';
import { PutButton } from './put-button';
import type { Corrections } from './put-button';

interface PartProps {
  report: LineReport;
  corrections: Corrections;
}

function rowFindings(circuit: CircuitReport, { report, corrections }: PartProps): Map<string, RowFinding[]> {
  const rows = new Map<string, RowFinding[]>();
  sortFindings(circuit).inRows.forEach((finding, i) => {
    const row = rowOf(finding.parameter) ?? '';
    const shared = sharesCause(finding, report);
    const own = shared ? [] : finding.causes.map((cause) => cause.sentence);
    rows.set(row, [
      ...(rows.get(row) ?? []),
      {
        key: `${finding.code}-${i}`,
        grade: finding.grade,
        says: <FindingSays message={shared ? `${finding.message} Same cause.` : finding.message} />,
        causes: own,
        acts: !shared && <PutButton finding={finding} corrections={corrections} />,
      },
    ]);
  });
  return rows;
}

function CircuitBalance({ circuit, ...part }: PartProps & { circuit: CircuitReport }) {
  const findings = rowFindings(circuit, part);
  const entries = entriesOf(circuit).map((entry): BalanceEntry => ({
    ...entry,
    findings: findings.get(entry.key) ?? [],
  }));
  const several = part.report.circuits.length > 1;
  const classKv = part.report.bandClassKv;
  return (
    <>
      {several && <h3 className="border-t border-rule px-6 py-2">{`Circuit ${circuit.circuit}`}</h3>}
      <BalanceTable
        label={several ? `Balance of circuit ${circuit.circuit}` : 'Balance'}
        scaleLabel={classKv === null ? 'No band for this voltage' : `Typical, ${classKv} kV`}
        entries={entries}
        live
      />
      <LooseFindings findings={sortFindings(circuit).loose} {...part} />
    </>
  );
}

function LooseFindings({
  findings,
  report,
  corrections,
}: PartProps & { findings: CircuitReport['findings'] }) {
  return findings.map((finding, i) => {
    const shared = sharesCause(finding, report);
    return (
      <LooseFinding
        key={`${finding.code}-${i}`}
        grade={finding.grade}
        says={<FindingSays message={shared ? `${finding.message} Same cause.` : finding.message} />}
        acts={!shared && <PutButton finding={finding} corrections={corrections} />}
      >
        {!shared &&
          finding.causes.map((cause, c) => (
            <CauseLine key={c} grade={finding.grade}>
              {cause.sentence}
            </CauseLine>
          ))}
      </LooseFinding>
    );
  });
}

/** What is said while a line cannot be filed yet: what the check speaks of so far, and how much is owed. */
function Owed({ count, preview }: { count: number; preview: Preview | null }) {
  const fields = count === 1 ? 'one more field' : `${count} more fields`;
  const part = preview && partWords(preview);
  const begins = 'The check begins with the voltage and a declared value, or a section’s whole geometry.';
  return (
    <p className="px-6 pb-4 text-control text-ink-soft">
      {!preview && `${begins} `}
      {part && `Recomputed from ${part} so far; declared values are weighed once every section is whole. `}
      {preview && !part && preview.whole.length === 0 && 'Recomputed once the geometry is whole. '}
      {`Filing needs ${fields} with a value that can be used.`}
    </p>
  );
}

/** How many findings of each grade, at the head of the sheet. */
function Counts({ report, partial }: { report: LineReport; partial: boolean }) {
  const counts = countFindings(report);
  const shown = FINDING_GRADES.filter((grade) => counts[grade] > 0);
  // Of a line that is not whole nobody can say that it is in balance.
  if (shown.length === 0) return partial ? null : <GradeLabel grade="in-balance" />;
  return (
    <span className="flex flex-wrap justify-end gap-x-4">
      {shown.map((grade) => (
        <GradeLabel key={grade} grade={grade}>
          {countWords(counts[grade], grade)}
        </GradeLabel>
      ))}
    </span>
  );
}

interface LiveCheckPanelProps {
  check: LiveCheck;
  /** How many fields stand in the way of filing. */
  owed: number;
  corrections: Corrections;
}

/** The check beside the form: the same rules as the server's, and a preview of it only. */
export function LiveCheckPanel({ check, owed, corrections }: LiveCheckPanelProps) {
  const { outcome, failed } = check;
  const report = reportIn(outcome);
  const partial = outcome?.kind === 'faults';
  return (
    <Sheet id="live-check" title="Live check" aside={report && <Counts report={report} partial={partial} />}>
      <div aria-busy={check.pending || undefined}>
        {failed && (
          <Notice grade="explain" className="mx-6 mb-6">
            The live check could not run in this browser. Filing is not affected: the server checks every
            line.
          </Notice>
        )}
        {!outcome && !failed && (
          <div className="px-6 pb-6">
            <SkeletonLines lines={5} label="The check is starting" />
          </div>
        )}
        {partial && <Owed count={owed} preview={outcome.preview} />}
        {report && (
          <>
            {report.circuits.map((circuit) => (
              <CircuitBalance
                key={circuit.circuit}
                circuit={circuit}
                report={report}
                corrections={corrections}
              />
            ))}
            <LooseFindings
              findings={report.findings.filter((f) => !f.follows)}
              report={report}
              corrections={corrections}
            />
          </>
        )}
        <p className="sheet-foot text-ink-soft">
          A preview by the rules in force; the server’s check after filing counts.
        </p>
      </div>
    </Sheet>
  );
}
