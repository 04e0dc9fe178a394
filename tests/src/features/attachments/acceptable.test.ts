import { describe, expect, it } from 'vitest';
import { LARGEST_BYTES, whyNot } from '../../../../src/features/attachments/model/acceptable';
import { fileSize } from '../../../../src/lib/file-size';

const file = (size: number, type: string) => ({ name: 'sheet.pdf', size, type });

describe('a file to attach', () => {
  it.each(['application/pdf', 'image/png', 'image/jpeg'])('may be %s', (type) => {
    expect(whyNot(file(LARGEST_BYTES, type))).toBeNull();
  });

  it('is refused with the reason before it is sent', () => {
    expect(whyNot(file(LARGEST_BYTES + 1, 'application/pdf'))).toMatch(/up to/);
    expect(whyNot(file(0, 'application/pdf'))).toMatch(/empty/);
    expect(whyNot(file(10, 'text/html'))).toMatch(/no PDF, PNG or JPEG/);
  });

  it.each([
    [999, '999 bytes'],
    [12_345, '12.3 kB'],
    [4_100_000, '4.10 MB'],
  ])('of %i bytes has %s', (size, words) => {
    expect(fileSize(size).replace(/\u2009/g, ' ')).toBe(words);
  });
});
