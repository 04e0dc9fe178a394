import { describe, expect, it } from 'vitest';
import { handCheck, type OverheadSection } from '#shared/engine/index';
import { handSteps, shortcutRows } from '../../../../src/features/line-sheet/model/hand-steps';
import { inductanceMilliHenryPerKm } from '../../../../src/features/line-sheet/model/sweep-points';

const conductor = {
  model: 'handbook' as const,
  diameterMm: 28.14,
  gmrMm: 11.37,
  acResistanceOhmPerKm: 0.0798,
};

function flat(bundleCount: number): OverheadSection {
  const phase = (name: 'a' | 'b' | 'c', horizontalM: number) => ({
    kind: 'phase' as const,
    circuit: 1,
    phase: name,
    conductor,
    horizontalM,
    attachmentHeightM: 24,
    sagM: 9,
    bundleCount,
    bundleSpacingM: bundleCount > 1 ? 0.4572 : 0,
  });
  return {
    kind: 'overhead',
    lengthKm: 10,
    earthResistivityOhmM: 100,
    groundWireBonding: 'continuous',
    positions: [phase('a', -9), phase('b', 0), phase('c', 9)],
  };
}

function stepsOf(bundleCount: number) {
  const result = handCheck(flat(bundleCount), 60, 1);
  if (!result.ok) throw new Error(result.detail);
  return { check: result.value, steps: handSteps(result.value) };
}

describe('the check by hand', () => {
  it('shows each intermediate value; GMD of a flat line is the spacing times the cube root of two', () => {
    const { check, steps } = stepsOf(1);
    expect(check.gmdM).toBeCloseTo(9 * Math.cbrt(2), 10);
    expect(steps.find((s) => s.what === 'GMD')?.result).toBe('11.34\u2009m');
    expect(steps.some((s) => s.what.startsWith('Bundle'))).toBe(false);
  });

  it('takes the bundle in where there is one', () => {
    const { steps } = stepsOf(2);
    const gmr = steps.find((s) => s.what === 'GMR of the bundle');
    expect(gmr?.how).toBe('√(GMR · 0.4572)');
    expect(gmr?.result).toBe('0.07210\u2009m');
  });

  it('says where shortcut and full method part', () => {
    const rows = shortcutRows(stepsOf(2).check);
    expect(rows.map((r) => r.name)).toEqual(['R1', 'X1', 'B1']);
    expect(rows.find((r) => r.name === 'B1')?.because).toContain('earth and images');
  });

  it('turns a reactance into its inductance', () => {
    expect(inductanceMilliHenryPerKm(0.3769911184, 60)).toBeCloseTo(1, 9);
  });
});
