import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { csvFile, jsonFile, neutralised } from '#server/files/write-filing-file';
import type { WrittenFile } from '#server/files/write-filing-file';
import { changed, EXAMPLE_TEXT, onlyLine, readText } from '../../shared/filing/sample';
import type { Line } from '../../shared/filing/sample';

const sheetOf = (change: (l: Line) => void) => [onlyLine(changed(change)).line.sheet];
const textOf = (file: WrittenFile) => {
  if (!file.ok) throw new Error(JSON.stringify(file.reasons));
  return new TextDecoder().decode(file.bytes);
};

describe('CSV that no spreadsheet runs', () => {
  it.each(['=1+1', '+1', '-1+1', '@SUM(1)', '＝1', '－1', '\t=1', '\r=1', '\0=1', "'=1"])(
    'marks %j',
    (text) => {
      expect(neutralised(text)).toBe(`'${text}`);
    },
  );

  it.each(['Harrow Fell', '1-2', 'a=b', "it's", "'tis", ''])('leaves %j', (text) => {
    expect(neutralised(text)).toBe(text);
  });

  it('has no cell of text that begins a formula, and numbers as they are', { timeout: 30_000 }, () => {
    const start = fc.constantFrom('=', '+', '-', '@', '＝', '＋', '－', '＠', "'=");
    fc.assert(
      fc.property(start, fc.string({ unit: 'grapheme-ascii', maxLength: 8 }), (s, rest) => {
        const name = `${s}${rest}`.trim();
        const text = textOf(csvFile(sheetOf((l) => Object.assign(l, { name, from: name, to: name }))));
        const { data } = Papa.parse<Record<string, string>>(text.replace('\ufeff', '').trimEnd(), {
          header: true,
        });
        const [row] = data;
        for (const column of ['name', 'from', 'to']) expect(row?.[column]).toBe(`'${name}`);
        expect(row?.['a_x_m']).toBe('-9');
      }),
      { numRuns: 100 },
    );
  });

  it('begins with a byte order mark and ends lines by CRLF', () => {
    const text = textOf(csvFile(sheetOf(() => undefined)));
    expect(new TextDecoder('utf-8', { ignoreBOM: true }).decode(new TextEncoder().encode(text))).toBe(text);
    const file = csvFile(sheetOf(() => undefined));
    expect(file.ok && [...file.bytes.subarray(0, 3)]).toEqual([0xef, 0xbb, 0xbf]);
    expect(text.split('\r\n')).toHaveLength(3);
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
  });

  it.each<[string, (l: Line) => void, string]>([
    [
      'two phase conductors',
      (l) => {
        l['sections'][0].conductors.other = { ...l['sections'][0].conductors.phase, gmrMm: 11 };
        l['sections'][0].positions[1].conductor = 'other';
      },
      'section 1 has more than one phase conductor',
    ],
    [
      'two bundle counts',
      (l) => (l['sections'][0].positions[0].bundleCount = 3),
      'more than one bundle count',
    ],
    [
      'five ground wires',
      (l) => {
        const wire = l['sections'][0].positions[4];
        l['sections'][0].positions.push(...[7, 8, 9].map((horizontalM) => ({ ...wire, horizontalM })));
      },
      'more than 4 ground wires',
    ],
    [
      'two bases',
      (l) => {
        l['declared'][0].x1 = { value: 1, unit: 'pu', baseMva: 10 };
        l['declared'][0].r1 = { value: 1, unit: 'pu', baseMva: 20 };
      },
      'more than one base',
    ],
    [
      'five seasons',
      (l) => {
        l['declared'][0].ratings = [1, 2, 3, 4, 5].map((n) => ({ season: `s${n}`, continuousA: 1000 }));
      },
      'more than 4 seasonal ratings',
    ],
  ])('says when rows cannot hold a line: %s', (_name, change, words) => {
    const file = csvFile(sheetOf(change));
    expect(!file.ok && file.reasons.map((r) => r.line)).toEqual(['Harrow Fell – Sarn']);
    expect(!file.ok && file.reasons[0]?.message).toContain(words);
    expect(jsonFile(sheetOf(change)).ok).toBe(true);
  });
});

describe('JSON', () => {
  it('keeps the digits as they were written', () => {
    const read = readText(EXAMPLE_TEXT.replace('0.6135', '0.6100'));
    const text = textOf(jsonFile(read.ok ? read.filing.lines.map((l) => l.sheet) : []));
    expect(text).toContain('"value": 0.6100,');
    expect(text).toContain('"gmrMm": 1.0,');
    expect(JSON.parse(text)).toMatchObject({ format: 'filing/1', lines: [{ name: 'Harrow Fell – Sarn' }] });
  });
});
