import { describe, expect, it } from 'vitest';
import { checkLine } from '#shared/checks/check-line';
import { checkPartialLine } from '#shared/checks/check-partial-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { CircuitReport, LineReport } from '#shared/checks/types';
import { readLine } from '#shared/filing/read-filing';
import { readPartialLine } from '#shared/filing/read-partial-line';
import { CONTEXT, example } from '../filing/sample';
import type { Line } from '../filing/sample';

/** The filing format's own example with something taken out of it or put wrong. */
function line(change: (line: Line) => void = () => undefined): Line {
  const own = example().lines[0];
  change(own);
  return own;
}

function partialOf(json: Line) {
  const read = readLine(json, CONTEXT);
  if (read.ok) throw new Error('the line holds as a whole');
  return readPartialLine(json, read.faults, CONTEXT);
}

function check(json: Line): LineReport {
  const partial = partialOf(json);
  if (!partial) throw new Error('there is nothing to weigh');
  return checkPartialLine(partial, DEFAULT_RULE_SET);
}

function wholeReport(): LineReport {
  const read = readLine(line(), CONTEXT);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return checkLine(read.line, DEFAULT_RULE_SET);
}

function only(report: LineReport): CircuitReport {
  const [circuit] = report.circuits;
  if (!circuit) throw new Error('a report has a circuit');
  return circuit;
}

const valueOf = (report: LineReport, parameter: string) =>
  only(report).values.find((value) => value.parameter === parameter);

const undeclared = (l: Line) => (l.declared = [{ circuit: 1 }]);
const undrawn = (l: Line) => delete l.sections[0].positions[2].horizontalM;

describe('a line of which only the geometry is whole', () => {
  it('gives what the whole line gives, to the digit, and nothing declared', () => {
    const report = check(line(undeclared));
    expect(only(report).recomputed).toEqual(only(wholeReport()).recomputed);
    expect(only(report).range).toEqual(only(wholeReport()).range);
    expect(valueOf(report, 'x1')).toMatchObject({ declared: null, deviation: null, grade: null });
    expect(valueOf(report, 'x1')?.typical).toEqual(valueOf(wholeReport(), 'x1')?.typical);
  });

  it('needs neither names nor the length of its only section', () => {
    const report = check(
      line((l) => {
        undeclared(l);
        delete l.name;
        delete l.sections[0].lengthKm;
      }),
    );
    expect(only(report).recomputed?.x1).toBeCloseTo(only(wholeReport()).recomputed?.x1 ?? NaN, 12);
  });

  it('says nothing of what is merely not there yet', () => {
    const report = check(line(undeclared));
    expect([...only(report).findings, ...report.findings].filter((f) => f.grade !== 'note')).toEqual([]);
    expect(only(report).findings.map((f) => f.code)).not.toContain('drawing.zero-sequence-not-given');
  });
});

describe('declared values that come one by one', () => {
  it('weighs each as soon as it is there', () => {
    const report = check(
      line((l) => {
        const { x1 } = l.declared[0];
        l.declared = [{ circuit: 1, x1 }];
      }),
    );
    expect(valueOf(report, 'x1')).toEqual(valueOf(wholeReport(), 'x1'));
    expect(only(report).findings.find((f) => f.code === 'geometry.x1')?.causes[0]?.code).toBe('per-mile');
    expect(valueOf(report, 'b1')).toMatchObject({ declared: null, deviation: null });
  });

  it('leaves out a value of the whole line while its length is not known', () => {
    const withTotal = (known: boolean) =>
      check(
        line((l) => {
          l.declared = [{ circuit: 1, r1: l.declared[0].r1, x1: { value: 16.2, unit: 'ohm' } }];
          if (!known) delete l.sections[0].lengthKm;
        }),
      );
    expect(valueOf(withTotal(false), 'x1')?.declared).toBeNull();
    expect(valueOf(withTotal(false), 'r1')?.declared).toBe(0.0404);
    // 16.2 Ω over 42.5 km
    expect(valueOf(withTotal(true), 'x1')?.declared).toBeCloseTo(16.2 / 42.5, 12);
  });

  it('leaves out a value that is no value, and keeps the one beside it', () => {
    const report = check(line((l) => (l.declared[0].x1 = { value: 'much', unit: 'ohm/km' })));
    expect(valueOf(report, 'x1')?.declared).toBeNull();
    expect(valueOf(report, 'b1')).toEqual(valueOf(wholeReport(), 'b1'));
  });
});

describe('declared values without a whole geometry', () => {
  it('are held against the band of their class alone', () => {
    const report = check(line(undrawn));
    expect(only(report).recomputed).toBeNull();
    expect(valueOf(report, 'x1')).toMatchObject({ declared: 0.6135, recomputed: null });
    expect(only(report).findings.map((f) => f.code)).toContain('typical.wave-speed');
    expect([...only(report).findings, ...report.findings].map((f) => f.code)).not.toContain(
      'drawing.geometry-missing',
    );
  });
});

describe('a line of several sections, one of them whole', () => {
  const two = (change: (second: Line) => void) =>
    line((l) => {
      const second = structuredClone(l.sections[0]);
      change(second);
      l.sections.push(second);
    });

  it('gives what that section gives, and weighs nothing declared of the whole line against it', () => {
    const json = two((second) => delete second.positions[0].attachmentHeightM);
    expect(partialOf(json)?.whole).toEqual([0]);
    const report = check(json);
    expect(only(report).recomputed?.x1).toBeCloseTo(only(wholeReport()).recomputed?.x1 ?? NaN, 12);
    expect(valueOf(report, 'x1')).toMatchObject({ declared: 0.6135, deviation: null });
    expect(only(report).findings.map((f) => f.code)).not.toContain('geometry.x1');
  });

  it('takes no section whose length is not known: the mean over the line would be invented', () => {
    expect(partialOf(two((second) => delete second.lengthKm))?.whole).toEqual([0]);
  });

  it('names the place of a finding in the line as it stands', () => {
    const json = line((l) => {
      const first = structuredClone(l.sections[0]);
      delete first.positions[0].attachmentHeightM;
      l.sections[0].positions[1].attachmentHeightM = 12;
      l.sections.unshift(first);
    });
    const low = check(json).findings.find((f) => f.code === 'drawing.phase-height');
    expect(low?.where).toContain('/sections/1/positions/1');
  });

  it('says nothing where a cable’s share of the line is not known', () => {
    const json = line((l) => l.sections.push({ kind: 'cable', lengthKm: 4 }));
    expect(partialOf(json)).toBeNull();
  });
});

describe('what cannot be weighed at all', () => {
  it.each<[string, (l: Line) => void]>([
    ['no voltage', (l) => delete l.nominalVoltageKv],
    ['a voltage that is none', (l) => (l.nominalVoltageKv = -345)],
    ['no frequency', (l) => delete l.frequencyHz],
    ['nothing declared and nothing drawn', (l) => (undeclared(l), undrawn(l))],
    ['no sections', (l) => delete l.sections],
    ['a circuit that is none', (l) => (l.declared[0].circuit = 7)],
  ])('%s', (_, change) => {
    expect(partialOf(line(change))).toBeNull();
  });

  it.each([[null], [7], [[]], [{}], [{ sections: 3 }]])('%j', (json) => {
    expect(partialOf(json)).toBeNull();
  });
});

it('never throws, whatever single member of the line is missing', () => {
  const drop = (node: Line, path: string[]): Line => {
    const [head = '', ...rest] = path;
    const copy = Array.isArray(node) ? [...node] : { ...node };
    if (rest.length > 0) copy[head] = drop(copy[head], rest);
    else if (Array.isArray(copy)) copy.splice(Number(head), 1);
    else delete copy[head];
    return copy;
  };
  const paths = (node: unknown, at: string[] = []): string[][] =>
    typeof node === 'object' && node !== null
      ? Object.entries(node).flatMap(([key, value]) => [[...at, key], ...paths(value, [...at, key])])
      : [];
  let reports = 0;
  for (const path of paths(line())) {
    const json = drop(line(), path);
    const read = readLine(json, CONTEXT);
    if (read.ok) continue;
    const partial = readPartialLine(json, read.faults, CONTEXT);
    if (partial && checkPartialLine(partial, DEFAULT_RULE_SET, { causes: false }).circuits.length > 0)
      reports += 1;
  }
  // Of most lines that lack one thing the rest is weighed.
  expect(reports).toBeGreaterThan(40);
});
