import { describe, expect, it } from 'vitest';
import { mediaTypeOf, safeFileName } from '#server/services/attachments/file-kinds';
import { changeWords, lineChange } from '#server/services/cases/revision-changes';
import { valueAt, writtenDigits } from '#server/services/drafts/read-draft';
import { findingName } from '#server/services/findings/finding-names';
import { differences } from '#server/services/reads/differences';
import { eventSentence } from '#server/services/reads/event-sentences';
import { decodeCursor, encodeCursor, likePattern } from '#server/repositories/paging';
import { findingRows } from '#server/services/filing/run-rows';
import type { FiledLine } from '#server/repositories/revision.repository';
import type { CheckReport, Finding } from '#shared/checks/types';

describe('files', () => {
  it('are what ending, declared type and first bytes say together', () => {
    const pdf = Buffer.from('%PDF-1.4');
    expect(mediaTypeOf('a.PDF', 'application/pdf; charset=x', pdf)).toBe('application/pdf');
    expect(mediaTypeOf('a.pdf', 'text/plain', pdf)).toBeNull();
    expect(mediaTypeOf('a.txt', 'application/pdf', pdf)).toBeNull();
    expect(mediaTypeOf('a.pdf', 'application/pdf', Buffer.from('%PDX-1.4'))).toBeNull();
  });

  it('keep a plain name', () => {
    expect(safeFileName('C:\\sheets\\tower.pdf')).toBe('tower.pdf');
    expect(safeFileName('a\u0000b\u202Ec.pdf')).toBe('abc.pdf');
    expect(safeFileName('///')).toBe('file');
    const long = safeFileName(`${'x'.repeat(400)}.jpeg`);
    expect(long).toHaveLength(200);
    expect(long.endsWith('.jpeg')).toBe(true);
  });
});

const line = (lineKey: string, lineHash: string): FiledLine => ({
  lineKey,
  lineHash,
  ordinal: 1,
  name: lineKey,
  nominalVoltageKv: 345,
  frequencyHz: 60,
  lengthKm: 1,
  body: {},
});

describe('what changed', () => {
  const before = [line('L1', 'a'), line('L2', 'b'), line('L3', 'c')];
  it('is said in words', () => {
    expect(changeWords(null, [line('L1', 'a')])).toBe('first filing, one line');
    expect(changeWords(null, before)).toBe('first filing, 3 lines');
    expect(changeWords(before, before)).toBe('no line changed');
    const after = [line('L1', 'x'), line('L2', 'y'), line('L4', 'd')];
    expect(changeWords(before, after)).toBe('L1 and L2 changed, L4 added, L3 removed');
    const many = Array.from({ length: 8 }, (_, i) => line(`L${i + 10}`, 'n'));
    expect(changeWords(before, [...before, ...many])).toBe('L10, L11, L12, L13, L14 and 3 more added');
  });
  it('is known of each line', () => {
    expect(lineChange(null, line('L1', 'a'))).toBe('first');
    expect(lineChange(before, line('L1', 'a'))).toBe('same');
    expect(lineChange(before, line('L1', 'z'))).toBe('changed');
    expect(lineChange(before, line('L9', 'z'))).toBe('new');
  });
  it('is found field by field, with pointers', () => {
    expect(differences({ a: [1, { 'b/c': 2 }], d: 1 }, { a: [1, { 'b/c': 3 }], e: null }).changes).toEqual([
      { pointer: '/a/1/b~1c', before: 2, after: 3 },
      { pointer: '/d', before: 1, after: null },
      { pointer: '/e', before: null, after: null },
    ]);
    const [wide, other] = [{ ...Array(900).fill(0) }, { ...Array(900).fill(1) }];
    const limited = differences(wide, other);
    expect(limited.limitReached).toBe(true);
    expect(limited.changes).toHaveLength(500);
  });
});

describe('drafts', () => {
  const body = { a: { 'x/y': [0.4] }, text: 'no number' };
  it('find what stands at a pointer, and nothing of the prototype', () => {
    expect(valueAt(body, '/a/x~1y/0')).toBe(0.4);
    expect(valueAt(body, '/a/none')).toBeUndefined();
    expect(valueAt(body, '/__proto__/toString')).toBeUndefined();
  });
  it('keep the digits of numbers that are still those typed', () => {
    const asTyped = {
      '/a/x~1y/0': { text: ' 0.40 ', unit: 'ohm/km' },
      '/text': { text: 'no number' },
      '/gone': { text: '1' },
    };
    expect(writtenDigits(asTyped, body)).toEqual({ '/a/x~1y/0': '0.40' });
    expect(writtenDigits({ '/a/x~1y/0': { text: '0.41' } }, body)).toEqual({});
  });
});

describe('cursors and patterns', () => {
  it('go there and back, and refuse what they did not make', () => {
    for (const cursor of [
      { value: 3.5, id: 'x' },
      { value: 'é', id: 'y' },
    ]) {
      expect(decodeCursor(encodeCursor(cursor))).toEqual(cursor);
    }
    expect(decodeCursor(undefined)).toBeNull();
    expect(() => decodeCursor('e30')).toThrow(/cursor/);
  });
  it('take the text’s own wildcards for themselves', () => {
    expect(likePattern('50%_\\')).toBe('%50\\%\\_\\\\%');
  });
});

describe('sentences', () => {
  it('name findings and events', () => {
    expect(findingName({ parameter: 'x1', code: 'geometry.x1', lineKey: 'L1', circuit: 1 })).toBe('X1 of L1');
    expect(findingName({ parameter: 'x1', code: 'geometry.x1', lineKey: 'L1', circuit: 2 })).toBe(
      'X1 of L1, circuit 2',
    );
    expect(
      findingName({ parameter: null, code: 'drawing.wire-in-ground', lineKey: 'L2', circuit: null }),
    ).toBe('wire in ground of L2');
    expect(eventSentence('application.filed', 'P. Sandgate', { revision: 'B' })).toBe(
      'P. Sandgate filed revision B.',
    );
    expect(eventSentence('application.put-back', 'M. T.', { reason: 'Leave.' })).toBe(
      'M. T. put the case back: Leave.',
    );
    expect(eventSentence('some.other', 'X', {})).toBe('X: some other.');
  });
});

describe('rows of a run', () => {
  const finding = (changes: Partial<Finding>): Finding => ({
    code: 'geometry.x1',
    family: 'geometry',
    grade: 'must-answer',
    where: '/lines/0',
    message: 'm',
    group: 1,
    causes: [],
    ...changes,
  });
  const report = (findings: Finding[]): CheckReport => ({
    engine: '1',
    bands: '1',
    tolerances: '1',
    lines: [
      {
        name: 'A',
        bandClassKv: 345,
        circuits: [
          {
            circuit: 2,
            declared: {},
            recomputed: null,
            equivalent: null,
            range: null,
            findings,
            implied: null,
            values: [],
          },
        ],
        findings: [finding({ code: 'drawing.spacing', position: 0, section: 0 })],
        mutual: [],
      },
    ],
  });
  const run = { id: 'run', orgId: 'org' };

  it('carry the line’s key, the circuit and a fingerprint of the figures', () => {
    const [first, second] = findingRows(run, ['L7'], report([finding({ declared: 0.6, recomputed: 0.4 })]));
    expect(first).toMatchObject({ lineKey: 'L7', circuit: 2, ordinal: 1, declared: 0.6 });
    expect(second).toMatchObject({ lineKey: 'L7', circuit: null, ordinal: 2, position: 0, section: 0 });
    const [again] = findingRows(
      run,
      ['L7'],
      report([finding({ declared: 0.6, recomputed: 0.4, tolerance: 9, message: 'x' })]),
    );
    expect(again?.fingerprint).toBe(first?.fingerprint);
    const [other] = findingRows(run, ['L7'], report([finding({ declared: 0.61, recomputed: 0.4 })]));
    expect(other?.fingerprint).not.toBe(first?.fingerprint);
  });

  it('tell two findings of one place apart, so that each is disposed of by itself', () => {
    const same = finding({ declared: 0.6, recomputed: 0.4 });
    const prints = findingRows(run, ['L7'], report([same, same, same])).map((row) => row.fingerprint);
    expect(new Set(prints).size).toBe(4);
    expect(findingRows(run, ['L7'], report([same, same, same])).map((row) => row.fingerprint)).toEqual(
      prints,
    );
  });

  it('leave figures out that no column takes', () => {
    const [row] = findingRows(run, ['L7'], report([finding({ deviation: Infinity, declared: Number.NaN })]));
    expect(row).toMatchObject({ deviation: null, declared: null });
  });
});
