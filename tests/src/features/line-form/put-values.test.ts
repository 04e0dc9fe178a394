import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { setAt, setCircuits } from '../../../../src/features/line-form/model/edit';
import { putCorrection } from '../../../../src/features/line-form/model/put-values';

const form = setAt(blankLine(), ['declared', 0, 'x1'], {
  text: '0.6135',
  unit: 'ohm/km',
  baseMva: '',
  baseKv: '',
});

describe('a correction put into the form', () => {
  it('writes a declared value per km with the digits of what it replaces, and says what stood there', () => {
    const put = putCorrection(form, { in: 'declared', corrected: { x1: 0.381211 } }, 1);
    expect(put.form.declared[0]?.x1).toMatchObject({ text: '0.3812', unit: 'ohm/km' });
    expect(put.values).toEqual([
      { pointer: '/declared/0/x1', label: 'X1', before: '0.6135\u2009Ω/km', after: '0.3812\u2009Ω/km' },
    ]);
  });

  it('states the unit anew where the old value was per unit or per mile', () => {
    const inMiles = setAt(form, ['declared', 0, 'x1', 'unit'], 'ohm/mi');
    const put = putCorrection(inMiles, { in: 'declared', corrected: { x1: 0.381211 } }, 1);
    expect(put.form.declared[0]?.x1).toMatchObject({ unit: 'ohm/km' });
  });

  it('puts several values in the order of their fields, and leaves the other circuit alone', () => {
    const two = setCircuits(form, 2);
    const put = putCorrection(two, { in: 'declared', corrected: { b1: 4.35, x1: 0.3812, r1: 0.04 } }, 2);
    expect(put.values.map((v) => v.pointer)).toEqual(['/declared/1/r1', '/declared/1/x1', '/declared/1/b1']);
    expect(put.form.declared[0]).toBe(two.declared[0]);
    expect(put.form.declared[1]?.b1.unit).toBe('uS/km');
  });

  it('writes an entry of the geometry in the unit of its field', () => {
    const inFeet = setAt(form, ['sections', 0, 'positions', 2, 'attachmentHeightM'], {
      text: '40',
      unit: 'ft',
    });
    const correction = {
      in: 'geometry' as const,
      where: '/lines/0/sections/0/positions/2',
      corrected: { attachmentHeightM: 19 },
    };
    const put = putCorrection(inFeet, correction, 1);
    expect(put.form.sections[0]?.positions[2]?.attachmentHeightM).toEqual({ text: '62.336', unit: 'ft' });
  });

  it('takes a pointer to the entry itself as well as one to its position', () => {
    const correction = {
      in: 'geometry' as const,
      where: '/sections/0/positions/0/bundleCount',
      corrected: { bundleCount: 2 },
    };
    const put = putCorrection(form, correction, 1);
    expect(put.form.sections[0]?.positions[0]).toMatchObject({ bundleCount: '2' });
  });

  it('puts nothing where there is no such field, or no number', () => {
    const corrected = { nonsense: 1, x1: Number.NaN };
    expect(putCorrection(form, { in: 'declared', corrected }, 1)).toEqual({ form, values: [] });
    expect(putCorrection(form, { in: 'declared', corrected: { x1: 1 } }, 2).values).toEqual([]);
  });
});
