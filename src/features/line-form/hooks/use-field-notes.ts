import { useCallback, useMemo, useState } from 'react';
import type { LineForm } from '../model/form-types';
import { getAt } from '../model/edit';
import { faultSentence, fieldPointer, inFormOrder, shownPointer } from '../model/pointers';
import { unitLabel } from '../model/unit-choices';
import type { FieldNote } from './form-context';

/** A fault or a finding at a place of the line. */
export interface PlacedNote extends FieldNote {
  pointer: string;
}

export interface NoteItem {
  pointer: string;
  message: string;
}

function hasText(form: LineForm, pointer: string): boolean {
  const node = getAt(form, pointer.split('/').slice(1));
  if (typeof node === 'string') return node.trim() !== '';
  return typeof node === 'object' && node !== null && 'text' in node && String(node.text).trim() !== '';
}

/** A wish for a value in the unit that its field stands at: "Give it in mm." */
function inItsUnit(form: LineForm, pointer: string, message: string): string {
  const node = getAt(form, pointer.split('/').slice(1));
  const unit =
    typeof node === 'object' && node !== null && 'unit' in node ? unitLabel(String(node.unit)) : '';
  return unit === '' ? message : message.replace(/Give it in\s[^\s.]+\.$/u, `Give it in ${unit}.`);
}

/** What the form says about its fields, and when. */
export type FormNotes = ReturnType<typeof useFieldNotes>;

/**
 * Brings faults to their fields and decides when to say them: a slip in what was typed once its field is
 * left; something missing once its field was visited, or once the writer asks what is missing.
 */
export function useFieldNotes(
  form: LineForm,
  faults: readonly PlacedNote[],
  findings: readonly PlacedNote[],
) {
  const [visited, setVisited] = useState<ReadonlySet<string>>(new Set());
  const [focused, setFocused] = useState<string | null>(null);
  const [showAll, setShowAll] = useState(false);
  const [asked, setAsked] = useState(false);

  const byField = useMemo(() => {
    const map = new Map<string, FieldNote>();
    // Faults first: a finding at the same field waits until the field holds a value.
    for (const { pointer, message, ...note } of [...faults, ...findings]) {
      const field = shownPointer(form, fieldPointer(form, pointer));
      if (!map.has(field)) map.set(field, { ...note, message: inItsUnit(form, field, message) });
    }
    return map;
  }, [form, faults, findings]);

  const isShown = useCallback(
    (pointer: string) => showAll || visited.has(pointer) || (focused !== pointer && hasText(form, pointer)),
    [form, focused, showAll, visited],
  );

  const items = useMemo((): NoteItem[] => {
    const first = new Map<string, NoteItem>();
    for (const { pointer, message } of faults) {
      const field = shownPointer(form, fieldPointer(form, pointer));
      if (!first.has(field))
        first.set(field, {
          pointer: field,
          message: faultSentence(form, field, inItsUnit(form, field, message)),
        });
    }
    return [...first.values()].sort((a, b) => inFormOrder(a.pointer, b.pointer));
  }, [form, faults]);

  return {
    noteAt: useCallback(
      (pointer: string) => (isShown(pointer) ? (byField.get(pointer) ?? null) : null),
      [byField, isShown],
    ),
    enter: useCallback((pointer: string) => {
      setFocused(pointer);
      // Whoever types again is not called away to the summary when another fault turns up.
      setAsked(false);
    }, []),
    leave: useCallback((pointer: string) => {
      setFocused(null);
      setVisited((before) => (before.has(pointer) ? before : new Set([...before, pointer])));
    }, []),
    /** Faults that are shown now; all of them once asked for. */
    shown: items.filter((item) => isShown(item.pointer)),
    /** All faults, shown or not. */
    all: items,
    showAll: useCallback(() => {
      setShowAll(true);
      setAsked(true);
    }, []),
    /** The writer has just asked for them. */
    asked,
  };
}
