import { SAG_SHARE } from '../../../engine/constants';
import { digitsApart, withUnit } from '../../words';
import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, phasesOf, positionPointer, positionWords } from './places';
import { dimensionsAt } from './voltage-table';

/** Phases lower than the voltage makes plausible. */
export const phaseHeight: LineRule = {
  code: 'drawing.phase-height',
  family: 'drawing',
  grades: ['must-answer', 'explain'],
  parameter: null,
  needs: 'positions; 60 to 880 kV',
  sentence:
    'The mean height of every phase, and its lowest point, lie above the least clearance of the voltage.',
  source:
    'NESC rule 232 over roads (from memory), computed at the highest operating voltage; local code governs',
  on: 'line',
  apply: ({ line }) => {
    const dimensions = dimensionsAt(line.nominalVoltageKv);
    if (dimensions === null) return [];
    const { leastHeightM } = dimensions;
    return drawnSections(line).flatMap(({ section, index }): FindingDraft[] => {
      const lowest = phasesOf(section).sort((a, b) => lowestPointM(a.position) - lowestPointM(b.position))[0];
      if (lowest === undefined) return [];
      const pointM = lowestPointM(lowest.position);
      const meanM = lowest.position.attachmentHeightM - SAG_SHARE * lowest.position.sagM;
      if (pointM >= leastHeightM) return [];
      const isMust = meanM < leastHeightM;
      const what = isMust
        ? `a mean height of ${withUnit(meanM, 'm', digitsApart(meanM, leastHeightM))}`
        : `its lowest point at ${withUnit(pointM, 'm', digitsApart(pointM, leastHeightM))}`;
      return [
        {
          grade: isMust ? 'must-answer' : 'explain',
          section: index,
          position: lowest.index,
          where: `${positionPointer(section, lowest.index)}/attachmentHeightM`,
          message: `${capital(positionWords(section, lowest.index))} has ${what}, below the ${withUnit(leastHeightM, 'm')} of clearance usual at ${withUnit(line.nominalVoltageKv, 'kV')}.`,
        },
      ];
    });
  },
};

function lowestPointM(position: { attachmentHeightM: number; sagM: number }): number {
  return position.attachmentHeightM - position.sagM;
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
