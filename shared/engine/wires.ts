import { SAG_SHARE } from './constants';
import { internalImpedance } from './conductor';
import { fail } from './failures';
import type { Failure, GroundWirePosition, OverheadSection, PhasePosition } from './types';
import { phaseSlot } from './validate';
import type { Workspace } from './workspace';

/** Angle of the first subconductor: 3, 5 and 7 have one on top, 4 stand upright, 2, 6 and 8 have one at the right. */
const FIRST_ANGLE = [0, 0, 0, Math.PI / 2, Math.PI / 4, Math.PI / 2, 0, Math.PI / 2, 0];

/** Unit polygons: offsets of each subconductor for a side of 1, [x, y, x, y …] by bundle count. */
const POLYGONS: Float64Array[] = FIRST_ANGLE.map((first, n) => {
  const offsets = new Float64Array(2 * n);
  const radius = n > 1 ? 1 / (2 * Math.sin(Math.PI / n)) : 0;
  for (let i = 0; i < n; i++) {
    const angle = first + (2 * Math.PI * i) / n;
    offsets[2 * i] = radius * Math.cos(angle);
    offsets[2 * i + 1] = radius * Math.sin(angle);
  }
  return offsets;
});

/**
 * Offsets of a bundle's subconductors from its centre, m, as [x, y, x, y …]; the polygon's side is the spacing.
 *
 * @param count 1 to 8
 * @param spacingM side, m
 * @example
 * bundleOffsets(2, 0.4)[0] // → 0.2
 * bundleOffsets(1, 0) // → [0,0]
 */
export function bundleOffsets(count: number, spacingM: number): number[] {
  return Array.from(POLYGONS[count] ?? [], (unit) => unit * spacingM);
}

const scratch = new Float64Array(2);

function setWire(
  w: Workspace,
  index: number,
  leader: number,
  position: number,
  p: PhasePosition | GroundWirePosition,
  dx: number,
  dy: number,
): void {
  w.x[index] = p.horizontalM + dx;
  w.height[index] = p.attachmentHeightM - SAG_SHARE * p.sagM + dy;
  w.radius[index] = p.conductor.diameterMm / 2000;
  w.internalR[index] = scratch[0] as number;
  w.internalX[index] = scratch[1] as number;
  w.leader[index] = leader;
  w.position[index] = position;
}

/** Counts wires by kind and makes room for them. */
function count(s: OverheadSection, w: Workspace): void {
  let wires = 0;
  w.phases = 0;
  w.groundWires = 0;
  for (const p of s.positions) {
    if (p.kind === 'phase') {
      w.phases += 1;
      wires += p.bundleCount;
    } else {
      w.groundWires += 1;
      wires += 1;
    }
  }
  w.wires = wires;
  w.seriesWires = s.groundWireBonding === 'segmented' ? wires - w.groundWires : wires;
  w.reserve(wires);
}

/**
 * Places every subconductor and ground wire of a checked section as a wire of its own.
 *
 * @param s section that passed `checkSection`
 * @param omega angular frequency, rad/s
 * @param w receives the wires
 */
export function placeWires(s: OverheadSection, omega: number, w: Workspace): void {
  count(s, w);
  let member = w.phases;
  let ground = w.wires - w.groundWires;
  let known: unknown = null;
  for (let i = 0; i < s.positions.length; i++) {
    const p = s.positions[i] as PhasePosition | GroundWirePosition;
    // Neighbours mostly share their conductor: the internal impedance of the last one is still at hand.
    if (p.conductor !== known) internalImpedance(p.conductor, omega, scratch);
    known = p.conductor;
    if (p.kind === 'ground-wire') {
      setWire(w, ground, ground, i, p, 0, 0);
      ground += 1;
      continue;
    }
    const slot = phaseSlot(p);
    const unit = POLYGONS[p.bundleCount] as Float64Array;
    for (let k = 0; k < p.bundleCount; k++) {
      const dx = (unit[2 * k] as number) * p.bundleSpacingM;
      const dy = (unit[2 * k + 1] as number) * p.bundleSpacingM;
      if (k === 0) setWire(w, slot, slot, i, p, p.bundleCount > 1 ? dx : 0, p.bundleCount > 1 ? dy : 0);
      else setWire(w, member++, slot, i, p, dx, dy);
    }
  }
}

/**
 * Sets every wire's internal impedance anew, for another frequency on the same geometry.
 *
 * @param s the section whose wires stand in the workspace
 * @param omega angular frequency, rad/s
 * @param w workspace after `placeWires`
 */
export function refreshInternal(s: OverheadSection, omega: number, w: Workspace): void {
  let known: unknown = null;
  for (let i = 0; i < w.wires; i++) {
    const p = s.positions[w.position[i] as number];
    if (!p) continue;
    if (p.conductor !== known) internalImpedance(p.conductor, omega, scratch);
    known = p.conductor;
    w.internalR[i] = scratch[0] as number;
    w.internalX[i] = scratch[1] as number;
  }
}

/**
 * Says which two wires touch or coincide.
 *
 * @returns the failure for wires i and j of the workspace
 */
export function touching(w: Workspace, i: number, j: number, distance2: number): Failure {
  const a = w.position[i] as number;
  const b = w.position[j] as number;
  const where =
    a === b ? { position: a, field: 'bundleSpacingM' } : { position: Math.max(a, b), other: Math.min(a, b) };
  const distance = Math.sqrt(distance2);
  if (distance < 1e-6) return fail('coincident-wires', where, 'two wires hang at the same place');
  return fail(
    'overlapping-wires',
    where,
    `two wires hang ${(1000 * distance).toFixed(1)} mm apart, closer than their radii allow`,
  );
}
