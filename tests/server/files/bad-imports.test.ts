/** The kinds of bad file that an importer is sent, by number: each is taken, or answered by row and column. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { filingHash } from '#server/files/content-hash';
import { readFilingFile } from '#server/files/read-filing-file';
import { CONTEXT } from '../../shared/filing/sample';
import { cellFaults, COLUMNS, csv, inDialect, readCsvFile } from './csv-sample';
import type { Column } from './csv-sample';

const HEADER = COLUMNS.join(',');
const bytes = (text: string) => new TextEncoder().encode(text);

describe('a sound file', () => {
  it('is taken', () => {
    const file = readCsvFile(csv({}, {}));
    expect(file.faults).toEqual([]);
    expect(file.filing?.lines.map((l) => [l.name, l.lengthKm])).toEqual([
      ['Line 1', 18.2],
      ['Line 2', 18.2],
    ]);
    expect(file.rowCount).toBe(2);
    expect(file.dialect).toEqual({ delimiter: 'comma', decimal: 'point', encoding: 'utf-8', lineEnds: 'lf' });
  });
});

describe('form of the file', () => {
  it('1: nothing in it', () => {
    expect(cellFaults('')).toEqual(['1 : The file is empty.']);
    expect(cellFaults('\ufeff')).toEqual(['1 : The file is empty.']);
    expect(cellFaults('\n \n\r\n')).toEqual(['1 : The file is empty.']);
    expect(cellFaults(HEADER)).toEqual(['2 : The file has no data rows.']);
    expect(cellFaults(`${HEADER}\n${','.repeat(COLUMNS.length - 1)}\n\n`)).toEqual([
      '2 : The file has no data rows.',
    ]);
  });

  it('tells a cell that goes to several places once, and asks for no model where its numbers cannot be read', () => {
    const [header, row] = csv({}).trim().split('\n');
    const more = 'bundle_count,bundle_spacing_m,ground_conductor,ground_conductor_ac_resistance_ohm_per_km';
    const faults = cellFaults(`${header},${more},gw1_x_m,gw1_height_m\n${row},2,x,3/8 in steel,y,0,30`);
    expect(faults.filter((f) => f.startsWith('2 bundle_spacing_m'))).toHaveLength(1);
    expect(faults.filter((f) => f.startsWith('2 ground_conductor_ac_resistance'))).toHaveLength(1);
    expect(faults.filter((f) => f.includes('model'))).toEqual([]);
  });

  it('says that ground wires hang there and no conductor is named for them', () => {
    const [header, row] = csv({}).trim().split('\n');
    expect(cellFaults(`${header},gw1_x_m,gw1_height_m\n${row},0,30`)).toEqual([
      '2 ground_conductor: Ground wires hang here, and their conductor is not named.',
    ]);
  });

  it('2: a column missing, unknown or doubled, told once and not on every row', () => {
    const renamed = csv({}, {}, {}).replace('length_km', 'lenght_km');
    expect(cellFaults(renamed)).toEqual([
      '1 lenght_km: Column “lenght_km” is not known. Did you mean length_km?',
      '1 length_km: Column length_km is missing.',
    ]);
    const doubled = csv({}).replace('earth_resistivity_ohm_m', 'r1');
    expect(cellFaults(doubled)).toEqual(['1 r1: Column r1 is there twice (columns 8 and 18).']);
  });

  it('3: headers that an object would take for its own, empty and endless ones', () => {
    for (const name of ['__proto__', 'constructor', 'toString', 'x'.repeat(300)]) {
      const faults = cellFaults(csv({}).replace('earth_resistivity_ohm_m', name));
      expect(faults).toHaveLength(1);
      expect(faults[0]).toMatch(/^1 .*is not known\./);
    }
    expect(cellFaults(csv({}).replace('earth_resistivity_ohm_m', ''))).toEqual([
      '1 (8): Column 8 has no name.',
    ]);
    expect(Object.prototype).not.toHaveProperty('polluted');
  });

  it('4: a field too many or too few', () => {
    const [head, first] = csv({}).split('\n');
    expect(cellFaults(`${head}\n${first?.replace('0.4846', '0,4846')}\n`)).toEqual([
      `2 : Row 2 has 23 fields, the header has 22. A decimal comma? Write a point, or part the fields by semicolons.`,
    ]);
    expect(cellFaults(`${head}\n${first?.replace(',60', '')}\n`)).toEqual([
      '2 : Row 2 has 21 fields, the header has 22.',
    ]);
    // Spreadsheets leave blank fields behind the last column.
    expect(cellFaults(`${head},,\n${first},,\n`)).toEqual([]);
    expect(cellFaults(`${head}\n${first},,\n`)).toEqual([]);
  });

  it('5: line ends of all kinds in one file', () => {
    const [head, one, two, three] = csv({}, {}, {}).split('\n');
    const mixed = readCsvFile(`${head}\r\n${one}\n${two}\r${three}\r\n`);
    expect(mixed.faults).toEqual([]);
    expect(mixed.rowCount).toBe(3);
    expect(mixed.dialect?.lineEnds).toBe('mixed');
    for (const [end, name] of [
      ['\r\n', 'crlf'],
      ['\r', 'cr'],
      ['\n', 'lf'],
    ] as const)
      expect(readCsvFile([head, one, ''].join(end)).dialect?.lineEnds).toBe(name);
  });

  it('6: a quote that is opened and not closed, or closed too early', () => {
    const open = `${csv({}, {}).trimEnd()}\n"Line 3,${'x,'.repeat(50_000)}`;
    expect(cellFaults(open)).toEqual(['4 : Row 4: a quote (") is opened and not closed.']);
    const early = csv({}).replace('Line 1', '"Line" 1');
    expect(cellFaults(early)).toEqual(['2 : Row 2: a quote (") stands where a field should end.']);
    expect(readCsvFile(csv({ name: 'The "old" line, north' })).filing?.lines[0]?.name).toBe(
      'The "old" line, north',
    );
  });

  it.each([
    [';', ',', { delimiter: 'semicolon', decimal: 'comma' }],
    [';', '.', { delimiter: 'semicolon', decimal: 'point' }],
    ['\t', ',', { delimiter: 'tab', decimal: 'comma' }],
    ['\t', '.', { delimiter: 'tab', decimal: 'point' }],
  ] as const)(
    '7: delimiter %j with decimal %s is found, and reads to the same content',
    (delimiter, decimal, dialect) => {
      const plain = readCsvFile(csv({}, {}));
      for (const head of ['', delimiter === ';' ? 'sep=;\n' : '']) {
        const other = readCsvFile(head + inDialect(csv({}, {}), delimiter, decimal));
        expect(other.faults).toEqual([]);
        expect(other.dialect).toMatchObject(dialect);
        expect(other.filing && filingHash(other.filing)).toBe(plain.filing && filingHash(plain.filing));
      }
    },
  );

  it('7: a decimal comma that is not the file’s sign is told, with the row that the header counts as 1', () => {
    const text = inDialect(csv({}, {}, {}), ';', ',').replace(/0,4846(?!.*0,4846)/s, '0.4846');
    expect(cellFaults(text)).toEqual([
      '4 x1: “0.4846” is not a number. Write it as 1234,5, with no thousands sign.',
    ]);
  });

  it('7: what the applicant says of the dialect holds against what was found', () => {
    const points = csv({ x1: '0.4846' });
    expect(cellFaults(points, { dialect: { delimiter: 'semicolon' } })[0]).toMatch(/is not known/);
    const semicolons = inDialect(points, ';', '.');
    expect(cellFaults(semicolons, { dialect: { decimal: 'comma' } })).toContain(
      '2 x1: “0.4846” is not a number. Write it as 1234,5, with no thousands sign.',
    );
    const accents = readCsvFile(csv({ from: 'Østrø' }), { dialect: { encoding: 'windows-1252' } });
    expect(accents.filing?.lines[0]?.from).toBe('Ã˜strÃ¸');
    const latin = Uint8Array.from(csv({ from: 'Østrø' }), (c) => c.charCodeAt(0));
    expect(cellFaults(latin, { dialect: { encoding: 'utf-8' } })).toEqual(['1 : The file is not UTF-8.']);
  });

  it('8: Windows-1252 is taken with a notice, UTF-16 is not', () => {
    // 0x96 is a dash and 0x80 the euro sign there; in Latin-1 both are control characters.
    const text = csv({ from: 'Østrø', to: 'A\u0096B\u0080' }).replaceAll('–', '-');
    const latin = Uint8Array.from(text, (c) => c.charCodeAt(0));
    const read = readCsvFile(latin);
    expect(read.filing?.lines[0]).toMatchObject({ from: 'Østrø', to: 'A–B€' });
    expect(read.dialect?.encoding).toBe('windows-1252');
    expect(read.notices.map((n) => n.code)).toContain('encoding-windows-1252');
    const utf16 = Uint8Array.from(`\ufeff${csv({})}`, (c) => c.charCodeAt(0));
    const wide = new Uint8Array(2 + 2 * utf16.length);
    wide.set([0xff, 0xfe]);
    utf16.forEach((b, i) => (wide[2 + 2 * i] = b));
    expect(cellFaults(wide)).toEqual(['1 : The file is UTF-16. Save it as UTF-8.']);
    expect(readCsvFile(`\ufeff${csv({})}`).faults).toEqual([]);
  });

  it('23: too many rows or bytes, and files of another kind', { timeout: 30_000 }, () => {
    const many = csv(...Array.from({ length: 501 }, () => ({})));
    expect(cellFaults(many)).toEqual(['502 : The file has 501 rows; at most 500 are taken.']);
    expect(cellFaults(many, { maxRows: 501 })).toEqual([]);
    expect(cellFaults(`${HEADER}\n${'\n'.repeat(2_000_000)}x`)[0]).toContain('more than 500 rows');
    expect(cellFaults(csv({}), { maxBytes: 100 })[0]).toContain('larger than is taken');
    expect(cellFaults(`${csv({})}${'x'.repeat(200_001)}`)).toEqual([
      '3 : Row 3 is longer than 200000 characters.',
    ]);
    expect(cellFaults(','.repeat(1_000_001))[0]).toContain('more than 1000 columns');
    for (const [start, words] of [
      ['PK\u0003\u0004', /Save it as CSV/],
      ['%PDF-1.7', /a PDF/],
      ['<!DOCTYPE html>', /web page/],
      ['MZ\u0090', /a program/],
    ] as const)
      expect(cellFaults(`${start}${csv({})}`)[0]).toMatch(words);
    expect(cellFaults(Uint8Array.from([0x1f, 0x8b, 8, 0]))[0]).toContain('gzip');
  });
});

describe('cells', () => {
  const of = (column: Column, text: string) => cellFaults(csv({}, { [column]: text }));

  it.each(['NaN', 'Infinity', '-inf', '1.#IND', '#N/A', '#REF!', '-', 'n/a', 'TBD'])(
    '9: %s for a number',
    (text) => {
      expect(of('x1', text)).toEqual([
        `3 x1: “${text}” is not a number. Write it as 1234.5, with no thousands sign.`,
      ]);
    },
  );

  it('10: numbers that cannot be held, or are out of range in SI', () => {
    expect(of('x1', '1e309')).toEqual(['3 x1: “1e309” is a number that cannot be reckoned with.']);
    expect(of('x1', '1e-400')).toEqual(['3 x1: “1e-400” is a number that cannot be reckoned with.']);
    expect(of('x1', '1e308')[0]).toMatch(/^3 x1: .*beyond any/);
    expect(of('length_km', '9e99')[0]).toMatch(/^3 length_km: .*at most/);
  });

  it.each(['1,234.5', '1 234', '1_000', '0x1F', '+5', '٣', '５', '5.', '.5'])(
    '11: %s is not how a number is written',
    (text) => {
      expect(of('length_km', text)[0]).toMatch(/^3 length_km: .*Write it as 1234\.5/);
    },
  );

  it.each([' 5 ', '1e5', '05', '5.0', '5e-3'])('11: %j is', (text) => {
    expect(of('a_x_m', text === '1e5' ? '1e1' : text)).toEqual([]);
  });

  it('12: empty, nought and minus nought', () => {
    expect(of('length_km', '')).toEqual(['3 length_km: Length is missing. Give it in\u2009km.']);
    expect(of('length_km', '0')[0]).toContain('more than 0');
    expect(of('length_km', '-0')[0]).toContain('more than 0');
    expect(of('nominal_voltage_kv', '0')[0]).toContain('3 nominal_voltage_kv:');
    expect(of('b_x_m', '')).toEqual(['3 b_x_m: Offset is missing. Give it in\u2009m.']);
    expect(of('a_x_m', '-0')).toEqual([]);
  });

  it('13: a negative length or height is a fault, a negative declared value is not', () => {
    expect(of('length_km', '-12')[0]).toContain('more than 0');
    expect(of('a_height_m', '-20')[0]).toContain('more than 0');
    expect(of('r1', '-0.12')).toEqual([]);
    expect(of('b1', '-3')).toEqual([]);
  });

  it('15: units in other spellings', () => {
    for (const unit of ['Ω/km', 'OHM/KM', 'ohm', 'mi'].filter((u) => u !== 'ohm'))
      expect(of('impedance_unit', unit)[0]).toMatch(/^3 impedance_unit: .*must be one of/);
    expect(of('impedance_unit', ' ohm/km ')).toEqual([]);
    expect(of('impedance_unit', '')).toEqual(['3 impedance_unit: Unit is missing.']);
    const pu = readCsvFile(csv({ impedance_unit: 'pu' }));
    expect(pu.faults).toEqual([]);
    expect(pu.notices.filter((n) => n.code === 'base-default')).toHaveLength(2);
  });

  it('17: the same line twice, in other words', () => {
    expect(cellFaults(csv({ name: 'L-12' }, {}, { name: 'L-12' }))).toEqual([
      '4 name: Rows 2 and 4 are of the same line “L-12”; the rows of a line stand together.',
    ]);
    expect(cellFaults(csv({ name: 'L-12' }, { name: 'l-12' }))[0]).toContain('have the same name');
    expect(cellFaults(csv({ name: 'L-12 ' }))).toEqual([]);
    expect(cellFaults(csv({ name: 'L-12\u200b' }))[0]).toMatch(/^2 name: .*not allowed/);
  });

  it('18 and 19: names that look like numbers, dates or formulas stay as they are', () => {
    const names = ['00012', '1E5', '3-4', '=A1', '=HYPERLINK("http://x","ok")', '@SUM(1)', '＝1'];
    const file = readCsvFile(csv(...names.map((name) => ({ name }))));
    expect(file.faults).toEqual([]);
    expect(file.filing?.lines.map((l) => l.name)).toEqual(names);
  });

  it('20: characters that no name has', () => {
    for (const [text, shown] of [
      ['A\u0000B', 'A\\u0000B'],
      ['A\u202eB', 'A\\u202EB'],
      ['A\u0007B', 'A\\u0007B'],
    ] as const)
      expect(of('from', text)[0]).toContain(shown);
    expect(of('from', 'A'.repeat(100_000))[0]).toContain('longer than 120');
  });

  it('25: a day that does not exist', () => {
    const text = csv({})
      .replace('susceptance_unit', 'susceptance_unit,basis_kind,basis_date')
      .replace(/uS\/km$/m, 'uS/km,calculated,2027-02-30');
    expect(cellFaults(text)[0]).toMatch(/^2 basis_date: .*YYYY-MM-DD/);
  });

  it('an unknown conductor comes with the nearest names, a missing phase with its column', () => {
    expect(of('conductor', 'Cardnial')[0]).toMatch(/^3 conductor: .*nearest (is|are) Cardinal/);
    expect(of('conductor', 'Tulip')[0]).toMatch(/^3 conductor: .*cannot be chosen/);
    expect(cellFaults(csv({ b_x_m: '', b_height_m: '' }))).toEqual([
      '2 b_x_m: Circuit 1 lacks phase b: give its offset and height.',
    ]);
  });

  it('one bad row leaves the others sound, and every fault is told', () => {
    const file = readCsvFile(
      csv({}, { x1: 'x', frequency_hz: '55', conductor: 'Cardnial' }, {}, { length_km: '' }),
    );
    expect(file.filing).toBeNull();
    expect(file.sound.lines.map((l) => l.name)).toEqual(['Line 1', 'Line 3']);
    expect(file.faults.map((f) => ('row' in f ? [f.row, f.column] : []))).toEqual([
      [3, 'frequency_hz'],
      [3, 'conductor'],
      [3, 'x1'],
      [5, 'length_km'],
    ]);
  });
});

describe('whatever is sent', () => {
  const isAnswered = (data: Uint8Array, name: string) => {
    const file = readFilingFile(data, name, CONTEXT);
    expect(file.filing === null).toBe(file.faults.length > 0);
    for (const f of file.faults) {
      expect(f.message.length).toBeGreaterThan(5);
      if (name.endsWith('.csv')) expect(f).toHaveProperty('row');
    }
  };

  it('is taken or answered with listed faults: any bytes, any text', { timeout: 30_000 }, () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), fc.constantFrom('a.csv', 'a.json'), isAnswered),
      { numRuns: 300 },
    );
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (t) => isAnswered(bytes(t), 'a.csv')),
      { numRuns: 300 },
    );
  });

  it('also any cell of a sound file', { timeout: 30_000 }, () => {
    const cell = fc.oneof(
      fc.string(),
      fc.string({ unit: fc.constantFrom(',', ';', '"', '\n', '\r', '\t', '1', '.', '-', 'e', ' ') }),
    );
    fc.assert(
      fc.property(fc.constantFrom(...COLUMNS), cell, (column, text) => {
        const own = csv({}, { [column]: text });
        isAnswered(bytes(own), 'a.csv');
        isAnswered(bytes(own.replaceAll('"', '')), 'a.csv');
      }),
      { numRuns: 300 },
    );
  });
});
