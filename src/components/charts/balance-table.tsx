import { classNames } from '../ui/class-names';
import { Figure } from '../ui/figure';
import { GradeLabel } from '../ui/grade-mark';
import {
  balanceSentence,
  isOutOfTolerance,
  toleranceOf,
  type BalanceEntry,
  type RowFinding,
} from './balance-entry';
import { Beam } from './beam';
import { CauseLine, FindingWords } from './cause-line';
import { Strip } from './strip';

interface BalanceTableProps {
  /** Names the table for screen readers. */
  label: string;
  /** The head over the strips: "Scale: outer limits of 345 kV". */
  scaleLabel: string;
  entries: readonly BalanceEntry[];
  /** Beside a form: without the columns of typical values and grades. */
  live?: boolean;
}

function PointerKey() {
  return (
    <svg width={9} height={8} viewBox="0 0 9 8" aria-hidden="true">
      <path d="M0 0H9L4.5 8Z" className="fill-copper" />
    </svg>
  );
}

function BarKey() {
  return (
    <svg width={9} height={12} viewBox="0 0 9 12" aria-hidden="true">
      <path d="M0 6H9" strokeWidth={1.5} className="stroke-verdigris" />
      <rect x={2.5} width={4} height={12} className="fill-verdigris" />
    </svg>
  );
}

function BandKey() {
  return (
    <svg width={14} height={12} viewBox="0 0 14 12" aria-hidden="true">
      <rect width={14} height={12} className="fill-band" />
      <path d="M.5 0V12M13.5 0V12" className="stroke-band-edge" />
    </svg>
  );
}

/** The heads carry pointer, bar and band as their own key. */
function BalanceHead({ scaleLabel, live }: { scaleLabel: string; live: boolean }) {
  const head = { role: 'columnheader', scope: 'col' } as const;
  return (
    <thead role="rowgroup">
      <tr role="row">
        <th {...head} className="b-name">
          Parameter
        </th>
        <th {...head} className="b-beam">
          Balance
        </th>
        <th {...head} className="b-strip">
          {live ? (
            <span className="head-key" title={scaleLabel}>
              <BandKey />
              Typical
            </span>
          ) : (
            scaleLabel
          )}
        </th>
        <th {...head} className="b-declared">
          <span className="head-key">
            <PointerKey />
            Declared
          </span>
        </th>
        <th {...head} className="b-recomputed">
          <span className="head-key">
            <BarKey />
            Recomputed
          </span>
        </th>
        {!live && (
          <th {...head} className="b-typical">
            <span className="head-key">
              <BandKey />
              Typical
            </span>
          </th>
        )}
        <th {...head} className="b-difference">
          Difference
        </th>
        {!live && (
          <th {...head} className="b-grade">
            Finding
          </th>
        )}
      </tr>
    </thead>
  );
}

function RowStrip({ entry }: { entry: BalanceEntry }) {
  const { outer, typical, declared, recomputed } = entry;
  if (!outer || !typical) return <span className="follows">no band for this voltage</span>;
  return (
    <Strip
      label={balanceSentence(entry)}
      endTexts={[outer.low.text, outer.high.text]}
      values={{
        outer: [outer.low.value, outer.high.value],
        typical: [typical.low.value, typical.high.value],
        declared: declared?.value ?? null,
        recomputed: recomputed?.value ?? null,
        range: entry.range,
        outOfTolerance: isOutOfTolerance(entry),
      }}
    />
  );
}

function RowVerdict({ entry }: { entry: BalanceEntry }) {
  if (entry.remark && !entry.settled) return <span className="follows">{entry.remark}</span>;
  if (!entry.grade) return null;
  return (
    <GradeLabel grade={entry.grade} settled={entry.settled}>
      {entry.remark}
    </GradeLabel>
  );
}

function EntryRow({ entry, live }: { entry: BalanceEntry; live: boolean }) {
  const { declared, recomputed, typical, difference } = entry;
  return (
    <tr role="row">
      <th role="rowheader" scope="row" className="b-name">
        {entry.name}
        <span>{entry.unit}</span>
      </th>
      <td role="cell" className="b-beam">
        {difference && <Beam difference={difference.value} tolerance={toleranceOf(entry)} />}
      </td>
      <td role="cell" className="b-strip">
        <RowStrip entry={entry} />
      </td>
      <td role="cell" className="b-declared" data-label="Declared">
        {declared ? <Figure>{declared.text}</Figure> : <span className="follows">not given</span>}
      </td>
      <td role="cell" className="b-recomputed" data-label="Recomputed">
        {recomputed ? <Figure>{recomputed.text}</Figure> : <span className="follows">none</span>}
      </td>
      {!live && (
        <td role="cell" className="b-typical" data-label="Typical">
          {typical && `${typical.low.text} – ${typical.high.text}`}
        </td>
      )}
      <td role="cell" className={classNames('b-difference', isOutOfTolerance(entry) && 'out-of-tolerance')}>
        {difference?.text}
      </td>
      {!live && (
        <td role="cell" className="b-grade">
          <RowVerdict entry={entry} />
        </td>
      )}
    </tr>
  );
}

function FindingRow({ finding, live }: { finding: RowFinding; live: boolean }) {
  const grade = finding.settled ? 'settled' : finding.grade;
  return (
    <tr role="row" className="b-finding">
      <td role="cell" colSpan={2} />
      <td role="cell" colSpan={live ? 4 : 6}>
        <FindingWords says={finding.says} acts={finding.acts}>
          {finding.causes?.map((cause, i) => (
            <CauseLine key={i} grade={grade}>
              {cause}
            </CauseLine>
          ))}
        </FindingWords>
      </td>
    </tr>
  );
}

function washOf(entry: BalanceEntry): string | undefined {
  if (entry.settled || (entry.grade !== 'must-answer' && entry.grade !== 'explain')) return undefined;
  return `wash-${entry.grade}`;
}

/** The three values of every parameter, weighed row by row; findings follow inside their row's group. */
export function BalanceTable({ label, scaleLabel, entries, live = false }: BalanceTableProps) {
  return (
    <table role="table" aria-label={label} className={classNames('balance', live && 'balance-live')}>
      <BalanceHead scaleLabel={scaleLabel} live={live} />
      {entries.map((entry) => (
        <tbody key={entry.key} role="rowgroup" className={washOf(entry)}>
          <EntryRow entry={entry} live={live} />
          {entry.findings?.map((finding) => (
            <FindingRow key={finding.key} finding={finding} live={live} />
          ))}
        </tbody>
      ))}
    </table>
  );
}
