import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { FEET } from '../../../../../src/components/charts/structure/drawn-position';
import { StructureDrawing } from '../../../../../src/components/charts/structure/structure-drawing';
import { DELTA, FLAT, TWO_CIRCUITS } from './positions';

describe('structure drawing', () => {
  it('is one image with a sentence where it is only looked at', () => {
    render(<StructureDrawing positions={FLAT} />);
    expect(screen.getByRole('img')).toHaveAccessibleName(/^Cross-section in metres: Phase a: 9\.00 left/);
    expect(screen.queryAllByRole('button')).toEqual([]);
  });

  it('draws discs with their letters, numbered by circuit where there are two', () => {
    const { container, unmount } = render(<StructureDrawing positions={FLAT} />);
    expect([...container.querySelectorAll('text.font-bold')].map((t) => t.textContent)).toEqual([
      'a',
      'b',
      'c',
    ]);
    unmount();
    const two = render(<StructureDrawing positions={TWO_CIRCUITS} />).container;
    expect([...two.querySelectorAll('text.font-bold')].map((t) => t.textContent)).toContain('2b');
  });

  it('writes the least clearance in three digits, whatever the unit', () => {
    const low = FLAT.map((p) => ({ ...p, sagM: p.attachmentHeightM - 5 }));
    // 7.5 m are 24.606 ft.
    const { container } = render(<StructureDrawing positions={low} unit={FEET} clearanceM={7.5} />);
    expect(container.textContent).toContain('24.6\u2009ft, the least clearance');
  });

  it('moves a position by the arrow keys and tells which one has the focus', async () => {
    const [move, pick] = [vi.fn(), vi.fn()];
    render(<StructureDrawing positions={DELTA} onMove={move} onPick={pick} clearanceM={7} />);
    const handle = screen.getByRole('button', {
      name: /^Phase c: 4\.60 right .* Move it with the arrow keys\.$/,
    });
    handle.focus();
    expect(pick).toHaveBeenCalledWith('1c');
    await userEvent.keyboard('{ArrowUp}');
    expect(move).toHaveBeenLastCalledWith('1c', { horizontalM: 4.6, attachmentHeightM: 12.1 });
    await userEvent.keyboard('{Shift>}{ArrowLeft}{/Shift}');
    expect(move).toHaveBeenLastCalledWith('1c', { horizontalM: 3.6, attachmentHeightM: 12 });
  });

  it('drags a position with the pointer, to scale', () => {
    const move = vi.fn();
    render(<StructureDrawing positions={DELTA} onMove={move} />);
    const handle = screen.getByRole('button', { name: /^Phase c/ });
    fireEvent.pointerDown(handle, { pointerId: 1, clientX: 100, clientY: 100 });
    fireEvent.pointerMove(handle, { pointerId: 1, clientX: 100, clientY: 60 });
    const [id, to] = move.mock.lastCall as [string, { horizontalM: number; attachmentHeightM: number }];
    expect(id).toBe('1c');
    expect(to.horizontalM).toBe(4.6);
    expect(to.attachmentHeightM).toBeGreaterThan(12.5);
    fireEvent.pointerUp(handle, { pointerId: 1 });
    move.mockClear();
    fireEvent.pointerMove(handle, { pointerId: 1, clientX: 0, clientY: 0 });
    expect(move).not.toHaveBeenCalled();
  });

  it('says what is below the least clearance on the drawing itself', () => {
    render(<StructureDrawing positions={DELTA} clearanceM={7} />);
    expect(screen.getByText(/^7\.00\sm, the least clearance$/)).toBeInTheDocument();
  });
});
