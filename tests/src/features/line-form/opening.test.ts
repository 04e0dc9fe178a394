import { beforeEach, describe, expect, it } from 'vitest';
import type { DraftLine } from '#shared/contracts/api.generated';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { dropKept, keepKey, readKept, writeKept } from '../../../../src/features/line-form/model/local-keep';
import { opening } from '../../../../src/features/line-form/model/opening';

const saved = (name: string, version: number): DraftLine => ({
  lineKey: 'L1',
  ordinal: 1,
  version,
  line: { name },
  asTyped: {},
  name,
  nominalVoltageKv: null,
  lengthKm: null,
  circuitCount: 1,
  complete: false,
  faults: [],
  updatedAt: '2027-03-04T10:42:00Z',
});

const kept = (name: string, version: number) => ({
  line: { name },
  asTyped: { '/nominalVoltageKv': { text: '34,5' } },
  version,
  at: '2027-03-04T10:41:00Z',
});

describe('how a form begins', () => {
  it('with what the server has', () => {
    const begun = opening(saved('A', 3), null);
    expect(begun).toMatchObject({ version: 3, restored: null, conflict: false, save: { kind: 'saved' } });
    expect(begun.form.name).toBe('A');
  });

  it('empty, on version 0, for a new line', () => {
    expect(opening(null, null)).toMatchObject({ version: 0, form: blankLine() });
  });

  it('with what only the browser had, when it was made on the same version', () => {
    const begun = opening(saved('A', 3), kept('B', 3));
    expect(begun).toMatchObject({ version: 3, conflict: false, restored: '2027-03-04T10:41:00Z' });
    expect(begun.form.name).toBe('B');
    expect(begun.form.nominalVoltageKv.text).toBe('34,5');
  });

  it('as a conflict, with the browser’s text standing, when somebody saved in between', () => {
    const begun = opening(saved('A', 4), kept('B', 3));
    expect(begun).toMatchObject({ version: 3, conflict: true, save: { kind: 'conflict' } });
    expect(begun.form.name).toBe('B');
  });
});

describe('what the browser keeps', () => {
  beforeEach(() => localStorage.clear());

  it('is given back to the same person for the same line only', () => {
    const key = keepKey('u1', '27-0418', 'L1');
    expect(writeKept(key, kept('B', 3))).toBe(true);
    expect(readKept(key)).toEqual(kept('B', 3));
    expect(readKept(keepKey('u2', '27-0418', 'L1'))).toBeNull();
    expect(readKept(keepKey('u1', '27-0418', 'L2'))).toBeNull();
    dropKept(key);
    expect(readKept(key)).toBeNull();
  });

  it('is passed over when it cannot be read', () => {
    const key = keepKey('u1', '27-0418', 'L1');
    for (const text of ['{', '7', 'null', '{"line":{}}', '{"line":{},"asTyped":{},"version":"3","at":"x"}']) {
      localStorage.setItem(key, text);
      expect(readKept(key)).toBeNull();
    }
  });

  it('says when there is no room', () => {
    const full = {
      setItem: () => {
        throw new Error('full');
      },
    } as unknown as Storage;
    expect(writeKept('k', kept('B', 3), full)).toBe(false);
  });
});
