/**
 * Reads JSON text strictly and keeps what `JSON.parse` loses: digits as they were written (`0.40`), keys that occur
 * twice, numbers that no double holds, and the place of whatever is wrong. One fault does not hide the next where
 * reading can go on.
 */
import { inWords, MAX_FAULTS, pointerToken, shown } from './faults';
import type { PointerFault } from './faults';
import { FORBIDDEN_KEY, forbiddenKey, MAX_DEPTH, notFinite, tooDeep } from './plain-data';

/** What came of a JSON text. */
export interface JsonText {
  /** The value; undefined where the text could not be read to its end. */
  value: unknown;
  /** Pointer → digits, where they are not the number's shortest form. */
  written: Record<string, string>;
  /** None when the text is without fault. Numbers that cannot be held stand as null or 0 in the value. */
  faults: PointerFault[];
}

/** Entries of one list and names of one object: what is longer is no filing, and reading it would only take time. */
const MOST = { entries: 50_000, names: 1000 };

/** Thrown inside this file only: the text cannot be read past this place. */
class Stop {
  constructor(
    readonly message: string,
    readonly at: number,
  ) {}
}

/** A number after RFC 8259, and whatever stands where a value should: words, numbers in other notations. */
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const WORD = /[+-]?[\w.#]+/y;
/** A map and not an object: a text may hold any word, also one that objects inherit. */
const LITERALS = new Map<string, boolean | null>([
  ['true', true],
  ['false', false],
  ['null', null],
]);
const ESCAPES: Readonly<Record<string, string>> = {
  '"': '"',
  '\\': '\\',
  '/': '/',
  b: '\b',
  f: '\f',
  n: '\n',
  r: '\r',
  t: '\t',
};

/** One pass over the text, with the path to where it is. */
class Reader {
  private at = 0;
  private lineStarts: number[] | undefined;
  private readonly path: (string | number)[] = [];
  readonly faults: PointerFault[] = [];
  readonly written: Record<string, string> = {};

  constructor(private readonly text: string) {}

  /** The value of the whole text. */
  whole(): unknown {
    this.blanks();
    if (this.at >= this.text.length) throw new Stop('There is nothing in it.', this.at);
    const value = this.value();
    this.blanks();
    if (this.at < this.text.length) throw new Stop('Something follows after the end.', this.at);
    return value;
  }

  /** JSON Pointer of where reading stands. */
  pointer(): string {
    return this.path.map((p) => `/${pointerToken(p)}`).join('');
  }

  private fault(f: PointerFault): void {
    if (this.faults.length < MAX_FAULTS) this.faults.push(f);
  }

  private blanks(): void {
    for (;;) {
      const c = this.text.charCodeAt(this.at);
      if (c !== 0x20 && c !== 0x0a && c !== 0x0d && c !== 0x09) return;
      this.at += 1;
    }
  }

  private value(): unknown {
    const c = this.text[this.at];
    if (c === '{') return this.nested(() => this.object());
    if (c === '[') return this.nested(() => this.list());
    return c === '"' ? this.string() : this.word();
  }

  /** Reads what nests, unless it nests too deeply: the call stack is the reader's own. */
  private nested<T>(read: () => T): T {
    if (this.path.length >= MAX_DEPTH) {
      this.fault(tooDeep(this.pointer()));
      throw new Stop('It is nested too deeply.', this.at);
    }
    return read();
  }

  private object(): Record<string, unknown> {
    const out: Record<string, unknown> = {};
    let count = 0;
    this.at += 1;
    this.blanks();
    if (this.text[this.at] === '}') {
      this.at += 1;
      return out;
    }
    do {
      this.blanks();
      if (this.text[this.at] !== '"') throw new Stop(this.instead('a name in double quotes'), this.at);
      const key = this.string();
      this.blanks();
      if (this.text[this.at] !== ':') throw new Stop(this.instead('a colon'), this.at);
      this.at += 1;
      this.blanks();
      this.path.push(key);
      const value = this.value();
      this.keep(out, key, value);
      this.path.pop();
      count += 1;
      if (count > MOST.names) throw new Stop(`An object has more than ${MOST.names} names.`, this.at);
    } while (this.more('}'));
    return out;
  }

  /** Puts a member into its object; a name that was there before, or may not be there, is a fault. */
  private keep(out: Record<string, unknown>, key: string, value: unknown): void {
    if (key === FORBIDDEN_KEY) this.fault(forbiddenKey(this.pointer()));
    else if (Object.hasOwn(out, key))
      this.fault({
        pointer: this.pointer(),
        value: shown(value),
        expected: 'each name once',
        message: `The name ${inWords(key)} occurs twice here (${this.place(this.at)}).`,
      });
    else out[key] = value;
  }

  private list(): unknown[] {
    const out: unknown[] = [];
    this.at += 1;
    this.blanks();
    if (this.text[this.at] === ']') {
      this.at += 1;
      return out;
    }
    do {
      this.blanks();
      this.path.push(out.length);
      out.push(this.value());
      this.path.pop();
      if (out.length > MOST.entries) throw new Stop(`A list has more than ${MOST.entries} entries.`, this.at);
    } while (this.more(']'));
    return out;
  }

  /** After an entry: whether another follows. */
  private more(end: string): boolean {
    this.blanks();
    const c = this.text[this.at];
    if (c !== ',' && c !== end) throw new Stop(this.instead(`a comma or ${end}`), this.at);
    this.at += 1;
    if (c === end) return false;
    this.blanks();
    if (this.text[this.at] === end) throw new Stop(`A comma stands before ${end}: take it out.`, this.at);
    return true;
  }

  private string(): string {
    const start = this.at + 1;
    let out = '';
    let from = start;
    for (let i = start; i < this.text.length; i++) {
      const c = this.text.charCodeAt(i);
      if (c === 0x22) {
        this.at = i + 1;
        return out + this.text.slice(from, i);
      }
      if (c < 0x20) throw new Stop('A control character or a line end stands inside a text.', i);
      if (c !== 0x5c) continue;
      const [char, next] = this.escape(i);
      out += this.text.slice(from, i) + char;
      from = next;
      i = next - 1;
    }
    throw new Stop('A text begins here and does not end.', start - 1);
  }

  /** The character that the escape at `i` stands for, and where the text goes on. */
  private escape(i: number): [string, number] {
    const c = this.text[i + 1] ?? '';
    if (c === 'u') {
      const hex = this.text.slice(i + 2, i + 6);
      if (!/^[0-9a-fA-F]{4}$/.test(hex)) throw new Stop('After \\u four hexadecimal digits are wanted.', i);
      return [String.fromCharCode(parseInt(hex, 16)), i + 6];
    }
    const char = ESCAPES[c];
    if (char === undefined) throw new Stop('This backslash begins no escape that JSON has.', i);
    return [char, i + 2];
  }

  /** A number, true, false or null. NaN and Infinity are told and read as null, so that reading can go on. */
  private word(): unknown {
    WORD.lastIndex = this.at;
    const word = WORD.exec(this.text)?.[0] ?? '';
    NUMBER.lastIndex = this.at;
    const number = NUMBER.exec(this.text)?.[0] ?? '';
    if (number !== '' && number.length >= word.length) {
      this.at += number.length;
      return this.number(number);
    }
    const literal = LITERALS.get(word);
    if (literal === undefined && !/^[+-]?(nan|inf(inity)?)$/i.test(word))
      throw new Stop(this.instead('a value', word || undefined), this.at);
    this.at += word.length;
    if (literal !== undefined) return literal;
    this.fault(notFinite(this.pointer(), word));
    return null;
  }

  /** A number, its digits kept where they are not its shortest form. */
  private number(digits: string): number {
    const value = Number(digits);
    const vanished = value === 0 && /[1-9]/.test(digits.replace(/e.*$/i, ''));
    if (!Number.isFinite(value) || vanished) this.fault(notFinite(this.pointer(), digits));
    else if (String(value) !== digits) this.written[this.pointer()] = digits;
    return Number.isFinite(value) ? value : 0;
  }

  /** What is wanted and what is there, with a hint for the slips that are seen most. */
  private instead(wanted: string, found = this.text[this.at] ?? ''): string {
    const hint = found.startsWith('/')
      ? ' JSON has no comments.'
      : found.startsWith("'")
        ? ' Use double quotes.'
        : '';
    const isNumber = /^[+-]?[\d.]/.test(found) ? ' Write numbers as 1234.5.' : '';
    return `Here ${wanted} is wanted, ${found === '' ? 'and the text ends' : `and ${inWords(found)} is there`}.${hint}${isNumber}`;
  }

  /** Line and column of a place, both from 1. */
  place(at: number): string {
    // Counted once: a text full of faults would otherwise be walked for each of them.
    this.lineStarts ??= [0, ...Array.from(this.text.matchAll(/\n/g), (m) => m.index + 1)];
    let line = this.lineStarts.findIndex((start) => start > at);
    if (line < 0) line = this.lineStarts.length;
    return `line ${line}, column ${at - (this.lineStarts[line - 1] ?? 0) + 1}`;
  }
}

/**
 * Reads a JSON text.
 * @param text the text, without a byte order mark
 * @returns the value with the digits as written, and every fault that reading could reach
 */
export function readJsonText(text: string): JsonText {
  const reader = new Reader(text);
  const { faults, written } = reader;
  try {
    return { value: reader.whole(), written, faults };
  } catch (e) {
    if (!(e instanceof Stop)) throw e;
    const message = `Not valid JSON at ${reader.place(e.at)}: ${e.message}`;
    // The nesting fault has said it already, with its pointer.
    if (!faults.some((f) => f.pointer === reader.pointer()))
      faults.push({ pointer: reader.pointer(), value: null, expected: 'JSON', message });
    return { value: undefined, written, faults };
  }
}
