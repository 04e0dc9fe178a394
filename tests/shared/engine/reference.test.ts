import { describe, expect, it } from 'vitest';
import { solveSection } from '#shared/engine/index';
import { goldenLines } from './golden-lines';
import { buildLine, rollDice, seededRandom } from './random-lines';
import { referenceSection } from './reference';
import { expectComplex, expectReal } from './tolerance';

/** The reference's quadrature and Runge–Kutta integration are good to about 1e-11. */
const RELATIVE = 1e-9;

function agree(section: Parameters<typeof solveSection>[0], frequencyHz: number): void {
  const result = solveSection(section, frequencyHz);
  if (!result.ok) throw new Error(result.detail);
  referenceSection(section, frequencyHz).forEach((wanted, c) => {
    const got = result.value.circuits[c];
    if (!got) throw new Error('circuit missing');
    expectComplex([got.r1, got.x1], wanted.z1, RELATIVE, `${frequencyHz} Hz Z1`);
    expectComplex([got.r0, got.x0], wanted.z0, RELATIVE, `${frequencyHz} Hz Z0`);
    expectReal(got.b1, wanted.b1, RELATIVE, 'B1');
    expectReal(got.b0, wanted.b0, RELATIVE, 'B0');
  });
}

const random = seededRandom(20_261);
const lines = Array.from({ length: 14 }, (_, k) => ({ k, section: buildLine(rollDice(random)) }));

describe('independent reference (mathjs matrices, numerical quadrature)', () => {
  it.each(lines)('random line $k at 60 Hz', ({ section }) => agree(section, 60));
  it.each(lines.slice(0, 3))('random line $k at 0.1 Hz and 40 kHz', ({ section }) => {
    agree(section, 0.1);
    agree(section, 40_000);
  });
  it.each(lines.slice(3, 5))('random line $k at 1 MHz', ({ section }) => agree(section, 1e6));
  it('two double circuits side by side: four circuits on one earth', () => {
    const left = buildLine({ ...rollDice(random), circuits: 2, bundleCount: 2, tube: false });
    const right = buildLine({ ...rollDice(random), circuits: 2, bundleCount: 1, tube: false });
    const moved = right.positions.map((p) => ({
      ...p,
      horizontalM: p.horizontalM + 45,
      ...(p.kind === 'phase' && { circuit: p.circuit + 2 }),
    }));
    const section = { ...left, positions: [...left.positions, ...moved] };
    agree(section, 60);
    const result = solveSection(section, 60);
    if (!result.ok) throw new Error(result.detail);
    expect(result.value.circuits).toHaveLength(4);
    expect(result.value.mutual.map((m) => m.circuits.join(''))).toEqual(['12', '13', '14', '23', '24', '34']);
  });

  it('reproduces a golden line too, so that the reference itself is checked', () => {
    const line = goldenLines[8];
    if (!line) throw new Error('no line');
    agree(line.section, line.frequencyHz);
    const answer = line.answers[0]?.circuits[0];
    const own = referenceSection(line.section, line.answers[0]?.frequencyHz ?? 50)[0];
    if (!answer || !own) throw new Error('no answer');
    expectComplex(own.z0, answer.z0OhmPerKm, RELATIVE, 'reference Z0');
    expectReal(own.b0, answer.b0MicrosiemensPerKm, RELATIVE, 'reference B0');
  });
});
