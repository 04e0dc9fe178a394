import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import {
  setCircuits,
  setGroundWires,
  changeSection,
  addSection,
} from '../../../../src/features/line-form/model/edit';
import {
  faultSentence,
  fieldId,
  fieldLabel,
  fieldPointer,
  inFormOrder,
} from '../../../../src/features/line-form/model/pointers';

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
    [oneWire, '/sections/0/positions/2/attachmentHeightM', 'Phase c: Height'],
    [oneWire, '/sections/0/positions/3/sagM', 'Ground wire: Sag'],
    [twoWires, '/sections/0/positions/4/horizontalM', 'Phase 2b: Across'],
    [twoWires, '/sections/0/positions/7/horizontalM', 'Ground wire 2: Across'],
    [twoWires, '/declared/1/x0/value', 'Circuit 2: X0'],
    [oneWire, '/declared/0/b1/value', 'B1'],
    [addSection(oneWire), '/sections/1/lengthKm', 'Section 2: Length'],
    [oneWire, '/declaredMutual/0/x0m/value', 'X0m'],
  ])('%# %s', (form, pointer, label) => {
    expect(fieldLabel(form, pointer)).toBe(label);
  });
});

describe('the error summary', () => {
  it('names the place of a fault once', () => {
    expect(faultSentence(oneWire, '/declared/0/x1', 'X1 is missing.')).toBe('X1 is missing.');
    expect(faultSentence(oneWire, '/declared/0/x1', 'Write it with a point.')).toBe(
      'X1: Write it with a point.',
    );
    expect(faultSentence(oneWire, '/sections/0/positions/2/sagM', 'Sag is missing.')).toBe(
      'Phase c: Sag is missing.',
    );
  });

  it('lists faults as their fields stand on the page', () => {
    const pointers = [
      '/sections/1/lengthKm',
      '/sections/0/conductors/phase/library',
      '/sections/0/positions/2/attachmentHeightM',
      '/sections/0/positions/2/horizontalM',
      '/declared/0/b1',
      '/declared/0/x1',
      '/to',
      '/name',
    ];
    expect([...pointers].sort(inFormOrder)).toEqual([...pointers].reverse().sort(inFormOrder));
    expect([...pointers].sort(inFormOrder)).toEqual([
      '/name',
      '/to',
      '/declared/0/x1',
      '/declared/0/b1',
      '/sections/0/positions/2/horizontalM',
      '/sections/0/positions/2/attachmentHeightM',
      '/sections/0/conductors/phase/library',
      '/sections/1/lengthKm',
    ]);
  });
});
