import { withUnit } from '../../words';
import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, phasesOf, positionPointer, positionWords } from './places';

/** Highest attachment of a phase that needs no explanation, m, up to 245 kV and above. */
const PLAIN_HEIGHT_M = { upTo245Kv: 55, above: 95 } as const;

/** Heights so large that they look like feet. */
export const heightInFeet: LineRule = {
  code: 'drawing.height-in-feet',
  family: 'drawing',
  grades: ['explain'],
  parameter: null,
  needs: 'positions',
  sentence: 'Phases are attached at heights that are usual in metres, not in feet.',
  source: 'common practice, no source: towers of 55 m and more are rare up to 245 kV, of 95 m above',
  on: 'line',
  apply: ({ line }) => {
    const limitM = line.nominalVoltageKv <= 245 ? PLAIN_HEIGHT_M.upTo245Kv : PLAIN_HEIGHT_M.above;
    return drawnSections(line).flatMap(({ section, index }): FindingDraft[] => {
      const lowest = phasesOf(section).sort(
        (a, b) => a.position.attachmentHeightM - b.position.attachmentHeightM,
      )[0];
      if (lowest === undefined || lowest.position.attachmentHeightM <= limitM) return [];
      return [
        {
          grade: 'explain',
          section: index,
          position: lowest.index,
          where: `${positionPointer(section, lowest.index)}/attachmentHeightM`,
          message: `Even the lowest phase, ${positionWords(section, lowest.index)}, is attached at ${withUnit(lowest.position.attachmentHeightM, 'm')}. A height in feet would look like this.`,
        },
      ];
    });
  },
};
