import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { FilterInput } from '../../../../src/components/ui/filter-input';

function Page({ onApply }: { onApply: (value: string) => void }) {
  const [value, setValue] = useState('');
  const apply = (next: string) => {
    onApply(next);
    setValue(next);
  };
  return (
    <>
      <FilterInput label="Name contains" value={value} onChange={apply} />
      <button type="button" onClick={() => setValue('')}>
        Clear
      </button>
    </>
  );
}

describe('a text filter', () => {
  it('is applied once, after a pause, and shows each letter at once', async () => {
    const onApply = vi.fn();
    render(<Page onApply={onApply} />);
    const field = screen.getByRole('textbox', { name: 'Name contains' });
    await userEvent.type(field, 'Sarn');
    expect(field).toHaveValue('Sarn');
    await waitFor(() => expect(onApply).toHaveBeenCalledWith('Sarn'));
    expect(onApply).toHaveBeenCalledTimes(1);
  });

  it('follows when the view is changed from elsewhere', async () => {
    const onApply = vi.fn();
    render(<Page onApply={onApply} />);
    const field = screen.getByRole('textbox', { name: 'Name contains' });
    await userEvent.type(field, 'Sarn');
    await waitFor(() => expect(onApply).toHaveBeenCalledWith('Sarn'));
    await userEvent.click(screen.getByRole('button', { name: 'Clear' }));
    expect(field).toHaveValue('');
    expect(onApply).toHaveBeenCalledTimes(1);
  });
});
