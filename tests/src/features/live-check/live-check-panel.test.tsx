import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { FindingCount } from '../../../../src/features/live-check/components/finding-count';
import { LiveCheckPanel } from '../../../../src/features/live-check/components/live-check';
import { checkDraftLine } from '../../../../src/features/live-check/worker/check-line';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { changeSection, setAt } from '../../../../src/features/line-form/model/edit';
import type { LineForm } from '../../../../src/features/line-form/model/form-types';
import { applyTemplate } from '../../../../src/features/line-form/model/templates';
import { readForm } from '../../../../src/features/line-form/model/to-line';

const basis = { rules: DEFAULT_RULE_SET, library: STARTING_LIBRARY };
const at345 = setAt(blankLine(), ['nominalVoltageKv'], { text: '345', unit: 'kV' });

/** A form with its voltage, its positions and its conductor, and nothing else. */
const drawn = setAt(
  changeSection(at345, 0, (s) => applyTemplate(s, 'flat', 345)),
  ['sections', 0, 'conductors', 'phase'],
  {
    ...blankLine().sections[0]?.conductors['phase'],
    library: 'Drake',
    temperatureC: { text: '50', unit: 'degC' },
  },
);

const declaring = (form: LineForm, x1: string) => setAt(form, ['declared', 0, 'x1', 'text'], x1);

function show(form: LineForm) {
  const outcome = checkDraftLine({ id: 1, line: readForm(form).line, written: {} }, basis);
  const check = { outcome, pending: false, failed: false };
  render(
    <>
      <LiveCheckPanel
        check={check}
        owed={outcome.kind === 'faults' ? outcome.faults.length : 0}
        corrections={{ offer: () => null, put: () => {} }}
      />
      <FindingCount check={check} />
    </>,
  );
}

const row = (name: string) => screen.getByRole('rowheader', { name: new RegExp(`^${name}`) }).closest('tr');

function cells(name: string) {
  const of = row(name);
  if (!of) throw new Error(`there is no row ${name}`);
  return within(of)
    .getAllByRole('cell')
    .map((cell) => cell.textContent);
}

describe('the live check of a line that is being written', () => {
  it('says with what it begins while there is nothing to weigh', () => {
    show(at345);
    expect(screen.queryByRole('table')).toBeNull();
    expect(screen.getByText(/The check begins with the voltage and a declared value/)).toBeVisible();
    expect(screen.getByText('The check waits for values')).toBeInTheDocument();
  });

  it('shows the recomputed side of all eight rows once the geometry is whole, and claims no balance', () => {
    show(drawn);
    for (const name of ['R1', 'X1', 'B1', 'R0', 'X0', 'B0', 'Zc', 'Wave speed']) {
      const [, , declared, recomputed] = cells(name);
      expect(declared, name).toBe('not given');
      expect(recomputed, name).toMatch(/^\d/);
    }
    expect(screen.queryByText('In balance')).toBeNull();
    expect(screen.getByText(/Filing needs \d+ more fields/)).toBeVisible();
    expect(screen.getByText(/A preview by the rules in force/)).toBeVisible();
    expect(screen.getByRole('link', { name: /go to the check/ })).toHaveTextContent(/^1 explain, 1 note/);
  });

  it('weighs the first declared value at once', () => {
    show(declaring(drawn, '0.8'));
    const [, , declared, recomputed, difference] = cells('X1');
    expect([declared, recomputed].every((text) => /^0\.\d/.test(text ?? ''))).toBe(true);
    expect(difference).toMatch(/^\+\d/);
    expect(cells('B1')[4]).toBe('');
  });

  it('holds a declared value against the band alone while the geometry is not whole', () => {
    show(declaring(at345, '0.37'));
    expect(cells('X1').slice(2, 4)).toEqual(['0.370', 'none']);
    expect(screen.getByText(/Recomputed once the geometry is whole/)).toBeVisible();
  });
});
