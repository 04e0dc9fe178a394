import { describe, expect, it } from 'vitest';
import type { Finding } from '#shared/contracts/api.generated';
import { arrangeFindings, countStanding } from '../../../../src/features/line-sheet/model/arrange-findings';

const finding = (over: Partial<Finding>): Finding =>
  ({
    fingerprint: over.code ?? 'f',
    code: 'geometry.x1',
    family: 'geometry',
    grade: 'must-answer',
    lineKey: 'L1',
    circuit: 1,
    section: null,
    position: null,
    parameter: 'x1',
    declared: 0.613,
    recomputed: 0.381,
    deviation: 0.609,
    tolerance: 0.015,
    where: null,
    message: 'X1 is 61 % above what the geometry gives.',
    group: 1,
    causes: [],
    first: true,
    follows: null,
    stands: true,
    disposition: null,
    discrepancy: null,
    ...over,
  }) as Finding;

const ROWS = ['x1', 'r0', 'waveSpeed'];

const rowOf = (parameter: string) =>
  ({ r0OverR1: 'r0', x1: 'x1', r0: 'r0', waveSpeed: 'waveSpeed' })[parameter] ?? null;

describe('findings on the sheet', () => {
  it('stand inside the row of their value, the carrier of the cause first', () => {
    const later = finding({ code: 'physics.wave-speed', parameter: 'x1', first: false });
    const { rows } = arrangeFindings([later, finding({})], 1, rowOf, ROWS);
    expect(rows.get('x1')?.map((f) => f.code)).toEqual(['geometry.x1', 'physics.wave-speed']);
  });

  it('put a ratio under the value that it speaks of', () => {
    const { rows, loose } = arrangeFindings([finding({ code: 't', parameter: 'r0OverR1' })], 1, rowOf, ROWS);
    expect([...rows.keys()]).toEqual(['r0']);
    expect(loose).toEqual([]);
  });

  it('leave out the other circuit, and keep what belongs to the whole line', () => {
    const all = [
      finding({ circuit: 2 }),
      finding({ code: 'd', circuit: null, parameter: null, family: 'drawing' }),
    ];
    const arranged = arrangeFindings(all, 1, rowOf, ROWS);
    expect(arranged.rows.size).toBe(0);
    expect(arranged.drawing.map((f) => f.code)).toEqual(['d']);
  });

  it('tell coupling and other loose findings apart', () => {
    const all = [
      finding({ code: 'geometry.x0m', parameter: 'x0m', circuit: null }),
      finding({ code: 'typical.no-class', parameter: null, family: 'typical', grade: 'note' }),
    ];
    const arranged = arrangeFindings(all, 1, rowOf, ROWS);
    expect(arranged.coupling.map((f) => f.code)).toEqual(['geometry.x0m']);
    expect(arranged.loose.map((f) => f.code)).toEqual(['typical.no-class']);
  });

  it('carry the cause of a group once on the sheet, in the first row that shows it', () => {
    const causes = [{ code: 'single-conductor' }] as Finding['causes'];
    const r0 = finding({ code: 'geometry.r0', parameter: 'r0', causes });
    const x1 = finding({ code: 'geometry.x1', parameter: 'x1', causes, first: false });
    const slow = finding({ code: 'w', parameter: 'waveSpeed', follows: 'x1', causes });
    const { carriers } = arrangeFindings([r0, slow, x1], 1, rowOf, ROWS);
    expect([...carriers]).toEqual([x1]);
  });

  it('count what stands, once a matter', () => {
    const all = [
      finding({}),
      finding({ code: 'w', parameter: 'waveSpeed', follows: 'x1' }),
      finding({ code: 's', grade: 'explain', stands: false }),
    ];
    expect(countStanding(all)).toEqual({ 'must-answer': 1, explain: 0, note: 0 });
  });
});
