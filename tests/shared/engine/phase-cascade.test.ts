import { describe, expect, it } from 'vitest';
import {
  phaseCascade,
  solveLine,
  type LineInput,
  type Pair,
  type SequenceConstants,
} from '#shared/engine/index';
import { toSequence } from '#shared/engine/matrices';
import { buildLine, rollDice, seededRandom } from './random-lines';
import { expectComplex, expectReal } from './tolerance';

const cable = (r1: number, lengthKm: number, circuits = 1) => {
  const values: SequenceConstants = { r1, x1: 0.35, b1: 4.5, r0: 0.3, x0: 1.2, b0: 2.8 };
  return { kind: 'cable' as const, lengthKm, perLength: Array.from({ length: circuits }, () => values) };
};

function cascade(l: LineInput) {
  const result = phaseCascade(l);
  if (!result.ok) throw new Error(result.detail);
  return result.value;
}

function multiply(p: Pair[][], q: Pair[][]): Pair[][] {
  return p.map((row) =>
    (q[0] ?? []).map((_, j): Pair => {
      let [re, im] = [0, 0];
      row.forEach(([a, b], k) => {
        const [c, d] = q[k]?.[j] ?? [NaN, NaN];
        re += a * c - b * d;
        im += a * d + b * c;
      });
      return [re, im];
    }),
  );
}

function transpose(m: Pair[][]): Pair[][] {
  return m.map((_, i) => m.map((row): Pair => row[i] ?? [NaN, NaN]));
}

/** Largest modulus of p − q. */
function apart(p: Pair[][], q: Pair[][]): number {
  return Math.max(
    ...p.flatMap((row, i) =>
      row.map(([a, b], j) => Math.hypot(a - (q[i]?.[j]?.[0] ?? NaN), b - (q[i]?.[j]?.[1] ?? NaN))),
    ),
  );
}

describe('cascade in phases', () => {
  it('of balanced sections is the per-sequence two-port', () => {
    const l = { frequencyHz: 60, sections: [cable(0.03, 180), cable(0.05, 90)] };
    const whole = solveLine(l);
    if (!whole.ok) throw new Error(whole.detail);
    const { pi } = cascade(l);
    const z = toSequence(pi.z);
    const yFrom = toSequence(pi.yFrom);
    const yTo = toSequence(pi.yTo);
    const want = whole.value.equivalent[0];
    expectComplex(z[1]?.[1] ?? [], [want?.r ?? NaN, want?.x ?? NaN], 1e-12, 'Z1');
    expectComplex(z[0]?.[0] ?? [], [want?.r0 ?? NaN, want?.x0 ?? NaN], 1e-12, 'Z0');
    expectReal(((yFrom[1]?.[1]?.[1] ?? NaN) + (yTo[1]?.[1]?.[1] ?? NaN)) * 1e6, want?.b ?? NaN, 1e-12, 'B1');
    expectReal(((yFrom[0]?.[0]?.[1] ?? NaN) + (yTo[0]?.[0]?.[1] ?? NaN)) * 1e6, want?.b0 ?? NaN, 1e-12, 'B0');
  });

  const random = seededRandom(99);
  const doubles = Array.from({ length: 6 }, (_, k) => ({
    k,
    sections: [
      buildLine({ ...rollDice(random), circuits: 2 }),
      { ...buildLine({ ...rollDice(random), circuits: 2 }), lengthKm: 130 },
    ],
  }));

  it.each(doubles)(
    'of a double circuit is reciprocal: A·Bᵀ = B·Aᵀ and A·Dᵀ − B·Cᵀ = 1 (line $k)',
    ({ sections }) => {
      const { a, b, c, d } = cascade({ frequencyHz: 60, sections });
      expect(a).toHaveLength(6);
      expect(apart(multiply(a, transpose(b)), multiply(b, transpose(a)))).toBeLessThan(1e-10);
      const unit = multiply(a, transpose(d)).map((row, i) =>
        row.map(([re, im], j): Pair => {
          const [p, q] = multiply(b, transpose(c))[i]?.[j] ?? [NaN, NaN];
          return [re - p - (i === j ? 1 : 0), im - q];
        }),
      );
      expect(
        apart(
          unit,
          unit.map((row) => row.map((): Pair => [0, 0])),
        ),
      ).toBeLessThan(1e-12);
    },
  );

  it('of a section cut in two is that of the section, and its pi gives A back', () => {
    const section = doubles[0]?.sections[0];
    if (!section) throw new Error('no section');
    const whole = cascade({ frequencyHz: 60, sections: [section] });
    const cut = cascade({
      frequencyHz: 60,
      sections: [
        { ...section, lengthKm: 13 },
        { ...section, lengthKm: section.lengthKm - 13 },
      ],
    });
    expect(apart(whole.b, cut.b)).toBeLessThan(1e-11);
    expect(apart(whole.c, cut.c)).toBeLessThan(1e-15);
    // A = 1 + Z·Y_to
    const product = multiply(whole.pi.z, whole.pi.yTo);
    expect(
      apart(
        whole.a,
        product.map((row, i) => row.map(([re, im], j): Pair => [re + (i === j ? 1 : 0), im])),
      ),
    ).toBeLessThan(1e-13);
  });

  it('a short double circuit’s pi is length times its matrices, mutuals between circuits included', () => {
    const section = doubles[1]?.sections[0];
    if (!section) throw new Error('no section');
    const l = { frequencyHz: 60, sections: [{ ...section, lengthKm: 0.5 }] };
    const z = toSequence(cascade(l).pi.z);
    const whole = solveLine(l);
    if (!whole.ok) throw new Error(whole.detail);
    const m = whole.value.mutual[0];
    expectComplex(z[0]?.[3] ?? [], [0.5 * (m?.r0m ?? NaN), 0.5 * (m?.x0m ?? NaN)], 1e-5, 'Z0m');
  });
});
