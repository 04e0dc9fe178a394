import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { Button } from '../../../../src/components/ui/button';
import { Dialog } from '../../../../src/components/ui/dialog';
import { Field } from '../../../../src/components/ui/field';
import { TextInput } from '../../../../src/components/ui/inputs';
import { NumberField } from '../../../../src/components/ui/number-field';
import { ErrorSummary } from '../../../../src/components/feedback/error-summary';

describe('button', () => {
  it('closed, says beside it what opens it, also to those who hear it', async () => {
    const press = vi.fn();
    render(
      <Button blockedBy="Accept opens once D-2 is settled." onClick={press}>
        Accept
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Accept' });
    expect(button).toBeDisabled();
    expect(button).toHaveAccessibleDescription('Accept opens once D-2 is settled.');
    await userEvent.click(button);
    expect(press).not.toHaveBeenCalled();
  });

  it('busy, stays where it is and cannot be pressed twice', async () => {
    const press = vi.fn();
    const { rerender } = render(<Button onClick={press}>File</Button>);
    await userEvent.click(screen.getByRole('button'));
    rerender(
      <Button onClick={press} busy>
        File
      </Button>,
    );
    await userEvent.click(screen.getByRole('button'));
    expect(press).toHaveBeenCalledTimes(1);
    expect(screen.getByRole('button')).toHaveAttribute('aria-busy', 'true');
  });
});

describe('field', () => {
  it('ties label, hint and error to its control', () => {
    render(
      <Field label="Length" hint="typical 5 to 60" error="Write a number.">
        {(ties) => <TextInput {...ties} />}
      </Field>,
    );
    const input = screen.getByLabelText('Length');
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription('Write a number. typical 5 to 60');
  });

  it('names the unit chooser after the value and keeps what is typed as it is typed', async () => {
    render(
      <NumberField
        label="R1"
        unit={{
          options: [
            { value: 'ohm/km', label: 'Ω/km' },
            { value: 'ohm/mi', label: 'Ω/mi' },
          ],
        }}
      />,
    );
    await userEvent.type(screen.getByLabelText('R1'), '0,0400');
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Unit of R1' }), 'ohm/mi');
    expect(screen.getByLabelText('R1')).toHaveValue('0,0400');
    expect(screen.getByRole('combobox')).toHaveValue('ohm/mi');
  });
});

describe('error summary', () => {
  it('takes the focus, and each item leads to its field', async () => {
    render(
      <>
        <ErrorSummary
          title="One field stands in the way"
          items={[{ fieldId: 'h', message: 'Height of c' }]}
        />
        <input id="h" aria-label="Height" />
      </>,
    );
    expect(screen.getByRole('alert')).toHaveFocus();
    await userEvent.click(screen.getByRole('link', { name: 'Height of c' }));
    expect(screen.getByLabelText('Height')).toHaveFocus();
  });
});

describe('dialog', () => {
  it('is named, holds the focus, and closes by Escape unless it insists', async () => {
    const change = vi.fn();
    const { rerender } = render(
      <Dialog open onOpenChange={change} title="Withdraw">
        <button type="button">Inside</button>
      </Dialog>,
    );
    expect(screen.getByRole('dialog', { name: 'Withdraw' })).toContainElement(
      document.activeElement as HTMLElement,
    );
    await userEvent.keyboard('{Escape}');
    expect(change).toHaveBeenCalledWith(false);
    change.mockClear();
    rerender(
      <Dialog open onOpenChange={change} title="Withdraw" insistent>
        <button type="button">Inside</button>
      </Dialog>,
    );
    await userEvent.keyboard('{Escape}');
    expect(change).not.toHaveBeenCalled();
    expect(screen.queryByRole('button', { name: 'Close' })).toBeNull();
  });
});
