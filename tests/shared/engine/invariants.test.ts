import { describe, expect, it } from 'vitest';
import { derive, type ConductorData, type OverheadSection } from '#shared/engine/index';
import { apart, constants, holds, mapPositions, matrices } from './properties';
import { buildLine } from './random-lines';
import { expectComplex, expectReal } from './tolerance';

/** Whether a symmetric matrix is positive definite, by Cholesky. */
function positiveDefinite(m: readonly (readonly number[])[]): boolean {
  const l: number[][] = [];
  for (let i = 0; i < m.length; i++) {
    l.push([]);
    for (let j = 0; j <= i; j++) {
      let sum = m[i]?.[j] ?? NaN;
      for (let k = 0; k < j; k++) sum -= (l[i]?.[k] ?? NaN) * (l[j]?.[k] ?? NaN);
      if (i === j && !(sum > 0)) return false;
      l[i]?.push(i === j ? Math.sqrt(sum) : sum / (l[j]?.[j] ?? NaN));
    }
  }
  return true;
}

describe('what holds for every line', () => {
  it('reciprocity and passivity: Z and B symmetric, Re Z and B positive definite', () => {
    holds((s) => {
      const m = matrices(s);
      const re = m.phaseImpedanceOhmPerKm.map((row) => row.map(([r]) => r));
      re.forEach((row, i) => row.forEach((r, j) => expect(r).toBe(re[j]?.[i])));
      expect(positiveDefinite(re)).toBe(true);
      expect(positiveDefinite(m.phaseSusceptanceMicrosiemensPerKm)).toBe(true);
    });
  });

  it('Maxwell: couplings of B are negative, and no phase holds less charge than it lends', () => {
    holds((s) => {
      matrices(s).phaseSusceptanceMicrosiemensPerKm.forEach((row, i) => {
        row.forEach((b, j) => expect(i === j ? b > 0 : b < 0).toBe(true));
        expect(row.reduce((sum, b) => sum + b, 0)).toBeGreaterThan(0);
      });
    });
  });

  it('overhead order: R0 > R1, X0 > X1, B0 < B1, and a wave slower than light, not below 0.9 of it', () => {
    holds((s) => {
      for (const c of constants(s).circuits) {
        expect(c.r0).toBeGreaterThan(c.r1);
        expect(c.x0).toBeGreaterThan(c.x1);
        expect(c.b0).toBeLessThan(c.b1);
        const speed = derive(c, 60).waveSpeed ?? NaN;
        expect(speed).toBeGreaterThan(0.9);
        expect(speed).toBeLessThan(1);
      }
    });
  });

  it('a mutual’s square stays below the product of the two selves', () => {
    holds((s, d) => {
      if (d.circuits === 1) return;
      const { circuits, mutual } = constants(s);
      const [one, two] = circuits;
      const m = mutual[0];
      if (!one || !two || !m) throw new Error('circuit missing');
      expect(m.x0m * m.x0m).toBeLessThan(one.x0 * two.x0);
      expect(m.b0m * m.b0m).toBeLessThan(one.b0 * two.b0);
      expect(m.b0m).toBeLessThan(0);
    });
  });
});

describe('what changes nothing', () => {
  it('the order of the positions', () => {
    holds((s) => {
      expect(apart(constants({ ...s, positions: [...s.positions].reverse() }), constants(s))).toBeLessThan(
        1e-11,
      );
    });
  });

  it('moving the axis sideways, and looking from behind', () => {
    holds((s) => {
      const moved = mapPositions(s, (p) => ({ ...p, horizontalM: p.horizontalM + 137 }));
      expect(apart(constants(moved), constants(s))).toBeLessThan(1e-10);
      // Triangles and pentagons look the same from behind only with the first corner on top, as drawn.
      const mirrored = mapPositions(s, (p) => ({ ...p, horizontalM: -p.horizontalM }));
      expect(apart(constants(mirrored), constants(s))).toBeLessThan(1e-11);
    });
  });

  it('height and sag that give the same average height', () => {
    holds((s) => {
      const flat = mapPositions(s, (p) => ({
        ...p,
        attachmentHeightM: p.attachmentHeightM - (2 * p.sagM) / 3,
        sagM: 0,
      }));
      expect(apart(constants(flat), constants(s))).toBeLessThan(1e-11);
    });
  });

  it('a ground wire far away', () => {
    holds((s) => {
      const conductor: ConductorData = {
        model: 'handbook',
        diameterMm: 9,
        gmrMm: 1,
        acResistanceOhmPerKm: 4,
      };
      const far = {
        kind: 'ground-wire' as const,
        conductor,
        horizontalM: 90_000,
        attachmentHeightM: 20,
        sagM: 0,
      };
      expect(apart(constants({ ...s, positions: [...s.positions, far] }), constants(s))).toBeLessThan(1e-6);
    });
  });

  it('swapping the numbers of two circuits, but for their order', () => {
    holds((s, d) => {
      if (d.circuits === 1) return;
      const swapped = mapPositions(s, (p) => (p.kind === 'phase' ? { ...p, circuit: 3 - p.circuit } : p));
      const own = constants(s);
      const other = constants(swapped);
      expect(apart({ ...other, circuits: [...other.circuits].reverse() }, own)).toBeLessThan(1e-11);
    });
  });
});

describe('how values scale', () => {
  /** All lengths times k, soil so that the earth looks the same. */
  function scaled(s: OverheadSection, k: number): OverheadSection {
    const grow = (c: ConductorData): ConductorData => ({
      ...c,
      diameterMm: c.diameterMm * k,
      ...(c.gmrMm !== undefined && { gmrMm: c.gmrMm * k }),
      ...(c.coreDiameterMm !== undefined && { coreDiameterMm: c.coreDiameterMm * k }),
    });
    const positions = s.positions.map((p) => ({
      ...p,
      conductor: grow(p.conductor),
      horizontalM: p.horizontalM * k,
      attachmentHeightM: p.attachmentHeightM * k,
      sagM: p.sagM * k,
      ...(p.kind === 'phase' && { bundleSpacingM: p.bundleSpacingM * k }),
    }));
    return { ...s, positions, earthResistivityOhmM: s.earthResistivityOhmM * k * k };
  }

  it('lengths: a drawing twice as large over soil of four times the resistivity is the same line', () => {
    holds((s) => {
      expect(apart(constants(scaled(s, 2)), constants(s))).toBeLessThan(1e-10);
    });
  });

  it('frequency: B in proportion; with soil and resistances in proportion, Z of handbook conductors too', () => {
    holds((s, d) => {
      const [slow, fast] = [constants(s, 50), constants(s, 100)];
      slow.circuits.forEach((c, i) => expectReal(fast.circuits[i]?.b1 ?? NaN, 2 * c.b1, 1e-12));
      if (d.tube) return;
      const double = (c: ConductorData): ConductorData => ({
        ...c,
        acResistanceOhmPerKm: 2 * (c.acResistanceOhmPerKm ?? NaN),
      });
      const other = mapPositions(s, (p) => ({ ...p, conductor: double(p.conductor) }));
      const got = constants({ ...other, earthResistivityOhmM: 2 * s.earthResistivityOhmM }, 100);
      slow.circuits.forEach((c, i) => {
        expectComplex([got.circuits[i]?.r1 ?? NaN, got.circuits[i]?.x1 ?? NaN], [2 * c.r1, 2 * c.x1], 1e-11);
        expectComplex([got.circuits[i]?.r0 ?? NaN, got.circuits[i]?.x0 ?? NaN], [2 * c.r0, 2 * c.x0], 1e-11);
      });
    });
  });

  it('X1 falls with every further subconductor and B1 rises', () => {
    holds((s, d) => {
      const more = buildLine({ ...d, bundleCount: d.bundleCount + 1 });
      const [one, two] = [constants(s).circuits[0], constants(more).circuits[0]];
      expect(two?.x1).toBeLessThan(one?.x1 ?? NaN);
      expect(two?.b1).toBeGreaterThan(one?.b1 ?? NaN);
    });
  });

  it('X1 of a flat line without ground wires rises with the spacing, B1 falls', () => {
    holds((s, d) => {
      if (d.circuits === 2 || d.groundWires > 0) return;
      const wide = mapPositions(s, (p) => ({ ...p, horizontalM: 1.3 * p.horizontalM }));
      expect(constants(wide).circuits[0]?.x1).toBeGreaterThan(constants(s).circuits[0]?.x1 ?? NaN);
      expect(constants(wide).circuits[0]?.b1).toBeLessThan(constants(s).circuits[0]?.b1 ?? NaN);
    });
  });
});
