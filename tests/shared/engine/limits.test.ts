import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { solveLine, type ConductorData, type OverheadSection } from '#shared/engine/index';
import { apart, constants, dice, holds, mapPositions, matrices, RUNS } from './properties';
import { buildLine } from './random-lines';
import { referenceSection } from './reference';
import { expectComplex, expectReal } from './tolerance';

describe('limits', () => {
  it('a perfect earth leaves the images alone (against the reference without earth)', () => {
    holds(
      (s) => {
        const image = referenceSection(s, 60, () => [0, 0]);
        const got = constants({ ...s, earthResistivityOhmM: 1e-16 });
        got.circuits.forEach((c, i) => {
          expectComplex([c.r1, c.x1], image[i]?.z1 ?? [], 1e-6);
          expectComplex([c.r0, c.x0], image[i]?.z0 ?? [], 1e-6);
        });
      },
      { ...RUNS, numRuns: 25 },
    );
  });

  it('perfect conductors above a perfect earth guide a wave at the speed of light: X·B = (ω/c)² unit matrix', () => {
    holds((s) => {
      const perfect = (c: ConductorData): ConductorData => ({
        model: 'handbook',
        diameterMm: c.diameterMm,
        gmrMm: c.diameterMm / 2,
        acResistanceOhmPerKm: 1e-9,
      });
      const ideal = mapPositions(s, (p) => ({ ...p, conductor: perfect(p.conductor) }));
      const m = matrices({ ...ideal, earthResistivityOhmM: 1e-12, groundWireBonding: 'continuous' });
      const wanted = ((2 * Math.PI * 60) / 299_792.458) ** 2 * 1e6;
      const b = m.phaseSusceptanceMicrosiemensPerKm;
      m.phaseImpedanceOhmPerKm.forEach((row, i) =>
        row.forEach((_, k) => {
          const product = row.reduce((sum, [, x], j) => sum + x * (b[j]?.[k] ?? NaN), 0);
          expect(Math.abs(product / wanted - (i === k ? 1 : 0))).toBeLessThan(1e-5);
        }),
      );
    });
  });

  it('segmented ground wires carry nothing: Z as without them, B as with them', () => {
    holds((s, d) => {
      if (d.groundWires === 0) return;
      const bare = { ...s, positions: s.positions.filter((p) => p.kind === 'phase') };
      const open = constants({ ...s, groundWireBonding: 'segmented' }).circuits[0];
      expectReal(open?.x0 ?? NaN, constants(bare).circuits[0]?.x0 ?? NaN, 1e-12);
      const closed = constants({ ...s, groundWireBonding: 'continuous' }).circuits[0];
      expectReal(open?.b0 ?? NaN, closed?.b0 ?? NaN, 1e-12);
    });
  });
});

describe('sections in series', () => {
  it('their order changes neither means nor totals, and a cut changes nothing', () => {
    fc.assert(
      fc.property(dice, dice, (d, e) => {
        const [a, b] = [buildLine(d), { ...buildLine({ ...e, circuits: d.circuits }), lengthKm: 75 }];
        const solve = (sections: OverheadSection[]) => {
          const result = solveLine({ frequencyHz: 60, sections });
          if (!result.ok) throw new Error(result.detail);
          return result.value;
        };
        const there = solve([a, b]);
        const back = solve([b, a]);
        const cut = solve([{ ...a, lengthKm: 15 }, { ...a, lengthKm: 25 }, b]);
        for (const other of [back, cut]) {
          expect(apart(other, there)).toBeLessThan(1e-12);
          const [p, q] = [there.equivalent[0], other.equivalent[0]];
          for (const key of ['x', 'b', 'x0', 'b0'] as const)
            expectReal(q?.[key] ?? NaN, p?.[key] ?? NaN, 1e-11, key);
        }
      }),
      { ...RUNS, numRuns: 100 },
    );
  });

  it('a short line’s equivalent pi is its nominal one, a long line’s parts by about 1 % in X at 200 km', () => {
    const s = buildLine({
      circuits: 1,
      bundleCount: 2,
      groundWires: 2,
      tube: false,
      segmented: false,
      spacing: 0.5,
      height: 0.3,
      sag: 0.5,
      diameter: 0.5,
      resistivity: 0.4,
      skew: 0,
    });
    const totals = (lengthKm: number) => {
      const result = solveLine({ frequencyHz: 60, sections: [{ ...s, lengthKm }] });
      if (!result.ok) throw new Error(result.detail);
      return { equivalent: result.value.equivalent[0], nominal: result.value.nominal[0] };
    };
    const short = totals(1);
    expectReal(short.equivalent?.x ?? NaN, short.nominal?.x ?? NaN, 1e-6);
    const long = totals(200);
    const part = 1 - (long.equivalent?.x ?? NaN) / (long.nominal?.x ?? NaN);
    expect(part).toBeGreaterThan(0.007);
    expect(part).toBeLessThan(0.014);
  });
});
