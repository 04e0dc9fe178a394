import type { ReactNode } from 'react';
import type { Discrepancy, DiscrepancyEntry } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { Disclosure } from '../../../components/ui/disclosure';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { ThreadReply } from './thread-reply';

export interface ThreadContext {
  number: string;
  /** The current revision: what a settlement is made on. */
  revision: string;
  /** The reviewer of the case, while it is in review. */
  mayAct: boolean;
  /** Files of a discrepancy, given by the page. */
  attachments?: (discrepancy: Discrepancy, mayAdd: boolean) => ReactNode;
}

const ENTRY_WORDS: Readonly<Record<DiscrepancyEntry['kind'], string>> = {
  raised: 'raised it',
  answered: 'answered',
  commented: '',
  settled: 'settled it',
  reopened: 'asked again',
  waived: 'waived it',
};

const isClosed = ({ state }: Discrepancy) => state === 'settled' || state === 'waived';

/** A discrepancy with its thread, ruled like a table of revisions; the reply stands in the same grid. */
export function DiscrepancyThread({
  discrepancy,
  context,
}: {
  discrepancy: Discrepancy;
  context: ThreadContext;
}) {
  const closed = isClosed(discrepancy);
  const name = `D-${discrepancy.number}`;
  const titleId = `d-${discrepancy.number}-title`;
  const body = (
    <>
      <Thread entries={discrepancy.entries} revision={context.revision} />
      {context.attachments?.(discrepancy, context.mayAct)}
      {context.mayAct && <ThreadReply discrepancy={discrepancy} context={context} />}
    </>
  );
  return (
    <section id={`d-${discrepancy.number}`} className="discrepancy" aria-labelledby={titleId} tabIndex={-1}>
      <div className="discrepancy-head">
        <h2 id={titleId}>
          {name}: {discrepancy.title}
        </h2>
        <GradeLabel grade={discrepancy.grade} settled={closed}>
          {closed ? discrepancy.state : `${GRADE_WORDS[discrepancy.grade]}, ${discrepancy.state}`}
        </GradeLabel>
        <p className="discrepancy-meta">
          <span>{`raised on revision ${discrepancy.raisedOn}, ${formatDate(discrepancy.raisedAt)}`}</span>
          {discrepancy.lineKeys.length > 0 && <span>{discrepancy.lineKeys.join(', ')}</span>}
          {discrepancy.wanted && <span>Wanted: {discrepancy.wanted}</span>}
        </p>
      </div>
      {closed ? (
        <Disclosure className="discrepancy-closed" summary={`Read ${name}`}>
          {body}
        </Disclosure>
      ) : (
        body
      )}
    </section>
  );
}

function Thread({ entries, revision }: { entries: readonly DiscrepancyEntry[]; revision: string }) {
  return (
    <ol className="thread">
      {entries.map((entry) => (
        <li key={entry.id}>
          <RevisionTriangle letter={entry.revision} older={entry.revision !== revision} />
          <div className="thread-who">
            <b>{entry.by.name}</b>
            <span>{entry.party.name}</span>
            <span>{formatDate(entry.at)}</span>
          </div>
          <div className="thread-words">
            {ENTRY_WORDS[entry.kind] && <p className="text-label text-ink-soft">{ENTRY_WORDS[entry.kind]}</p>}
            {entry.text}
          </div>
        </li>
      ))}
    </ol>
  );
}
