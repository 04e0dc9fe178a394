import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { readArguments } from '#server/scripts/check-arguments';
import { reportLines } from '#server/scripts/check-table';
import { checkFiling } from '#shared/checks/check-filing';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { CheckReport } from '#shared/checks/types';
import { exampleLine, read } from '../../shared/checks/example-line';

const folder = mkdtempSync(join(tmpdir(), 'check-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const PATIENCE_MS = 90_000;

interface Run {
  status: number | null;
  out: string;
  err: string;
}

/** Runs the command in a process of its own, without database or network settings. */
function run(words: readonly string[], input = ''): Run {
  const done = spawnSync(process.execPath, ['server/scripts/check.mjs', ...words], {
    input,
    encoding: 'utf8',
    env: { PATH: process.env['PATH'] ?? '' },
  });
  return { status: done.status, out: done.stdout, err: done.stderr };
}

/** A file of the test's own. */
function keep(name: string, content: unknown): string {
  const path = join(folder, name);
  writeFileSync(path, typeof content === 'string' ? content : JSON.stringify(content));
  return path;
}

const filing = (...lines: unknown[]) => ({ format: 'filing/1', lines });
const perMile = exampleLine((line) => (line.declared[0].x1.value = 0.6135));

describe('npm run check', { timeout: PATIENCE_MS }, () => {
  it('prints one JSON document with what was asked for, and leaves words for people to standard error', () => {
    const path = keep('slipped.json', filing(perMile));
    const { status, out, err } = run([path, '--json', '--frequencies', '1,1000', '--matrices']);
    expect(status).toBe(1);
    const report = JSON.parse(out) as CheckReport;
    const [line] = report.lines;
    const [circuit] = line?.circuits ?? [];
    // The interfaces' own example: recomputed apart from the product.
    expect(circuit?.recomputed?.x1).toBeCloseTo(0.381199, 6);
    expect(circuit?.recomputed?.b1).toBeCloseTo(4.34727, 5);
    expect(circuit?.recomputed?.surgeImpedanceOhm).toBeCloseTo(296.12, 2);
    expect(circuit?.recomputed?.waveSpeed).toBeCloseTo(0.976846, 6);
    const finding = circuit?.findings.find(({ code }) => code === 'geometry.x1');
    expect(finding).toMatchObject({
      family: 'geometry',
      grade: 'must-answer',
      parameter: 'x1',
      declared: 0.6135,
      where: '/lines/0/declared/0/x1',
    });
    expect(finding?.causes[0]).toMatchObject({ code: 'per-mile', in: 'declared', explains: ['x1'] });
    expect(circuit?.frequencies?.map(({ frequencyHz }) => frequencyHz)).toEqual([1, 1000]);
    expect(line?.matrices?.phaseImpedanceOhmPerKm.length).toBe(3);
    expect(circuit?.range?.x1[0]).toBeLessThan(0.3812);
    expect(err).toContain('1 must be answered');
    expect([report.engine, report.bands, report.tolerances].every((version) => version.length > 0)).toBe(
      true,
    );
  });

  it('takes standard input, and ends with 0 where nothing must be answered', () => {
    const { status, out } = run(['-'], JSON.stringify(filing(exampleLine())));
    expect(status).toBe(0);
    expect(out).toContain('In balance');
    expect(out).toContain('replaces no engineering study');
    // Colours are for terminals alone.
    expect(out).not.toContain('\u001b[');
  });

  it('takes tolerances and bands of files, and says by which it judged', () => {
    const path = keep('slipped.json', filing(perMile));
    const tolerances = keep('wide.json', { tolerances: { x1: { relative: 0.7, cap: 0.7 } } });
    const bands = keep('none.json', []);
    const { status, out } = run([path, '--json', '--tolerances', tolerances, '--bands', bands]);
    expect(status).toBe(0);
    const report = JSON.parse(out) as CheckReport;
    expect(report.tolerances).toMatch(/^file-[0-9a-f]{12}$/u);
    expect(report.bands).not.toBe(report.tolerances);
  });

  it('lists every fault at once with 2, and never a stack trace', () => {
    const bad = exampleLine((line) => {
      line.nominalVoltageKv = 'high';
      line.sections[0].positions[1].phase = 'a';
      line.declared[0].x1.unit = 'ohm/league';
    });
    const { status, out, err } = run(['-', '--json'], JSON.stringify(filing(bad)));
    expect(status).toBe(2);
    const { faults } = JSON.parse(out) as {
      faults: { pointer: string; value: unknown; expected: string; message: string }[];
    };
    const pointers = faults.map(({ pointer }) => pointer);
    expect(pointers).toEqual(
      expect.arrayContaining(['/lines/0/nominalVoltageKv', '/lines/0/declared/0/x1/unit']),
    );
    for (const { expected, message } of faults)
      expect(Math.min(expected.length, message.length)).toBeGreaterThan(0);
    expect(`${out}${err}`).not.toMatch(/\bat .*\.(ts|mjs|js):\d+/u);
  });

  it.each([
    ['numbers that are none', '{"format":"filing/1","lines":[{"nominalVoltageKv":1e999,"name":NaN}]}'],
    ['a prototype', '{"format":"filing/1","lines":[],"__proto__":{"x":1}}'],
    ['nothing', ''],
    ['a list cut short', '[1,2'],
  ])('ends with 2 on %s', (_name, text) => {
    const { status, out, err } = run(['-', '--json', '--format', 'json'], text);
    expect(status).toBe(2);
    expect((JSON.parse(out) as { faults: unknown[] }).faults.length).toBeGreaterThan(0);
    expect(err).not.toMatch(/\bat .*\.(ts|mjs|js):\d+/u);
  });

  it('names row and column of a table’s faults', () => {
    const { status, out } = run(['-', '--json', '--format', 'csv'], 'name,nominal_voltage_kv\nA,high\n');
    expect(status).toBe(2);
    const { faults } = JSON.parse(out) as { faults: { row?: number; column?: string }[] };
    expect(faults.some(({ row, column }) => row === 2 && column === 'nominal_voltage_kv')).toBe(true);
  });

  it('tells what is wrong with rules of files', () => {
    const bands = keep('bad-bands.json', [{ classKv: 345 }]);
    const { status, err } = run([keep('fine.json', filing(exampleLine())), '--bands', bands]);
    expect(status).toBe(2);
    expect(err).toContain('/0/parameter');
  });
});

describe('the command line', () => {
  it('is read whole', () => {
    expect(
      readArguments(['a.csv', '--json', '--matrices', '--frequencies=0.1,1e6', '--format', 'csv']),
    ).toEqual({
      kind: 'check',
      arguments: {
        file: 'a.csv',
        isJson: true,
        wantsMatrices: true,
        frequenciesHz: [0.1, 1e6],
        format: 'csv',
      },
    });
  });

  it('lists each of its faults', () => {
    const read = readArguments(['a', 'b', '--frequencies', '0.05,x', '--format', 'xml', '--fast', '--bands']);
    const values = read.kind === 'wrong' ? read.faults.map(({ value }) => value) : [];
    expect(values).toEqual([
      'b',
      '--frequencies 0.05',
      '--frequencies x',
      '--format xml',
      '--fast',
      '--bands',
    ]);
  });

  it('takes no option for the value of another one', () => {
    expect(readArguments(['a', '--frequencies', '--json'])).toMatchObject({
      kind: 'wrong',
      isJson: true,
      faults: [{ value: '--frequencies', expected: 'a value behind it' }],
    });
  });

  it('wants a file', () => {
    expect(readArguments(['--json'])).toMatchObject({ kind: 'wrong', isJson: true });
    expect(readArguments(['--help'])).toEqual({ kind: 'help' });
  });
});

describe('the table', () => {
  const report = checkFiling(
    {
      lines: read(
        perMile,
        exampleLine((line) => (line.name = 'Other')),
      ),
    },
    DEFAULT_RULE_SET,
  );

  it('has colours on a terminal only', () => {
    expect(reportLines(report, true).join('\n')).toContain('\u001b[31m■ Must answer');
    expect(reportLines(report, false).join('\n')).not.toContain('\u001b');
  });

  it('says what follows, and does not count it', () => {
    const lines = reportLines(report, false);
    expect(lines.find((line) => line.includes('Wave speed'))).toContain('follows X1');
    expect(lines.at(-3)).toBe('2 lines: 1 must be answered, 0 to explain, 0 notes.');
  });
});
