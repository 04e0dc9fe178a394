import { figure, withUnit } from '../../words';
import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, phasesOf, positionPointer } from './places';

/** Sides of a bundle that need no explanation, m. */
const PLAIN_SIDE_M = [0.2, 0.6] as const;

/** Side ÷ conductor diameter that needs no explanation. */
const PLAIN_RATIO = [6, 40] as const;

/** A bundle's side implausible by itself or against the conductor's diameter. */
export const bundleSpacing: LineRule = {
  code: 'drawing.bundle-spacing',
  family: 'drawing',
  grades: ['explain'],
  parameter: null,
  needs: 'positions with two subconductors or more',
  sentence: 'A bundle’s side lies between 0.2 and 0.6 m and between 6 and 40 conductor diameters.',
  source: 'common practice: 0.3 to 0.5 m, 10 to 20 diameters',
  on: 'line',
  apply: ({ line }) =>
    drawnSections(line).flatMap(({ section, index }): FindingDraft[] => {
      const odd = phasesOf(section).find(({ position }) => position.bundleCount > 1 && isOdd(position));
      if (odd === undefined) return [];
      const { bundleSpacingM, conductor } = odd.position;
      const ratio = (bundleSpacingM * 1000) / conductor.diameterMm;
      return [
        {
          grade: 'explain',
          section: index,
          position: odd.index,
          where: `${positionPointer(section, odd.index)}/bundleSpacingM`,
          message: `The bundle’s side is ${withUnit(bundleSpacingM, 'm')}, ${figure(ratio)} diameters of its conductor (${withUnit(conductor.diameterMm, 'mm', 4)}). Usual are ${figure(PLAIN_SIDE_M[0])} to ${withUnit(PLAIN_SIDE_M[1], 'm')} and ${PLAIN_RATIO[0]} to ${PLAIN_RATIO[1]} diameters.`,
        },
      ];
    }),
};

function isOdd(position: { bundleSpacingM: number; conductor: { diameterMm: number } }): boolean {
  const ratio = (position.bundleSpacingM * 1000) / position.conductor.diameterMm;
  const [low, high] = PLAIN_SIDE_M;
  return (
    position.bundleSpacingM < low ||
    position.bundleSpacingM > high ||
    ratio < PLAIN_RATIO[0] ||
    ratio > PLAIN_RATIO[1]
  );
}
