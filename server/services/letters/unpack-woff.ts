import { inflateSync } from 'node:zlib';

const WOFF_HEADER = 44;
const WOFF_ENTRY = 20;
const SFNT_HEADER = 12;
const SFNT_ENTRY = 16;

interface Table {
  tag: Buffer;
  checksum: number;
  bytes: Buffer;
}

function tablesOf(woff: Buffer): Table[] {
  const count = woff.readUInt16BE(12);
  return Array.from({ length: count }, (_, i) => {
    const at = WOFF_HEADER + i * WOFF_ENTRY;
    const offset = woff.readUInt32BE(at + 4);
    const packed = woff.subarray(offset, offset + woff.readUInt32BE(at + 8));
    const length = woff.readUInt32BE(at + 12);
    return {
      tag: woff.subarray(at, at + 4),
      checksum: woff.readUInt32BE(at + 16),
      bytes: packed.length < length ? inflateSync(packed) : packed,
    };
  });
}

/**
 * A WOFF 1 font as the plain font that it packs (W3C, WOFF File Format 1.0). The PDF maker reads WOFF too, but inflates
 * it in JavaScript for every document, which takes most of a letter's time.
 */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('the font is not a WOFF file');
  const tables = tablesOf(woff);
  const header = Buffer.alloc(SFNT_HEADER + tables.length * SFNT_ENTRY);
  woff.copy(header, 0, 4, 8);
  const power = Math.floor(Math.log2(tables.length));
  header.writeUInt16BE(tables.length, 4);
  header.writeUInt16BE(16 * 2 ** power, 6);
  header.writeUInt16BE(power, 8);
  header.writeUInt16BE(16 * (tables.length - 2 ** power), 10);
  const parts: Buffer[] = [header];
  let offset = header.length;
  tables.forEach(({ tag, checksum, bytes }, i) => {
    const at = SFNT_HEADER + i * SFNT_ENTRY;
    tag.copy(header, at);
    header.writeUInt32BE(checksum, at + 4);
    header.writeUInt32BE(offset, at + 8);
    header.writeUInt32BE(bytes.length, at + 12);
    const padding = Buffer.alloc((4 - (bytes.length % 4)) % 4);
    parts.push(bytes, padding);
    offset += bytes.length + padding.length;
  });
  return Buffer.concat(parts);
}
