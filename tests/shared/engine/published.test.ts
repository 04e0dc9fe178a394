import { describe, expect, it } from 'vitest';
import { derive, solveLine, solveSection, type OverheadSection, type Pair } from '#shared/engine/index';
import { toSequence } from '#shared/engine/matrices';
import { uniformTwoPort } from '#shared/engine/two-port';
import table from '../../golden/engine/worked-examples.json';
import { deviation, expectPrinted, expectReal } from './tolerance';

// worked-examples.json: published examples with their sources; "verified" there says whether the numbers were read in
// public text (T), are from memory and reproduced by arithmetic (M) or were computed for the table (C).

describe('Gonen, Electric Power Transmission System Engineering, 2nd ed., Examples 9.3–9.5 (T)', () => {
  it('sequence matrix of a line that is not transposed, all digits', () => {
    const example = table.examples.find((e) => e.id === 'GONEN-9.3');
    const { z_abc_ohm: phase, z_012_ohm: wanted } = example?.outputs as unknown as {
      z_abc_ohm: Pair[][];
      z_012_ohm: Pair[][];
    };
    const got = toSequence(phase);
    wanted.forEach((row, i) =>
      row.forEach((z, j) => {
        const pair = got[i]?.[j] ?? [NaN, NaN];
        // The phase matrix is printed to four decimals, so is what comes of it.
        expect(Math.hypot(pair[0] - z[0], pair[1] - z[1]), `Z012 ${i}${j}`).toBeLessThan(1.5e-4);
      }),
    );
  });
});

describe('Glover/Sarma/Overbye, Examples 5.1–5.3: two-ports of long lines (M + C)', () => {
  it('A, B and C of the 765 kV line, exact', () => {
    const port = uniformTwoPort([0.0165 * 300, 0.3306 * 300], [0, 4.674e-6 * 300]);
    expect(deviation([port.a[0] + 1, port.a[1]], [0.931265, 0.003391])).toBeLessThan(1e-6);
    expect(deviation(port.b, [4.7229, 96.9027])).toBeLessThan(1e-6);
    expect(deviation(port.c, [-1.59964e-6, 0.00136992])).toBeLessThan(4e-6);
  });

  it('equivalent and nominal pi of the same line', () => {
    const values = { r1: 0.0165, x1: 0.3306, b1: 4.674, r0: 0.1, x0: 1, b0: 3 };
    const result = solveLine({
      frequencyHz: 60,
      sections: [{ kind: 'cable', lengthKm: 300, perLength: [values] }],
    });
    if (!result.ok) throw new Error(result.detail);
    const pi = result.value.equivalent[0];
    expectPrinted(pi?.r ?? NaN, 4.7229, 1e-4);
    expectPrinted(pi?.x ?? NaN, 96.9027, 1e-4);
    expectPrinted((pi?.b ?? NaN) / 2e6, 0.000709339, 1e-9);
    expectReal(result.value.nominal[0]?.x ?? NaN, 99.18, 1e-12);
    expectReal((result.value.nominal[0]?.b ?? NaN) / 2e6, 0.0007011, 1e-12);
  });

  it('A of the 345 kV line: 0.9706 at 0.159°, B 6.4 + j70 Ω', () => {
    const port = uniformTwoPort([6.4, 70], [0, 4.2e-6 * 200]);
    const a = [port.a[0] + 1, port.a[1]] as const;
    // The book uses the nominal pi here; the exact A differs in the fourth digit.
    expect(Math.hypot(...a)).toBeCloseTo(0.9706, 3);
    expect((Math.atan2(a[1], a[0]) * 180) / Math.PI).toBeCloseTo(0.159, 2);
  });
});

describe('Kundur, Power System Stability and Control, Table 6.1 (M)', () => {
  // The table prints two or three digits of each value, from data with as many.
  const rows = table.examples
    .filter((e) => e.id.startsWith('KUNDUR'))
    .map((e) => ({
      kv: Number(e.id.slice(7)),
      inputs: e.inputs as { r_ohm_per_km: number; x_ohm_per_km: number; b_uS_per_km: number },
      outputs: e.outputs as { zc_ohm: number; sil_MW: number; charging_Mvar_per_km: number },
    }));

  it.each(rows)('$kv kV: surge impedance, loading, charging', ({ kv, inputs, outputs }) => {
    const d = derive({ r1: inputs.r_ohm_per_km, x1: inputs.x_ohm_per_km, b1: inputs.b_uS_per_km }, 60, kv);
    expectReal(d.surgeImpedanceOhm ?? NaN, outputs.zc_ohm, 0.003);
    expectReal(d.surgeImpedanceLoadingMw ?? NaN, outputs.sil_MW, 0.01);
    expectPrinted(d.chargingMvarPerKm ?? NaN, outputs.charging_Mvar_per_km, 0.01, 1);
    expect(d.waveSpeed).toBeGreaterThan(0.96);
    expect(d.waveSpeed).toBeLessThan(0.99);
  });
});

describe('reference cases computed with exact Carson by another program (C)', () => {
  interface Reference {
    frequency_hz: number;
    earth_resistivity_ohm_m: number;
    phase_xy_m: [number, number][];
    shield_xy_m: [number, number][];
    subconductor: { r_ohm_per_km: number; gmr_m: number; radius_m: number };
    bundle_n: number;
    bundle_spacing_m: number;
    shield: { r_ohm_per_km: number; gmr_m: number; radius_m: number } | null;
  }

  function conductor(c: { r_ohm_per_km: number; gmr_m: number; radius_m: number }) {
    return {
      model: 'handbook' as const,
      diameterMm: c.radius_m * 2000,
      gmrMm: c.gmr_m * 1000,
      acResistanceOhmPerKm: c.r_ohm_per_km,
    };
  }

  function build(r: Reference): OverheadSection {
    const phases = r.phase_xy_m.map(([x, y], i) => ({
      kind: 'phase' as const,
      circuit: 1 + Math.floor(i / 3),
      phase: (['a', 'b', 'c'] as const)[i % 3] ?? 'a',
      conductor: conductor(r.subconductor),
      horizontalM: x,
      attachmentHeightM: y,
      sagM: 0,
      bundleCount: r.bundle_n,
      bundleSpacingM: r.bundle_spacing_m,
    }));
    const wires = r.shield_xy_m.map(([x, y]) => ({
      kind: 'ground-wire' as const,
      conductor: conductor(r.shield ?? r.subconductor),
      horizontalM: x,
      attachmentHeightM: y,
      sagM: 0,
    }));
    const { earth_resistivity_ohm_m: earthResistivityOhmM } = r;
    return {
      kind: 'overhead',
      lengthKm: 1,
      earthResistivityOhmM,
      groundWireBonding: 'continuous',
      positions: [...phases, ...wires],
    };
  }

  const cases = table.examples
    .filter((e) => e.id.startsWith('REF-'))
    .map((e) => ({
      id: e.id,
      inputs: e.inputs as unknown as Reference,
      outputs: e.outputs as unknown as Record<string, unknown>,
    }));

  it.each(cases)('$id', ({ inputs, outputs }) => {
    const result = solveSection(build(inputs), inputs.frequency_hz);
    if (!result.ok) throw new Error(result.detail);
    const c = result.value.circuits[0];
    // Printed to six digits; bundles there are one equivalent conductor, worth up to 3e-4 here.
    const tolerance = inputs.bundle_n === 1 ? 1e-5 : 6e-4;
    expect(deviation([c?.r1 ?? NaN, c?.x1 ?? NaN], outputs['z1'] as number[])).toBeLessThan(tolerance);
    expect(deviation([c?.r0 ?? NaN, c?.x0 ?? NaN], outputs['z0'] as number[])).toBeLessThan(tolerance);
    expect(deviation([c?.b1 ?? NaN], [outputs['b1'] as number])).toBeLessThan(tolerance);
    expect(deviation([c?.b0 ?? NaN], [outputs['b0'] as number])).toBeLessThan(tolerance);
  });
});
