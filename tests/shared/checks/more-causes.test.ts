/** Slips that reach past one section, one unit or one form: each was once missed, or once cried wolf. */
import { describe, expect, it } from 'vitest';
import type { Cause, Finding } from '#shared/checks/types';
import { check, doubleLine, exampleLine, findings } from './example-line';
import type { Json } from './example-line';

const KEYS = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;

/** Gives `line` the values that `right` has. */
function declareAs(line: Json, right: Json): void {
  const values = check(right).circuits[0]?.recomputed;
  for (const key of KEYS) {
    const value = values?.[key];
    if (value === undefined) throw new Error('no values');
    line.declared[0][key].value = value;
  }
}

const found = (line: Json, code: string): Finding | undefined =>
  findings(check(line)).find((one) => one.code === code);
const causes = (line: Json, code: string): Cause[] => found(line, code)?.causes ?? [];
const phases = (section: Json): Json[] => section.positions.filter((spot: Json) => spot.phase !== undefined);

/** Two sections of 42.5 km, the second as changed. */
const twoSections = (change: (second: Json) => void): Json =>
  exampleLine((line) => {
    const second = structuredClone(line.sections[0]);
    change(second);
    line.sections.push(second);
  });

describe('over several sections', () => {
  it('different earths, each taken ten times as resistive', () => {
    const line = twoSections((second) => (second.earthResistivityOhmM = 300));
    const taken = structuredClone(line);
    for (const section of taken.sections) section.earthResistivityOhmM *= 10;
    declareAs(line, taken);
    const [cause] = causes(line, 'geometry.x0');
    expect(cause).toMatchObject({ code: 'earth-resistivity', in: 'declared', explains: ['r0', 'x0'] });
    expect(cause?.sentence).toContain('10.0 times as much');
  });

  it('d.c. resistance without the ground wires’ share, where one section has no ground wires', () => {
    const line = twoSections((second) => (second.positions = phases(second)));
    for (const section of line.sections) section.conductors.phase.acResistanceOhmPerKm = 0.0858;
    line.sections[0].conductors.ground.acResistanceOhmPerKm = 0.5;
    const values = check(line).circuits[0]?.recomputed;
    Object.assign(line.declared[0].r0, { value: values?.r0 });
    Object.assign(line.declared[0].x0, { value: values?.x0 });
    Object.assign(line.declared[0].b0, { value: values?.b0 });
    // 0.0702·(1 + 0.00403·30) ÷ 2
    line.declared[0].r1.value = 0.039344;
    const [cause] = causes(line, 'geometry.r1');
    expect(cause).toMatchObject({ code: 'dc-resistance', explains: ['r1'] });
    // The earth's own share, 0.03 mΩ/km, is all that is left.
    expect(cause?.residual).toBeLessThan(1e-3);
  });
});

describe('in the units of the drawing', () => {
  it('a tube’s diameter in inches beside a core in millimetres: not computable, and why', () => {
    const line = exampleLine((one) => (one.sections[0].conductors.phase.model = 'tube'));
    declareAs(line, line);
    line.sections[0].conductors.phase.diameterMm = 28.14 / 25.4;
    expect(found(line, 'drawing.not-computable')?.where).toBe(
      '/lines/0/sections/0/conductors/phase/coreDiameterMm',
    );
    const [cause] = causes(line, 'drawing.not-computable');
    expect(cause?.code).toBe('inches-for-millimetres');
    expect(Object.keys(cause?.corrected ?? {})).toEqual(['diameterMm']);
    expect(cause?.corrected['diameterMm']).toBeCloseTo(28.14, 9);
  });

  it('a bundle’s side of 1.5 for 18 inches: in feet, or another side', () => {
    const line = exampleLine();
    for (const spot of phases(line.sections[0])) spot.bundleSpacingM = 1.5;
    const codes = causes(line, 'geometry.x1').map(({ code }) => code);
    expect(codes.slice(0, 2)).toEqual(['feet-for-metres', 'bundle-spacing']);
  });

  it('six subconductors filed as one', () => {
    const line = exampleLine((one) => {
      for (const spot of phases(one.sections[0]))
        Object.assign(spot, { bundleCount: 6, bundleSpacingM: 0.4 });
    });
    declareAs(line, line);
    for (const spot of phases(line.sections[0])) Object.assign(spot, { bundleCount: 1, bundleSpacingM: 0 });
    const [cause] = causes(line, 'geometry.x1');
    expect(cause).toMatchObject({ code: 'bundle-count', corrected: { bundleCount: 6, bundleSpacingM: 0.4 } });
  });
});

describe('a coupling beside the equivalent pi of a long line', () => {
  /** 400 km; R0 of both circuits as the equivalent pi in ohm, the coupling per length. */
  const long = (factor: number): Json => {
    const line = doubleLine((one) => {
      one.sections[0].lengthKm = 400;
      for (const spot of phases(one.sections[0])) Object.assign(spot, { bundleCount: 4 });
    });
    const report = check(line);
    report.circuits.forEach((circuit, index) => {
      const entry = line.declared[index];
      for (const key of KEYS) entry[key] = { value: circuit.recomputed?.[key], unit: entry[key].unit };
      entry.r0 = { value: circuit.equivalent?.r0, unit: 'ohm' };
    });
    const [pair] = report.mutual;
    line.declaredMutual = [{ circuits: [1, 2], r0m: { value: (pair?.r0m ?? 0) * factor, unit: 'ohm/km' } }];
    return line;
  };

  it('is held against values per length', () => {
    const line = long(1);
    const [circuit] = check(line).circuits;
    const perKm = (circuit?.equivalent?.r0 ?? 0) / 400;
    // The case is one where the two forms would give different answers.
    expect(line.declaredMutual[0].r0m.value).toBeGreaterThan(perKm);
    expect(found(line, 'physics.mutual-exceeds-selves')).toBeUndefined();
  });

  it('is contradicted where it exceeds those', () => {
    expect(found(long(1.2), 'physics.mutual-exceeds-selves')?.grade).toBe('must-answer');
  });
});
