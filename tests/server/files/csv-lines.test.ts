import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { csvColumn, CSV_COLUMNS, CSV_NAMES } from '#shared/filing/csv-columns';
import type { NormalisedLine } from '#shared/filing/types';
import { readFilingFile } from '#server/files/read-filing-file';
import { CONTEXT } from '../../shared/filing/sample';
import { cellFaults, readCsvFile } from './csv-sample';

/** Text of a file from rows of cells by column. */
function table(...rows: Record<string, string | number>[]): string {
  const columns = [...new Set(rows.flatMap((r) => Object.keys(r)))];
  return [columns.join(','), ...rows.map((r) => columns.map((c) => r[c] ?? '').join(',')), ''].join('\n');
}

const LINE = { name: 'L', from: 'A', to: 'B', nominal_voltage_kv: 230, frequency_hz: 50 };
const PHASES = {
  conductor: 'Cardinal',
  conductor_temperature_c: 50,
  a_x_m: -7,
  a_height_m: 20,
  b_x_m: 0,
  b_height_m: 20,
  c_x_m: 7,
  c_height_m: 20,
};
const DECLARED = { r1: 0.07, x1: 0.4, b1: 3, impedance_unit: 'ohm/km', susceptance_unit: 'uS/km' };
const ROW = { ...LINE, section: 1, length_km: 10, ...PHASES, ...DECLARED };

function line(...rows: Record<string, string | number>[]): NormalisedLine {
  const file = readCsvFile(table(...rows));
  const [first] = file.filing?.lines ?? [];
  if (!first) throw new Error(JSON.stringify(file.faults));
  return first;
}

const faults = (...rows: Record<string, string | number>[]) => cellFaults(table(...rows));

describe('the list of columns', () => {
  it('has every column that the interface names', () => {
    const named =
      'name from to nominal_voltage_kv frequency_hz section kind length_km earth_resistivity_ohm_m ground_wire_bonding conductor ' +
      'conductor_temperature_c ground_conductor bundle_count bundle_spacing_m sag_m gw_sag_m a_x_m a_height_m a_sag_m b_x_m b_height_m ' +
      'b_sag_m c_x_m c_height_m c_sag_m c2_a_x_m c2_a_height_m c2_c_sag_m gw1_x_m gw1_height_m gw1_sag_m gw2_x_m gw4_x_m gw4_height_m ' +
      'gw4_sag_m r1 x1 b1 r0 x0 b0 c2_r1 c2_x1 c2_b1 c2_r0 c2_x0 c2_b0 r0m x0m b0m impedance_unit susceptance_unit base_mva base_kv ' +
      'rating_a max_temperature_c conductor_diameter_mm conductor_gmr_mm conductor_ac_resistance_ohm_per_km ground_conductor_diameter_mm';
    expect(named.split(' ').filter((n) => !csvColumn(n))).toEqual([]);
  });

  it('has each name once, each with its meaning', () => {
    expect(new Set(CSV_NAMES).size).toBe(CSV_COLUMNS.length);
    expect(CSV_COLUMNS.filter((c) => c.meaning.length < 10)).toEqual([]);
    expect(CSV_NAMES.every((n) => /^[a-z][a-z0-9_]*$/.test(n))).toBe(true);
    expect(csvColumn('__proto__')).toBeUndefined();
  });

  it('is what the published template is written in, which reads without a fault', () => {
    const bytes = readFileSync(new URL('../../../schemas/files/lines-template.csv', import.meta.url));
    const file = readFilingFile(bytes, 'lines-template.csv', CONTEXT);
    expect(file.faults).toEqual([]);
    expect(file.filing?.lines.map((l) => [l.name, l.sections.length, l.lengthKm])).toEqual([
      ['Harrow Fell – Sarn', 2, 42.5],
      ['Sarn – Ostrey', 1, 18.2],
    ]);
  });
});

describe('rows of a line', () => {
  it('are its sections, the declared values on the first', () => {
    const second = { name: 'L', section: 2, length_km: 2.5, ...PHASES, a_height_m: 30 };
    const read = line(ROW, second);
    expect(read.sections.map((s) => [s.kind, s.lengthKm])).toEqual([
      ['overhead', 10],
      ['overhead', 2.5],
    ]);
    expect(read.lengthKm).toBe(12.5);
    expect(read.circuits[0]?.declared.x1).toMatchObject({ value: 0.4, unit: 'ohm/km' });
  });

  it('may repeat what stands once for the line, but not differ there', () => {
    expect(faults(ROW, { ...ROW, section: 2 })).toEqual([]);
    expect(faults(ROW, { ...ROW, section: 2, x1: 0.41, to: 'C' })).toEqual([
      '3 to: This stands once for the line, on row 2; here “C” differs from it.',
      '3 x1: This stands once for the line, on row 2; here “0.41” differs from it.',
    ]);
  });

  it('are numbered in their order', () => {
    expect(faults({ ...ROW, section: '' })).toEqual([]);
    expect(faults({ ...ROW, section: 2 })[0]).toMatch(/^2 section: Section 1 of this line is wanted here/);
    expect(faults(ROW, { ...ROW, section: 3 })[0]).toMatch(/^3 section: Section 2/);
    expect(faults(ROW, { ...ROW, section: '' })[0]).toMatch(/^3 section: Section 2/);
    expect(faults(ROW, { ...ROW, section: 'two' })[0]).toMatch(/^3 section: “two” is not a number/);
  });

  it('without places have no geometry; a conductor alone is half of one', () => {
    const bare = { ...LINE, length_km: 10, ...DECLARED };
    expect(line(bare).sections[0]?.kind).toBe('geometry-missing');
    expect(faults({ ...bare, conductor: 'Cardinal', conductor_temperature_c: 50 })[0]).toMatch(
      /^2 a_x_m: Positions are missing/,
    );
    const { conductor: _c, conductor_temperature_c: _t, ...noConductor } = ROW;
    expect(faults(noConductor)[0]).toMatch(/^2 conductor: Conductors are missing/);
  });
});

describe('conductors and places', () => {
  const positions = (l: NormalisedLine) => {
    const [s] = l.sections;
    return s?.kind === 'overhead' ? s.input.positions : [];
  };

  it('by data: the model follows from them', () => {
    const { conductor: _c, conductor_temperature_c: _t, ...rest } = ROW;
    const handbook = {
      ...rest,
      conductor: 'Own',
      conductor_diameter_mm: 30,
      conductor_gmr_mm: 12,
      conductor_ac_resistance_ohm_per_km: 0.07,
    };
    expect(positions(line(handbook))[0]?.conductor).toMatchObject({
      name: 'Own',
      model: 'handbook',
      diameterMm: 30,
      gmrMm: 12,
    });
    const tube = {
      ...rest,
      conductor_diameter_mm: 30,
      conductor_dc_resistance_20_ohm_per_km: 0.06,
      conductor_temperature_c: 50,
    };
    expect(positions(line(tube))[0]?.conductor).toMatchObject({
      model: 'tube',
      coreDiameterMm: 0,
      temperatureC: 50,
    });
    const other = {
      ...rest,
      conductor_diameter_mm: 30,
      conductor_dc_resistance20_ohm_per_km: 0.06,
      conductor_temperature_c: 50,
    };
    expect(positions(line(other))).toEqual(positions(line(tube)));
    expect(faults({ ...rest, conductor_diameter_mm: 30, conductor_gmr_mm: 12 })[0]).toMatch(
      /^2 conductor_model: /,
    );
    expect(faults({ ...handbook, conductor_gmr_mm: '' })[0]).toMatch(/^2 conductor_gmr_mm: GMR is missing/);
  });

  it('sags: a place’s own before the row’s, ground wires by theirs', () => {
    const wires = {
      ground_conductor: '7 No.8 Alumoweld',
      gw1_x_m: -5,
      gw1_height_m: 27,
      gw2_x_m: 5,
      gw2_height_m: 27,
      gw2_sag_m: 4.5,
    };
    const read = positions(line({ ...ROW, ...wires, sag_m: 7, gw_sag_m: 5, b_sag_m: 6.5 }));
    expect(read.map((p) => p.sagM)).toEqual([7, 6.5, 7, 5, 4.5]);
    // Its temperature is the phases’ where the row gives it none.
    expect(read[3]?.conductor).toMatchObject({ name: '7 No.8 Alumoweld', temperatureC: 50 });
  });

  it('a ground wire without a conductor is told at the conductor’s column', () => {
    expect(faults({ ...ROW, gw1_x_m: 0, gw1_height_m: 27 })[0]).toMatch(/^2 ground_conductor: /);
    expect(faults({ ...ROW, gw1_x_m: 0, ground_conductor: 'Cardinal' })[0]).toMatch(/^2 gw1_height_m: /);
  });

  it('bundles', () => {
    expect(positions(line({ ...ROW, bundle_count: 2, bundle_spacing_m: 0.4 }))[2]).toMatchObject({
      bundleCount: 2,
      bundleSpacingM: 0.4,
    });
    expect(faults({ ...ROW, bundle_count: 2 })).toEqual([
      '2 bundle_spacing_m: Bundle spacing is missing. Give it in\u2009m.',
    ]);
    expect(faults({ ...ROW, bundle_count: 2.5 })[0]).toMatch(/^2 bundle_count: .*whole number/);
  });
});

describe('two circuits, coupling, ratings, cable', () => {
  const SECOND = {
    c2_a_x_m: 9,
    c2_a_height_m: 30,
    c2_b_x_m: 9,
    c2_b_height_m: 36,
    c2_c_x_m: 9,
    c2_c_height_m: 42,
  };

  it('the second circuit has its own places and values', () => {
    const read = line({
      ...ROW,
      ...SECOND,
      c2_r1: 0.08,
      c2_x1: 0.41,
      c2_b1: 3.1,
      c2_x1_unit: 'ohm/mi',
      r0m: 0.2,
      x0m: 0.7,
      b0m: -0.6,
    });
    expect(read.circuitCount).toBe(2);
    expect(read.circuits.map((c) => [c.circuit, c.declared.x1?.unit])).toEqual([
      [1, 'ohm/km'],
      [2, 'ohm/mi'],
    ]);
    expect(read.mutual[0]?.declared.b0m?.perKm).toBe(-0.6);
    expect(
      faults({ ...ROW, c2_r1: 0.08, c2_x1: 0.4, c2_b1: 3, c2_a_x_m: 1, c2_a_height_m: 9 }).map(
        (f) => f.split(':')[0],
      ),
    ).toEqual(['2 c2_b_x_m', '2 c2_c_x_m']);
  });

  it('somebody else’s circuit on the same structure needs no values', () => {
    const { r1: _r, x1: _x, b1: _b, ...rest } = ROW;
    const read = line({ ...rest, ...SECOND, r1: '', x1: '', b1: '', c2_r1: 0.08, c2_x1: 0.41, c2_b1: 3.1 });
    expect(read.circuits.map((c) => c.circuit)).toEqual([2]);
    expect(faults({ ...rest, r1: '', x1: '', b1: '' }).map((f) => f.split(':')[0])).toEqual([
      '2 r1',
      '2 x1',
      '2 b1',
    ]);
  });

  it('ratings and basis', () => {
    const read = line({
      ...ROW,
      rating_a: 990,
      max_temperature_c: 75,
      rating1_season: 'winter',
      rating1_continuous_a: 1200,
      basis_kind: 'measured',
      circuit_id: 'SO-1',
    });
    expect(read.circuits[0]).toMatchObject({
      circuitId: 'SO-1',
      ratingA: 990,
      maxTemperatureC: 75,
      ratings: [{ season: 'winter', continuousA: 1200 }],
      basis: { kind: 'measured' },
    });
  });

  it('a cable row carries its maker’s values', () => {
    const values = {
      cable_r1: 0.03,
      cable_x1: 0.12,
      cable_b1: 60,
      cable_r0: 0.1,
      cable_x0: 0.08,
      cable_b0: 60,
    };
    const cable = { name: 'L', section: 2, kind: 'cable', length_km: 2, ...values };
    const read = line(ROW, cable);
    expect(read.sections[1]).toMatchObject({ kind: 'cable', input: { perLength: [{ r1: 0.03, b0: 60 }] } });
    // On a later row the plain columns may hold them, since declared values stand on the first.
    const plain = {
      name: 'L',
      section: 2,
      kind: 'cable',
      length_km: 2,
      r1: 0.03,
      x1: 0.12,
      b1: 60,
      r0: 0.1,
      x0: 0.08,
      b0: 60,
    };
    const zero = { r0: 0.2, x0: 1.2, b0: 2 };
    expect(line({ ...ROW, ...zero }, plain).sections[1]).toEqual(
      line({ ...ROW, ...zero }, cable).sections[1],
    );
    const own = { ...cable, cable_impedance_unit: 'ohm/mi' };
    expect(line(ROW, own).sections[1]).toMatchObject({ input: { perLength: [{ r1: 0.03 / 1.609344 }] } });
    expect(faults(ROW, { ...cable, cable_b0: '' })).toEqual(['3 cable_b0: B0 is missing.']);
    expect(faults(ROW, { ...cable, ...PHASES })[0]).toMatch(/^3 (conductor|a_x_m): A cable section has no/);
  });
});
