import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { FirstFaults } from '../../../../src/features/imports/components/first-faults';
import { ReadLines } from '../../../../src/features/imports/components/read-lines';

afterEach(cleanup);

const line = (name: string) => ({
  name,
  lineKey: null,
  lengthKm: 42.5,
  nominalVoltageKv: 345,
  circuitCount: 2,
  replaces: false,
});

describe('what was read of a file, before it is taken', () => {
  it('stands line by line with voltage, length and circuits, and says what is replaced', () => {
    render(<ReadLines lines={[line('Sarn tie'), { ...line('Tarn tie'), lineKey: 'L3', replaces: true }]} />);
    const items = screen.getAllByRole('listitem').map((item) => item.textContent?.replace(/\u2009/g, ' '));
    expect(items).toEqual([
      'Sarn tie345 kV, 42.5 km, double circuit',
      'Tarn tie345 kV, 42.5 km, double circuitTakes the place of L3 in the draft',
    ]);
  });

  it('keeps a long list short until it is opened', () => {
    render(<ReadLines lines={Array.from({ length: 11 }, (_, i) => line(`Line ${i + 1}`))} />);
    expect(
      within(screen.getByRole('list', { name: 'Lines that can be taken' })).getAllByRole('listitem'),
    ).toHaveLength(8);
    expect(screen.getByText('3 more lines')).toBeTruthy();
  });

  it('names the first places where nothing can be taken', () => {
    const fault = {
      row: 2,
      column: 'x1',
      value: '0.489 km',
      expected: 'a number',
      message: 'x1 is no number.',
    };
    render(<FirstFaults faults={Array.from({ length: 5 }, () => fault)} />);
    expect(screen.getAllByRole('listitem')).toHaveLength(3);
    expect(screen.getAllByText('Row 2, x1')).toHaveLength(3);
  });
});
