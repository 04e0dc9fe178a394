import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { halfLastDigit, readNumber } from '#shared/units/number-text';

describe('numbers as written', () => {
  it.each([
    ['1234.5', 1234.5],
    ['-0.12', -0.12],
    [' 5 ', 5],
    ['0', 0],
    ['007', 7],
    ['1.2e-05', 1.2e-5],
    ['6E+3', 6000],
    ['1e5', 1e5],
  ])('takes %j', (text, value) => {
    expect(readNumber(text)).toMatchObject({ ok: true, value });
  });

  it.each([
    ...['1,234.5', '1 234', '1_000', '0x1F', '+5', '٣', '５', '5.', '.5', '1e', 'e5', '--1', '1.2.3', '-'],
    ...['NaN', 'Infinity', '-inf', '1.#IND', '#N/A', '#REF!', 'n/a', 'TBD', '1/2', '50%', '5 km'],
  ])('refuses %j', (text) => {
    expect(readNumber(text)).toEqual({ ok: false, reason: 'grammar' });
  });

  it.each(['1e308', '1e-300'])('takes %j, which a double holds', (text) => {
    expect(readNumber(text).ok).toBe(true);
  });

  it.each(['1e309', '-9e999', '1e-400'])('says that %j is out of what a double holds', (text) => {
    expect(readNumber(text)).toEqual({ ok: false, reason: 'range' });
  });

  it('tells an empty cell from a faulty one', () => {
    expect(readNumber('  ')).toEqual({ ok: false, reason: 'empty' });
  });

  it('takes the decimal comma only when it is the file’s sign', () => {
    expect(readNumber('0,40', 'comma')).toEqual({ ok: true, value: 0.4, digits: '0.40' });
    expect(readNumber('0.40', 'comma').ok).toBe(false);
    expect(readNumber('0,40').ok).toBe(false);
  });

  it('has no negative zero', () => {
    const read = readNumber('-0.0');
    expect(read.ok && Object.is(read.value, 0)).toBe(true);
  });

  it('gives back every double that is written in its shortest form', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
        const read = readNumber(String(x));
        expect(read.ok && read.value).toBe(x === 0 ? 0 : x);
      }),
    );
  });
});

describe('half a unit of the last digit', () => {
  it.each([
    ['0.40', 0.005],
    ['0.4', 0.05],
    ['600', 0.5],
    ['4.347', 0.0005],
    ['6.1e2', 5],
    ['6.1e-2', 0.0005],
    ['-0.0404', 0.00005],
  ])('of %s is %d', (digits, half) => {
    expect(halfLastDigit(digits)).toBe(half);
  });

  it('is nothing for what is no number', () => {
    expect(halfLastDigit('about 3')).toBe(0);
  });
});
