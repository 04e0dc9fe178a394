import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { useTheme } from '../../../src/hooks/use-theme';

function Switch() {
  const { theme, switchTheme } = useTheme();
  return <button onClick={switchTheme}>{theme}</button>;
}

afterEach(() => {
  delete document.documentElement.dataset['theme'];
  localStorage.clear();
});

describe('theme', () => {
  it('follows the system until chosen; the choice is set on the page and kept', async () => {
    render(<Switch />);
    expect(screen.getByRole('button')).toHaveTextContent('light');
    await userEvent.click(screen.getByRole('button'));
    expect(screen.getByRole('button')).toHaveTextContent('dark');
    expect(document.documentElement).toHaveAttribute('data-theme', 'dark');
    expect(localStorage.getItem('counterpoise-theme')).toBe('dark');
    await userEvent.click(screen.getByRole('button'));
    expect(document.documentElement).toHaveAttribute('data-theme', 'light');
  });
});
