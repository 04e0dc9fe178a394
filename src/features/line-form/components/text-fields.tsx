import { Field } from '../../../components/ui/field';
import { Select, TextInput } from '../../../components/ui/inputs';
import type { Option } from '../../../components/ui/inputs';
import { NumberField } from '../../../components/ui/number-field';
import { useTextField } from '../hooks/use-field';
import type { FormPath } from '../model/form-types';

interface TextFieldProps {
  path: FormPath;
  label: string;
  optional?: boolean;
  type?: 'text' | 'date';
}

/** A text of the form. */
export function TextField({ path, label, optional, type = 'text' }: TextFieldProps) {
  const { field, input } = useTextField(path);
  return (
    <Field label={label} optional={optional} {...field}>
      {(ties) => <TextInput {...ties} {...input} type={type} autoComplete="off" />}
    </Field>
  );
}

interface ChoiceFieldProps {
  path: FormPath;
  label: string;
  options: readonly Option[];
  /** The words of no choice, first in the list. */
  none?: string;
  hint?: string;
}

/** A choice of one. */
export function ChoiceField({ path, label, options, none, hint }: ChoiceFieldProps) {
  const { field, input } = useTextField(path);
  return (
    <Field label={label} {...field} hint={hint ?? field.hint}>
      {(ties) => <Select {...ties} {...input} options={options} none={none} />}
    </Field>
  );
}

interface PlainNumberProps {
  path: FormPath;
  label: string;
  hint?: string;
  optional?: boolean;
}

/** A number that has no unit of its own to choose, kept as text. */
export function PlainNumber({ path, label, hint, optional }: PlainNumberProps) {
  const { field, input } = useTextField(path);
  return <NumberField label={label} optional={optional} {...field} hint={hint ?? field.hint} {...input} />;
}
