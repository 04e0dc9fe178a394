import { describe, expect, it } from 'vitest';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { checkDraftLine } from '../../../../src/features/live-check/worker/check-line';
import type { CheckOutcome } from '../../../../src/features/live-check/worker/messages';
import {
  badPositions,
  blockersOf,
  drawingNotes,
} from '../../../../src/features/live-check/model/placed-notes';
import {
  countFindings,
  entriesOf,
  partWords,
  reportIn,
  sharesCause,
  sortFindings,
} from '../../../../src/features/live-check/model/report-view';

const basis = { rules: DEFAULT_RULE_SET, library: STARTING_LIBRARY };

const phase = (name: string, horizontalM: number, attachmentHeightM = 24) => ({
  circuit: 1,
  phase: name,
  conductor: 'phase',
  horizontalM,
  attachmentHeightM,
  sagM: 9,
  bundleCount: 2,
  bundleSpacingM: 0.4572,
});

interface Planted {
  x1?: number;
  b1?: number;
  positions?: object[];
  lengthKm?: unknown;
}

/** The line of the filing format's own example (interfaces.md), with what a test plants in it. */
const line = ({ x1 = 0.3812, b1 = 4.347, positions, lengthKm = 42.5 }: Planted = {}) => ({
  name: 'Harrow Fell – Sarn',
  from: 'Harrow Fell',
  to: 'Sarn',
  nominalVoltageKv: 345,
  frequencyHz: 60,
  sections: [
    {
      kind: 'overhead',
      lengthKm,
      earthResistivityOhmM: 100,
      conductors: {
        phase: {
          model: 'handbook',
          diameterMm: 28.14,
          gmrMm: 11.37,
          acResistanceOhmPerKm: 0.0798,
        },
        ground: { model: 'handbook', diameterMm: 9.14, gmrMm: 1, acResistanceOhmPerKm: 4 },
      },
      positions: positions ?? [
        phase('a', -9),
        phase('b', 0),
        phase('c', 9),
        { groundWire: true, conductor: 'ground', horizontalM: -6.5, attachmentHeightM: 30, sagM: 7 },
        { groundWire: true, conductor: 'ground', horizontalM: 6.5, attachmentHeightM: 30, sagM: 7 },
      ],
    },
  ],
  declared: [
    {
      circuit: 1,
      r1: { value: 0.0404, unit: 'ohm/km' },
      x1: { value: x1, unit: 'ohm/km' },
      b1: { value: b1, unit: 'uS/km' },
      r0: { value: 0.334, unit: 'ohm/km' },
      x0: { value: 1.271, unit: 'ohm/km' },
      b0: { value: 2.83, unit: 'uS/km' },
    },
  ],
});

const check = (planted?: Planted) => checkDraftLine({ id: 1, line: line(planted), written: {} }, basis);

function reportOf(outcome: CheckOutcome) {
  if (outcome.kind !== 'report') throw new Error(JSON.stringify(outcome.faults));
  return outcome.report;
}

describe('the live check of a line', () => {
  it('finds an honest line in balance, row by row', () => {
    const report = reportOf(check());
    expect(countFindings(report)['must-answer']).toBe(0);
    const [circuit] = report.circuits;
    const entries = circuit ? entriesOf(circuit) : [];
    expect(entries.map((e) => e.name)).toEqual(['R1', 'X1', 'B1', 'R0', 'X0', 'B0', 'Zc', 'Wave speed']);
    expect(entries.every((e) => e.grade === 'in-balance')).toBe(true);
    expect(entries.every((e) => e.typical !== null && e.outer !== null)).toBe(true);
  });

  it('names a value per mile, offers the value per km, and counts what follows from it once', () => {
    const report = reportOf(check({ x1: 0.6135 }));
    const [circuit] = report.circuits;
    if (!circuit) throw new Error('a report has a circuit');
    const { inRows } = sortFindings(circuit);
    const own = inRows.find((f) => f.code === 'geometry.x1');
    expect(own?.causes[0]?.code).toBe('per-mile');
    // 0.6135 ÷ 1.609344, the international mile
    expect(own?.causes[0]?.corrected['x1']).toBeCloseTo(0.381211, 5);
    const follows = entriesOf(circuit).filter((e) => e.remark);
    expect(follows.map((e) => [e.name, e.remark])).toEqual([
      ['Zc', 'follows X1'],
      ['Wave speed', 'follows X1'],
    ]);
    expect(
      inRows.filter((f) => f !== own).every((f) => sharesCause(f, report) || f.group !== own?.group),
    ).toBe(true);
  });

  it('shows one cause once, at the uppermost of the findings that it explains', () => {
    // X1 and B1 for 50 Hz on a line of 60 Hz: one slip, two findings of one group.
    const report = reportOf(check({ x1: 0.3812 * (50 / 60), b1: 4.347 * (50 / 60) }));
    const findings = report.circuits[0]?.findings ?? [];
    const [x1, b1] = ['geometry.x1', 'geometry.b1'].map((code) => findings.find((f) => f.code === code));
    if (!x1 || !b1) throw new Error('both are out of tolerance');
    expect(x1.group).toBe(b1.group);
    expect(x1.causes[0]?.code).toBe('frequency');
    expect([x1, b1].map((f) => sharesCause(f, report))).toEqual([false, true]);
  });

  it('checks the parts of a line that cannot be filed yet, and says that they are parts', () => {
    const { name: _, ...unnamed } = line({ x1: 0.6135 });
    const outcome = checkDraftLine({ id: 1, line: unnamed, written: {} }, basis);
    if (outcome.kind !== 'faults' || !outcome.preview) throw new Error('a preview was to be there');
    expect(outcome.faults.map((f) => f.pointer)).toEqual(['/name']);
    expect(outcome.preview).toMatchObject({ whole: [0], sections: 1 });
    expect(partWords(outcome.preview)).toBeNull();
    expect(countFindings(outcome.preview.report)['must-answer']).toBe(1);
    expect(reportIn(outcome)).toBe(outcome.preview.report);
  });

  it('says of which sections the recomputed side speaks', () => {
    const report = reportOf(check());
    expect(partWords({ report, whole: [1], sections: 2 })).toBe('section 2 of 2');
    expect(partWords({ report, whole: [0, 1, 3], sections: 4 })).toBe('sections 1, 2 and 4 of 4');
    expect(partWords({ report, whole: [], sections: 2 })).toBeNull();
  });

  it('says at which field a fault sits, with pointers within the line', () => {
    const outcome = check({ lengthKm: 'long' });
    expect(blockersOf(outcome)).toMatchObject([
      { pointer: '/sections/0/lengthKm', grade: 'must-answer', missing: false },
    ]);
    const { lengthKm: _, ...bare } = line().sections[0] ?? { lengthKm: 0 };
    const question = { id: 1, line: { ...line(), sections: [bare] }, written: {} };
    const absent = checkDraftLine(question, basis);
    expect(blockersOf(absent)).toMatchObject([{ pointer: '/sections/0/lengthKm', missing: true }]);
  });

  it('keeps a geometry that cannot be computed from being filed, and marks the position', () => {
    const outcome = check({ positions: [phase('a', -9), phase('b', -9), phase('c', 9)] });
    const blockers = blockersOf(outcome);
    expect(blockers.length).toBeGreaterThan(0);
    expect(blockers[0]?.pointer).toMatch(/^\/sections\/0\/positions\/[01]\//);
    expect([...badPositions(outcome, 0)].some((i) => i === 0 || i === 1)).toBe(true);
  });

  it('says a height below the clearance at the field, and lets it be filed', () => {
    const outcome = check({ positions: [phase('a', -9), phase('b', 0), phase('c', 9, 12)] });
    expect(drawingNotes(outcome).map((n) => n.pointer)).toContain(
      '/sections/0/positions/2/attachmentHeightM',
    );
    expect(blockersOf(outcome)).toEqual([]);
    expect(badPositions(outcome, 0)).toEqual(new Set([2]));
    expect(badPositions(outcome, 1)).toEqual(new Set());
  });

  it('checks what it can where the geometry is owed, and blocks nothing', () => {
    const {
      positions: _p,
      conductors: _c,
      ...section
    } = line().sections[0] ?? { positions: [], conductors: {} };
    const outcome = checkDraftLine({ id: 1, line: { ...line(), sections: [section] }, written: {} }, basis);
    expect(reportOf(outcome).circuits[0]?.recomputed).toBeNull();
    expect(blockersOf(outcome)).toEqual([]);
    expect(drawingNotes(outcome)).toEqual([]);
  });
});
