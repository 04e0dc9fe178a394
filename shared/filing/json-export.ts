/** Lines as a filing in JSON, with the digits as they were written. */
import { pointerToken } from '../contracts/faults';
import type { LineSheet, WrittenDigits } from './types';

/** Digits as written when JSON has that form: a CSV file may say `007`. */
function numberText(value: number, digits: string | undefined): string {
  const isJson = digits !== undefined && /^-?(0|[1-9]\d*)(\.\d+)?([eE][+-]?\d+)?$/.test(digits);
  return isJson ? digits : JSON.stringify(value);
}

/** JSON with two blanks a level; a number stands as it was written, where that is kept. */
function text(value: unknown, pointer: string, written: WrittenDigits, indent: string): string {
  if (typeof value === 'number') return numberText(value, written[pointer]);
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const inner = `${indent}  `;
  const list = Array.isArray(value);
  const rows = list
    ? value.map((v, i) => inner + text(v, `${pointer}/${i}`, written, inner))
    : Object.entries(value)
        .filter(([, v]) => v !== undefined)
        .map(
          ([k, v]) =>
            `${inner}${JSON.stringify(k)}: ${text(v, `${pointer}/${pointerToken(k)}`, written, inner)}`,
        );
  const [open, close] = list ? '[]' : '{}';
  return rows.length === 0 ? `${open}${close}` : `${open}\n${rows.join(',\n')}\n${indent}${close}`;
}

/**
 * The text of a filing.
 * @param sheets the lines, complete in themselves
 * @returns JSON in the filing format, ending with a line end
 */
export function jsonOfLines(sheets: readonly LineSheet[]): string {
  const lines = sheets.map((s) => `    ${text(s.line, '', s.written, '    ')}`);
  return `{\n  "format": "filing/1",\n  "lines": [\n${lines.join(',\n')}\n  ]\n}\n`;
}
