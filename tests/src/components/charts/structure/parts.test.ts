import { describe, expect, it } from 'vitest';
import { bundlePolygon, spacingPair } from '../../../../../src/components/charts/structure/bundle';
import { describeStructure } from '../../../../../src/components/charts/structure/describe';
import { offsets } from '../../../../../src/components/charts/structure/dimensions';
import {
  lengthText,
  METRES,
  smallLengthText,
  FEET,
} from '../../../../../src/components/charts/structure/drawn-position';
import { overlaps, placeLabels } from '../../../../../src/components/charts/structure/label-placing';
import { nudged, snap } from '../../../../../src/components/charts/structure/use-position-drag';
import { bundleOffsets } from '#shared/engine/index';
import { DELTA, FLAT } from './positions';

describe('bundles', () => {
  it.each([2, 3, 4, 5, 6, 7, 8])('draws %i subconductors where the engine computes them', (count) => {
    const side = 0.4;
    const radius = side / (2 * Math.sin(Math.PI / count));
    const key = (points: readonly (readonly [number, number])[]) =>
      points.map(([x, y]) => `${x.toFixed(6)}/${y.toFixed(6)}`.replaceAll('-0.000000', '0.000000')).sort();
    const drawn = bundlePolygon(count).map(([x, y]) => [x * radius, y * radius] as const);
    const flat = bundleOffsets(count, side);
    const computed = Array.from(
      { length: count },
      (_, i) => [flat[2 * i] ?? NaN, flat[2 * i + 1] ?? NaN] as const,
    );
    expect(key(drawn)).toEqual(key(computed));
  });

  it('dimensions the lowest level side', () => {
    const [i, j] = spacingPair(4);
    const points = bundlePolygon(4);
    expect(points[i]?.[1]).toBeCloseTo(points[j]?.[1] ?? NaN, 9);
    expect(points[i]?.[1]).toBeLessThan(0);
    expect(spacingPair(2).toSorted()).toEqual([0, 1]);
  });
});

describe('offsets', () => {
  it('chains through the centre line where there is room for figures', () => {
    expect(offsets(FLAT, 'phase', 12, 44)).toEqual([
      { fromM: -9, toM: 0, row: 0 },
      { fromM: 0, toM: 9, row: 0 },
    ]);
  });

  it('measures each from the centre line where there is not', () => {
    expect(offsets(FLAT, 'phase', 4, 44)).toEqual([
      { fromM: -9, toM: 0, row: 0 },
      { fromM: 0, toM: 9, row: 0 },
    ]);
    expect(offsets(DELTA, 'ground-wire', 12, 44)).toEqual([]);
  });
});

describe('lengths', () => {
  it('carry two digits and a true minus, and never a negative nought', () => {
    expect(lengthText(-9, METRES)).toBe('\u22129.00');
    expect(lengthText(-0.001, METRES)).toBe('0.00');
    expect(lengthText(24, FEET)).toBe('78.74');
    expect(smallLengthText(0.4572, METRES)).toBe('457\u2009mm');
    expect(smallLengthText(0.4572, FEET)).toBe('18.0\u2009in');
  });
});

describe('moving a position', () => {
  it('goes one step an arrow, ten with Shift, and never into the ground', () => {
    const at = { horizontalM: 4.6, attachmentHeightM: 12 };
    expect(nudged(at, 'ArrowRight', false, 0.1)).toEqual({ horizontalM: 4.7, attachmentHeightM: 12 });
    expect(nudged(at, 'ArrowUp', true, 0.1)).toEqual({ horizontalM: 4.6, attachmentHeightM: 13 });
    expect(nudged({ ...at, attachmentHeightM: 0.4 }, 'ArrowDown', true, 0.1)?.attachmentHeightM).toBe(0.1);
    expect(nudged(at, 'Enter', false, 0.1)).toBeNull();
  });

  it('snaps without the dust of binary fractions', () => {
    expect(snap(0.1 + 0.2, 0.1)).toBe(0.3);
    expect(snap(-4.649, 0.1)).toBe(-4.6);
  });
});

describe('figures on their lines', () => {
  it('move along until they are free, and stay in the middle where nothing is', () => {
    const box = { x: 50, y: 100, width: 30, height: 14 };
    const label = { from: 0, to: 200, box, along: 'y' as const };
    const [first, second] = placeLabels([label, label], []);
    expect(first?.y).toBe(100);
    expect(first && second && overlaps(first, second)).toBe(false);
    const cramped = { ...label, from: 95, to: 105 };
    expect(placeLabels([cramped, cramped], []).map((b) => b.y)).toEqual([100, 100]);
  });
});

describe('the drawing in words', () => {
  it('names each position, where it hangs and what breaks the clearance', () => {
    const words = describeStructure(DELTA, 1, METRES, 7);
    expect(words).toContain('Phase a: 4.60 left of the centre line, 19.00 high, 12.80 at mid-span');
    expect(words).toContain('Phase b: on the centre line');
    expect(words).toContain('Ground wire 1');
    expect(words).toMatch(/Below the least clearance: Phase c\.$/);
    expect(describeStructure([], 1, METRES, null)).toMatch(/no position is entered yet/);
  });
});
