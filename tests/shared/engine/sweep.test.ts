import { describe, expect, it } from 'vitest';
import {
  logarithmicGrid,
  solveSection,
  sweep,
  withSkinEffect,
  type OverheadSection,
} from '#shared/engine/index';
import { goldenLines } from './golden-lines';
import { expectReal } from './tolerance';

const grid = logarithmicGrid(1, 1e6, 25);

describe('frequency sweep', () => {
  it.each(goldenLines)('is the solve at each frequency: $name', ({ section }) => {
    const result = sweep(section, grid);
    if (!result.ok) throw new Error(result.detail);
    grid.forEach((f, k) => {
      const point = solveSection(section, f);
      if (!point.ok) throw new Error(point.detail);
      point.value.circuits.forEach((c, i) => {
        const row = result.value.circuits[i];
        expectReal(row?.r1[k] ?? NaN, c.r1, 1e-11, 'r1');
        expectReal(row?.r0[k] ?? NaN, c.r0, 1e-11, 'r0');
        expectReal((row?.l1[k] ?? NaN) * 2 * Math.PI * f, 1000 * c.x1, 1e-11, 'l1');
        expectReal((row?.l0[k] ?? NaN) * 2 * Math.PI * f, 1000 * c.x0, 1e-11, 'l0');
        expectReal(row?.b1[k] ?? NaN, c.b1, 1e-12, 'b1');
        expectReal(row?.b0[k] ?? NaN, c.b0, 1e-12, 'b0');
      });
    });
  });

  it('R rises and L falls with frequency (passive, causal line)', () => {
    for (const { section } of goldenLines) {
      const result = sweep(section, grid);
      if (!result.ok) throw new Error(result.detail);
      for (const c of result.value.circuits) {
        for (let k = 1; k < grid.length; k++) {
          expect(c.r0[k]).toBeGreaterThan((c.r0[k - 1] ?? NaN) * (1 - 1e-12));
          expect(c.l0[k]).toBeLessThan((c.l0[k - 1] ?? NaN) * (1 + 1e-12));
        }
      }
    }
  });

  it('keeps handbook data unless skin effect is asked for, and says which', () => {
    const handbook = {
      model: 'handbook' as const,
      diameterMm: 28.14,
      coreDiameterMm: 10.36,
      gmrMm: 11.37,
      acResistanceOhmPerKm: 0.0798,
      dcResistance20OhmPerKm: 0.0702,
      temperatureC: 50,
    };
    const first = goldenLines[0]?.section as OverheadSection;
    const section = { ...first, positions: first.positions.map((p) => ({ ...p, conductor: handbook })) };
    const plain = sweep(section, [60, 1e5]);
    const skin = sweep(section, [60, 1e5], true);
    if (!plain.ok || !skin.ok) throw new Error('not computed');
    expect(plain.value.conductors).toBe('as-filed');
    expect(skin.value.conductors).toBe('tube');
    const [p, q] = [plain.value.circuits[0], skin.value.circuits[0]];
    // Alike at power frequency (the tabled resistance is made of the same skin effect), far apart at 100 kHz.
    expectReal(q?.r1[0] ?? NaN, p?.r1[0] ?? NaN, 0.01);
    expect(q?.r1[1]).toBeGreaterThan(3 * (p?.r1[1] ?? NaN));
    const without = { ...handbook, dcResistance20OhmPerKm: undefined };
    const bare = {
      ...section,
      positions: section.positions.map((x, i) => (i === 0 ? { ...x, conductor: without } : x)),
    };
    expect(withSkinEffect(bare).conductors).toBe('mixed');
  });

  it('grids are even in their logarithm and keep both ends', () => {
    expect(grid[0]).toBe(1);
    expect(grid[24]).toBe(1e6);
    expectReal((grid[13] ?? NaN) / (grid[12] ?? NaN), 10 ** 0.25, 1e-12);
  });
});
