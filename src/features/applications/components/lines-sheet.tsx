import { Link } from 'react-router-dom';
import type { Application, Draft, DraftLine, LineSummary } from '#shared/contracts/api.generated';
import { ButtonLink } from '../../../components/ui/button';
import { EmptyState } from '../../../components/feedback/empty-state';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { plainQuantity } from '../../../lib/plain-number';
import { linesWords } from '../model/words';
import { RemoveLine } from './remove-line';

interface LineRowProps {
  lineKey: string;
  name: string;
  to: string;
  voltageKv: number | null;
  lengthKm: number | null;
  circuits: number;
  check: React.ReactNode;
  remove?: React.ReactNode;
}

function LineRow({ lineKey, name, to, voltageKv, lengthKm, circuits, check, remove }: LineRowProps) {
  return (
    <Row selectable>
      <Cell fold="hide">{lineKey}</Cell>
      <RowHead fold="row">
        <Link to={to} className="link-ink">
          {name}
        </Link>
      </RowHead>
      <Cell oneLine>{voltageKv === null ? '' : plainQuantity(voltageKv, 'kV')}</Cell>
      <Cell oneLine number fold="end">
        {lengthKm === null ? '' : plainQuantity(lengthKm, 'km')}
      </Cell>
      <Cell oneLine fold="hide">
        {circuits === 2 ? 'double' : 'single'}
      </Cell>
      <Cell oneLine fold={remove ? undefined : 'row'}>
        {check}
      </Cell>
      {remove !== undefined && <Cell fold="end">{remove}</Cell>}
    </Row>
  );
}

/** What the check found in a filed line: its findings' parameters by grade, leading to its sheet. */
function FiledMarks({ line, to }: { line: LineSummary; to: string }) {
  const shown = line.marks.slice(0, 4);
  const inBalance = line.marks.every((m) => m.grade === 'note');
  return (
    <Link to={to} className="inline-flex flex-wrap gap-x-3">
      <span className="sr-only">{`What was found in ${line.name}:`}</span>
      {inBalance && <GradeLabel grade="in-balance" />}
      {shown.map((mark) => (
        <GradeLabel key={mark.code + (mark.parameter ?? '')} grade={mark.grade} settled={!mark.stands}>
          {mark.words}
        </GradeLabel>
      ))}
      {line.marks.length > shown.length && (
        <span className="text-ink-soft">{`and ${line.marks.length - shown.length} more`}</span>
      )}
    </Link>
  );
}

function DraftState({ line }: { line: DraftLine }) {
  if (line.complete) return <span className="text-ink-soft">complete</span>;
  const count = line.faults.length;
  return (
    <span className="font-semibold text-copper">
      {count === 1 ? '1 entry to complete' : `${count} entries to complete`}
    </span>
  );
}

interface LinesSheetProps {
  application: Application;
  /** The draft of the next revision, while there is one. */
  draft: Draft | null;
  /** The lines of the latest revision, with what was found. */
  filed: { letter: string; lines: readonly LineSummary[] } | null;
}

function Heads({ removable, check }: { removable: boolean; check: string }) {
  return (
    <TableHead>
      <Row>
        <HeadCell>
          <span className="sr-only">Key</span>
        </HeadCell>
        <HeadCell>Line</HeadCell>
        <HeadCell>Voltage</HeadCell>
        <HeadCell number>Length</HeadCell>
        <HeadCell>Circuits</HeadCell>
        <HeadCell>{check}</HeadCell>
        {removable && (
          <HeadCell>
            <span className="sr-only">Remove</span>
          </HeadCell>
        )}
      </Row>
    </TableHead>
  );
}

function DraftRows({ application, draft, filed }: LinesSheetProps & { draft: Draft }) {
  const base = `/applications/${application.number}`;
  return draft.lines.map((line) => {
    const before = filed?.lines.find((f) => f.lineKey === line.lineKey);
    const marks = before && filed && (
      <FiledMarks line={before} to={`${base}/revisions/${filed.letter}/lines/${line.lineKey}`} />
    );
    return (
      <LineRow
        key={line.lineKey}
        lineKey={line.lineKey}
        name={line.name ?? 'Line without a name'}
        to={`${base}/lines/${line.lineKey}`}
        voltageKv={line.nominalVoltageKv}
        lengthKm={line.lengthKm}
        circuits={line.circuitCount}
        check={line.complete && marks ? marks : <DraftState line={line} />}
        remove={<RemoveLine number={application.number} line={line} />}
      />
    );
  });
}

/** The lines: of the draft while there is one, else of the latest revision. */
export function LinesSheet(props: LinesSheetProps) {
  const { application, draft, filed } = props;
  const base = `/applications/${application.number}`;
  const count = draft ? draft.lines.length : (filed?.lines.length ?? 0);
  const lengthKm = (draft?.lines ?? filed?.lines ?? []).reduce((sum, l) => sum + (l.lengthKm ?? 0), 0);
  return (
    <Sheet title="Lines" aside={linesWords(count, lengthKm)} id="lines">
      {count === 0 ? (
        <EmptyState title="No line yet">
          Declare each line by the form, or take them from a JSON or CSV file at the right.
        </EmptyState>
      ) : (
        <Table label="Lines" folds>
          <Heads
            removable={draft !== null}
            // beside a draft stands what was found in the revision before it
            check={draft && filed ? `Check of ${filed.letter}` : 'Check'}
          />
          <TableBody>
            {draft && <DraftRows {...props} draft={draft} />}
            {!draft &&
              filed?.lines.map((line) => {
                const to = `${base}/revisions/${filed.letter}/lines/${line.lineKey}`;
                return (
                  <LineRow
                    key={line.lineKey}
                    lineKey={line.lineKey}
                    name={line.name}
                    to={to}
                    voltageKv={line.nominalVoltageKv}
                    lengthKm={line.lengthKm}
                    circuits={line.circuitCount}
                    check={<FiledMarks line={line} to={to} />}
                  />
                );
              })}
          </TableBody>
        </Table>
      )}
      {draft && (
        <div className="sheet-foot items-center">
          <ButtonLink small to={`${base}/lines/${draft.nextLineKey}`}>
            Add a line
          </ButtonLink>
          <span className="text-ink-soft">{`Changes go into the draft of revision ${application.nextRevision}.`}</span>
        </div>
      )}
    </Sheet>
  );
}
