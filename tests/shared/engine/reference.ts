import { add, complex, conj, divide, inv, matrix, multiply, type Complex, type Matrix } from 'mathjs';
import type { ConductorData, OverheadSection } from '#shared/engine/types';

/**
 * A slow line-constants calculation from the definitions, sharing nothing with the engine but the shape of its input:
 * mathjs matrices, numerical quadrature for the earth, numerical integration of the field equations inside a wire.
 * Bundles and ground wires are handled through the inverse (nodal) matrices instead of eliminations.
 */

const MU = 4e-7 * Math.PI;
const EPSILON = 1 / (MU * 299_792_458 ** 2);

/** mathjs answers "number or matrix or …"; of complex scalars it is always a complex scalar. */
const plus = (a: Complex, b: Complex): Complex => add(a, b) as Complex;
const times = (a: Complex, b: Complex | number): Complex => multiply(a, b) as Complex;
const over = (a: Complex, b: Complex | number): Complex => divide(a, b) as Complex;

interface Wire {
  x: number;
  y: number;
  radius: number;
  conductor: ConductorData;
  /** Column of the phase that the wire belongs to; −1 for ground wires. */
  phase: number;
}

/** ∫₀^∞ 2·e^(−Hλ)·cos(λx) / (λ + √(λ² + jωμ/ρ)) dλ as [re, im]. */
export type EarthIntegral = (
  heightSumM: number,
  offsetM: number,
  omega: number,
  resistivityOhmM: number,
) => readonly [number, number];

/**
 * The integral by the trapezoidal rule in t = ln λ, which converges exponentially: the integrand is analytic in a strip
 * about the real axis, as wide as √(λ² + jωμ/ρ) and the growth of cos(λx) allow.
 */
export const earthByQuadrature: EarthIntegral = (h, x, omega, rho) => {
  const k2 = (omega * MU) / rho;
  const strip = 0.9 * Math.min(Math.PI / 4, Math.atan2(h, Math.abs(x)));
  const step = (2 * Math.PI * strip) / 36;
  const first = Math.log(Math.min(Math.sqrt(k2), 1 / h)) - 34;
  const last = Math.log(45 / h);
  let re = 0;
  let im = 0;
  for (let t = first; t <= last; t += step) {
    const l = Math.exp(t);
    const modulus = Math.hypot(l * l, k2);
    const rootRe = Math.sqrt((modulus + l * l) / 2);
    const rootIm = k2 / (2 * rootRe);
    const below = (l + rootRe) ** 2 + rootIm ** 2;
    const weight = (2 * step * l * Math.exp(-h * l) * Math.cos(l * x)) / below;
    re += weight * (l + rootRe);
    im -= weight * rootIm;
  }
  return [re, im];
};

/** Corners of a regular polygon of side 1, written out corner by corner from the drawing rule. */
function corners(count: number): [number, number][] {
  const r = count === 1 ? 0 : 0.5 / Math.sin(Math.PI / count);
  const top = count === 3 || count === 5 || count === 7;
  const start = count === 4 ? 45 : top ? 90 : 0;
  return Array.from({ length: count }, (_, k) => {
    const a = ((start + (360 * k) / count) * Math.PI) / 180;
    return [r * Math.cos(a), r * Math.sin(a)];
  });
}

function wiresOf(s: OverheadSection): Wire[] {
  return s.positions.flatMap((p) => {
    const y = p.attachmentHeightM - (2 * p.sagM) / 3;
    const radius = p.conductor.diameterMm / 2000;
    if (p.kind === 'ground-wire') return [{ x: p.horizontalM, y, radius, conductor: p.conductor, phase: -1 }];
    const phase = 3 * (p.circuit - 1) + 'abc'.indexOf(p.phase);
    return corners(p.bundleCount).map(([dx, dy]) => ({
      x: p.horizontalM + dx * (p.bundleSpacingM || 0),
      y: y + dy * (p.bundleSpacingM || 0),
      radius,
      conductor: p.conductor,
      phase,
    }));
  });
}

/** E and rH across the metal of a tube by the classical Runge–Kutta method, from the core outwards. */
function tubeByIntegration(c: ConductorData, omega: number): Complex {
  const outer = c.diameterMm / 2000;
  const inner = (c.coreDiameterMm ?? 0) / 2000;
  const dc =
    ((c.dcResistance20OhmPerKm ?? 0) / 1000) *
    (1 + (c.temperatureCoefficientPerK ?? 0.00403) * ((c.temperatureC ?? 20) - 20));
  const sigma = 1 / (dc * Math.PI * (outer * outer - inner * inner));
  const steps = 4000;
  const h = (outer - inner) / steps;
  // State: E re, E im, rH re, rH im. dE/dr = jωμ·H, d(rH)/dr = σ·r·E; on the axis H vanishes like r.
  const slope = (r: number, v: readonly number[]): number[] => {
    const [er = 0, ei = 0, hr = 0, hi = 0] = v;
    const f = r > 0 ? (omega * MU) / r : 0;
    return [-f * hi, f * hr, sigma * r * er, sigma * r * ei];
  };
  let v: number[] = [1, 0, 0, 0];
  const moved = (k: readonly number[], by: number): number[] => v.map((a, n) => a + by * (k[n] ?? 0));
  for (let n = 0; n < steps; n++) {
    const r = inner + n * h;
    const k1 = slope(r, v);
    const k2 = slope(r + h / 2, moved(k1, h / 2));
    const k3 = slope(r + h / 2, moved(k2, h / 2));
    const k4 = slope(r + h, moved(k3, h));
    v = v.map((a, m) => a + (h / 6) * ((k1[m] ?? 0) + 2 * (k2[m] ?? 0) + 2 * (k3[m] ?? 0) + (k4[m] ?? 0)));
  }
  const [er = 0, ei = 0, hr = 0, hi = 0] = v;
  return over(complex(er, ei), times(complex(hr, hi), 2 * Math.PI));
}

function selfImpedance(w: Wire, omega: number): Complex {
  const c = w.conductor;
  if (c.model === 'tube') return tubeByIntegration(c, omega);
  const inside = (omega * MU * Math.log(w.radius / ((c.gmrMm ?? 0) / 1000))) / (2 * Math.PI);
  return complex((c.acResistanceOhmPerKm ?? 0) / 1000, inside);
}

/** Sums the rows and columns of each phase's wires in an inverse matrix and leaves the ground wires out (V = 0). */
function sumPhases(nodal: Complex[][], wires: readonly Wire[]): Complex[][] {
  const n = 1 + Math.max(...wires.map((w) => w.phase));
  const sum = Array.from({ length: n }, () => Array.from({ length: n }, () => complex(0, 0)));
  wires.forEach((a, i) =>
    wires.forEach((b, j) => {
      const row = sum[a.phase];
      const entry = nodal[i]?.[j];
      const known = row?.[b.phase];
      if (row && known && entry) row[b.phase] = plus(known, entry);
    }),
  );
  return sum;
}

function inverse(m: Complex[][]): Complex[][] {
  return (inv(matrix(m)) as Matrix).toArray() as Complex[][];
}

/** Mean self −/+ mean mutual of a circuit's block, by T⁻¹·M·T with T written out. */
function sequence(m: Complex[][], first: number): { zero: Complex; positive: Complex } {
  const one = complex(1, 0);
  const a = complex(-0.5, Math.sqrt(3) / 2);
  const form = (left: readonly Complex[]): Complex => {
    let sum = complex(0, 0);
    left.forEach((l, i) =>
      left.forEach((r, k) => {
        sum = plus(sum, times(times(l, m[first + i]?.[first + k] ?? NaN), conj(r)));
      }),
    );
    return over(sum, 3);
  };
  return { zero: form([one, one, one]), positive: form([one, a, times(a, a)]) };
}

/** What the reference answers, one entry a circuit, in Ω/km and µS/km. */
export interface ReferenceCircuit {
  z1: [number, number];
  z0: [number, number];
  b1: number;
  b0: number;
}

/** Sequence constants of a section by the slow method. */
export function referenceSection(
  s: OverheadSection,
  frequencyHz: number,
  earth: EarthIntegral = earthByQuadrature,
): ReferenceCircuit[] {
  const omega = 2 * Math.PI * frequencyHz;
  const wires = wiresOf(s);
  const carrying = s.groundWireBonding === 'segmented' ? wires.filter((w) => w.phase >= 0) : wires;
  const log = (a: Wire, b: Wire): number =>
    Math.log(Math.hypot(a.x - b.x, a.y + b.y) / (a === b ? a.radius : Math.hypot(a.x - b.x, a.y - b.y)));
  const z = carrying.map((a) =>
    carrying.map((b) => {
      const [re, im] = earth(a.y + b.y, a.x - b.x, omega, s.earthResistivityOhmM);
      const outside = times(complex(log(a, b) + re, im), complex(0, (omega * MU) / (2 * Math.PI)));
      return a === b ? plus(outside, selfImpedance(a, omega)) : outside;
    }),
  );
  const p = wires.map((a) => wires.map((b) => complex(log(a, b) / (2 * Math.PI * EPSILON), 0)));
  const zPhase = inverse(sumPhases(inverse(z), carrying));
  const cPhase = sumPhases(inverse(p), wires);
  return Array.from({ length: zPhase.length / 3 }, (_, c) => {
    const zs = sequence(zPhase, 3 * c);
    const cs = sequence(cPhase, 3 * c);
    return {
      z1: [zs.positive.re * 1000, zs.positive.im * 1000],
      z0: [zs.zero.re * 1000, zs.zero.im * 1000],
      b1: omega * cs.positive.re * 1e9,
      b0: omega * cs.zero.re * 1e9,
    };
  });
}
