import { useId, type ReactNode } from 'react';
import { GradeMark } from './grade-mark';
import { classNames } from './class-names';

/** What ties a control to its label, hint and error; spread it onto the control. */
export interface ControlTies {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
  required?: boolean;
}

interface FieldProps {
  label: ReactNode;
  /** A label for screen readers only, where a table's head says it to the eye. */
  labelHidden?: boolean;
  hint?: ReactNode;
  error?: string | null;
  optional?: boolean;
  /** A fixed id, so that an error summary may link to the control. */
  id?: string;
  className?: string;
  children: (ties: ControlTies) => ReactNode;
}

/** A label over its control, the hint (or the typical band) and the error under it. */
export function Field({ label, labelHidden, hint, error, optional, id, className, children }: FieldProps) {
  const own = useId();
  const controlId = id ?? own;
  const hintId = hint ? `${controlId}-hint` : undefined;
  const errorId = error ? `${controlId}-error` : undefined;
  const described = [errorId, hintId].filter(Boolean).join(' ') || undefined;
  return (
    <div className={classNames('field', className)}>
      <label htmlFor={controlId} className={labelHidden ? 'sr-only' : 'field-label'}>
        {label}
        {optional && <span className="field-optional"> (optional)</span>}
      </label>
      {children({ id: controlId, 'aria-describedby': described, 'aria-invalid': error ? true : undefined })}
      {hint && (
        <span id={hintId} className="field-hint">
          {hint}
        </span>
      )}
      {error && <FieldError id={errorId}>{error}</FieldError>}
    </div>
  );
}

/** An error under its field, with the mark of what must be answered. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <span id={id} className="field-error">
      <GradeMark grade="must-answer" />
      <span>{children}</span>
    </span>
  );
}
