import { useState } from 'react';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { TextArea } from '../../../components/ui/inputs';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { useLeaveGuard } from '../../../hooks/use-leave-guard';
import { useRemarkOnDiscrepancy } from '../api/remark-on-discrepancy';
import { useReopenDiscrepancy } from '../api/reopen-discrepancy';
import { useSettleDiscrepancy } from '../api/settle-discrepancy';
import { replyActs } from '../model/reply-acts';
import type { ThreadContext } from './discrepancy-thread';

interface ThreadReplyProps {
  discrepancy: Discrepancy;
  context: ThreadContext;
}

/** The reviewer's next words in a thread, and what becomes of the discrepancy with them. */
export function ThreadReply({ discrepancy, context: { number, revision } }: ThreadReplyProps) {
  const [words, setWords] = useState('');
  const remark = useRemarkOnDiscrepancy(number);
  const settle = useSettleDiscrepancy(number);
  const reopen = useReopenDiscrepancy(number);
  const [last, setLast] = useState<'remark' | 'settle' | 'reopen'>('remark');
  const writes = { remark, settle, reopen };
  const busy = remark.isPending || settle.isPending || reopen.isPending;
  useLeaveGuard(words.trim() !== '');
  const text = words.trim();
  const params = { number: discrepancy.number };
  const { version } = discrepancy;
  const done = { onSuccess: () => setWords('') };
  const act = {
    remark: () => remark.mutate({ params, body: { text } }, done),
    reopen: () => reopen.mutate({ params, body: { revision, text, version } }, done),
    settle: () =>
      settle.mutate({ params, body: { revision, version, ...(text === '' ? {} : { text }) } }, done),
  };
  const name = `D-${discrepancy.number}`;
  return (
    <div className="thread-reply">
      <RevisionTriangle letter={revision} />
      <div className="thread-who">
        <b>Your reply</b>
        <span>to {name}</span>
      </div>
      <div>
        <TextArea
          aria-label={`Reply to ${name}`}
          rows={3}
          maxLength={4000}
          value={words}
          onChange={(event) => setWords(event.target.value)}
        />
        <div className="actions mt-2.5">
          {replyActs(discrepancy.state).map(({ act: which, label, primary, needsWords }) => (
            <Button
              key={which}
              small
              kind={primary ? 'primary' : 'secondary'}
              busy={busy && last === which}
              disabled={needsWords && text === ''}
              title={needsWords && text === '' ? 'Write your words first' : undefined}
              onClick={() => {
                setLast(which);
                act[which]();
              }}
            >
              {label}
            </Button>
          ))}
          <span className="text-table text-ink-soft">
            Sent with the letter when you return the application.
          </span>
        </div>
        <ProblemNotice error={writes[last].error} className="mt-3" />
      </div>
    </div>
  );
}
