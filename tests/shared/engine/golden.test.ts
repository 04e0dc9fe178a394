import { describe, expect, it } from 'vitest';
import { sectionMatrices, solveSection } from '#shared/engine/index';
import { goldenLines, type GoldenAnswer } from './golden-lines';
import { expectComplex, expectReal } from './tolerance';

/** Agreement with the 34-digit tables: of the complex modulus, with a floor of 1e-12 Ω/km. */
const RELATIVE = 1e-9;
const FLOOR = 1e-3;

function checkAnswer(line: (typeof goldenLines)[number], answer: GoldenAnswer): void {
  const result = solveSection(line.section, answer.frequencyHz);
  if (!result.ok) throw new Error(result.detail);
  expect(result.value.circuits).toHaveLength(answer.circuits.length);
  answer.circuits.forEach((wanted, c) => {
    const got = result.value.circuits[c];
    if (!got) throw new Error('circuit missing');
    const what = `${line.name} at ${answer.frequencyHz} Hz, circuit ${c + 1}`;
    expectComplex([got.r1, got.x1], wanted.z1OhmPerKm, RELATIVE, `${what} Z1`, FLOOR);
    expectComplex([got.r0, got.x0], wanted.z0OhmPerKm, RELATIVE, `${what} Z0`, FLOOR);
    expectReal(got.b1, wanted.b1MicrosiemensPerKm, RELATIVE, `${what} B1`);
    expectReal(got.b0, wanted.b0MicrosiemensPerKm, RELATIVE, `${what} B0`);
  });
  const mutual = result.value.mutual[0];
  if (answer.zeroSequenceMutualOhmPerKm) {
    if (!mutual) throw new Error('mutual missing');
    expectComplex(
      [mutual.r0m, mutual.x0m],
      answer.zeroSequenceMutualOhmPerKm,
      RELATIVE,
      `${line.name} Z0m`,
      FLOOR,
    );
    expectReal(mutual.b0m, answer.zeroSequenceMutualMicrosiemensPerKm ?? NaN, RELATIVE, `${line.name} B0m`);
  }
}

function checkMatrices(line: (typeof goldenLines)[number], answer: GoldenAnswer): void {
  const result = sectionMatrices(line.section, answer.frequencyHz);
  if (!result.ok) throw new Error(result.detail);
  answer.phaseImpedanceOhmPerKm?.forEach((row, i) =>
    row.forEach((wanted, k) =>
      expectComplex(
        result.value.phaseImpedanceOhmPerKm[i]?.[k] ?? [],
        wanted,
        RELATIVE,
        `${line.name} Z[${i}][${k}]`,
        FLOOR,
      ),
    ),
  );
  answer.phaseSusceptanceMicrosiemensPerKm?.forEach((row, i) =>
    row.forEach((wanted, k) =>
      expectReal(
        result.value.phaseSusceptanceMicrosiemensPerKm[i]?.[k] ?? NaN,
        wanted,
        RELATIVE,
        `${line.name} B[${i}][${k}]`,
      ),
    ),
  );
}

// lines.json: made with 34-digit arithmetic by a program of its own, see the file's first line.
describe('whole lines of the golden table', () => {
  it.each(goldenLines)('$name', (line) => {
    expect(line.answers.length).toBeGreaterThan(0);
    for (const answer of line.answers) {
      checkAnswer(line, answer);
      checkMatrices(line, answer);
    }
  });
});
