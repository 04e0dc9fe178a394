import { withUnit } from '../../words';
import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, groundWiresOf, phasesOf, positionPointer, positionWords } from './places';

/** A ground wire that shields nothing. */
export const groundWireBelowPhases: LineRule = {
  code: 'drawing.ground-wire-below-phases',
  family: 'drawing',
  grades: ['explain'],
  parameter: null,
  needs: 'positions',
  sentence: 'Ground wires hang above the highest phase.',
  source: 'common practice, no source: a ground wire is there to take the lightning',
  on: 'line',
  apply: ({ line }) =>
    drawnSections(line).flatMap(({ section, index }) => {
      const topM = Math.max(...phasesOf(section).map(({ position }) => position.attachmentHeightM));
      return groundWiresOf(section).flatMap((wire): FindingDraft[] => {
        if (wire.position.attachmentHeightM >= topM) return [];
        return [
          {
            grade: 'explain',
            section: index,
            position: wire.index,
            where: `${positionPointer(section, wire.index)}/attachmentHeightM`,
            message: `A ground wire, ${positionWords(section, wire.index).replace(' (a ground wire)', '')}, hangs at ${withUnit(wire.position.attachmentHeightM, 'm')}, below the highest phase at ${withUnit(topM, 'm')}.`,
          },
        ];
      });
    }),
};
