import type { Frame } from './frame';
import { overlaps, type Box } from './label-placing';

export interface LensPlace {
  x: number;
  y: number;
}

const STEP = 10;

/**
 * A free place for the round magnifier of a bundle: inside the drawing, clear of everything in `taken`,
 * above the ground, as near its position as can be. Null where nothing is free.
 */
export function placeLens(
  target: { x: number; y: number },
  radius: number,
  frame: Frame,
  sides: { left: number; right: number },
  taken: readonly Box[],
): LensPlace | null {
  let best: (LensPlace & { distance: number }) | null = null;
  const size = 2 * radius + 6;
  for (let y = radius + 6; y <= frame.groundY - radius - 8; y += STEP) {
    for (let x = sides.left + radius; x <= sides.right - radius; x += STEP) {
      const distance = Math.hypot(x - target.x, y - target.y);
      if (distance < radius + 16 || (best && distance >= best.distance)) continue;
      const box = { x, y, width: size, height: size };
      if (taken.every((other) => !overlaps(box, other))) best = { x, y, distance };
    }
  }
  return best && { x: best.x, y: best.y };
}
