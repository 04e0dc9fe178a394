import {
  DEFAULT_INPUT_UNCERTAINTIES,
  logarithmicGrid,
  solveLine,
  solveSection,
  sweep,
  uncertainty,
  type LineInput,
  type OverheadSection,
  type Phase,
} from '#shared/engine/index';
import { referenceSection, type EarthIntegral } from '../shared/engine/reference';
import { seededRandom } from '../shared/engine/random-lines';
import { leastNs, row, type BenchRow } from './rows';

const PHASES: readonly Phase[] = ['a', 'b', 'c'];
const PHASE_CONDUCTOR = {
  model: 'handbook',
  diameterMm: 28.14,
  gmrMm: 11.37,
  acResistanceOhmPerKm: 0.0798,
} as const;
const GROUND_CONDUCTOR = { model: 'handbook', diameterMm: 9.14, gmrMm: 1, acResistanceOhmPerKm: 4 } as const;
const BUNDLE_SPACING_M = 0.4572;

function phase(circuit: number, name: Phase, horizontalM: number, heightM: number, bundleCount: number) {
  return {
    kind: 'phase' as const,
    circuit,
    phase: name,
    conductor: PHASE_CONDUCTOR,
    horizontalM,
    attachmentHeightM: heightM,
    sagM: 0,
    bundleCount,
    bundleSpacingM: BUNDLE_SPACING_M,
  };
}

function section(
  positions: OverheadSection['positions'][number][],
  top: number,
  random: () => number,
): OverheadSection {
  const wires = [-6.5, 6.5].map((horizontalM) => ({
    kind: 'ground-wire' as const,
    conductor: GROUND_CONDUCTOR,
    horizontalM,
    attachmentHeightM: top,
    sagM: 0,
  }));
  return {
    kind: 'overhead',
    lengthKm: 50,
    earthResistivityOhmM: 50 + 500 * random(),
    groundWireBonding: 'continuous',
    positions: [...positions, ...wires],
  };
}

/** Flat, mean height 18 m, spacing 7–13 m, two subconductors, two ground wires: 8 wires. */
function single2(random: () => number): OverheadSection {
  const spacing = 7 + 6 * random();
  const positions = PHASES.map((name, i) => phase(1, name, (i - 1) * spacing, 18, 2));
  return section(positions, 28, random);
}

/** Two vertical circuits at ±7 m, arms 7–13 m apart, four subconductors, two ground wires: 26 wires. */
function double4(random: () => number): OverheadSection {
  const arm = 7 + 6 * random();
  const circuit = (c: number, x: number) => PHASES.map((name, i) => phase(c, name, x, 18 + i * arm, 4));
  return section([...circuit(1, -7), ...circuit(2, 7)], 28 + 2 * arm, random);
}

/** Carson's series with the few terms that power frequency asks for: the slow comparison's earth. */
const earthBySeries: EarthIntegral = (h, x, omega, rho) => {
  const d = Math.hypot(h, x) * Math.sqrt((omega * 4e-7 * Math.PI) / rho);
  const theta = Math.atan2(Math.abs(x), h);
  let re = 0.25 - 0.5 * (Math.log(d / 2) + 0.5772156649015329);
  let im = -Math.PI / 8;
  let a = 1 / 3;
  let b = 0.5;
  let psi = 0.5 - 0.5772156649015329;
  for (let k = 0; k < 10; k++) {
    const n = 2 * k + 1;
    const turn = (Math.PI / 4) * n;
    re += a * d ** n * Math.cos(n * theta) * Math.cos(turn);
    im += a * d ** n * Math.cos(n * theta) * Math.sin(turn);
    a *= -1 / ((2 * k + 3) * (2 * k + 5));
    b *= -1 / (4 * (k + 1) * (k + 2));
    psi += 0.5 / (k + 1) + 0.5 / (k + 2);
    const m = 2 * (k + 1);
    const real = b * d ** m * ((psi - Math.log(d / 2)) * Math.cos(m * theta) + theta * Math.sin(m * theta));
    const imaginary = -b * d ** m * Math.cos(m * theta) * (Math.PI / 4);
    const half = (Math.PI / 2) * (k + 1);
    re += real * Math.cos(half) - imaginary * Math.sin(half);
    im += real * Math.sin(half) + imaginary * Math.cos(half);
  }
  return [2 * re, 2 * im];
};

function must(ok: boolean): void {
  if (!ok) throw new Error('a benchmark line could not be computed');
}

/** The slow comparison has to be a right one: agreement before anything is timed. */
function checkComparison(s: OverheadSection): void {
  const fast = solveSection(s, 60);
  const slow = referenceSection(s, 60, earthBySeries)[0];
  const own = fast.ok ? fast.value.circuits[0] : undefined;
  const near = (a: number, b: number): boolean => Math.abs(a / b - 1) < 1e-9;
  must(!!own && !!slow && near(own.x1, slow.z1[1]) && near(own.x0, slow.z0[1]) && near(own.b0, slow.b0));
}

/** Bytes that stay on the heap for each line computed, after collection. */
function heapGrowth(call: (k: number) => void, calls: number): number {
  const collect = globalThis.gc;
  if (!collect) return NaN;
  for (let k = 0; k < calls; k++) call(k);
  collect();
  const before = process.memoryUsage().heapUsed;
  for (let k = 0; k < calls; k++) call(k);
  collect();
  return Math.max(0, process.memoryUsage().heapUsed - before) / calls;
}

/** Batches of lines, no two alike, so that nothing can be kept from one to the next. */
function lines(make: (random: () => number) => OverheadSection, count: number): OverheadSection[] {
  const random = seededRandom(count);
  return Array.from({ length: count }, () => make(random));
}

function asLine(s: OverheadSection): LineInput {
  return { frequencyHz: 60, sections: [s] };
}

/** Times a solve of each line in turn. */
function solveNs(all: readonly OverheadSection[]): number {
  return leastNs((k) => must(solveSection(all[k % all.length] as OverheadSection, 60).ok), 1.5);
}

function slowNs(all: readonly OverheadSection[]): number {
  return leastNs((k) => void referenceSection(all[k % all.length] as OverheadSection, 60, earthBySeries));
}

/** Sweeps, whole lines and ranges on the small case. */
function widerRows(all: readonly OverheadSection[], single: number): BenchRow[] {
  const grid = logarithmicGrid(1, 1e6, 200);
  const at = (k: number): OverheadSection => all[k % all.length] as OverheadSection;
  const whole = all.map(asLine);
  const sweepNs = leastNs((k) => must(sweep(at(k), grid).ok), 1.5);
  const lineNs = leastNs((k) => must(solveLine(whole[k % whole.length] as LineInput).ok));
  const rangeNs = leastNs((k) =>
    must(uncertainty(whole[k % whole.length] as LineInput, DEFAULT_INPUT_UNCERTAINTIES).ok),
  );
  const many = leastNs((k) => must(solveSection(at(k), 60).ok), 1, 10_000) * 10_000;
  return [
    row('engine/sweep200', sweepNs, 'ns', 'engine/single2', single),
    row('engine/line-single2', lineNs, 'ns', 'engine/single2', single),
    row('engine/range-single2', rangeNs, 'ns', 'engine/line-single2', lineNs),
    row('engine/lines10000', many, 'ns', 'engine/single2', single),
  ];
}

/**
 * Benchmarks of the engine. `single2` and `double4` stand against the same sums on mathjs matrices, the sweep, the
 * whole line and its ranges against a single solve.
 */
export async function benchEngine(): Promise<BenchRow[]> {
  const small = lines(single2, 2000);
  const large = lines(double4, 400);
  [...small.slice(0, 5), ...large.slice(0, 2)].forEach(checkComparison);
  const single = solveNs(small);
  const double = solveNs(large);
  const slowSingle = slowNs(small);
  const slowDouble = slowNs(large);
  const heap = heapGrowth(
    (k) => must(solveSection(small[k % small.length] as OverheadSection, 60).ok),
    20_000,
  );
  const slowHeap = heapGrowth(
    (k) => void referenceSection(small[k] as OverheadSection, 60, earthBySeries),
    100,
  );
  const largeLines = large.map(asLine);
  const lineDouble = leastNs((k) => must(solveLine(largeLines[k % largeLines.length] as LineInput).ok));
  const rangeDouble = leastNs((k) =>
    must(uncertainty(largeLines[k % largeLines.length] as LineInput, DEFAULT_INPUT_UNCERTAINTIES).ok),
  );
  return [
    row('engine/single2', single, 'ns', 'engine/single2-mathjs', slowSingle),
    row('engine/single2-mathjs', slowSingle, 'ns', 'engine/single2', single),
    row('engine/double4', double, 'ns', 'engine/double4-mathjs', slowDouble),
    row('engine/double4-mathjs', slowDouble, 'ns', 'engine/double4', double),
    ...widerRows(small, single),
    row('engine/line-double4', lineDouble, 'ns', 'engine/double4', double),
    row('engine/range-double4', rangeDouble, 'ns', 'engine/line-double4', lineDouble),
    row('engine/heap-growth', heap, 'byte', 'engine/heap-growth-mathjs', Math.max(1, slowHeap)),
  ];
}
