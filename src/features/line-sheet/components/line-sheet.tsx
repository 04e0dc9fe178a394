import { useId, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { RevisionLine } from '#shared/contracts/api.generated';
import { Notice } from '../../../components/feedback/notice';
import { SegmentChoice } from '../../../components/ui/segment';
import { BALANCE_ROWS, rowOf } from '../../../components/charts/balance-entries';
import { useRevisionLine } from '../../../lib/queries/get-revision-line';
import { arrangeFindings } from '../model/arrange-findings';
import { overheadOf, readFiledLine, type FiledLine } from '../model/filed-line';
import { BalanceSection, type FindingActions } from './balance-section';
import { CouplingSection } from './coupling-section';
import { FrequencySection } from './frequency-section';
import { GeometrySection } from './geometry-section';
import { HandCheckSection } from './hand-check-section';
import { LineHead } from './line-head';
import { SinceBeforeSection } from './since-before-section';
import { WholeLineSection } from './whole-line-section';

interface LineSheetProps {
  applicationNumber: string;
  letter: string;
  lineKey: string;
  /** What can be done with each finding; none without it. */
  findingActions?: FindingActions;
}

/** The sheet of a filed line: its values weighed, what does not balance and why, the geometry behind them. */
export function LineSheet({ applicationNumber, letter, lineKey, findingActions }: LineSheetProps) {
  const line = useRevisionLine(applicationNumber, letter, lineKey);
  const filed = useMemo(() => readFiledLine(line.line), [line.line]);
  const titleId = useId();
  const circuits = filed.normalised.circuits.map((c) => c.circuit);
  const [circuit, setCircuit] = useCircuit(circuits);
  const arranged = arrangeFindings(line.findings, circuit, rowOf, BALANCE_ROWS);
  return (
    <article className="sheet sheet-main" aria-labelledby={titleId}>
      <LineHead line={line} filed={filed} titleId={titleId} jumps={jumpsOf(line, filed)} />
      <RunState line={line} />
      {circuits.length > 1 && (
        <div className="border-b border-rule px-4 py-3 field:px-6">
          <SegmentChoice
            label="Circuit"
            value={String(circuit)}
            onChange={(value) => setCircuit(Number(value))}
            options={circuits.map((c) => ({
              value: String(c),
              label: circuitLabel(filed.filed.declared, c),
            }))}
          />
        </div>
      )}
      <BalanceSection line={line} circuit={circuit} findingActions={findingActions} />
      <SinceBeforeSection line={line} circuit={circuit} />
      <CouplingSection
        line={line}
        filed={filed}
        findings={arranged.coupling}
        carriers={arranged.carriers}
        findingActions={findingActions}
      />
      <GeometrySection
        line={line}
        filed={filed}
        findings={arranged.drawing}
        carriers={arranged.carriers}
        findingActions={findingActions}
      />
      <WholeLineSection line={line} circuit={circuit} />
      <Calculations line={line} filed={filed} circuit={circuit} />
    </article>
  );
}

/** What the browser computes from the filed geometry of the first overhead section. */
function Calculations({ line, filed, circuit }: { line: RevisionLine; filed: FiledLine; circuit: number }) {
  const index = filed.normalised.sections.findIndex((s) => s.kind === 'overhead');
  const section = overheadOf(filed.normalised.sections[index]);
  const where = line.sectionCount > 1 ? `Section ${index + 1}; ` : '';
  return (
    <>
      <FrequencySection line={line} circuit={circuit} section={section} index={index} />
      <HandCheckSection section={section} frequencyHz={line.frequencyHz} circuit={circuit} where={where} />
    </>
  );
}

function jumpsOf(line: RevisionLine, filed: FiledLine): { id: string; label: string }[] {
  const computed = line.equivalents.length > 0;
  const hasOverhead = filed.normalised.sections.some((s) => s.kind === 'overhead');
  const coupled = line.mutual.length > 0;
  return [
    { id: 'balance', label: 'Balance', shown: true },
    { id: 'coupling', label: 'Coupling', shown: coupled },
    { id: 'geometry', label: 'Geometry', shown: true },
    { id: 'whole-line', label: 'Whole line', shown: computed },
    { id: 'frequency', label: 'Frequency', shown: hasOverhead },
    { id: 'hand-check', label: 'By hand', shown: hasOverhead },
  ].filter((jump) => jump.shown);
}

function circuitLabel(declared: readonly { circuit: number; circuitId?: string }[], circuit: number): string {
  const name = declared.find((d) => d.circuit === circuit)?.circuitId;
  return name ? `Circuit ${circuit}, ${name}` : `Circuit ${circuit}`;
}

/** Which circuit is shown stands in the address, so that a link leads to what is meant. */
function useCircuit(circuits: readonly number[]): [number, (circuit: number) => void] {
  const [params, setParams] = useSearchParams();
  const asked = Number(params.get('circuit'));
  const circuit = circuits.includes(asked) ? asked : (circuits[0] ?? 1);
  const choose = (next: number) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        after.set('circuit', String(next));
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  return [circuit, choose];
}

/** Says when the values are still on their way, or when the check could not be made. */
function RunState({ line: { run } }: { line: RevisionLine }) {
  if (run === null || run.state === 'done') return null;
  if (run.state === 'failed') {
    return (
      <Notice grade="must-answer" title="The check of this revision failed." className="m-4">
        {run.failure}
      </Notice>
    );
  }
  return (
    <Notice title="The check is still running." className="m-4">
      {`${run.linesChecked} of ${run.lineCount} lines are checked; the page follows by itself.`}
    </Notice>
  );
}
