import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import {
  setCircuits,
  setGroundWires,
  changeSection,
  addSection,
} from '../../../../src/features/line-form/model/edit';
import { fieldId, fieldLabel, fieldPointer } from '../../../../src/features/line-form/model/pointers';

const oneWire = changeSection(blankLine(), 0, (s) => setGroundWires(s, 1));
const twoWires = changeSection(setCircuits(blankLine(), 2), 0, (s) => setGroundWires(s, 2));

describe('a fault finds its field', () => {
  it.each([
    ['/sections/0/positions/2/attachmentHeightM', '/sections/0/positions/2/attachmentHeightM'],
    ['/declared/0/x1/value', '/declared/0/x1'],
    ['/declared/0/x1/unit', '/declared/0/x1'],
    ['/declared/0/b1/baseMva', '/declared/0/b1/baseMva'],
    ['/sections/0/perLength/r1', '/sections/0/perLength/0/r1'],
    ['/sections/0/conductors/phase/gmrMm', '/sections/0/conductors/phase/gmrMm'],
    ['/nominalVoltageKv', '/nominalVoltageKv'],
    ['/sections/0/positions/1', '/sections/0/positions/1/horizontalM'],
    ['/sections', '/sections/0/lengthKm'],
    ['/sections/0/conductors/phase', '/sections/0/conductors/phase/library'],
    ['/declared', '/declared/0/r1'],
    ['/sections/0/unknownMember', '/name'],
    ['', '/name'],
  ])('%s → %s', (pointer, field) => {
    expect(fieldPointer(oneWire, pointer)).toBe(field);
  });

  it('makes an id that a label and a link can carry', () => {
    expect(fieldId('/sections/0/conductors/ground 2/gmrMm')).toBe(
      'line-sections-0-conductors-ground-2-gmrMm',
    );
  });
});

describe('a field has the name that people use', () => {
  it.each([
    [oneWire, '/sections/0/positions/2/attachmentHeightM', 'Height of c'],
    [oneWire, '/sections/0/positions/3/sagM', 'Sag of the ground wire'],
    [twoWires, '/sections/0/positions/4/horizontalM', 'Across of b2'],
    [twoWires, '/sections/0/positions/7/horizontalM', 'Across of ground wire 2'],
    [twoWires, '/declared/1/x0/value', 'X0 of circuit 2'],
    [oneWire, '/declared/0/b1/value', 'B1'],
    [addSection(oneWire), '/sections/1/lengthKm', 'Length, section 2'],
    [oneWire, '/declaredMutual/0/x0m/value', 'X0m'],
  ])('%# %s', (form, pointer, label) => {
    expect(fieldLabel(form, pointer)).toBe(label);
  });
});
