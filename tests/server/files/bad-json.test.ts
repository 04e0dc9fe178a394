/** The kinds of bad file that an importer is sent, by number: each is taken, or answered by row and column. */
import { describe, expect, it } from 'vitest';
import { readFilingFile } from '#server/files/read-filing-file';
import { CONTEXT, EXAMPLE_TEXT } from '../../shared/filing/sample';
import { csv } from './csv-sample';

const bytes = (text: string) => new TextEncoder().encode(text);
const jsonFaults = (text: string) =>
  readFilingFile(bytes(text), 'lines.json', CONTEXT).faults.map((f) =>
    'pointer' in f ? `${f.pointer}: ${f.message}` : '',
  );

describe('JSON files', () => {
  it('21: what is not JSON, keys twice, an unknown version', () => {
    expect(jsonFaults('{"lines": [1,]}')[0]).toMatch(/Not valid JSON at line 1, column 14/);
    expect(jsonFaults('// lines\n{}')[0]).toContain('no comments');
    expect(jsonFaults(EXAMPLE_TEXT.replace('"r1"', '"x1"')).join(' ')).toContain(
      'The name “x1” occurs twice',
    );
    expect(jsonFaults(EXAMPLE_TEXT.replace('filing/1', 'filing/9'))).toEqual([
      '/format: Format must be “filing/1”; “filing/9” is there.',
    ]);
    expect(jsonFaults('"lines"')).toHaveLength(1);
    expect(jsonFaults('[]')[0]).toContain('put the list under "lines"');
  });

  it('22: numbers in quotes, texts without, deep nesting, a prototype', () => {
    expect(jsonFaults(EXAMPLE_TEXT.replace('345', '"345"'))).toEqual([
      '/lines/0/nominalVoltageKv: Nominal voltage must be a number; “345” is there. Leave out the quotes.',
    ]);
    expect(jsonFaults(EXAMPLE_TEXT.replace('"Harrow Fell – Sarn"', '9007199254740993'))[0]).toMatch(
      /^\/lines\/0\/name: /,
    );
    expect(jsonFaults('['.repeat(5000))[0]).toContain('nested more than 32');
    expect(jsonFaults(EXAMPLE_TEXT.replace('"transposed"', '"__proto__"'))[0]).toMatch(
      /^\/lines\/0\/__proto__: /,
    );
  });

  it('23: longer than any filing, answered without reading it all', { timeout: 30_000 }, () => {
    expect(jsonFaults(`{"lines":[${'1,'.repeat(5_000_000)}1]}`)[0]).toContain('more than 50000 entries');
    expect(jsonFaults(`{"lines":[${'NaN,'.repeat(60_000)}1]}`).length).toBeGreaterThan(1000);
    expect(jsonFaults(`{"lines":[{${'"a":1,'.repeat(100_000)}"b":1}]}`).at(-1)).toContain(
      'more than 1000 names',
    );
  });

  it('9 and 10: NaN, Infinity and 1e999 are told beside all other faults', () => {
    const text = EXAMPLE_TEXT.replace('"value": 0.6135', '"value": NaN')
      .replace('"sagM": 9', '"sagM": 1e999')
      .replace('"ohm/km"', '"ohms"');
    expect(jsonFaults(text).map((f) => f.split(': ')[0])).toEqual([
      '/lines/0/declared/0/r1/unit',
      '/lines/0/declared/0/x1/value',
      '/lines/0/sections/0/positions/0/sagM',
    ]);
  });

  it('is told from CSV by name, else by its first character', () => {
    expect(readFilingFile(bytes(`\n  ${EXAMPLE_TEXT}`), '-', CONTEXT).format).toBe('json');
    expect(readFilingFile(bytes(csv({})), '-', CONTEXT).format).toBe('csv');
    expect(readFilingFile(bytes(csv({})), 'lines.json', CONTEXT).format).toBe('json');
    expect(readFilingFile(bytes(EXAMPLE_TEXT), 'lines.json', { ...CONTEXT, format: 'csv' }).format).toBe(
      'csv',
    );
  });
});
