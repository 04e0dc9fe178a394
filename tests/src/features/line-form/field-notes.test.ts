import { act, renderHook } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { useFieldNotes } from '../../../../src/features/line-form/hooks/use-field-notes';
import type { PlacedNote } from '../../../../src/features/line-form/hooks/use-field-notes';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { setAt } from '../../../../src/features/line-form/model/edit';

const note = (pointer: string, message: string): PlacedNote => ({ pointer, message, grade: 'must-answer' });
const missing = note('/name', 'Name is missing.');
const slip = note('/declared/0/x1/value', 'Write it with a point.');
const form = setAt(blankLine(), ['declared', 0, 'x1', 'text'], '0,6');

describe('when the form says what is wrong', () => {
  it('says a slip at once, something missing only when its field was visited', () => {
    const { result } = renderHook(() => useFieldNotes(form, [missing, slip], []));
    expect(result.current.noteAt('/declared/0/x1')?.message).toBe('Write it with a point.');
    expect(result.current.noteAt('/name')).toBeNull();
    act(() => result.current.enter('/name'));
    act(() => result.current.leave('/name'));
    expect(result.current.noteAt('/name')?.message).toBe('Name is missing.');
  });

  it('holds its tongue while the field is typed in for the first time', () => {
    const { result } = renderHook(() => useFieldNotes(form, [slip], []));
    act(() => result.current.enter('/declared/0/x1'));
    expect(result.current.noteAt('/declared/0/x1')).toBeNull();
    expect(result.current.shown).toEqual([]);
    act(() => result.current.leave('/declared/0/x1'));
    expect(result.current.shown).toHaveLength(1);
  });

  it('says everything when asked, in the order of the page, each field once', () => {
    const doubled = note('/declared/0/x1', 'X1 is missing.');
    const { result } = renderHook(() => useFieldNotes(form, [slip, doubled, missing], []));
    expect(result.current.all.map((i) => i.message)).toEqual([
      'Name is missing.',
      'X1: Write it with a point.',
    ]);
    act(() => result.current.showAll());
    expect(result.current.shown).toHaveLength(2);
    expect(result.current.asked).toBe(true);
  });

  it('wishes for a value in the unit that its field stands at', () => {
    const inMm = setAt(form, ['sections', 0, 'positions', 0, 'bundleSpacingM', 'unit'], 'mm');
    const wish = note(
      '/sections/0/positions/0/bundleSpacingM',
      'Bundle spacing is missing. Give it in\u2009m.',
    );
    const { result } = renderHook(() => useFieldNotes(inMm, [wish], []));
    expect(result.current.all[0]?.message).toBe('Bundle spacing is missing. Give it in mm.');
  });

  it('calls to the summary when asked, not any more once somebody types again', () => {
    const { result } = renderHook(() => useFieldNotes(form, [missing], []));
    act(() => result.current.showAll());
    act(() => result.current.enter('/from'));
    expect(result.current.asked).toBe(false);
    expect(result.current.shown).toHaveLength(1);
  });

  it('says once what every phase of a bundle lacks, at the one field and without a phase', () => {
    const spacing = (n: number) =>
      note(`/sections/0/positions/${n}/bundleSpacingM`, 'Bundle spacing is missing.');
    const { result } = renderHook(() => useFieldNotes(form, [spacing(0), spacing(1), spacing(2)], []));
    expect(result.current.all).toEqual([
      { pointer: '/sections/0/positions/0/bundleSpacingM', message: 'Bundle spacing is missing.' },
    ]);
  });

  it('lets a fault go before a finding at the same field', () => {
    const finding: PlacedNote = { pointer: '/declared/0/x1', message: 'odd', grade: 'explain' };
    const { result } = renderHook(() => useFieldNotes(form, [slip], [finding]));
    expect(result.current.noteAt('/declared/0/x1')?.grade).toBe('must-answer');
  });
});
