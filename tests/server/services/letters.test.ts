import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { inflateSync } from 'node:zlib';
import PDFDocument from 'pdfkit';
import { describe, expect, it } from 'vitest';
import { registerFonts, runsOf } from '#server/services/letters/letter-fonts';
import { caseMail } from '#server/services/letters/mail-texts';
import { renderLetter, type LetterContent } from '#server/services/letters/render-letter';
import { unpackWoff } from '#server/services/letters/unpack-woff';
import { CAUTION } from '#shared/workflow/caution';

const content = (changes: Partial<LetterContent> = {}): LetterContent => ({
  owner: 'Northmoor Grid',
  applicant: 'Fellgate Renewables',
  contactName: 'P. Sandgate',
  date: '9 Mar 2027',
  heading: 'One discrepancy to answer by 23 Mar 2027',
  intro: ['We reviewed revision B.'],
  items: [
    {
      label: 'D-2',
      grade: 'must-answer',
      title: 'X1 of L1',
      body: ['X1 is 61 % above: 0.613 Ω/km declared.'],
      ask: 'the unit',
    },
  ],
  closingHeading: 'How to answer',
  closing: ['File revision C.'],
  signedBy: 'M. Thornholt',
  createdAt: new Date('2027-03-09T10:00:00Z'),
  block: {
    application: 'Fellgate Wind, 480 MW at Sarn',
    subject: 'Discrepancy letter',
    number: '27-0418',
    revision: 'B',
    voltages: '345 kV',
    filed: '9 Feb 2027',
    reviewer: 'M. Thornholt',
    state: 'Returned',
  },
  ...changes,
});
const pages = (pdf: Buffer) => pdf.toString('latin1').match(/\/Type \/Page\b/g)?.length ?? 0;

describe('a letter', () => {
  it('is an A4 page with its own faces embedded', async () => {
    const text = (await renderLetter(content())).toString('latin1');
    expect(text.startsWith('%PDF-')).toBe(true);
    expect(pages(Buffer.from(text, 'latin1'))).toBe(1);
    expect(text).toContain('/MediaBox [0 0 595.28 841.89]');
    expect(text.match(/\/FontFile2/g)?.length).toBeGreaterThanOrEqual(3);
    expect(text).not.toContain('Helvetica');
  });

  it('goes on over as many pages as it needs', async () => {
    const [item] = content().items;
    if (item === undefined) throw new Error('the sample has an item');
    const many = Array.from({ length: 30 }, (_, i) => ({ ...item, label: `D-${i + 1}` }));
    expect(pages(await renderLetter(content({ items: many })))).toBeGreaterThan(2);
    const wide = { ...item, body: ['W'.repeat(300)] };
    expect(pages(await renderLetter(content({ items: [wide] })))).toBe(1);
  });

  it('is drawn with a face for every sign, and shows what none has', () => {
    const document = new PDFDocument();
    registerFonts(document);
    expect(runsOf(document, '5 Ω/km', 'regular').map((run) => run.font)).toEqual([
      'regular',
      'symbols',
      'regular',
    ]);
    expect(runsOf(document, 'Řeka', 'strong').map((run) => run.font)).toEqual(['strong-extended', 'strong']);
    expect(runsOf(document, 'ab', 'regular')).toEqual([{ font: 'regular', text: 'ab' }]);
    expect(runsOf(document, '漢', 'regular').map((run) => run.text)).toEqual(['?']);
    document.end();
  });
});

describe('unpacking a font', () => {
  const require = createRequire(import.meta.url);
  const woff = readFileSync(
    require.resolve('@fontsource/public-sans/files/public-sans-latin-400-normal.woff'),
  );

  it('gives each table its own bytes', () => {
    const plain = unpackWoff(woff);
    const count = plain.readUInt16BE(4);
    expect(count).toBe(woff.readUInt16BE(12));
    for (let i = 0; i < count; i++) {
      const entry = 12 + i * 16;
      const [offset, length] = [plain.readUInt32BE(entry + 8), plain.readUInt32BE(entry + 12)];
      const packedAt = 44 + i * 20;
      const packed = woff
        .subarray(woff.readUInt32BE(packedAt + 4))
        .subarray(0, woff.readUInt32BE(packedAt + 8));
      const bytes = packed.length < length ? inflateSync(packed) : packed;
      expect(plain.subarray(offset, offset + length).equals(bytes)).toBe(true);
      expect(offset % 4).toBe(0);
    }
  });

  it('refuses another file', () => {
    expect(() => unpackWoff(Buffer.from('%PDF-1.7 and more'))).toThrow(/not a WOFF/);
  });
});

describe('a mail about a case', () => {
  it('names the case, links to the public address and carries the caution', () => {
    const text = caseMail({ number: '27-0418', title: 'Fellgate Wind' }, new URL('https://grid.example/'), [
      'It is filed.',
    ]);
    expect(text).toContain('Fellgate Wind (27-0418)');
    expect(text).toContain('https://grid.example/applications/27-0418');
    expect(text).toContain(CAUTION);
  });
});
