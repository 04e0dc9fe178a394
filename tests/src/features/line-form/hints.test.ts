import { describe, expect, it } from 'vitest';
import { DEFAULT_BANDS } from '#shared/checks/defaults/rule-set';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { setAt } from '../../../../src/features/line-form/model/edit';
import { siHint, typicalHint } from '../../../../src/features/line-form/model/hints';
import type { LineForm } from '../../../../src/features/line-form/model/form-types';

const declared = (text: string, unit: string, form: LineForm = blankLine()): LineForm =>
  setAt(form, ['declared', 0, 'x1'], { text, unit, baseMva: '', baseKv: '' });

const at345 = setAt(blankLine(), ['nominalVoltageKv', 'text'], '345');
const plain = (text: string | undefined): string | undefined => text?.replace(/[\u2009\u202f]/g, ' ');

describe('the value in the filing’s unit', () => {
  it('says a value per mile per km (1 mi = 1.609344 km, exact)', () => {
    expect(plain(siHint(declared('0.6135', 'ohm/mi'), '/declared/0/x1', 100))).toBe('is 0.3812 Ω/km');
  });

  it('says a per-unit value per km once voltage and length are there: Z_b = kV² ÷ MVA', () => {
    const form = declared('0.0136', 'pu', at345);
    expect(siHint(form, '/declared/0/x1', 100)).toBeUndefined();
    const long = setAt(form, ['sections', 0, 'lengthKm'], { text: '42.5', unit: 'km' });
    // 0.0136 · 345² ÷ 100 ÷ 42.5
    expect(plain(siHint(long, '/declared/0/x1', 100))).toBe('is 0.3809 Ω/km');
  });

  it.each([
    // 1 mi = 1.609344 km, 1 ft = 0.3048 m, exact.
    ['bundleSpacingM', '457', 'mm', 'is 0.457 m'],
    ['attachmentHeightM', '30', 'ft', 'is 9.14 m'],
    ['attachmentHeightM', '78.704', 'ft', 'is 23.989 m'],
  ])('says %s of %s %s in no more digits than were typed, but three', (key, text, unit, hint) => {
    const path = ['sections', 0, 'positions', 0, key] as const;
    const form = setAt(blankLine(), path, { text, unit });
    expect(plain(siHint(form, `/sections/0/positions/0/${key}`, 100))).toBe(hint);
  });

  it('says 41.6 mi as 66.9 km', () => {
    const form = setAt(blankLine(), ['sections', 0, 'lengthKm'], { text: '41.6', unit: 'mi' });
    expect(plain(siHint(form, '/sections/0/lengthKm', 100))).toBe('is 66.9 km');
  });

  it('says a length in metres, and nothing where the unit is the filing’s own or the text no number', () => {
    const path = ['sections', 0, 'positions', 0, 'attachmentHeightM'] as const;
    const pointer = '/sections/0/positions/0/attachmentHeightM';
    expect(plain(siHint(setAt(blankLine(), path, { text: '78.7', unit: 'ft' }), pointer, 100))).toBe(
      'is 24.0 m',
    );
    expect(siHint(setAt(blankLine(), path, { text: '24', unit: 'm' }), pointer, 100)).toBeUndefined();
    expect(siHint(setAt(blankLine(), path, { text: 'high', unit: 'ft' }), pointer, 100)).toBeUndefined();
  });
});

describe('the typical band of a declared value', () => {
  it('is that of the class of the nominal voltage at the frequency', () => {
    const band = DEFAULT_BANDS.find((b) => b.classKv === 345 && b.frequencyHz === 60 && b.parameter === 'x1');
    const hint = plain(typicalHint(at345, 'x1', DEFAULT_BANDS));
    expect(hint).toBe(`typical ${band?.typical[0].toFixed(2)} to ${band?.typical[1].toFixed(2)} Ω/km`);
  });

  it('of R0 is that of its excess over R1', () => {
    expect(plain(typicalHint(at345, 'r0', DEFAULT_BANDS))).toMatch(/^typical R1 \+ [\d.]+ to [\d.]+ Ω\/km$/);
  });

  it('is left out without a voltage, and far from every class', () => {
    expect(typicalHint(blankLine(), 'x1', DEFAULT_BANDS)).toBeUndefined();
    const far = setAt(blankLine(), ['nominalVoltageKv', 'text'], '20');
    expect(typicalHint(far, 'x1', DEFAULT_BANDS)).toBeUndefined();
  });
});
