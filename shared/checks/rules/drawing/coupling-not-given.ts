import type { LineRule } from '../rule';

/** Two circuits declared without their coupling. */
export const couplingNotGiven: LineRule = {
  code: 'drawing.coupling-not-given',
  family: 'drawing',
  grades: ['note'],
  parameter: null,
  needs: 'two circuits',
  sentence: 'The coupling of two circuits that is not declared is not weighed.',
  source: 'the filing format',
  on: 'line',
  apply: ({ line }) =>
    line.circuits.length < 2 || line.mutual.length > 0
      ? []
      : [
          {
            grade: 'note',
            where: line.pointer,
            message:
              'Two circuits share the structure and no zero-sequence coupling between them is declared.',
          },
        ],
};
