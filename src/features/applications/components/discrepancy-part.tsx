import type { ReactNode } from 'react';
import type { Application, Discrepancy, DiscrepancyEntry } from '#shared/contracts/api.generated';
import { formatDay } from '#shared/format/dates';
import { Disclosure } from '../../../components/ui/disclosure';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { mattersOf } from '../model/matters';
import { hasDraft } from '../model/words';
import { AnswerForm } from './answer-form';
import { CauseOffer, PlainFindings } from './cause-offer';
import { Thread } from './thread';

/** The owner's last words that are still to be answered. */
function askedIn({ entries, question, raisedBy, raisedAt }: Discrepancy): {
  text: string;
  by: string;
  at: string;
} {
  const asks: readonly DiscrepancyEntry['kind'][] = ['raised', 'reopened', 'commented'];
  const last = entries.filter((e) => asks.includes(e.kind)).at(-1);
  return last
    ? { text: last.text, by: last.by.name, at: last.at }
    : { text: question, by: raisedBy.name, at: raisedAt };
}

interface DiscrepancyPartProps {
  application: Application;
  discrepancy: Discrepancy;
  /** The way to attach a file to it. */
  attach: ReactNode;
  /** The files that belong to it. */
  files: ReactNode;
}

/** One discrepancy to answer: what is asked, what the check says, the answer. */
export function DiscrepancyPart({ application, discrepancy, attach, files }: DiscrepancyPartProps) {
  const asked = askedIn(discrepancy);
  const answered = discrepancy.state === 'answered';
  const open = hasDraft(application);
  const matters = mattersOf(discrepancy.findings);
  const explained = matters.filter((m) => m.causes.length > 0);
  const lastAnswer = discrepancy.entries.filter((e) => e.kind === 'answered').at(-1);
  return (
    <div className="sheet-cut px-4 py-5 field:px-6" id={`D-${discrepancy.number}`}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h3>{`D-${discrepancy.number}: ${discrepancy.title}`}</h3>
        {discrepancy.findings.length === 0 ? (
          <span className="text-table font-semibold">
            {answered ? 'raised by hand, answered' : 'raised by hand'}
          </span>
        ) : (
          <GradeLabel grade={discrepancy.grade} settled={answered}>
            {answered ? 'answered' : undefined}
          </GradeLabel>
        )}
      </div>
      <p className="mt-2 max-w-prose">
        {`“${asked.text}” `}
        <span className="text-table whitespace-nowrap text-ink-soft">{`${asked.by}, ${formatDay(asked.at)}`}</span>
      </p>
      {discrepancy.wanted && (
        <p className="mt-1 text-table text-ink-soft">{`What would settle it: ${discrepancy.wanted}`}</p>
      )}
      {explained.map((matter) => (
        <CauseOffer key={matter.key} number={application.number} matter={matter} open={open && !answered} />
      ))}
      <PlainFindings matters={matters.filter((m) => m.causes.length === 0)} />
      {files}
      {answered && lastAnswer && (
        <p className="mt-3 max-w-prose border-l-2 border-copper pl-3">
          {lastAnswer.text}{' '}
          <span className="text-table whitespace-nowrap text-ink-soft">{`${lastAnswer.by.name}, ${formatDay(lastAnswer.at)}`}</span>
        </p>
      )}
      {open && !answered && (
        <AnswerForm number={application.number} discrepancy={discrepancy} attach={attach} />
      )}
      {discrepancy.entries.length > 1 && (
        <Disclosure summary="The whole thread" className="mt-3">
          <Thread entries={discrepancy.entries} />
        </Disclosure>
      )}
    </div>
  );
}
