import type {
  InputHTMLAttributes,
  ReactNode,
  Ref,
  SelectHTMLAttributes,
  TextareaHTMLAttributes,
} from 'react';
import { classNames } from './class-names';

interface Variant {
  /** The low form that stands in a table's head. */
  small?: boolean;
  /** Differs from the value in force. */
  changed?: boolean;
}

function looksOf({ small, changed }: Variant, extra?: string): string {
  return classNames('input', small && 'input-small', changed && 'input-changed', extra);
}

interface TextInputProps extends InputHTMLAttributes<HTMLInputElement>, Variant {
  ref?: Ref<HTMLInputElement>;
}

/** One line of text. */
export function TextInput({ small, changed, className, ...rest }: TextInputProps) {
  return <input type="text" {...rest} className={looksOf({ small, changed }, className)} />;
}

/**
 * A number as it is typed. It stays text: what was written (its digits, its sign, its decimal comma)
 * is kept as it stands, and reading it is the form's business. Figures stand to the right.
 */
export function FigureInput({ className, ...rest }: TextInputProps) {
  return (
    <TextInput
      inputMode="decimal"
      autoComplete="off"
      spellCheck={false}
      {...rest}
      className={classNames('input-figure', className)}
    />
  );
}

interface TextAreaProps extends TextareaHTMLAttributes<HTMLTextAreaElement> {
  ref?: Ref<HTMLTextAreaElement>;
}

/** Several lines of text. */
export function TextArea({ className, ...rest }: TextAreaProps) {
  return <textarea rows={4} {...rest} className={classNames('input', className)} />;
}

/** One value of a list, with its word. */
export interface Option {
  value: string;
  label: string;
  disabled?: boolean;
}

interface SelectProps extends SelectHTMLAttributes<HTMLSelectElement>, Variant {
  ref?: Ref<HTMLSelectElement>;
  options?: readonly Option[];
  /** The choice of none, first in the list. */
  none?: string;
  children?: ReactNode;
}

/** A choice of one. The browser's own list, so that every device offers it in its own way. */
export function Select({ small, changed, options, none, className, children, ...rest }: SelectProps) {
  return (
    <span className="select">
      <select {...rest} className={looksOf({ small, changed }, className)}>
        {none !== undefined && <option value="">{none}</option>}
        {options?.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.label}
          </option>
        ))}
        {children}
      </select>
      <svg width={10} height={6} viewBox="0 0 10 6" aria-hidden="true">
        <path d="M0 0h10L5 6Z" fill="currentColor" />
      </svg>
    </span>
  );
}

interface CheckboxProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'type'> {
  ref?: Ref<HTMLInputElement>;
  label: ReactNode;
}

/** Yes or no, with its words beside it. */
export function Checkbox({ label, ...rest }: CheckboxProps) {
  return (
    <label className="check">
      <input type="checkbox" {...rest} />
      <span>{label}</span>
    </label>
  );
}

/** One of a few, each with its words: a radio button. */
export function Radio({ label, ...rest }: CheckboxProps) {
  return (
    <label className="check">
      <input type="radio" {...rest} />
      <span>{label}</span>
    </label>
  );
}
