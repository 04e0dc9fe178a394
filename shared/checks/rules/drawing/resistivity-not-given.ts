import type { FindingDraft, LineRule } from '../rule';

/** An earth resistivity that the owner supplied. */
export const resistivityNotGiven: LineRule = {
  code: 'drawing.resistivity-not-given',
  family: 'drawing',
  grades: ['note'],
  parameter: null,
  needs: 'an overhead section',
  sentence: 'Earth resistivity that is not filed is the owner’s.',
  source: 'the filing format',
  on: 'line',
  apply: ({ line }) =>
    line.sections.flatMap((section, index): FindingDraft[] =>
      section.kind === 'cable' || !section.resistivityIsOwners
        ? []
        : [
            {
              grade: 'note',
              section: index,
              where: section.pointer,
              message: `No earth resistivity is filed for section ${index + 1}. The grid owner’s was taken; R0 and X0 hang on it.`,
            },
          ],
    ),
};
