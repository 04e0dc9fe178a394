import { describe, expect, it } from 'vitest';
import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { Cause } from '#shared/checks/types';
import { readLine } from '#shared/filing/read-filing';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { setAt, setCircuits } from '../../../../src/features/line-form/model/edit';
import { openForm } from '../../../../src/features/line-form/model/from-line';
import { putCorrection } from '../../../../src/features/line-form/model/put-values';
import { putWords } from '../../../../src/features/line-form/model/put-words';
import { readForm } from '../../../../src/features/line-form/model/to-line';

const HEIGHTS = { a: 24, b: 24, c: 19 } as const;

interface Filed {
  /** Heights as filed. */
  heights?: Record<string, number>;
  /** What offsets, heights and sags were multiplied with. */
  factor?: number;
  bundleCount?: number;
  sections?: number;
  diameterFactor?: number;
}

/** A 345 kV line as filed; what is declared belongs to it as it was built, c at 19 m. */
function filed({ heights = HEIGHTS, factor = 1, bundleCount = 2, sections = 1, diameterFactor = 1 }: Filed) {
  const position = (phase: string, acrossM: number) => ({
    ...{ circuit: 1, phase, conductor: 'phase', bundleCount, bundleSpacingM: 0.4572 },
    horizontalM: acrossM * factor,
    attachmentHeightM: (heights[phase] ?? NaN) * factor,
    sagM: 7 * factor,
  });
  const section = {
    kind: 'overhead',
    lengthKm: 20,
    earthResistivityOhmM: 100,
    conductors: {
      phase: {
        model: 'handbook',
        diameterMm: 28.14 * diameterFactor,
        gmrMm: 11.37 * diameterFactor,
        acResistanceOhmPerKm: 0.0798,
      },
    },
    positions: [position('a', -9), position('b', 0), position('c', 9)],
  };
  return {
    ...{
      name: 'Harrow Fell – Sarn',
      from: 'Harrow Fell',
      to: 'Sarn',
      nominalVoltageKv: 345,
      frequencyHz: 60,
    },
    sections: Array.from({ length: sections }, () => structuredClone(section)),
    declared: [{ circuit: 1 }],
  };
}

const CONTEXT = { library: STARTING_LIBRARY, owner: { baseMva: 100, earthResistivityOhmM: 100 } };

function check(line: object) {
  const read = readLine(line, CONTEXT);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return checkLine(read.line, DEFAULT_RULE_SET);
}

/** The values that the line as it was built gives, as somebody declares them. */
function honest(sections: number) {
  const bare = { ...filed({ sections }), declared: [declaring({ r1: 0.04, x1: 0.38, b1: 4.3 })] };
  const values = check(bare).circuits[0]?.recomputed;
  if (!values) throw new Error('the line can be computed');
  const { r1, x1, b1, r0, x0, b0 } = values;
  return declaring({ r1, x1, b1, r0, x0, b0 });
}

function declaring(values: Record<string, number>) {
  const entries = Object.entries(values).map(([key, value]) => [
    key,
    { value: Number(value.toPrecision(5)), unit: key.startsWith('b') ? 'uS/km' : 'ohm/km' },
  ]);
  return { circuit: 1, ...Object.fromEntries(entries) };
}

/** A slip in the geometry: the form that holds it and the best cause that the check finds. */
function slip(how: Filed): { form: ReturnType<typeof openForm>; cause: Cause } {
  const line = { ...filed(how), declared: [honest(how.sections ?? 1)] };
  const report = check(line);
  const findings = [...report.circuits.flatMap((c) => c.findings), ...report.findings];
  const cause = findings.flatMap((f) => f.causes).find((c) => c.in === 'geometry');
  if (!cause) throw new Error('a cause in the geometry was to be found');
  return { form: openForm(line), cause };
}

const said = (text: string | null) => text?.replace(/[\u2009\u202f]/g, ' ');

/** What the check says of the form after the correction was put in. */
function afterwards({ form, cause }: ReturnType<typeof slip>) {
  const report = check(readForm(putCorrection(form, cause, 1).form).line);
  return report.circuits.flatMap((c) => c.findings).filter((f) => f.family === 'geometry');
}

describe('the button of a cause that lies in the geometry', () => {
  it('names value, field and place of two digits changed about, and puts it there', () => {
    const found = slip({ heights: { ...HEIGHTS, c: 91 } });
    expect(found.cause.code).toBe('position');
    expect(said(putWords(found.form, found.cause, 1))).toBe('Put 19.0 m into the height of c');
    const { values } = putCorrection(found.form, found.cause, 1);
    expect(values.map(({ before, after }) => [said(before), said(after)])).toEqual([['91 m', '19.0 m']]);
    expect(afterwards(found)).toEqual([]);
  });

  it('says it in the unit of the field', () => {
    const { form, cause } = slip({ heights: { ...HEIGHTS, c: 91 } });
    const path = ['sections', 0, 'positions', 2, 'attachmentHeightM'];
    const inFeet = setAt(form, path, { text: '298.6', unit: 'ft' });
    // 19 m ÷ 0.3048, the international foot
    expect(said(putWords(inFeet, cause, 1))).toBe('Put 62.336 ft into the height of c');
  });

  it('counts the fields that were typed in feet, and converts every one of them', () => {
    const found = slip({ factor: 1 / 0.3048 });
    expect(found.cause.code).toBe('feet-for-metres');
    // The offset of b is 0 in either unit.
    expect(putWords(found.form, found.cause, 1)).toBe('Put in 2 offsets, 3 heights and 3 sags');
    const heights = putCorrection(found.form, found.cause, 1).form.sections[0]?.positions.map(
      (p) => p.attachmentHeightM.text,
    );
    expect(heights).toEqual(['24.0', '24.0', '19.0']);
    expect(afterwards(found)).toEqual([]);
  });

  it('does so in every section of the line', () => {
    const found = slip({ factor: 1 / 0.3048, sections: 2 });
    expect(putWords(found.form, found.cause, 1)).toBe('Put in 4 offsets, 6 heights and 6 sags');
    expect(afterwards(found)).toEqual([]);
  });

  it('gives every phase the bundle', () => {
    const found = slip({ bundleCount: 3, sections: 2 });
    expect(found.cause.code).toBe('bundle-count');
    expect(putWords(found.form, found.cause, 1)).toBe('Put 2 into the number of subconductors');
    const put = putCorrection(found.form, found.cause, 1);
    expect(put.values).toHaveLength(6);
    expect(afterwards(found)).toEqual([]);
  });

  it('turns inches of a conductor into millimetres', () => {
    const found = slip({ diameterFactor: 1 / 25.4 });
    expect(found.cause.code).toBe('inches-for-millimetres');
    expect(said(putWords(found.form, found.cause, 1))).toBe(
      'Put 28.14 mm into the diameter and 11.37 mm into the GMR',
    );
    expect(afterwards(found)).toEqual([]);
  });
});

describe('the button of a declared slip', () => {
  const form = openForm({ ...filed({}), declared: [declaring({ r1: 0.05, x1: 0.6135, b1: 4.3 })] });
  const declared = (corrected: Record<string, number>) => ({ in: 'declared' as const, corrected });

  it.each<[Record<string, number>, string]>([
    [{ x1: 0.381211 }, 'Put 0.3812 Ω/km into X1'],
    [{ x1: 0.381211, r1: 0.04 }, 'Put 0.0400 Ω/km into R1 and 0.3812 Ω/km into X1'],
    [{ x1: 0.381211, r1: 0.04, b1: 4.2 }, 'Put 3 values into R1, X1 and B1'],
  ])('%j', (corrected, words) => {
    expect(said(putWords(form, declared(corrected), 1))).toBe(words);
  });

  it('names the circuit where there are two', () => {
    expect(said(putWords(setCircuits(form, 2), declared({ x1: 0.38 }), 2))).toBe(
      'Put 0.380 Ω/km into X1 of circuit 2',
    );
  });

  it('is not there where the form has no field for it', () => {
    expect(putWords(form, declared({ nonsense: 1 }), 1)).toBeNull();
    expect(
      putWords(form, { in: 'geometry', where: '/sections/4/positions/0', corrected: { sagM: 1 } }, 1),
    ).toBeNull();
  });
});
