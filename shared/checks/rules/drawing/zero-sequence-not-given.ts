import type { FindingDraft, LineRule } from '../rule';

/** A circuit declared without zero sequence. */
export const zeroSequenceNotGiven: LineRule = {
  code: 'drawing.zero-sequence-not-given',
  family: 'drawing',
  grades: ['note'],
  parameter: null,
  needs: 'a declared circuit',
  sentence: 'Zero-sequence values that are not declared are not weighed.',
  source: 'the filing format',
  on: 'line',
  apply: ({ line }) =>
    line.circuits.flatMap((circuit): FindingDraft[] =>
      circuit.declared.r0 !== undefined && circuit.declared.x0 !== undefined
        ? []
        : [
            {
              grade: 'note',
              circuit: circuit.circuit,
              where: circuit.pointer,
              message: `Circuit ${circuit.circuit} comes without zero-sequence impedance. Fault studies need R0 and X0.`,
            },
          ],
    ),
};
