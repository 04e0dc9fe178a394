import { describe, expect, it } from 'vitest';
import { blankSection } from '../../../../src/features/line-form/model/blank';
import { drawnPositions, movePosition } from '../../../../src/features/line-form/model/drawn';
import { setGroundWires, setHeightUnit } from '../../../../src/features/line-form/model/edit';
import { midspan } from '../../../../src/features/line-form/model/midspan';
import { applyTemplate } from '../../../../src/features/line-form/model/templates';

const section = applyTemplate(setGroundWires(blankSection(1), 1), 'flat', 345);

describe('form and drawing are one state', () => {
  it('draws every position that has its figures, in metres', () => {
    const [a, , , ground] = drawnPositions(section);
    expect(a).toMatchObject({ id: '0', kind: 'phase', label: 'a', horizontalM: -9, attachmentHeightM: 22 });
    expect(ground).toMatchObject({ id: '3', kind: 'ground-wire' });
  });

  it('numbers ground wires where there are several', () => {
    const labels = (count: number) =>
      drawnPositions(applyTemplate(setGroundWires(blankSection(1), count), 'flat', 345))
        .filter((p) => p.kind === 'ground-wire')
        .map((p) => p.label);
    expect(labels(1)).toEqual(['']);
    expect(labels(3)).toEqual(['1', '2', '3']);
  });

  it('leaves out what is not entered yet or is no number, and takes a missing sag for none', () => {
    const positions = section.positions.map((p, i) =>
      i === 1
        ? { ...p, horizontalM: { text: 'x', unit: 'm' } }
        : i === 2
          ? { ...p, sagM: { text: '', unit: 'm' } }
          : p,
    );
    const drawn = drawnPositions({ ...section, positions });
    expect(drawn.map((p) => p.id)).toEqual(['0', '2', '3']);
    expect(drawn[1]?.sagM).toBe(0);
  });

  it('writes a move into the fields, in their own unit', () => {
    const moved = movePosition(section, '1', { horizontalM: 1.25, attachmentHeightM: 23 });
    expect(moved.positions[1]).toMatchObject({
      horizontalM: { text: '1.25', unit: 'm' },
      attachmentHeightM: { text: '23', unit: 'm' },
    });
    const feet = movePosition(setHeightUnit(section, 'ft'), '1', {
      horizontalM: -3.048,
      attachmentHeightM: 24,
    });
    expect(feet.positions[1]?.horizontalM).toEqual({ text: '\u221210', unit: 'ft' });
    expect(feet.positions[1]?.attachmentHeightM).toEqual({ text: '78.7', unit: 'ft' });
  });

  it('marks what a finding names', () => {
    expect(drawnPositions(section, new Set([2])).map((p) => p.bad)).toEqual([false, false, true, false]);
  });

  it('says what is left at mid-span, also where nothing is', () => {
    const [a] = section.positions;
    if (!a) throw new Error('the template has positions');
    expect(midspan(a)).toEqual({ text: '13.00', metres: 13 });
    expect(midspan({ ...a, sagM: { text: '24', unit: 'm' } })).toEqual({ text: '\u22122.00', metres: -2 });
    expect(midspan({ ...a, attachmentHeightM: { text: '', unit: 'm' } })).toBeNull();
  });
});
