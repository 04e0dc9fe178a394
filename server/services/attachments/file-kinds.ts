/** Files that may be attached: the ending, the declared type and the first bytes have to say the same. */
interface FileKind {
  endings: readonly string[];
  mediaType: string;
  begins: readonly number[];
}

const KINDS: readonly FileKind[] = [
  { endings: ['.pdf'], mediaType: 'application/pdf', begins: [0x25, 0x50, 0x44, 0x46, 0x2d] },
  { endings: ['.png'], mediaType: 'image/png', begins: [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a] },
  { endings: ['.jpg', '.jpeg'], mediaType: 'image/jpeg', begins: [0xff, 0xd8, 0xff] },
];

/** 20 MB, of a thousand kB each, as sizes are shown. */
export const MAX_ATTACHMENT_BYTES = 20_000_000;
export const TAKEN_FILES = 'a PDF, PNG or JPEG';

/** The media type of a file, or null when the three do not agree on one that is taken. */
export function mediaTypeOf(name: string, declared: string, bytes: Uint8Array): string | null {
  const lower = name.toLowerCase();
  const kind = KINDS.find(({ endings }) => endings.some((ending) => lower.endsWith(ending)));
  if (kind === undefined || declared.split(';')[0]?.trim() !== kind.mediaType) return null;
  return kind.begins.every((byte, i) => bytes[i] === byte) ? kind.mediaType : null;
}

const LONGEST_NAME = 200;

/** A file's own name without folders, control signs or direction marks, and not longer than is kept. */
export function safeFileName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? '';
  const plain = last.replace(/[\p{Cc}\p{Cf}]/gu, '').trim();
  if (plain.length <= LONGEST_NAME) return plain === '' ? 'file' : plain;
  const ending = /\.[a-zA-Z0-9]{1,5}$/.exec(plain)?.[0] ?? '';
  const start = plain.slice(0, LONGEST_NAME - ending.length);
  // a cut through a character would leave half of it
  return `${start.replace(/\p{Cs}$/u, '')}${ending}`;
}
