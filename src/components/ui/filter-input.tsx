import { useEffect, useRef, useState } from 'react';
import { TextInput } from './inputs';

interface FilterInputProps {
  label: string;
  id?: string;
  value: string;
  onChange: (value: string) => void;
  placeholder?: string;
  small?: boolean;
  /** Longest text that the filter takes. */
  maxLength?: number;
  type?: 'text' | 'search';
}

const PAUSE_MS = 250;

/** A text filter: what is typed shows at once and is applied after a pause. */
export function FilterInput({
  label,
  id,
  value,
  onChange,
  placeholder,
  small,
  maxLength = 120,
  type,
}: FilterInputProps) {
  const [typed, setTyped] = useState(value);
  const [applied, setApplied] = useState(value);
  const pause = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(pause.current), []);
  // The view may be changed from elsewhere (a link, "clear the filters"): the field then follows.
  if (value !== applied) {
    setApplied(value);
    setTyped(value);
  }
  const enter = (text: string) => {
    setTyped(text);
    clearTimeout(pause.current);
    pause.current = setTimeout(() => {
      setApplied(text);
      onChange(text);
    }, PAUSE_MS);
  };
  return (
    <TextInput
      id={id}
      small={small}
      type={type}
      aria-label={label}
      placeholder={placeholder}
      maxLength={maxLength}
      value={typed}
      autoComplete="off"
      spellCheck={false}
      onChange={(event) => enter(event.target.value)}
    />
  );
}
