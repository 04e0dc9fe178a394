import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { filingHash } from '#server/files/content-hash';
import { readFilingFile } from '#server/files/read-filing-file';
import type { FileFormat } from '#server/files/read-filing-file';
import { csvFile, jsonFile } from '#server/files/write-filing-file';
import type { NormalisedFiling } from '#shared/filing/types';
import { filingText } from '../../shared/filing/arbitrary-filing';
import { CONTEXT, EXAMPLE_TEXT } from '../../shared/filing/sample';

const bytes = (text: string) => new TextEncoder().encode(text);

function read(data: Uint8Array, format: FileFormat): NormalisedFiling {
  const file = readFilingFile(data, '-', { ...CONTEXT, format });
  if (!file.filing) throw new Error(JSON.stringify(file.faults, null, 1));
  return file.filing;
}

function written(filing: NormalisedFiling, format: FileFormat): Uint8Array {
  const sheets = filing.lines.map((l) => l.sheet);
  const file = format === 'csv' ? csvFile(sheets) : jsonFile(sheets);
  if (!file.ok) throw new Error(JSON.stringify(file.reasons));
  return file.bytes;
}

/** Digits of every declared value: what the tolerance of half a last digit is taken from. */
const declaredDigits = (filing: NormalisedFiling) =>
  filing.lines.map((l) =>
    l.circuits.map((c) => Object.values(c.declared).map((v) => [v.written, v.halfDigitPerKm])),
  );

describe('a file written and read again', () => {
  it.each(['csv', 'json'] as const)('the format’s own example, as %s: same content hash', (format) => {
    const filing = read(bytes(EXAMPLE_TEXT), 'json');
    expect(filingHash(read(written(filing, format), format))).toBe(filingHash(filing));
  });

  it('any filing, as JSON and as CSV: same content hash, same digits', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(filingText, (text) => {
        const filing = read(bytes(text), 'json');
        for (const format of ['json', 'csv'] as const) {
          const again = read(written(filing, format), format);
          expect(filingHash(again)).toBe(filingHash(filing));
          expect(declaredDigits(again)).toEqual(declaredDigits(filing));
        }
      }),
      { numRuns: 150 },
    );
  });

  it('sees a difference when there is one', () => {
    const filing = read(bytes(EXAMPLE_TEXT), 'json');
    const csv = new TextDecoder().decode(written(filing, 'csv'));
    expect(csv).toContain('0.6135');
    const other = read(bytes(csv.replace('0.6135', '0.6136')), 'csv');
    expect(filingHash(other)).not.toBe(filingHash(filing));
  });
});
