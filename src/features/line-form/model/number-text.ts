/** What a field's text turned out to be. */
export type NumberReading =
  | { kind: 'empty' }
  | { kind: 'number'; value: number }
  | { kind: 'fault'; expected: string; message: string };

const GRAMMAR = /^-?\d+(?:\.\d+)?(?:e[+-]?\d{1,3})?$/i;
const SPACES = /[\s\u2009\u202f\u00a0]/g;

/** The text with the signs that people paste from documents turned into plain ones. */
const plainSigns = (text: string): string =>
  text
    .trim()
    .replace(/\u2212/g, '-')
    .replace(SPACES, '');

function fault(text: string, plain: string): NumberReading {
  if (/^-?\d+,\d+$/.test(plain)) {
    const wanted = plain.replace(',', '.');
    return { kind: 'fault', expected: wanted, message: `Write the decimal sign as a point: ${wanted}.` };
  }
  return {
    kind: 'fault',
    expected: 'a number such as 0.381 or 4.2e-3',
    message: `“${text.trim()}” is no number. Write it like 0.381 or 4.2e-3; the unit stands beside it.`,
  };
}

/** Reads a number as a person types it; spaces between digits and a true minus sign are taken. */
export function readNumber(text: string): NumberReading {
  const plain = plainSigns(text);
  if (plain === '') return { kind: 'empty' };
  if (!GRAMMAR.test(plain)) return fault(text, plain);
  const value = Number(plain);
  if (Number.isFinite(value)) return { kind: 'number', value };
  return { kind: 'fault', expected: 'a smaller number', message: `${plain} is too large to be kept.` };
}

/** How many significant digits a text says its number with; zeros that lead say nothing. */
export const digitsTyped = (text: string): number =>
  text.replace(/e.*$/i, '').replace(/[^\d]/g, '').replace(/^0+/, '').length;

/** A number as the form writes it when nobody typed it: shortest digits that read back the same. */
export function writeNumber(value: number): string {
  return Object.is(value, -0) ? '0' : String(value).replace('-', '\u2212');
}
