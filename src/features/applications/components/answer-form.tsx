import { useState } from 'react';
import type { FormEvent, ReactNode } from 'react';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { formatTime } from '#shared/format/dates';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormWords } from '../../../components/ui/form-text';
import { Radio } from '../../../components/ui/inputs';
import { useCaseWrite } from '../../../lib/queries/use-case-write';
import { useAnswerDraft } from '../hooks/use-answer-draft';
import type { AnswerBy } from '../hooks/use-answer-draft';

const WAYS: readonly { value: AnswerBy; label: string }[] = [
  { value: 'change', label: 'I changed the data' },
  { value: 'explanation', label: 'The value stands; I explain it' },
];

interface AnswerFormProps {
  number: string;
  discrepancy: Discrepancy;
  /** The way to attach a file. */
  attach: ReactNode;
}

/** The answer to one discrepancy: how, in which words, with which files. Its draft is kept as it is typed. */
export function AnswerForm({ number, discrepancy, attach }: AnswerFormProps) {
  const draft = useAnswerDraft(number, discrepancy);
  const answer = useCaseWrite('answerDiscrepancy', number);
  const [missing, setMissing] = useState(false);
  const name = `D-${discrepancy.number}`;
  const fieldId = `answer-${discrepancy.number}`;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const text = draft.text.trim();
    setMissing(text === '');
    if (text === '') {
      document.getElementById(fieldId)?.focus();
      return;
    }
    answer.mutate({
      params: { number: discrepancy.number },
      body: { by: draft.by, text, version: discrepancy.version },
    });
  };
  return (
    <form onSubmit={submit} noValidate className="mt-4 grid gap-3">
      <div role="radiogroup" aria-label={`How you answer ${name}`} className="flex flex-wrap gap-x-6 gap-y-2">
        {WAYS.map((way) => (
          <Radio
            key={way.value}
            name={`by-${discrepancy.number}`}
            label={way.label}
            checked={draft.by === way.value}
            onChange={() => draft.setBy(way.value)}
          />
        ))}
      </div>
      <FormWords
        id={fieldId}
        label={`Your answer to ${name}`}
        rows={2}
        placeholder="Say what you changed, or why the value stands."
        value={draft.text}
        onText={draft.setText}
        error={missing ? 'Say what you changed, or why the value stands.' : null}
      />
      <ProblemNotice error={answer.error} />
      <div className="flex flex-wrap items-center gap-3">
        <Button small kind="primary" type="submit" busy={answer.isPending}>
          {`Answer ${name}`}
        </Button>
        {attach}
        <span className="text-table text-ink-soft" aria-live="polite">
          {draft.savedAt ? `Draft saved at ${formatTime(draft.savedAt)}.` : ''}
          {draft.error ? 'The draft is not saved yet; it stays here.' : ''}
        </span>
      </div>
    </form>
  );
}
