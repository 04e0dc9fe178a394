import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readJsonText } from '#shared/contracts/json-text';

const pointers = (text: string) => readJsonText(text).faults.map((f) => f.pointer);
const messages = (text: string) =>
  readJsonText(text)
    .faults.map((f) => f.message)
    .join(' ');

describe('JSON read strictly', () => {
  it('gives what JSON.parse gives, for any JSON', { timeout: 30_000 }, () => {
    fc.assert(
      fc.property(fc.json({ maxDepth: 6 }), (text) => {
        fc.pre(!text.includes('__proto__'));
        const read = readJsonText(text);
        expect(read.faults).toEqual([]);
        expect(read.value).toEqual(JSON.parse(text));
      }),
    );
  });

  it('never throws, and refuses what JSON.parse refuses', { timeout: 30_000 }, () => {
    const text = fc.oneof(
      fc.string(),
      fc.string({
        unit: fc.constantFrom(
          '{',
          '}',
          '[',
          ']',
          '"',
          ':',
          ',',
          '1',
          '-',
          '.',
          'e',
          ' ',
          '\\',
          'u',
          'null',
          'NaN',
        ),
      }),
    );
    fc.assert(
      fc.property(text, (t) => {
        let parses = true;
        try {
          JSON.parse(t);
        } catch {
          parses = false;
        }
        const read = readJsonText(t);
        if (!parses) expect(read.faults.length).toBeGreaterThan(0);
      }),
      { numRuns: 1000 },
    );
  });

  it('keeps digits that a number loses', () => {
    const read = readJsonText('{"a": 0.40, "b": [1.0, 2, 1e3, 0.5], "c/d": {"e~f": 4.0}}');
    expect(read.written).toEqual({ '/a': '0.40', '/b/0': '1.0', '/b/2': '1e3', '/c~1d/e~0f': '4.0' });
  });

  it('tells every key that occurs twice', () => {
    const read = readJsonText('{"a": 1, "b": {"c": 1, "c": 2}, "a": 3}');
    expect(read.faults.map((f) => f.pointer)).toEqual(['/b/c', '/a']);
    expect(messages('{"a":1,\n"a":2}')).toContain('line 2');
  });

  it('tells every number that cannot be held, and reads on', () => {
    const text = '{"a": NaN, "b": -Infinity, "c": 1e999, "d": 1e-999, "e": [Infinity, 1], "f": "ok"}';
    expect(pointers(text)).toEqual(['/a', '/b', '/c', '/d', '/e/0']);
    expect(readJsonText(text).value).toMatchObject({ f: 'ok', e: [null, 1] });
  });

  it('refuses the key that would be a prototype, and drops it', () => {
    const read = readJsonText('{"__proto__": {"polluted": true}, "a": 1}');
    expect(read.faults.map((f) => f.pointer)).toEqual(['/__proto__']);
    expect(read.value).toEqual({ a: 1 });
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
    expect(Object.getPrototypeOf(read.value)).toBe(Object.prototype);
  });

  it.each([
    ['', 'nothing in it'],
    ['{"a": 1,}', 'comma stands before }'],
    ['[1, 2,]', 'comma stands before ]'],
    ["{'a': 1}", 'double quotes'],
    ['{"a": 1 // one\n}', 'no comments'],
    ['// one\n{}', 'no comments'],
    ['{"a": +5}', 'Write numbers as'],
    ['{"a": .5}', 'Write numbers as'],
    ['{"a": 5.}', 'Write numbers as'],
    ['{"a": 012}', 'Write numbers as'],
    ['{"a": tru}', 'a value is wanted'],
    ['{"a" 1}', 'a colon is wanted'],
    ['{"a": 1} x', 'follows after the end'],
    ['{"a": "b', 'does not end'],
    ['{"a": "b\nc"}', 'control character'],
    ['{"a": "\\x41"}', 'no escape that JSON has'],
    ['{"a": "\\u12G4"}', 'hexadecimal'],
    ['{"a": 1', 'the text ends'],
  ])('says of %j that %s', (text, words) => {
    const read = readJsonText(text);
    expect(read.value).toBeUndefined();
    expect(read.faults.at(-1)?.message).toMatch(/^Not valid JSON at line \d+, column \d+: /);
    expect(messages(text)).toContain(words);
  });

  it('names line, column and pointer of where it stopped', () => {
    const [fault] = readJsonText('{\n  "lines": [\n    {"name": oops}\n  ]\n}').faults;
    expect(fault?.pointer).toBe('/lines/0/name');
    expect(fault?.message).toContain('line 3, column 14');
  });

  it('stops at nesting that no filing has, without running out of stack', () => {
    const [fault] = readJsonText('['.repeat(100_000)).faults;
    expect(fault?.message).toContain('nested more than 32');
    expect(pointers('{"a":'.repeat(33) + '1' + '}'.repeat(33))).toHaveLength(1);
    expect(pointers('{"a":'.repeat(31) + '1' + '}'.repeat(31))).toEqual([]);
  });
});
