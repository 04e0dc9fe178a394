import type { InputHTMLAttributes, ReactNode } from 'react';
import { Field } from './field';
import { TextArea, TextInput } from './inputs';

interface FormTextProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'value' | 'onChange' | 'id'> {
  id?: string;
  label: string;
  hint?: ReactNode;
  error?: string | null;
  optional?: boolean;
  value: string;
  onText: (text: string) => void;
}

/** A label with one line of text under it. */
export function FormText({ id, label, hint, error, optional, onText, ...input }: FormTextProps) {
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      {(ties) => <TextInput {...input} {...ties} onChange={(event) => onText(event.target.value)} />}
    </Field>
  );
}

interface FormWordsProps {
  id?: string;
  label: string;
  hint?: ReactNode;
  error?: string | null;
  optional?: boolean;
  value: string;
  onText: (text: string) => void;
  rows?: number;
  placeholder?: string;
}

/** A label with room for several lines. */
export function FormWords({ id, label, hint, error, optional, onText, ...area }: FormWordsProps) {
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      {(ties) => <TextArea {...area} {...ties} onChange={(event) => onText(event.target.value)} />}
    </Field>
  );
}
