import type { FindingDraft, LineRule } from '../rule';

/** A cable section, which is not recomputed. */
export const cableAsDeclared: LineRule = {
  code: 'drawing.cable-as-declared',
  family: 'drawing',
  grades: ['note'],
  parameter: null,
  needs: 'a cable section',
  sentence: 'A cable section is taken as its maker declares it.',
  source: 'the filing format',
  on: 'line',
  apply: ({ line }) =>
    line.sections.flatMap((section, index): FindingDraft[] =>
      section.kind !== 'cable'
        ? []
        : [
            {
              grade: 'note',
              section: index,
              where: section.pointer,
              message: `Section ${index + 1} is cable: its values are taken as declared and enter the whole line unweighed.`,
            },
          ],
    ),
};
