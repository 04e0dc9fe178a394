import { useId, useState, type FormEvent, type ReactNode } from 'react';
import { Button, type ButtonKind } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Field } from '../ui/field';
import { TextArea } from '../ui/inputs';
import { ProblemNotice } from './problem-notice';

interface WordsDialogProps {
  title: string;
  description?: ReactNode;
  /** Name of the field for the words. */
  label: string;
  hint?: ReactNode;
  /** Words that may stand already. */
  initial?: string;
  optional?: boolean;
  /** What the button says, as what it does. */
  confirm: string;
  kind?: ButtonKind;
  /** More fields, above the words. */
  children?: ReactNode;
  busy: boolean;
  error: Error | null;
  onConfirm: (words: string) => void;
  onClose: () => void;
}

/** A step that wants a reason: what it does, the words, one button that does it. The words stay if it is refused. */
export function WordsDialog({
  initial = '',
  optional,
  confirm,
  kind = 'primary',
  ...props
}: WordsDialogProps) {
  const [words, setWords] = useState(initial);
  const [missing, setMissing] = useState(false);
  const fieldId = useId();
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const lacking = !optional && words.trim() === '';
    setMissing(lacking);
    if (lacking) document.getElementById(fieldId)?.focus();
    else props.onConfirm(words.trim());
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && props.onClose()}
      title={props.title}
      description={props.description}
    >
      <form onSubmit={submit} className="grid gap-4" noValidate>
        {props.children}
        <Field
          id={fieldId}
          label={props.label}
          optional={optional}
          hint={props.hint}
          error={missing ? 'Write this first: it is kept with the record.' : null}
        >
          {(ties) => (
            <TextArea
              {...ties}
              rows={4}
              maxLength={4000}
              value={words}
              onChange={(event) => setWords(event.target.value)}
            />
          )}
        </Field>
        <ProblemNotice error={props.error} />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind={kind} busy={props.busy}>
            {confirm}
          </Button>
          <Button onClick={props.onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
