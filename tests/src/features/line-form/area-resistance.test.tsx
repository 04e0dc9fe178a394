import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { OwnConductor } from '../../../../src/features/line-form/components/own-conductor';
import { LineFormContext } from '../../../../src/features/line-form/hooks/form-context';
import type { LineFormView } from '../../../../src/features/line-form/hooks/form-context';
import { proposedResistance } from '../../../../src/features/line-form/model/area-resistance';
import { blankConductor, blankLine } from '../../../../src/features/line-form/model/blank';
import { setAt } from '../../../../src/features/line-form/model/edit';
import { openForm } from '../../../../src/features/line-form/model/from-line';
import { readForm } from '../../../../src/features/line-form/model/to-line';

const PATH = ['sections', 0, 'conductors', 'phase'] as const;
const ofArea = (text: string, unit: string) => ({ ...blankConductor(), aluminiumArea: { text, unit } });

describe('the d.c. resistance that an area proposes', () => {
  // R = ρ ÷ A with ρ = 0.028264 Ω mm²/m (IEC 60889, hard-drawn aluminium, 20 °C); 1 kcmil = 0.506707 mm².
  it.each([
    ['100', 'mm2', '0.2826'],
    ['795', 'kcmil', '0.07016'],
  ])('of %s %s is %s Ω/km', (text, unit, ohmPerKm) => {
    expect(proposedResistance(ofArea(text, unit))).toEqual({ text: ohmPerKm, unit: 'ohm/km' });
  });

  it.each(['', '0', '-4', 'Drake'])('is none for “%s”', (text) => {
    expect(proposedResistance(ofArea(text, 'mm2'))).toBeNull();
  });
});

const tube = setAt(blankLine(), PATH, { ...blankConductor(), source: 'own', model: 'tube' });

function Stage({ onForm }: { onForm: (form: typeof tube) => void }) {
  const [form, setForm] = useState(tube);
  onForm(form);
  const view = {
    form,
    set: (path: readonly (string | number)[], value: unknown) => setForm((f) => setAt(f, path, value)),
    noteAt: () => null,
    enter: () => undefined,
    leave: () => undefined,
    hintAt: () => undefined,
  } as unknown as LineFormView;
  return (
    <LineFormContext value={view}>
      <OwnConductor path={PATH} model="tube" />
    </LineFormContext>
  );
}

describe('an area in the form', () => {
  it('puts the resistance in when asked to, and keeps its own text beside the line', async () => {
    let form = tube;
    render(<Stage onForm={(next) => (form = next)} />);
    await userEvent.type(screen.getByRole('textbox', { name: /^Nominal aluminium area/ }), '402.8');
    const before = readForm(form);
    expect(JSON.stringify(before.line)).not.toContain('402.8');
    expect(before.asTyped['/sections/0/conductors/phase/aluminiumArea']).toMatchObject({ text: '402.8' });
    await userEvent.click(screen.getByRole('button', { name: /^Put in 0\.07017\sΩ\/km$/ }));
    expect(readForm(form).line).toMatchObject({
      sections: [{ conductors: { phase: { dcResistance20OhmPerKm: 0.07017 } } }],
    });
    expect(screen.queryByRole('button', { name: /^Put/ })).toBeNull();
    const { line, asTyped } = readForm(form);
    expect(openForm(line, asTyped).sections[0]?.conductors['phase']?.aluminiumArea).toEqual({
      text: '402.8',
      unit: 'mm2',
    });
  });
});
