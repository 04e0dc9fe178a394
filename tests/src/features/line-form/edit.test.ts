import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import {
  addConductor,
  addSection,
  changeSection,
  groundWiresOf,
  phasesOf,
  setBundle,
  setCircuits,
  setDeclares,
  setGroundWires,
  setHeightUnit,
} from '../../../../src/features/line-form/model/edit';
import { TEMPLATES, applyTemplate } from '../../../../src/features/line-form/model/templates';
import { readNumber } from '../../../../src/features/line-form/model/number-text';
import type { SectionForm } from '../../../../src/features/line-form/model/form-types';

const first = (form = blankLine()): SectionForm => {
  const section = form.sections[0];
  if (!section) throw new Error('a form has a section');
  return section;
};

const metres = (text: string): number => {
  const reading = readNumber(text);
  return reading.kind === 'number' ? reading.value : Number.NaN;
};

describe('changes of a line’s shape', () => {
  it('a second circuit starts with the first one’s conductor and bundle, and goes without a trace', () => {
    const bundled = changeSection(blankLine(), 0, (s) => setBundle(s, { bundleCount: '2' }));
    const two = setCircuits(bundled, 2);
    expect(phasesOf(first(two)).map((p) => `${p.phase}${p.circuit}×${p.bundleCount}`)).toEqual([
      'a1×2',
      'b1×2',
      'c1×2',
      'a2×2',
      'b2×2',
      'c2×2',
    ]);
    expect(two.declared.map((d) => d.circuit)).toEqual([1, 2]);
    expect(setCircuits(two, 1)).toEqual(bundled);
  });

  it('a circuit of somebody else has no values, but one circuit always has', () => {
    const two = setCircuits(blankLine(), 2);
    const theirs = setDeclares(two, 1, false);
    expect(theirs.declared.map((d) => d.circuit)).toEqual([2]);
    expect(setDeclares(theirs, 2, false)).toBe(theirs);
    expect(setDeclares(theirs, 1, true).declared.map((d) => d.circuit)).toEqual([1, 2]);
  });

  it('ground wires come with a conductor and keep what was entered for those that stay', () => {
    const one = setGroundWires(first(), 1);
    expect(one.conductors['ground']).toBeDefined();
    const moved = {
      ...one,
      positions: one.positions.map((p) =>
        p.kind === 'ground-wire' ? { ...p, attachmentHeightM: { text: '31', unit: 'm' } } : p,
      ),
    };
    const texts = groundWiresOf(setGroundWires(moved, 3)).map((w) => w.attachmentHeightM.text);
    expect(texts).toEqual(['31', '', '']);
    expect(groundWiresOf(setGroundWires(moved, 0))).toEqual([]);
  });

  it('a new section repeats the last one but for its length', () => {
    const form = addSection(
      changeSection(blankLine(), 0, (s) => ({ ...s, lengthKm: { text: '3', unit: 'mi' } })),
    );
    expect(form.sections[1]?.lengthKm).toEqual({ text: '', unit: 'mi' });
  });

  it('a unit says what the texts mean and changes none of them', () => {
    const section = applyTemplate(first(), 'flat', 345);
    const feet = setHeightUnit(section, 'ft');
    expect(feet.positions.map((p) => p.horizontalM.text)).toEqual(
      section.positions.map((p) => p.horizontalM.text),
    );
    expect(feet.positions.every((p) => p.sagM.unit === 'ft')).toBe(true);
  });

  it('a position may get a conductor of its own', () => {
    const section = addConductor(addConductor(first(), 1), 2);
    expect(section.positions.map((p) => p.conductor)).toEqual(['phase', 'phase 2', 'phase 3']);
    expect(Object.keys(section.conductors)).toEqual(['phase', 'phase 2', 'phase 3']);
  });
});

describe('structure templates', () => {
  it.each(TEMPLATES.flatMap((t) => [69, 138, 345, 765].map((kv) => [t.name, kv, t.circuits] as const)))(
    '%s at %i kV hangs every wire apart from the others and above ground, shields on top',
    (name, kv, circuits) => {
      const shaped = setGroundWires(first(setCircuits(blankLine(), circuits)), 2);
      const { positions } = applyTemplate(shaped, name, kv);
      expect(positions).toHaveLength(circuits * 3 + 2);
      const places = positions.map(
        (p) => [metres(p.horizontalM.text), metres(p.attachmentHeightM.text)] as const,
      );
      const lowest = Math.min(
        ...positions.map((p) => metres(p.attachmentHeightM.text) - metres(p.sagM.text)),
      );
      expect(lowest).toBeGreaterThan(6);
      places.forEach(([x, y], i) =>
        places.slice(i + 1).forEach(([u, v]) => expect(Math.hypot(x - u, y - v)).toBeGreaterThan(1.5)),
      );
      const heights = places.map(([, y]) => y);
      expect(Math.min(...heights.slice(-2))).toBeGreaterThan(Math.max(...heights.slice(0, -2)));
    },
  );

  it('writes feet where the section is in feet', () => {
    const feet = applyTemplate(setHeightUnit(first(), 'ft'), 'flat', 345);
    expect(feet.positions[2]?.horizontalM).toEqual({ text: '29.53', unit: 'ft' });
  });
});
