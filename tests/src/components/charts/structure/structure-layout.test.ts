import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  FEET,
  METRES,
  type DrawnPosition,
} from '../../../../../src/components/charts/structure/drawn-position';
import { overlaps } from '../../../../../src/components/charts/structure/label-placing';
import { layOutStructure } from '../../../../../src/components/charts/structure/structure-layout';
import { DELTA, FLAT, groundWire, phase, TWO_CIRCUITS } from './positions';

const draw = (positions: readonly DrawnPosition[], width = 470, clearanceM: number | null = null) =>
  layOutStructure(positions, { width, tallest: 520, unit: METRES, clearanceM });

const texts = (layout: ReturnType<typeof draw>) => layout.dimensions.map((d) => d.text);

describe('a structure on paper', () => {
  it('is to scale, the same across and up', () => {
    const layout = draw(FLAT);
    const [a, b, c] = layout.marks;
    const perM = layout.frame.pixelsPerM;
    expect((c?.x ?? 0) - (a?.x ?? 0)).toBeCloseTo(18 * perM, 6);
    expect(layout.frame.groundY - (b?.y ?? 0)).toBeCloseTo(24 * perM, 6);
    expect((b?.midY ?? 0) - (b?.y ?? 0)).toBeCloseTo(9 * perM, 6);
    expect(b?.x).toBeCloseTo(layout.frame.centreX, 6);
  });

  it('dimensions what was entered: heights, spacings from the centre line, sag, height at mid-span', () => {
    expect(texts(draw(FLAT)).sort()).toEqual(
      ['15.00', '24.00', '30.00', '6.50', '6.50', '9.00', '9.00', 'sag 9.00'].sort(),
    );
  });

  it('writes feet where lengths are in feet', () => {
    const layout = layOutStructure(FLAT, { width: 470, tallest: 520, unit: FEET, clearanceM: null });
    expect(texts(layout)).toContain('78.74');
    expect(texts(layout)).toContain('29.53');
  });

  it('shades the zone under the least clearance only where it is broken, and marks what breaks it', () => {
    expect(draw(FLAT, 470, 7).zone).toBeNull();
    const layout = draw(DELTA, 470, 7);
    expect(layout.zone?.height).toBeCloseTo(7 * layout.frame.pixelsPerM, 6);
    expect(layout.marks.filter((m) => m.bad).map((m) => m.position.id)).toEqual(['1c']);
    expect(layout.dimensions.filter((d) => d.bad).map((d) => d.text)).toEqual(['5.80', '12.00']);
  });

  it('gives rows of their own to offsets too close for one chain', () => {
    const layout = draw(TWO_CIRCUITS);
    const across = layout.dimensions.filter((d) => d.along === 'x');
    expect(across.map((d) => d.text).sort()).toEqual(['5.20', '5.20', '5.60', '5.60', '7.40', '7.40']);
    expect(new Set(across.map((d) => d.at)).size).toBe(3);
  });

  it('shrinks the discs of positions that would touch', () => {
    expect(draw(FLAT).discRadius).toBe(9);
    const close = [phase('a', 1, -0.3, 12, 1), phase('b', 1, 0, 12.2, 1), phase('c', 1, 0.3, 12, 1)];
    expect(draw(close, 300).discRadius).toBeLessThan(9);
  });

  it('draws nothing of a position whose figures are not numbers yet', () => {
    const layout = draw([...FLAT, phase('x', 1, NaN, 20, 1)]);
    expect(layout.marks).toHaveLength(5);
    expect(draw([]).marks).toEqual([]);
  });

  it('keeps the scale while the extent is held, so that nothing moves under the hand', () => {
    const before = draw(FLAT);
    const moved = FLAT.map((p) => (p.id === '1c' ? { ...p, horizontalM: 14 } : p));
    const held = layOutStructure(moved, {
      width: 470,
      tallest: 520,
      unit: METRES,
      clearanceM: null,
      extent: before.extent,
    });
    expect(held.frame.pixelsPerM).toBeCloseTo(before.frame.pixelsPerM, 9);
    expect(held.marks[0]?.x).toBeCloseTo(before.marks[0]?.x ?? NaN, 6);
  });
});

describe('the magnifier of a bundle', () => {
  it('stands clear of every disc, figure and upright dimension line, at any width', () => {
    for (const width of [324, 400, 470, 560, 700])
      for (const positions of [FLAT, TWO_CIRCUITS]) {
        const layout = draw(positions, width);
        expect(layout.lenses).toHaveLength(1);
        for (const { place, radius } of layout.lenses) {
          const lens = { ...place, width: 2 * radius, height: 2 * radius };
          for (const mark of layout.marks)
            expect(overlaps(lens, { x: mark.x, y: mark.y, width: 10, height: 10 })).toBe(false);
          for (const dimension of layout.dimensions) expect(overlaps(lens, dimension.box)).toBe(false);
        }
      }
  });

  it('is shown once for bundles that are alike, and not for single conductors', () => {
    expect(draw(DELTA).lenses).toEqual([]);
    const mixed = [...FLAT.slice(0, 2), phase('c', 1, 9, 24, 9, { count: 4, spacingM: 0.4 })];
    expect(draw(mixed).lenses).toHaveLength(2);
  });
});

describe('any structure', () => {
  const positions = fc
    .array(
      fc.tuple(
        fc.double({ min: -25, max: 25, noNaN: true }),
        fc.double({ min: 6, max: 70, noNaN: true }),
        fc.double({ min: 0, max: 5, noNaN: true }),
      ),
      { minLength: 3, maxLength: 8 },
    )
    .map((list) =>
      list.map(([x, h, sag], i) =>
        i < 6 ? phase('abc'[i % 3] ?? 'a', i < 3 ? 1 : 2, x, h, sag) : groundWire(String(i), x, h, sag),
      ),
    );

  it('fits the width, stands on the ground and keeps its figures off each other where there is room', () => {
    fc.assert(
      fc.property(positions, fc.integer({ min: 320, max: 900 }), (drawn, width) => {
        const layout = draw(drawn, width, 7);
        for (const mark of layout.marks) {
          expect(mark.x).toBeGreaterThanOrEqual(0);
          expect(mark.x).toBeLessThanOrEqual(width);
          expect(mark.y).toBeGreaterThanOrEqual(0);
          expect(mark.y).toBeLessThanOrEqual(layout.frame.groundY);
        }
        for (const d of layout.dimensions) expect(Number.isFinite(d.at + d.from + d.to + d.box.x)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});
