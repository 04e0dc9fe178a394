import { useState, type FormEvent } from 'react';
import type { Finding, LineSummary } from '#shared/contracts/api.generated';
import { ErrorSummary } from '../../../components/feedback/error-summary';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { GradeMark } from '../../../components/ui/grade-mark';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { Checkbox, TextArea, TextInput } from '../../../components/ui/inputs';
import { parameterName } from '../../../components/charts/balance-entries';
import { useRaiseDiscrepancy } from '../api/raise-discrepancy';
import { draftFrom, raiseFaults, raiseRequest, type RaiseDraft } from '../model/raise';

interface RaiseDialogProps {
  number: string;
  revision: string;
  /** Findings that it is raised from; none when it is raised by hand. */
  findings: readonly Finding[];
  lines: readonly LineSummary[];
  /** "D-3": the number that it will have, as far as is known. */
  name: string;
  onRaised: () => void;
  onClose: () => void;
}

const FIELD_IDS = { title: 'raise-title', question: 'raise-question' } as const;

/** A discrepancy from findings or by hand: what is questioned, what would settle it. */
export function RaiseDialog({
  number,
  revision,
  findings,
  lines,
  name,
  onRaised,
  onClose,
}: RaiseDialogProps) {
  const [draft, setDraft] = useState<RaiseDraft>(() => draftFrom(findings, parameterName));
  const [tried, setTried] = useState(false);
  const raise = useRaiseDiscrepancy(number);
  const faults = tried ? raiseFaults(draft) : [];
  const faultOf = (field: 'title' | 'question') => faults.find((f) => f.field === field)?.message ?? null;
  const change = (part: Partial<RaiseDraft>) => setDraft((before) => ({ ...before, ...part }));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (raiseFaults(draft).length > 0) return;
    raise.mutate({ body: raiseRequest(draft, revision) }, { onSuccess: onRaised });
  };
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title={`Raise ${name}`}
      description={`On revision ${revision}. It goes to the applicant with the letter when you return the application.`}
    >
      <form onSubmit={submit} className="grid gap-4" noValidate>
        <ErrorSummary
          title="Before it can be raised"
          items={faults.map(({ field, message }) => ({ fieldId: FIELD_IDS[field], message }))}
        />
        {findings.length > 0 ? (
          <ChosenFindings findings={findings} />
        ) : (
          <LineChoice lines={lines} chosen={draft.lineKeys} onChange={(lineKeys) => change({ lineKeys })} />
        )}
        <RaiseFields draft={draft} faultOf={faultOf} onChange={change} />
        <ProblemNotice error={raise.error} />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={raise.isPending}>
            {`Raise ${name}`}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}

interface RaiseFieldsProps {
  draft: RaiseDraft;
  faultOf: (field: 'title' | 'question') => string | null;
  onChange: (part: Partial<RaiseDraft>) => void;
}

function RaiseFields({ draft, faultOf, onChange }: RaiseFieldsProps) {
  return (
    <>
      <Field label="About" id={FIELD_IDS.title} error={faultOf('title')}>
        {(ties) => (
          <TextInput
            {...ties}
            maxLength={200}
            value={draft.title}
            onChange={(e) => onChange({ title: e.target.value })}
          />
        )}
      </Field>
      <Field label="What is questioned" id={FIELD_IDS.question} error={faultOf('question')}>
        {(ties) => (
          <TextArea
            {...ties}
            rows={5}
            maxLength={4000}
            value={draft.question}
            onChange={(e) => onChange({ question: e.target.value })}
          />
        )}
      </Field>
      <Field label="What would settle it" optional>
        {(ties) => (
          <TextArea
            {...ties}
            rows={2}
            maxLength={4000}
            value={draft.wanted}
            onChange={(e) => onChange({ wanted: e.target.value })}
          />
        )}
      </Field>
    </>
  );
}

function ChosenFindings({ findings }: { findings: readonly Finding[] }) {
  return (
    <ul aria-label="Findings that it is raised from" className="border border-rule-strong text-table">
      {findings.map((finding) => (
        <li
          key={`${finding.lineKey} ${finding.fingerprint}`}
          className="flex gap-2 border-b border-rule px-3 py-2 last:border-b-0"
        >
          <GradeMark grade={finding.grade} label={GRADE_WORDS[finding.grade]} />
          <span>
            <b className="font-semibold">{finding.lineKey}</b> {finding.message}
          </span>
        </li>
      ))}
    </ul>
  );
}

interface LineChoiceProps {
  lines: readonly LineSummary[];
  chosen: readonly string[];
  onChange: (lineKeys: string[]) => void;
}

function LineChoice({ lines, chosen, onChange }: LineChoiceProps) {
  const toggle = (key: string) =>
    onChange(chosen.includes(key) ? chosen.filter((k) => k !== key) : [...chosen, key]);
  return (
    <fieldset className="grid gap-1">
      <legend className="field-label">Lines that it is about</legend>
      {lines.map((line) => (
        <Checkbox
          key={line.lineKey}
          label={`${line.lineKey} ${line.name}`}
          checked={chosen.includes(line.lineKey)}
          onChange={() => toggle(line.lineKey)}
        />
      ))}
    </fieldset>
  );
}
