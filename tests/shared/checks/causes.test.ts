import { describe, expect, it } from 'vitest';
import type { Cause } from '#shared/checks/types';
import { bareLine, check, doubleLine, exampleLine, findings } from './example-line';
import type { Json } from './example-line';

/** Causes of the finding about one parameter. */
function causesOf(line: Json, parameter: string): Cause[] {
  const found = findings(check(line)).find(
    (one) => one.parameter === parameter && (one.family === 'geometry' || one.family === 'physics'),
  );
  if (found === undefined) throw new Error(`nothing was found about ${parameter}`);
  return found.causes;
}

const declared = (change: (entry: Json) => void): Json => exampleLine((line) => change(line.declared[0]));
const times = (keys: string[], factor: number): Json =>
  declared((entry) => keys.forEach((key) => (entry[key].value *= factor)));
const section = (change: (section: Json) => void): Json => exampleLine((line) => change(line.sections[0]));
const phases = (one: Json): Json[] => one.positions.filter((spot: Json) => spot.phase !== undefined);

describe('causes in the declared values', () => {
  it('one mile for one kilometre in X1 alone: the example of the interfaces', () => {
    const [cause] = causesOf(
      declared((entry) => (entry.x1.value = 0.6135)),
      'x1',
    );
    expect(cause).toMatchObject({ code: 'per-mile', in: 'declared', explains: ['x1'] });
    // 0.6135 ÷ 1.609344 = 0.381211…, 3e-5 above 0.381199.
    expect(cause?.corrected['x1']).toBeCloseTo(0.381211, 6);
    expect(cause?.residual).toBeLessThan(5e-5);
    expect(cause?.sentence).toBe('Fits within 0.1\u2009% if the value is per mile: X1 is 0.3812\u2009Ω/km.');
  });

  it('all of Z and B per mile are one matter with one cause', () => {
    const all = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'];
    const found = findings(check(times(all, 1.609344))).filter(({ family }) => family === 'geometry');
    expect(found.map(({ parameter }) => parameter)).toEqual(all);
    expect(new Set(found.map(({ group }) => group)).size).toBe(1);
    for (const one of found) {
      expect(one.causes[0]?.code).toBe('per-mile');
      expect(one.causes[0]?.explains).toEqual(all);
    }
  });

  it('two slips in different constants are two matters, each with its own cause', () => {
    const line = declared((entry) => {
      entry.x1.value *= 1.609344;
      entry.b1.value /= 2;
    });
    const found = findings(check(line)).filter(({ family }) => family === 'geometry');
    expect(found.map(({ parameter, causes }) => [parameter, causes[0]?.code])).toEqual([
      ['x1', 'per-mile'],
      ['b1', 'half-charging'],
    ]);
    expect(found[0]?.group).not.toBe(found[1]?.group);
  });

  it.each([
    ['half-charging', ['b1'], 0.5],
    ['double-charging', ['b1', 'b0'], 2],
    ['total', ['r1', 'x1', 'r0', 'x0'], 42.5],
    ['decimal-shift', ['x0'], 10],
    ['decimal-shift', ['r1'], 1e-3],
    ['capacitance', ['b1'], 1000 / (2 * Math.PI * 60)],
  ] as const)('%s in %j', (code, keys, factor) => {
    const [cause] = causesOf(times([...keys], factor), keys[0]);
    expect(cause?.code).toBe(code);
    expect(cause?.explains).toEqual([...keys]);
  });

  it('per unit on another base, R and X one way and B the other', () => {
    const line = declared((entry) => {
      const base = 345 ** 2 / 100;
      for (const key of ['r1', 'x1', 'r0', 'x0'])
        entry[key] = { value: (entry[key].value * 42.5 * 10) / base, unit: 'pu' };
      for (const key of ['b1', 'b0'])
        entry[key] = { value: (entry[key].value * 42.5e-6 * base) / 10, unit: 'pu' };
    });
    const [cause] = causesOf(line, 'x1');
    expect(cause).toMatchObject({ code: 'base-mva', explains: ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] });
    expect(cause?.sentence).toContain('1\u202f000\u2009MVA');
  });

  it('values in each other’s field get each other’s number', () => {
    const line = declared((entry) => {
      [entry.r1.value, entry.x1.value] = [entry.x1.value, entry.r1.value];
    });
    const [cause] = causesOf(line, 'x1');
    expect(cause?.code).toBe('r-x-swapped');
    expect(cause?.corrected['r1']).toBeCloseTo(0.040384, 9);
    expect(cause?.corrected['x1']).toBeCloseTo(0.381199, 9);
  });

  it('one conductor for the bundle, with every value that it moves', () => {
    const alone = section((one) =>
      phases(one).forEach((spot) => {
        delete spot.bundleCount;
        delete spot.bundleSpacingM;
      }),
    );
    const values = check(alone).circuits[0]?.recomputed;
    const line = declared((entry) => {
      for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const) entry[key].value = values?.[key];
    });
    const [cause] = causesOf(line, 'x1');
    expect(cause).toMatchObject({ code: 'single-conductor', in: 'declared' });
    expect(cause?.corrected['x1']).toBeCloseTo(0.381199, 5);
  });
});

describe('slips that are small', () => {
  const SERIES = 2 * Math.PI * 60 * 2e-4;

  it('the arithmetic mean of 6, 12 and 18 m in place of the geometric one', () => {
    const uneven = section((one) => (one.positions[1].horizontalM = -3));
    const values = check(uneven).circuits[0]?.recomputed;
    for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const)
      uneven.declared[0][key].value = values?.[key];
    // X = ω·2e-4·ln(spacing ÷ GMR) per km: only the mean spacing changes, by 12 ÷ ∛(6·12·18).
    const shift = Math.log(12 / Math.cbrt(6 * 12 * 18));
    uneven.declared[0].x1.value += SERIES * shift;
    const charge = (2 * Math.PI * 60 * 2 * Math.PI * 1e9) / (4e-7 * Math.PI * 299_792_458 ** 2);
    uneven.declared[0].b1.value = charge / (charge / uneven.declared[0].b1.value + shift);
    const [cause] = causesOf(uneven, 'x1');
    expect(cause?.code).toBe('arithmetic-spacing');
    expect(cause?.residual).toBeLessThan(1e-4);
  });

  it('d.c. for a.c. resistance of a conductor so thick that it shows', () => {
    // Bluebird 84/19 at 50 °C and 60 Hz: 0.03205 Ω/km against 0.02946 Ω/km d.c. (catalogue values).
    const line = exampleLine((one) => {
      one.sections[0].conductors.phase = { library: 'Bluebird', temperatureC: 50 };
      for (const spot of phases(one.sections[0])) {
        delete spot.bundleCount;
        delete spot.bundleSpacingM;
      }
    });
    const values = check(line).circuits[0]?.recomputed;
    for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const)
      line.declared[0][key].value = values?.[key];
    line.declared[0].r1.value = 0.02628 * (1 + 0.00403 * 30);
    const [cause] = causesOf(line, 'r1');
    expect(cause).toMatchObject({ code: 'dc-resistance', explains: ['r1'] });
  });

  it('below the tolerance is no finding and nobody is asked', () => {
    const line = declared((entry) => (entry.x1.value += SERIES * Math.log(4 / 3 / Math.cbrt(2))));
    expect(findings(check(line)).filter(({ grade }) => grade === 'must-answer')).toEqual([]);
  });
});

describe('causes in a declared coupling', () => {
  it('all three per mile are one matter at the line', () => {
    const line = doubleLine((one) => {
      for (const key of ['r0m', 'x0m', 'b0m']) one.declaredMutual[0][key].value *= 1.609344;
    });
    const report = check(line);
    expect(
      report.circuits.flatMap((circuit) => circuit.findings).filter(({ grade }) => grade === 'must-answer'),
    ).toEqual([]);
    const found = report.findings.filter(({ family }) => family === 'geometry');
    expect(found.map(({ parameter, causes }) => [parameter, causes[0]?.code])).toEqual([
      ['r0m', 'per-mile'],
      ['x0m', 'per-mile'],
      ['b0m', 'per-mile'],
    ]);
    expect(new Set(found.map(({ group }) => group)).size).toBe(1);
  });

  it('a slip in the geometry is one matter over both circuits', () => {
    const line = doubleLine();
    for (const spot of line.sections[0].positions) spot.bundleSpacingM = 0.9144;
    const found = check(line).circuits.flatMap(({ findings: own }) =>
      own.filter(({ code }) => code === 'geometry.x1'),
    );
    expect(found.length).toBe(2);
    expect(found.map(({ causes }) => causes[0]?.code)).toEqual(['bundle-spacing', 'bundle-spacing']);
    expect(found[0]?.group).toBe(found[1]?.group);
  });
});

describe('causes in the geometry', () => {
  it('one offset with the wrong sign: the place and the corrected entry', () => {
    const line = exampleLine((one) => {
      one.sections[0].positions[0].horizontalM = 9;
      one.sections[0].positions[0].attachmentHeightM = 31;
      one.sections[0].positions[2].horizontalM = 9;
    });
    const right = structuredClone(line);
    right.sections[0].positions[0].horizontalM = -9;
    const values = check(right).circuits[0]?.recomputed;
    for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const)
      line.declared[0][key].value = values?.[key];
    const [cause] = causesOf(line, 'x1');
    expect(cause).toMatchObject({
      code: 'position',
      in: 'geometry',
      where: '/lines/0/sections/0/positions/0/horizontalM',
      corrected: { horizontalM: -9 },
    });
  });

  it('feet typed as metres, over the whole structure', () => {
    const line = section((one) => {
      for (const spot of one.positions) {
        for (const key of ['horizontalM', 'attachmentHeightM', 'sagM']) spot[key] /= 0.3048;
      }
    });
    const [cause] = causesOf(line, 'x1');
    expect(cause).toMatchObject({ code: 'feet-for-metres', in: 'geometry', where: '/lines/0/sections/0' });
    expect(cause?.corrected['positions/0/attachmentHeightM']).toBeCloseTo(24, 9);
  });

  it('a geometry that cannot be computed, put right: 45.72 cm typed as metres', () => {
    const line = section((one) => {
      for (const spot of phases(one)) Object.assign(spot, { bundleCount: 4, bundleSpacingM: 0.4572 });
    });
    const values = check(line).circuits[0]?.recomputed;
    for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const)
      line.declared[0][key].value = values?.[key];
    for (const spot of phases(line.sections[0])) spot.bundleSpacingM = 45.72;
    const report = check(line);
    expect(report.circuits[0]?.recomputed).toBeNull();
    const [finding] = report.findings.filter(({ grade }) => grade === 'must-answer');
    expect(finding?.code).toBe('drawing.wire-in-ground');
    expect(finding?.causes[0]?.code).toBe('centimetres-for-metres');
    expect(finding?.causes[0]?.residual).toBeLessThan(1e-6);
  });
});

describe('what causes never do', () => {
  it('a value that no slip explains says so', () => {
    const found = findings(check(times(['b1'], 1.137))).find(({ code }) => code === 'geometry.b1');
    expect(found?.causes).toEqual([]);
    expect(found?.message).toContain('None of the slips');
  });

  it('a cause that would spoil a value that fits is not offered: half the frequency’s values', () => {
    // X1 alone at 5/6: another frequency in X1 only; B1 fits as it stands and stays out of the cause.
    const [cause] = causesOf(times(['x1'], 50 / 60), 'x1');
    expect(cause?.code).toBe('frequency');
    expect(cause?.explains).toEqual(['x1']);
  });

  it.each([1.61, 0.5, 2, 10, 0.62, 1.2, 0.33, 42.5, 0.1])(
    'with all values × %d: three at most, best first, residual at most 0.01',
    (factor) => {
      const line = times(['r1', 'x1', 'b1', 'r0', 'x0', 'b0'], factor);
      for (const { causes } of findings(check(line))) {
        expect(causes.length).toBeLessThanOrEqual(3);
        for (const cause of causes) expect(cause.residual).toBeLessThanOrEqual(0.01);
        expect(new Set(causes.map(({ code }) => code)).size).toBe(causes.length);
        const reach = causes.map(({ explains }) => explains.length);
        expect(Math.max(0, ...reach)).toBe(reach[0] ?? 0);
      }
    },
  );

  it('nothing is sought where that was not asked for', () => {
    const found = findings(check(times(['x1'], 1.609344), { causes: false }));
    expect(found.flatMap(({ causes }) => causes)).toEqual([]);
    expect(found.some(({ message }) => message.includes('None of the slips'))).toBe(false);
  });
});

describe('without geometry', () => {
  const good = { r1: 0.0404, x1: 0.3812, b1: 4.347 };

  it.each([
    ['half-charging', { ...good, b1: 4.347 / 2 }, 'b1'],
    ['per-mile', { r1: 0.065, x1: 0.3812 * 1.609, b1: 4.347 * 1.609 }, 'x1'],
  ] as const)('%s is offered as possible', (code, values, parameter) => {
    const report = check(bareLine(345, 60, values));
    const causes = findings(report).flatMap((one) => one.causes);
    const cause = causes.find((one) => one.code === code);
    expect(cause?.possible).toBe(true);
    expect(cause?.explains).toContain(parameter);
    expect(cause?.sentence).toMatch(/^Possible if /u);
  });

  it('an honest line gets none', () => {
    expect(findings(check(bareLine(345, 60, good))).flatMap((one) => one.causes)).toEqual([]);
  });
});
