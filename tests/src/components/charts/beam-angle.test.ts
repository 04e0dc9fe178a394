import { describe, expect, it } from 'vitest';
import { beamAngle } from '../../../../src/components/charts/beam-angle';

describe('tilt of the beam', () => {
  it('is level up to the tolerance, either way', () => {
    expect(beamAngle(0, 0.015)).toBe(0);
    expect(beamAngle(0.015, 0.015)).toBe(0);
    expect(beamAngle(-0.0149, 0.015)).toBe(0);
  });

  it('is 4° for each tolerance beyond', () => {
    expect(beamAngle(-0.03, 0.015)).toBeCloseTo(8, 10);
    expect(beamAngle(0.0225, 0.015)).toBeCloseTo(-6, 10);
  });

  it('stops at 14°', () => {
    expect(beamAngle(0.61, 0.015)).toBe(-14);
    expect(beamAngle(-0.2, 0.0001)).toBe(14);
  });

  it('lets the heavier side down: declared stands at the left, and SVG turns clockwise', () => {
    expect(beamAngle(0.05, 0.015)).toBeLessThan(0);
    expect(beamAngle(-0.05, 0.015)).toBeGreaterThan(0);
  });

  it('stays level when there is nothing to weigh, and tilts fully when nothing is tolerated', () => {
    expect(beamAngle(NaN, 0.015)).toBe(0);
    expect(beamAngle(0.001, 0)).toBe(-14);
  });
});
