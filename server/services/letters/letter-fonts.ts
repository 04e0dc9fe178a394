import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { unpackWoff } from './unpack-woff';

type Weight = 'regular' | 'strong';

const require = createRequire(import.meta.url);
const FILES: Readonly<Record<Weight, string>> = {
  regular: '@fontsource/public-sans/files/public-sans-latin-400-normal.woff',
  strong: '@fontsource/public-sans/files/public-sans-latin-600-normal.woff',
};
const EXTENDED: Readonly<Record<Weight, string>> = {
  regular: '@fontsource/public-sans/files/public-sans-latin-ext-400-normal.woff',
  strong: '@fontsource/public-sans/files/public-sans-latin-ext-600-normal.woff',
};

/** The checkout: the nearest folder above that has a package.json, since a bundle lies elsewhere than its source. */
function checkout(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, 'package.json'))) {
    const above = dirname(folder);
    if (above === folder) throw new Error('the project’s own folder is not found');
    folder = above;
  }
  return folder;
}

const files = new Map<string, Buffer>();

function bytesOf(path: string): Buffer {
  const known = files.get(path);
  if (known !== undefined) return known;
  const read = readFileSync(path);
  const bytes = path.endsWith('.woff') ? unpackWoff(read) : read;
  files.set(path, bytes);
  return bytes;
}

interface FontHost {
  registerFont(name: string, source: Buffer): unknown;
  font(name: string): unknown;
}

/** The product's own faces: Public Sans, its extended Latin, and the signs that it lacks (Ω, thin spaces, arrows). */
export function registerFonts(document: FontHost): void {
  for (const weight of ['regular', 'strong'] as const) {
    document.registerFont(weight, bytesOf(require.resolve(FILES[weight])));
    document.registerFont(`${weight}-extended`, bytesOf(require.resolve(EXTENDED[weight])));
  }
  document.registerFont('symbols', bytesOf(join(checkout(), 'src/styles/fonts/counterpoise-symbols.ttf')));
}

/** pdfkit keeps the opened font here; its types do not say so. */
interface OpenedFont {
  _font: { font: { hasGlyphForCodePoint(code: number): boolean } };
}

export interface Run {
  font: string;
  text: string;
}

type Covers = (code: number) => boolean;

const coverage = new WeakMap<FontHost, Map<string, Covers>>();

/** Whether a face has a sign; asking means opening the face, so it is done once a document. */
function coverOf(document: FontHost, face: string): Covers {
  const known = coverage.get(document) ?? new Map<string, Covers>();
  coverage.set(document, known);
  const cover = known.get(face);
  if (cover !== undefined) return cover;
  document.font(face);
  const { font } = (document as unknown as OpenedFont)._font;
  const opened: Covers = (code) => font.hasGlyphForCodePoint(code);
  known.set(face, opened);
  return opened;
}

/** Splits a text into runs that one face can draw each; a sign that no face has becomes a question mark. */
export function runsOf(document: FontHost, text: string, weight: Weight): Run[] {
  const faces = [weight, 'symbols', `${weight}-extended`];
  const runs: Run[] = [];
  for (const sign of text.replace(/[\t\r]/g, ' ')) {
    const code = sign.codePointAt(0) ?? 0;
    const font = faces.find((face) => coverOf(document, face)(code));
    const last = runs.at(-1);
    const drawn = font === undefined ? '?' : sign;
    if (last !== undefined && last.font === (font ?? weight)) last.text += drawn;
    else runs.push({ font: font ?? weight, text: drawn });
  }
  return runs;
}
