import { useEffect, useState } from 'react';
import { useDebounced } from '../../hooks/use-debounced';
import { TextInput } from './inputs';

interface FilterInputProps {
  label: string;
  id?: string;
  value: string;
  onChange: (value: string) => void;
  placeholder?: string;
  small?: boolean;
  type?: 'text' | 'search';
}

const PAUSE_MS = 250;

/** A text filter: what is typed shows at once and is applied after a pause. */
export function FilterInput({ label, id, value, onChange, placeholder, small, type }: FilterInputProps) {
  const [typed, setTyped] = useState(value);
  const [applied, setApplied] = useState(value);
  const settled = useDebounced(typed, PAUSE_MS);
  // The view may be changed from elsewhere (a link, "clear the filters"): the field then follows.
  if (value !== applied) {
    setApplied(value);
    setTyped(value);
  }
  useEffect(() => {
    if (settled === typed && settled !== applied) {
      setApplied(settled);
      onChange(settled);
    }
  }, [settled, typed, applied, onChange]);
  return (
    <TextInput
      id={id}
      small={small}
      type={type}
      aria-label={label}
      placeholder={placeholder}
      value={typed}
      autoComplete="off"
      spellCheck={false}
      onChange={(event) => setTyped(event.target.value)}
    />
  );
}
