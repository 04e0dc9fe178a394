import { describe, expect, it } from 'vitest';
import type { Import } from '#shared/contracts/api.generated';
import {
  dialectWords,
  exportBlockedBy,
  readWords,
} from '../../../../src/features/imports/model/dialect-words';

const read = (over: Partial<Import>): Import => ({
  id: 'i',
  applicationId: 'a',
  state: 'staged',
  fileName: 'lines.csv',
  sha256: '',
  format: 'csv',
  dialect: null,
  rowCount: 2,
  lines: [],
  faults: [],
  notices: [],
  createdAt: '',
  importedAt: null,
  ...over,
});
const line = {
  name: 'A',
  lineKey: null,
  lengthKm: 1,
  nominalVoltageKv: 138,
  circuitCount: 1,
  replaces: false,
};

describe('what was read of a file', () => {
  it('says how it is written', () => {
    expect(
      dialectWords({ delimiter: 'semicolon', decimal: 'comma', encoding: 'windows-1252', lineEnds: 'mixed' }),
    ).toBe('Columns parted by semicolons, decimal comma, Windows-1252, mixed line ends');
  });

  it('counts rows, lines and places to look at', () => {
    expect(readWords(read({ lines: [line] }))).toBe('2 rows read: 1 line can be taken.');
    const fault = { row: 2, column: 'r1', value: 'x', expected: 'a number', message: 'm' };
    expect(readWords(read({ lines: [line, line], faults: [fault] }))).toBe(
      '2 rows read: 2 lines can be taken, 1 place to look at.',
    );
    expect(readWords(read({ format: 'json', lines: [line] }))).toBe('1 line can be taken.');
  });
});

describe('the draft as a file', () => {
  it('waits for the lines that are not complete, and names them', () => {
    expect(exportBlockedBy([])).toBeNull();
    expect(exportBlockedBy(['L2'])).toBe('The draft can be saved as a file once L2 is complete.');
    expect(exportBlockedBy(['L2', 'L3', 'L7'])).toMatch(/once L2, L3 and L7 are complete/);
    expect(exportBlockedBy(['L1', 'L2', 'L3', 'L4'])).toMatch(/once its 4 incomplete lines are complete/);
  });
});
