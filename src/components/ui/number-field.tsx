import type { InputHTMLAttributes, Ref, SelectHTMLAttributes } from 'react';
import { Field } from './field';
import { FigureInput, Select, type Option } from './inputs';

interface UnitChooser extends Omit<SelectHTMLAttributes<HTMLSelectElement>, 'children'> {
  ref?: Ref<HTMLSelectElement>;
  options: readonly Option[];
}

interface NumberFieldProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'id'> {
  ref?: Ref<HTMLInputElement>;
  id?: string;
  label: string;
  labelHidden?: boolean;
  /** The only unit the value can have, or the props of the chooser. */
  unit?: string | UnitChooser;
  hint?: string;
  error?: string | null;
  optional?: boolean;
  changed?: boolean;
}

/** A figure with its unit: fixed, or chosen from what tables are written in. */
export function NumberField({
  id,
  label,
  labelHidden,
  unit,
  hint,
  error,
  optional,
  changed,
  ...input
}: NumberFieldProps) {
  return (
    <Field id={id} label={label} labelHidden={labelHidden} hint={hint} error={error} optional={optional}>
      {(ties) =>
        unit === undefined ? (
          <FigureInput {...input} {...ties} changed={changed} />
        ) : (
          <div className="with-unit">
            <FigureInput {...input} {...ties} changed={changed} />
            {typeof unit === 'string' ? (
              <span className="unit-fixed">{unit}</span>
            ) : (
              <Select {...unit} aria-label={`Unit of ${label}`} />
            )}
          </div>
        )
      }
    </Field>
  );
}
