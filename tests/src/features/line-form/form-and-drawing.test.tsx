import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { LineDrawing } from '../../../../src/features/line-form/components/line-drawing';
import { DeclaredValues } from '../../../../src/features/line-form/components/declared-values';
import { LineIdentity } from '../../../../src/features/line-form/components/line-identity';
import { SectionFields } from '../../../../src/features/line-form/components/section-fields';
import { LineFormContext } from '../../../../src/features/line-form/hooks/form-context';
import { TakeBackContext, useTakenBack } from '../../../../src/features/line-form/hooks/take-back-context';
import { useFieldNotes } from '../../../../src/features/line-form/hooks/use-field-notes';
import type { PlacedNote } from '../../../../src/features/line-form/hooks/use-field-notes';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { changeSection, setAt } from '../../../../src/features/line-form/model/edit';
import type { LineForm } from '../../../../src/features/line-form/model/form-types';
import { applyTemplate } from '../../../../src/features/line-form/model/templates';
import { readForm } from '../../../../src/features/line-form/model/to-line';

const NO_NOTES: readonly PlacedNote[] = [];

/** The form around its parts, with its state and nothing else: no server, no check. */
function Stage({ start, notes = NO_NOTES, onForm }: StageProps) {
  const [form, setForm] = useState(start);
  const [shown, setShown] = useState(0);
  const said = useFieldNotes(form, notes, NO_NOTES);
  const takeBack = useTakenBack();
  onForm(form);
  const view = {
    form,
    set: (path: readonly (string | number)[], value: unknown) => setForm((f) => setAt(f, path, value)),
    change: (apply: (f: LineForm) => LineForm) => setForm(apply),
    noteAt: said.noteAt,
    enter: said.enter,
    leave: said.leave,
    hintAt: () => undefined,
    conductors: [],
    ownersResistivityOhmM: 100,
    ownersBaseMva: 100,
    classesKv: [],
  };
  return (
    <MemoryRouter>
      <LineFormContext value={view}>
        <TakeBackContext value={takeBack}>
          <LineIdentity />
          <DeclaredValues />
          <SectionFields shown={shown} onShow={setShown} />
          <LineDrawing shown={shown} />
        </TakeBackContext>
      </LineFormContext>
    </MemoryRouter>
  );
}

interface StageProps {
  start: LineForm;
  notes?: readonly PlacedNote[];
  onForm: (form: LineForm) => void;
}

const flat = changeSection(blankLine(), 0, (s) => applyTemplate(s, 'flat', 345));

function stand(start: LineForm = flat, notes?: readonly PlacedNote[]) {
  let latest = start;
  render(<Stage start={start} notes={notes} onForm={(form) => (latest = form)} />);
  return { user: userEvent.setup(), form: () => latest };
}

describe('form and drawing', () => {
  it('what is typed is drawn at once', async () => {
    const { user } = stand();
    const height = screen.getByRole('textbox', { name: 'Phase c, height, metres' });
    await user.clear(height);
    expect(screen.queryByRole('button', { name: /^Phase c:/ })).toBeNull();
    await user.type(height, '25');
    expect(screen.getByRole('button', { name: /^Phase c:.*25\.00 high/ })).toBeInTheDocument();
  });

  it('what is moved in the drawing stands in the form', async () => {
    const { user } = stand();
    screen.getByRole('button', { name: /^Phase b:/ }).focus();
    await user.keyboard('{ArrowRight}{Shift>}{ArrowUp}{/Shift}');
    expect(screen.getByRole('textbox', { name: 'Phase b, across, metres' })).toHaveValue('0.1');
    expect(screen.getByRole('textbox', { name: 'Phase b, height, metres' })).toHaveValue('23');
  });

  it('a structure fills the positions of one circuit or of two', async () => {
    const { user, form } = stand(blankLine());
    await user.selectOptions(screen.getByLabelText('Fill from a structure'), 'delta');
    expect(screen.getByRole('textbox', { name: 'Phase b, height, metres' })).not.toHaveValue('');
    expect(form().sections[0]?.positions).toHaveLength(3);
    await user.selectOptions(screen.getByLabelText('Ground wires'), '2');
    expect(screen.getByRole('textbox', { name: 'Ground wire 2, sag, metres' })).toHaveValue('5.6');
  });

  it('asks for the bundle’s spacing from two subconductors on, and writes it to every phase', async () => {
    const { user, form } = stand();
    expect(screen.queryByRole('textbox', { name: 'Bundle spacing' })).toBeNull();
    await user.selectOptions(screen.getByLabelText('Subconductors per phase'), '2');
    await user.type(screen.getByRole('textbox', { name: 'Bundle spacing' }), '18');
    await user.selectOptions(screen.getByLabelText('Unit of Bundle spacing'), 'in');
    const { positions } = (readForm(form()).line['sections'] as { positions: object[] }[])[0] ?? {
      positions: [],
    };
    expect(positions).toHaveLength(3);
    positions.forEach((p) => expect(p).toMatchObject({ bundleCount: 2, bundleSpacingM: 0.4572 }));
  });

  it('asks for the bases of a per-unit value only', async () => {
    const { user, form } = stand();
    expect(screen.queryByLabelText('X1 on MVA')).toBeNull();
    await user.selectOptions(screen.getByLabelText('Unit of X1'), 'pu');
    await user.type(screen.getByLabelText('X1 on MVA'), '50');
    expect(form().declared[0]?.x1).toMatchObject({ unit: 'pu', baseMva: '50' });
  });

  it('ties an error to its field, by name and description', () => {
    stand(setAt(flat, ['declared', 0, 'x1', 'text'], '0,6'), [
      { pointer: '/declared/0/x1/value', message: 'Write it with a point.', grade: 'must-answer' },
    ]);
    const field = screen.getByRole('textbox', { name: 'X1' });
    expect(field).toHaveAttribute('id', 'line-declared-0-x1');
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription(/Write it with a point\./);
  });

  it('goes from section to section, each with its own drawing', async () => {
    const { user } = stand();
    await user.click(screen.getByRole('button', { name: 'Add a section' }));
    const length = screen.getByRole('textbox', { name: 'Length' });
    expect(length).toHaveAttribute('id', 'line-sections-1-lengthKm');
    await user.selectOptions(screen.getByLabelText('Kind'), 'cable');
    expect(screen.queryByText('As it hangs')).toBeNull();
    const chooser = screen.getByRole('group', { name: 'Section' });
    await user.click(within(chooser).getByRole('button', { name: 'Section 1' }));
    expect(screen.getByText('As it hangs')).toBeInTheDocument();
  });
});

describe('what one press takes away', () => {
  it('a removed section comes back to its place, and the reader to its length', async () => {
    const { user, form } = stand();
    await user.click(screen.getByRole('button', { name: 'Add a section' }));
    await user.type(screen.getByRole('textbox', { name: 'Length' }), '12.5');
    await user.click(screen.getByRole('button', { name: 'Remove section 2' }));
    expect(form().sections).toHaveLength(1);
    expect(screen.getByRole('button', { name: 'Take it back' })).toHaveFocus();
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(form().sections[1]?.lengthKm.text).toBe('12.5');
    expect(screen.queryByRole('button', { name: 'Take it back' })).toBeNull();
    expect(document.body).not.toHaveFocus();
  });

  it('the second circuit comes back with its values', async () => {
    const { user, form } = stand();
    await user.click(screen.getByRole('button', { name: 'Two' }));
    await user.type(screen.getAllByRole('textbox', { name: 'X1' })[1] as HTMLElement, '0.4');
    await user.click(screen.getByRole('button', { name: 'One' }));
    expect(form().declared).toHaveLength(1);
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(form().declared[1]?.x1.text).toBe('0.4');
    expect(screen.getByRole('button', { name: 'Two' })).toHaveFocus();
  });

  it('the geometry that is not known yet leads to the button that enters it, and back', async () => {
    const { user } = stand();
    await user.click(screen.getByRole('checkbox', { name: 'The geometry is not known yet' }));
    expect(screen.getByRole('button', { name: 'Enter the geometry' })).toHaveFocus();
    await user.keyboard('{Enter}');
    expect(screen.getByRole('combobox', { name: 'Fill from a structure' })).toHaveFocus();
  });
});
