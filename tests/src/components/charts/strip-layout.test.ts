import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layOutStrip, ratioText, type StripValues } from '../../../../src/components/charts/strip-layout';
import { textWidth } from '../../../../src/components/charts/text-width';

const X1: StripValues = {
  outer: [0.23, 0.62],
  typical: [0.33, 0.4],
  declared: 0.613,
  recomputed: 0.381,
  range: null,
  outOfTolerance: true,
};

describe('strip', () => {
  it('runs from the outer lower to the outer upper limit', () => {
    const layout = layOutStrip({ ...X1, declared: 0.62, recomputed: 0.23 }, 272);
    expect([layout.start, layout.end]).toEqual([8, 264]);
    expect(layout.recomputed).toEqual({ x: 8, pinned: null });
    expect(layout.declared).toEqual({ x: 264, pinned: null });
  });

  it('places band and values in proportion', () => {
    const layout = layOutStrip(X1, 272);
    const at = (v: number) => 8 + ((v - 0.23) / (0.62 - 0.23)) * 256;
    expect(layout.band[0]).toBeCloseTo(at(0.33), 9);
    expect(layout.band[1]).toBeCloseTo(at(0.4), 9);
    expect(layout.declared?.x).toBeCloseTo(at(0.613), 9);
  });

  it('does not move its scale for the line: the same value stands at the same place whatever the others are', () => {
    const one = layOutStrip({ ...X1, recomputed: 0.24 }, 300);
    const other = layOutStrip({ ...X1, recomputed: 0.61 }, 300);
    expect(one.declared).toEqual(other.declared);
    expect(one.ticks).toEqual(other.ticks);
  });

  it('pins what lies beyond to the end that it lies beyond', () => {
    const layout = layOutStrip({ ...X1, declared: 9, recomputed: 0.001 }, 272);
    expect(layout.declared).toEqual({ x: 264, pinned: 'high' });
    expect(layout.recomputed).toEqual({ x: 8, pinned: 'low' });
  });

  it('draws no whisker under 5 px and none for a value that is pinned', () => {
    const wide = layOutStrip({ ...X1, range: [0.37, 0.39] }, 272).whisker;
    expect(wide && wide[1] - wide[0]).toBeCloseTo((0.02 / 0.39) * 256, 6);
    expect(layOutStrip({ ...X1, range: [0.379, 0.383] }, 272).whisker).toBeNull();
    expect(layOutStrip({ ...X1, recomputed: 0.7, range: [0.5, 0.9] }, 272).whisker).toBeNull();
  });

  it('carries the ratio on a dimension line only beyond the tolerance', () => {
    expect(layOutStrip(X1, 272).dimension?.text).toBe('× 1.61');
    expect(layOutStrip({ ...X1, outOfTolerance: false }, 272).dimension).toBeNull();
    expect(layOutStrip({ ...X1, declared: null }, 272).dimension).toBeNull();
    expect(layOutStrip({ ...X1, declared: -0.613 }, 272).dimension).toBeNull();
  });

  it('puts the ratio beside the pair where it does not fit between', () => {
    const near = layOutStrip({ ...X1, declared: 0.398 }, 272).dimension;
    expect(near?.anchor).toBe('start');
    expect(near?.arrows).toBe('outside');
    const atEnd = layOutStrip({ ...X1, declared: 0.615, recomputed: 0.59 }, 272).dimension;
    expect(atEnd?.anchor).toBe('end');
  });

  it('keeps everything on the paper, for any values and widths', () => {
    const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(value, value, fc.integer({ min: 180, max: 600 }), (declared, recomputed, width) => {
        const layout = layOutStrip({ ...X1, declared, recomputed, outOfTolerance: true }, width);
        const xs = [layout.declared?.x, layout.recomputed?.x, ...layout.ticks, ...layout.band];
        for (const x of xs) {
          expect(x).toBeGreaterThanOrEqual(layout.start);
          expect(x).toBeLessThanOrEqual(layout.end);
        }
        const dimension = layout.dimension;
        if (!dimension) return;
        const words = textWidth(dimension.text, 11);
        const share = { start: 0, middle: 0.5, end: 1 }[dimension.anchor];
        expect(dimension.textX - share * words).toBeGreaterThanOrEqual(0);
        expect(dimension.textX + (1 - share) * words).toBeLessThanOrEqual(width);
      }),
    );
  });

  it('writes ratios in three digits', () => {
    expect([ratioText(1.609), ratioText(0.79012), ratioText(1000)]).toEqual(['× 1.61', '× 0.790', '× 1.0e3']);
  });
});
