import { describe, expect, it } from 'vitest';
import { RULES, ruleOf } from '#shared/checks/rules/table';
import type { Grade } from '#shared/checks/types';
import { bareLine, check, doubleLine, exampleLine, findings } from './example-line';
import type { Json } from './example-line';

interface Case {
  /** The smallest line on which the rule speaks, and the grade that it gives. */
  fires: Json;
  grade: Grade;
  /** Its neighbour on which it is silent. */
  silent: Json;
}

const GOOD_345 = { r1: 0.0404, x1: 0.3812, b1: 4.347, r0: 0.3344, x0: 1.271, b0: 2.827 };
const bare = (change: Record<string, number>): Json => bareLine(345, 60, { ...GOOD_345, ...change });
const set = (key: string, value: number) => exampleLine((line) => (line.declared[0][key].value = value));
const section = (change: (section: Json) => void) => exampleLine((line) => change(line.sections[0]));
const at = (index: number, change: Record<string, unknown>) =>
  section((one) => Object.assign(one.positions[index], change));
const conductor = (change: Record<string, unknown>) =>
  section((one) => Object.assign(one.conductors.phase, change));
const everyPhase = (change: Record<string, unknown>) =>
  section((one) => one.positions.slice(0, 3).forEach((spot: Json) => Object.assign(spot, change)));

const coupled = (key: string, factor: number) =>
  doubleLine((line) => (line.declaredMutual[0][key].value *= factor));
const cable = {
  kind: 'cable',
  lengthKm: 2,
  perLength: { r1: 0.03, x1: 0.12, b1: 70, r0: 0.1, x0: 0.08, b0: 70 },
};
const withCable = (lengthKm: number) =>
  exampleLine((line) => {
    const values = Object.entries(cable.perLength).map(([key, value]) => [
      key,
      { value, unit: key.startsWith('b') ? 'uS/km' : 'ohm/km' },
    ]);
    line.sections.push({ ...cable, lengthKm, perLength: Object.fromEntries(values) });
  });

/** Whole-line values at 420 km, where equivalent pi and length × per-length value part. */
const longLine = (form: 'equivalent' | 'nominal') =>
  exampleLine((line) => {
    line.sections[0].lengthKm = 420;
    const circuit = check(line).circuits[0];
    const value =
      form === 'equivalent' ? (circuit?.equivalent?.x ?? 0) : (circuit?.recomputed?.x1 ?? 0) * 420;
    line.declared[0].x1 = { value, unit: 'ohm' };
  });

const rated = (ratingA: number): Json =>
  exampleLine((line) => Object.assign(line.declared[0], { ratingA, maxTemperatureC: 75 }));

const CASES: Readonly<Record<string, Case>> = {
  'physics.not-positive': { fires: bare({ r1: -0.04 }), grade: 'must-answer', silent: bare({}) },
  // v = 1.03 against 1.00 of light's; what the digits leave is far less.
  'physics.wave-speed': { fires: bare({ b1: 3.9067 }), grade: 'must-answer', silent: bare({ b1: 4.1505 }) },
  'physics.r1-below-dc': { fires: set('r1', 0.0325), grade: 'must-answer', silent: set('r1', 0.0345) },
  'physics.r0-below-r1': { fires: bare({ r0: 0.04 }), grade: 'must-answer', silent: bare({ r0: 0.041 }) },
  'physics.x0-below-x1': { fires: bare({ x0: 0.381 }), grade: 'must-answer', silent: bare({ x0: 0.382 }) },
  'physics.b0-above-b1': { fires: bare({ b0: 4.35 }), grade: 'must-answer', silent: bare({ b0: 4.34 }) },
  'physics.mutual-exceeds-selves': {
    fires: coupled('x0m', 2.5),
    grade: 'must-answer',
    silent: coupled('x0m', 1),
  },
  'geometry.r1': { fires: set('r1', 0.0428), grade: 'must-answer', silent: set('r1', 0.0422) },
  'geometry.x1': { fires: set('x1', 0.3874), grade: 'must-answer', silent: set('x1', 0.3864) },
  'geometry.b1': { fires: set('b1', 4.2789), grade: 'must-answer', silent: set('b1', 4.2852) },
  'geometry.r0': { fires: set('r0', 0.37301), grade: 'must-answer', silent: set('r0', 0.36401) },
  'geometry.x0': { fires: set('x0', 1.3751), grade: 'must-answer', silent: set('x0', 1.3421) },
  'geometry.b0': { fires: set('b0', 2.9187), grade: 'must-answer', silent: set('b0', 2.9067) },
  'geometry.r0m': { fires: coupled('r0m', 1.3), grade: 'must-answer', silent: coupled('r0m', 1.05) },
  'geometry.x0m': { fires: coupled('x0m', 1.3), grade: 'must-answer', silent: coupled('x0m', 1.05) },
  'geometry.b0m': { fires: coupled('b0m', 1.3), grade: 'must-answer', silent: coupled('b0m', 1.05) },
  'geometry.whole-line-form': {
    fires: longLine('nominal'),
    grade: 'note',
    silent: exampleLine((line) => (line.declared[0].x1 = { value: 16.2, unit: 'ohm' })),
  },
  // Two Drake at 75 °C carry about 2 × 907 A on the published tables' basis.
  'geometry.rating': { fires: rated(2100), grade: 'explain', silent: rated(1800) },
  'typical.r1': { fires: bare({ r1: 0.0655 }), grade: 'explain', silent: bare({ r1: 0.0645 }) },
  'typical.x1': {
    fires: bare({ x1: 0.533, b1: 3.11 }),
    grade: 'explain',
    silent: bare({ x1: 0.527, b1: 3.13 }),
  },
  'typical.b1': {
    fires: bare({ x1: 0.318, b1: 5.22 }),
    grade: 'explain',
    silent: bare({ x1: 0.318, b1: 5.18 }),
  },
  'typical.r0-minus-r1': { fires: bare({ r0: 0.5421 }), grade: 'explain', silent: bare({ r0: 0.5391 }) },
  'typical.x0': { fires: bare({ x0: 2.061 }), grade: 'explain', silent: bare({ x0: 2.041 }) },
  'typical.b0': { fires: bare({ b0: 1.493 }), grade: 'explain', silent: bare({ b0: 1.506 }) },
  'typical.x1-over-r1': { fires: bare({ r1: 0.01895 }), grade: 'explain', silent: bare({ r1: 0.01915 }) },
  'typical.x0-over-x1': { fires: bare({ x0: 0.7602 }), grade: 'explain', silent: bare({ x0: 0.7651 }) },
  'typical.r0-over-r1': {
    fires: bare({ r1: 0.0649, r0: 0.1291 }),
    grade: 'explain',
    silent: bare({ r1: 0.0649, r0: 0.1301 }),
  },
  'typical.b0-over-b1': { fires: bare({ b0: 3.361 }), grade: 'explain', silent: bare({ b0: 3.341 }) },
  'typical.surge-impedance': { fires: bare({ x1: 0.5301, b1: 2.9451 }), grade: 'note', silent: bare({}) },
  'typical.wave-speed': { fires: bare({ b1: 4.571 }), grade: 'explain', silent: bare({ b1: 4.531 }) },
  'typical.between-classes': { fires: bareLine(330, 60, GOOD_345), grade: 'note', silent: bare({}) },
  'typical.no-class': {
    fires: bareLine(420, 60, GOOD_345),
    grade: 'note',
    silent: bareLine(396, 60, GOOD_345),
  },
  'drawing.geometry-missing': { fires: bare({}), grade: 'must-answer', silent: exampleLine() },
  'drawing.coincident-wires': {
    fires: at(1, { horizontalM: -9 }),
    grade: 'must-answer',
    silent: exampleLine(),
  },
  'drawing.overlapping-wires': {
    fires: everyPhase({ bundleSpacingM: 0.028 }),
    grade: 'must-answer',
    silent: everyPhase({ bundleSpacingM: 0.0283 }),
  },
  'drawing.wire-in-ground': {
    fires: at(0, { attachmentHeightM: 5, sagM: 9 }),
    grade: 'must-answer',
    silent: exampleLine(),
  },
  'drawing.not-computable': {
    fires: conductor({ model: 'tube', coreDiameterMm: 28.14 }),
    grade: 'must-answer',
    silent: conductor({ model: 'tube' }),
  },
  'drawing.phase-spacing': {
    fires: at(1, { horizontalM: -3.5 }),
    grade: 'explain',
    silent: at(1, { horizontalM: -3 }),
  },
  'drawing.phase-height': { fires: at(0, { sagM: 16.6 }), grade: 'explain', silent: at(0, { sagM: 16.4 }) },
  'drawing.height-in-feet': {
    fires: everyPhase({ attachmentHeightM: 96 }),
    grade: 'explain',
    silent: everyPhase({ attachmentHeightM: 94 }),
  },
  'drawing.ground-wire-below-phases': {
    fires: at(3, { attachmentHeightM: 23.9 }),
    grade: 'explain',
    silent: at(3, { attachmentHeightM: 24 }),
  },
  'drawing.bundle-spacing': {
    fires: everyPhase({ bundleSpacingM: 0.61 }),
    grade: 'explain',
    silent: everyPhase({ bundleSpacingM: 0.59 }),
  },
  'drawing.gmr-against-diameter': {
    fires: conductor({ gmrMm: 14.2 }),
    grade: 'must-answer',
    silent: conductor({ gmrMm: 14.07 }),
  },
  // 0.0702 Ω/km at 20 °C is 0.0787 Ω/km at 50 °C.
  'drawing.ac-against-dc': {
    fires: conductor({ acResistanceOhmPerKm: 0.076 }),
    grade: 'must-answer',
    silent: conductor({ acResistanceOhmPerKm: 0.0768 }),
  },
  'drawing.core-against-diameter': {
    fires: conductor({ coreDiameterMm: 28.2 }),
    grade: 'must-answer',
    silent: conductor({ coreDiameterMm: 28.1 }),
  },
  'drawing.conductor-diameter': {
    fires: conductor({ diameterMm: 61 }),
    grade: 'explain',
    silent: conductor({ diameterMm: 59 }),
  },
  'drawing.resistance-against-diameter': {
    fires: conductor({ acResistanceOhmPerKm: 0.18 }),
    grade: 'explain',
    silent: conductor({ acResistanceOhmPerKm: 0.17 }),
  },
  'drawing.sag-not-given': { fires: everyPhase({ sagM: 0 }), grade: 'note', silent: exampleLine() },
  'drawing.resistivity-not-given': {
    fires: section((one) => delete one.earthResistivityOhmM),
    grade: 'note',
    silent: exampleLine(),
  },
  'drawing.zero-sequence-not-given': {
    fires: exampleLine((line) => delete line.declared[0].x0),
    grade: 'note',
    silent: exampleLine(),
  },
  'drawing.coupling-not-given': {
    fires: doubleLine((line) => delete line.declaredMutual),
    grade: 'note',
    silent: doubleLine(),
  },
  'drawing.cable-as-declared': { fires: withCable(2), grade: 'note', silent: exampleLine() },
};

const ofCode = (line: Json, code: string) =>
  findings(check(line, { causes: false })).filter((one) => one.code === code);

describe('the table of rules', () => {
  it('has one case here for every rule, and no rule twice', () => {
    expect(Object.keys(CASES).sort()).toEqual(RULES.map(({ code }) => code).sort());
    expect(new Set(RULES.map(({ code }) => code)).size).toBe(RULES.length);
  });

  it('says of every rule what it needs, what it holds and where it comes from', () => {
    for (const rule of RULES) {
      expect(rule.code.startsWith(`${rule.family}.`), rule.code).toBe(true);
      expect(
        Math.min(rule.needs.length, rule.sentence.length, rule.source.length),
        rule.code,
      ).toBeGreaterThan(1);
      expect(rule.sentence.endsWith('.'), rule.code).toBe(true);
    }
  });

  it('finds a rule by the code of its finding', () => {
    expect(ruleOf('geometry.x1')?.parameter).toBe('x1');
    expect(ruleOf('geometry.nothing')).toBeUndefined();
  });
});

describe.each(Object.entries(CASES))('%s', (code, { fires, grade, silent }) => {
  it('fires on its smallest case', () => {
    const found = ofCode(fires, code);
    expect(found.length).toBeGreaterThan(0);
    expect(found[0]?.grade).toBe(grade);
    expect(ruleOf(code)?.grades.includes(grade) || found[0]?.follows !== undefined).toBe(true);
    expect(found[0]?.message).toMatch(/^[\p{Lu}\d].*\.$/u);
    expect(found[0]?.where).toMatch(/^\/lines\/0/u);
  });

  it('is silent on its neighbour', () => {
    expect(ofCode(silent, code)).toEqual([]);
  });
});
