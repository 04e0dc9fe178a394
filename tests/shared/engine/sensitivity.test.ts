import { describe, expect, it } from 'vitest';
import {
  DEFAULT_INPUT_UNCERTAINTIES,
  SEQUENCE_KEYS,
  sensitivities,
  solveLine,
  solveSection,
  uncertainty,
  type ConductorData,
  type OverheadSection,
  type SectionConstants,
  type Sensitivity,
} from '#shared/engine/index';
import { goldenLines } from './golden-lines';

type Position = OverheadSection['positions'][number];

function solved(s: OverheadSection, frequencyHz: number): SectionConstants {
  const result = solveSection(s, frequencyHz);
  if (!result.ok) throw new Error(result.detail);
  return result.value;
}

/** All values of a section in one row: six a circuit, then the mutuals. */
function flat(c: SectionConstants | Sensitivity): number[] {
  return [
    ...c.circuits.flatMap((v) => SEQUENCE_KEYS.map((key) => v[key])),
    ...c.mutual.flatMap((m) => [m.r0m, m.x0m, m.b0m]),
  ];
}

function mapPositions(s: OverheadSection, change: (p: Position, i: number) => Position): OverheadSection {
  return { ...s, positions: s.positions.map(change) };
}

/** The conductor with one datum moved: shares for logarithmic inputs, kelvins for temperature. */
function changeConductor(c: ConductorData, input: Sensitivity['input'], step: number): ConductorData {
  const grow = (v: number | undefined): number | undefined => (v === undefined ? v : v * Math.exp(step));
  const alpha = c.temperatureCoefficientPerK ?? 0.00403;
  switch (input) {
    case 'diameter':
      return { ...c, diameterMm: c.diameterMm * Math.exp(step) };
    case 'gmr':
      return { ...c, gmrMm: grow(c.gmrMm) };
    case 'ac-resistance':
    case 'ground-wire-resistance':
      return {
        ...c,
        acResistanceOhmPerKm: grow(c.acResistanceOhmPerKm),
        dcResistance20OhmPerKm: grow(c.dcResistance20OhmPerKm),
      };
    default: {
      const t = c.temperatureC ?? 20;
      const ratio = (1 + alpha * (t + step - 20)) / (1 + alpha * (t - 20));
      const ac = c.acResistanceOhmPerKm;
      return { ...c, temperatureC: t + step, acResistanceOhmPerKm: ac === undefined ? ac : ac * ratio };
    }
  }
}

/** The section with one input moved by a step. */
function moved(s: OverheadSection, row: Sensitivity, step: number): OverheadSection {
  switch (row.input) {
    case 'height':
      return mapPositions(s, (p) => ({ ...p, attachmentHeightM: p.attachmentHeightM + step }));
    case 'sag':
      return mapPositions(s, (p) => ({ ...p, sagM: p.sagM + step }));
    case 'offset':
      return mapPositions(s, (p, i) =>
        i === row.where.position ? { ...p, horizontalM: p.horizontalM + step } : p,
      );
    case 'earth-resistivity':
      return { ...s, earthResistivityOhmM: s.earthResistivityOhmM * Math.exp(step) };
    default: {
      const kind = s.positions[row.where.position ?? 0]?.kind;
      return mapPositions(s, (p) =>
        p.conductor === row.conductor && p.kind === kind
          ? { ...p, conductor: changeConductor(p.conductor, row.input, step) }
          : p,
      );
    }
  }
}

/** Central difference of fourth order at a step that balances truncation against rounding. */
function difference(s: OverheadSection, frequencyHz: number, row: Sensitivity): number[] {
  const h = row.unit === 'm' ? 0.02 : row.unit === 'K' ? 1 : 0.01;
  const at = (k: number): number[] => flat(solved(moved(s, row, k * h), frequencyHz));
  const [a, b, c, d] = [at(-2), at(-1), at(1), at(2)];
  return a.map((_, q) => ((a[q] ?? 0) - 8 * (b[q] ?? 0) + 8 * (c[q] ?? 0) - (d[q] ?? 0)) / (12 * h));
}

function rows(s: OverheadSection, frequencyHz: number): Sensitivity[] {
  const result = sensitivities(s, frequencyHz);
  if (!result.ok) throw new Error(result.detail);
  return result.value;
}

// Some golden lines use the same positions' heights at 0 sag: a negative sag is refused, so sag steps need room.
const roomy = goldenLines.map((line) => ({
  ...line,
  section: mapPositions(line.section, (p) => ({
    ...p,
    sagM: p.sagM + 1,
    attachmentHeightM: p.attachmentHeightM + 2 / 3,
  })),
}));

/** A single circuit of twin bundles with one ground wire. */
const fifth = sectionOf('R005');

function sectionOf(name: string): OverheadSection {
  const line = roomy.find((l) => l.name === name);
  if (!line) throw new Error(`no line ${name}`);
  return line.section;
}

describe('first-order sensitivities', () => {
  it.each(roomy)('are the limits of differences: $name', ({ section, frequencyHz }) => {
    const scale = flat(solved(section, frequencyHz)).map(Math.abs);
    for (const row of rows(section, frequencyHz)) {
      const wanted = difference(section, frequencyHz, row);
      flat(row).forEach((slope, q) => {
        const error = Math.abs(slope - (wanted[q] ?? NaN)) / (scale[q] ?? 1);
        expect(
          error,
          `${row.input} ${JSON.stringify(row.where)} value ${q}: ${slope} against ${wanted[q]}`,
        ).toBeLessThan(2e-8);
      });
    }
  });

  it.each([500, 20_000, 1e6])('hold where the earth return leaves its small-argument series: %i Hz', (f) => {
    const section = { ...fifth, earthResistivityOhmM: 8 };
    const scale = flat(solved(section, f)).map(Math.abs);
    for (const row of rows(section, f)) {
      const wanted = difference(section, f, row);
      flat(row).forEach((slope, q) => {
        expect(
          Math.abs(slope - (wanted[q] ?? NaN)) / (scale[q] ?? 1),
          `${row.input} value ${q}`,
        ).toBeLessThan(1e-6);
      });
    }
  });

  it('sees a wrong slope: half of one is refused', () => {
    const line = roomy[0];
    if (!line) throw new Error('no line');
    const row = rows(line.section, 50).find((r) => r.input === 'height');
    if (!row) throw new Error('no row');
    const wanted = difference(line.section, 50, row);
    expect(Math.abs((row.circuits[0]?.b0 ?? 0) / 2 - (wanted[5] ?? 0))).toBeGreaterThan(1e-4);
  });
});

describe('plausible ranges', () => {
  const line = { frequencyHz: 60, sections: [fifth] };

  function range(sections: OverheadSection[]) {
    const result = uncertainty({ frequencyHz: 60, sections }, DEFAULT_INPUT_UNCERTAINTIES);
    if (!result.ok) throw new Error(result.detail);
    return result.value;
  }

  function first(sections: OverheadSection[]) {
    const circuit = range(sections).circuits[0];
    if (!circuit) throw new Error('no circuit');
    return circuit;
  }

  it('combine the inputs in quadrature and name the largest', () => {
    const u = DEFAULT_INPUT_UNCERTAINTIES;
    const steps: Record<Sensitivity['input'], number> = {
      height: u.heightM,
      sag: u.sagM,
      offset: u.offsetM,
      diameter: u.diameterRelative,
      gmr: u.gmrRelative,
      'ac-resistance': u.acResistanceRelative,
      temperature: u.temperatureK,
      'ground-wire-resistance': u.groundWireResistanceRelative,
      'earth-resistivity': Math.log(u.earthResistivityFactor),
    };
    const moves = rows(fifth, 60).map((row) => ({
      input: row.input,
      move: steps[row.input] * (row.circuits[0]?.x0 ?? 0),
    }));
    const largest = moves.reduce((a, b) => (Math.abs(b.move) > Math.abs(a.move) ? b : a));
    const got = first([fifth]).x0;
    expect(got.halfRange).toBeCloseTo(Math.hypot(...moves.map((m) => m.move)), 12);
    expect(got.dominant).toBe(largest.input);
    expect(got.dominant).toBe('earth-resistivity');
    expect(got.high - got.value).toBeCloseTo(got.halfRange, 12);
  });

  it('have the constants of solveLine', () => {
    const plain = solveLine(line);
    if (!plain.ok) throw new Error(plain.detail);
    expect(range(line.sections).constants).toEqual(plain.value);
  });

  it('shrink when sections move independently, and not where they share a conductor', () => {
    const one = first([fifth]);
    const two = first([fifth, fifth]);
    // R1 hangs on the conductor alone, B0 mostly on heights.
    expect(two.r1.halfRange / one.r1.halfRange).toBeCloseTo(1, 3);
    expect(two.b0.halfRange / one.b0.halfRange).toBeLessThan(0.75);
    expect(two.b0.halfRange / one.b0.halfRange).toBeGreaterThan(0.7);
  });

  it('pin X1 and B1 to within about half a per cent on ordinary lines (engine contract)', () => {
    for (const { section, frequencyHz } of roomy) {
      const result = uncertainty({ frequencyHz, sections: [section] }, DEFAULT_INPUT_UNCERTAINTIES);
      if (!result.ok) throw new Error(result.detail);
      for (const c of result.value.circuits) {
        expect(c.x1.halfRange / c.x1.value).toBeLessThan(0.015);
        expect(c.b1.halfRange / c.b1.value).toBeLessThan(0.015);
      }
    }
  });
});
