/** Bytes of an uploaded file as text, or a sentence on what the file is instead. */

export type Encoding = 'utf-8' | 'windows-1252';

export type Decoded = { ok: true; text: string; encoding: Encoding } | { ok: false; message: string };

/** Beginnings of files that people send under another name. */
const SIGNATURES: readonly (readonly [bytes: string, what: string, mend: string])[] = [
  ['PK\u0003\u0004', 'a spreadsheet or another zip file', 'Save it as CSV.'],
  ['\u00d0\u00cf\u0011\u00e0', 'an old spreadsheet or document', 'Save it as CSV.'],
  ['%PDF', 'a PDF', 'Send the data as CSV or JSON.'],
  ['\u001f\u008b', 'a gzip file', 'Unpack it first.'],
  ['MZ', 'a program', 'Send the data as CSV or JSON.'],
  ['\u007fELF', 'a program', 'Send the data as CSV or JSON.'],
  ['\u0089PNG', 'a picture', 'Send the data as CSV or JSON.'],
  ['\u00ff\u00d8\u00ff', 'a picture', 'Send the data as CSV or JSON.'],
];

const begins = (bytes: Uint8Array, signature: string) =>
  [...signature].every((c, i) => bytes[i] === c.charCodeAt(0));

function isUtf16(bytes: Uint8Array): boolean {
  if (begins(bytes, '\u00ff\u00fe') || begins(bytes, '\u00fe\u00ff')) return true;
  const zeros = bytes.subarray(0, 200).filter((b) => b === 0).length;
  return zeros > 20;
}

function utf8(bytes: Uint8Array): string | null {
  try {
    // The decoder takes a byte order mark off by itself.
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

/** What the bytes 0x80 to 0x9F are in Windows-1252; the five that it leaves free stay control characters. */
const C1 =
  '\u20ac\u0081\u201a\u0192\u201e\u2026\u2020\u2021\u02c6\u2030\u0160\u2039\u0152\u008d\u017d\u008f' +
  '\u0090\u2018\u2019\u201c\u201d\u2022\u2013\u2014\u02dc\u2122\u0161\u203a\u0153\u009d\u017e\u0178';

/** Node 20's own decoder of that name reads Latin-1, which has control characters in that place. */
function windows1252(bytes: Uint8Array): string {
  const latin1 = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString('latin1');
  return latin1.replace(/[\u0080-\u009f]/g, (c) => C1[c.charCodeAt(0) - 0x80] ?? c);
}

/**
 * UTF-8 with or without a byte order mark, else Windows-1252, in which every byte has a meaning.
 * @param told the encoding, when somebody said it
 * @returns the text; or what the file seems to be, as a sentence
 */
export function decodeText(bytes: Uint8Array, told?: Encoding): Decoded {
  const other = SIGNATURES.find(([signature]) => begins(bytes, signature));
  if (other) return { ok: false, message: `This is ${other[1]}, whatever its name says. ${other[2]}` };
  if (isUtf16(bytes)) return { ok: false, message: 'The file is UTF-16. Save it as UTF-8.' };
  const text = told === 'windows-1252' ? null : utf8(bytes);
  if (text === null && told === 'utf-8') return { ok: false, message: 'The file is not UTF-8.' };
  const decoded: Decoded =
    text === null
      ? { ok: true, text: windows1252(bytes), encoding: 'windows-1252' }
      : { ok: true, text, encoding: 'utf-8' };
  if (/^\s*<(!doctype|html|\?xml)/i.test(decoded.text.slice(0, 200)))
    return {
      ok: false,
      message: 'This is a web page or XML, whatever its name says. Send the data as CSV or JSON.',
    };
  return decoded;
}
