import type { LineRule } from '../rule';

/** An overhead section without conductors and positions. */
export const geometryMissing: LineRule = {
  code: 'drawing.geometry-missing',
  family: 'drawing',
  grades: ['must-answer'],
  parameter: null,
  needs: 'an overhead section',
  sentence: 'Every overhead section is filed with its conductors and positions.',
  source: 'the filing format: without geometry nothing can be recomputed',
  on: 'line',
  apply: ({ line }) =>
    line.sections.flatMap((section, index) =>
      section.kind !== 'geometry-missing'
        ? []
        : [
            {
              grade: 'must-answer' as const,
              section: index,
              where: section.pointer,
              message: `Section ${index + 1} is filed without conductors and positions. Give where each phase and ground wire hangs and with which conductor; until then the values are held against physics and bands only.`,
            },
          ],
    ),
};
