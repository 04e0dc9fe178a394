import { describe, expect, it } from 'vitest';
import { blankDeclared, blankLine } from '../../../../src/features/line-form/model/blank';
import {
  addSection,
  changeSection,
  groundWiresOf,
  removeSection,
  setAt,
  setCircuits,
  setDeclares,
  setGroundWires,
} from '../../../../src/features/line-form/model/edit';
import {
  backCircuit,
  backDeclared,
  backGroundWires,
  backPositions,
  backSection,
} from '../../../../src/features/line-form/model/take-back';
import { applyTemplate, hangGroundWires } from '../../../../src/features/line-form/model/templates';

const renamed = <T>(form: T): T => setAt(form, ['name'], 'typed since');

describe('taking back what was taken away', () => {
  it('brings a section back to its place and keeps what was typed since', () => {
    const before = setAt(addSection(blankLine()), ['sections', 0, 'lengthKm', 'text'], '7');
    const back = backSection(before, 0)(renamed(removeSection(before, 0)));
    expect(back).toEqual(renamed(before));
  });

  it('brings the second circuit back on every section', () => {
    const two = changeSection(setCircuits(blankLine(), 2), 0, (s) =>
      setGroundWires(applyTemplate(s, 'double-delta', 230), 1),
    );
    const before = setAt(two, ['declared', 1, 'r1', 'text'], '0.05');
    expect(backCircuit(before)(renamed(setCircuits(before, 1)))).toEqual(renamed(before));
  });

  it('brings a second circuit back that alone was declared', () => {
    const before = { ...setCircuits(blankLine(), 2), declared: [blankDeclared(2)] };
    expect(backCircuit(before)(setCircuits(before, 1))).toEqual(before);
  });

  it('brings declared values, ground wires and positions back', () => {
    const two = setAt(setCircuits(blankLine(), 2), ['declared', 0, 'x1', 'text'], '0.4');
    expect(backDeclared(two, 1)(setDeclares(two, 1, false))).toEqual(two);

    const flat = changeSection(blankLine(), 0, (s) => applyTemplate(setGroundWires(s, 3), 'flat', 345));
    const section = flat.sections[0] as (typeof flat.sections)[number];
    const fewer = changeSection(flat, 0, (s) => setGroundWires(s, 1));
    expect(backGroundWires(section, 0)(fewer)).toEqual(flat);
    const other = changeSection(flat, 0, (s) => applyTemplate(s, 'delta', 345));
    expect(backPositions(section, 0)(other)).toEqual(flat);
  });
});

describe('ground wires over phases that hang already', () => {
  const flat = changeSection(blankLine(), 0, (s) => applyTemplate(s, 'flat', 345)).sections[0];
  if (!flat) throw new Error('A blank line has a section.');

  it('begin where a structure would hang them', () => {
    const filled = applyTemplate(setGroundWires(flat, 2), 'flat', 345);
    expect(hangGroundWires(flat, 2, 345)).toEqual(filled);
  });

  it('stay empty where a phase lacks its place, and where one of them has a place keep it', () => {
    const lacking = setAt(flat, ['positions', 1, 'horizontalM', 'text'], '');
    expect(groundWiresOf(hangGroundWires(lacking, 1, 345))[0]?.attachmentHeightM.text).toBe('');
    const placed = setAt(setGroundWires(flat, 1), ['positions', 3, 'attachmentHeightM', 'text'], '31');
    expect(groundWiresOf(hangGroundWires(placed, 2, 345)).map((w) => w.attachmentHeightM.text)).toEqual([
      '31',
      '',
    ]);
  });
});
