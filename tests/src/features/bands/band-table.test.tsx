import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import type { Band } from '#shared/contracts/api.generated';
import { BandTable } from '../../../../src/features/bands/components/band-table';
import { bandKey, type BandEdits } from '../../../../src/features/bands/model/band-form';

const X1: Band = {
  classKv: 230,
  frequencyHz: 60,
  parameter: 'x1',
  typical: [0.32, 0.54],
  outer: [0.26, 0.62],
  source: 'public data',
};

function Page() {
  const [edits, setEdits] = useState<BandEdits>({});
  return (
    <BandTable
      bands={[X1]}
      inForce={new Map([[bandKey(X1), X1]])}
      edits={edits}
      onEdit={(key, edit) => setEdits((before) => ({ ...before, [key]: edit }))}
    />
  );
}

const field = (name: string) => screen.getByRole('textbox', { name });

async function retype(name: string, text: string) {
  await userEvent.clear(field(name));
  await userEvent.type(field(name), text);
}

describe('the limits of a parameter', () => {
  it('stand in the order in which they lie on the scale', () => {
    render(<Page />);
    const values = screen.getAllByRole('textbox').map((input) => (input as HTMLInputElement).value);
    expect(values).toEqual(['0.26', '0.32', '0.54', '0.62']);
  });

  it('show what is in force below a changed one, and ask what it rests on', async () => {
    render(<Page />);
    await retype('X1, lower bound, Ω/km', '0.33');
    const cell = field('X1, lower bound, Ω/km').closest('td');
    expect(within(cell as HTMLElement).getByText('now 0.32')).toBeInTheDocument();
    expect(field('X1, lower bound, Ω/km')).toHaveClass('input-changed');
    expect(screen.getByLabelText('What the bounds rest on')).toHaveValue('public data');
    await retype('X1, lower bound, Ω/km', '0.32');
    expect(screen.queryByText(/^now/)).not.toBeInTheDocument();
  });

  it('say what is wrong, at the fields at fault', async () => {
    render(<Page />);
    await retype('X1, lower bound, Ω/km', '0.7');
    const lower = field('X1, lower bound, Ω/km');
    expect(lower).toHaveAttribute('aria-invalid', 'true');
    expect(lower).toHaveAccessibleDescription('X1: The lower bound must lie below the upper one.');
    expect(field('X1, outer lower limit, Ω/km')).not.toHaveAttribute('aria-invalid');
  });
});
