import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, phasesOf } from './places';

/** A section whose phases have no sag. */
export const sagNotGiven: LineRule = {
  code: 'drawing.sag-not-given',
  family: 'drawing',
  grades: ['note'],
  parameter: null,
  needs: 'positions',
  sentence: 'Where no phase has a sag, the heights filed are taken as mean heights.',
  source: 'the filing format: mean height is attachment less two thirds of the sag',
  on: 'line',
  apply: ({ line }) =>
    drawnSections(line).flatMap(({ section, index }): FindingDraft[] => {
      if (phasesOf(section).some(({ position }) => position.sagM > 0)) return [];
      return [
        {
          grade: 'note',
          section: index,
          where: section.pointer,
          message: `No phase of section ${index + 1} has a sag. Its heights are taken as mean heights.`,
        },
      ];
    }),
};
