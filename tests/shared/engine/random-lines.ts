import type { ConductorData, OverheadSection, Phase } from '#shared/engine/types';

/** A small seeded generator (mulberry32): the same lines on every run. */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** What varies from line to line, each 0 … 1 unless its name says otherwise. */
export interface LineDice {
  circuits: 1 | 2;
  bundleCount: number;
  groundWires: number;
  tube: boolean;
  segmented: boolean;
  spacing: number;
  height: number;
  sag: number;
  diameter: number;
  resistivity: number;
  skew: number;
}

function phaseConductor(d: LineDice): ConductorData {
  const diameterMm = 18 + 20 * d.diameter;
  const base = { diameterMm, temperatureC: 75, temperatureCoefficientPerK: 0.00403 };
  const dc = 28.3 / (0.6 * diameterMm * diameterMm);
  if (d.tube)
    return { ...base, model: 'tube', coreDiameterMm: 0.35 * diameterMm, dcResistance20OhmPerKm: dc };
  return { ...base, model: 'handbook', gmrMm: 0.405 * diameterMm, acResistanceOhmPerKm: 1.25 * dc };
}

const GROUND: ConductorData = { model: 'handbook', diameterMm: 9.14, gmrMm: 1, acResistanceOhmPerKm: 4 };

/** A line that could stand somewhere: one flat circuit or two vertical ones, heights and offsets slightly uneven. */
export function buildLine(d: LineDice): OverheadSection {
  const conductor = phaseConductor(d);
  const spacing = 4 + 9 * d.spacing;
  const height = 18 + 15 * d.height;
  const sagM = 1 + 8 * d.sag;
  const phases: Phase[] = ['a', 'b', 'c'];
  const positions: OverheadSection['positions'][number][] = [];
  for (let c = 1; c <= d.circuits; c++) {
    phases.forEach((phase, i) => {
      const level = d.circuits === 1 ? 0.6 * d.skew * i : spacing * i;
      const across =
        d.circuits === 1 ? (i - 1) * spacing : (c === 1 ? -1 : 1) * (0.6 * spacing + d.skew * (i % 2));
      positions.push({
        kind: 'phase',
        circuit: c,
        phase,
        conductor,
        horizontalM: across,
        attachmentHeightM: height + level,
        sagM,
        bundleCount: d.bundleCount,
        bundleSpacingM: d.bundleCount > 1 ? 0.4 + 0.1 * d.skew : 0,
      });
    });
  }
  const top = height + (d.circuits === 1 ? 7 : 2 * spacing + 6);
  for (let g = 0; g < d.groundWires; g++) {
    const horizontalM = d.groundWires === 1 ? 0.3 * d.skew : (g - (d.groundWires - 1) / 2) * 0.9 * spacing;
    positions.push({
      kind: 'ground-wire',
      conductor: GROUND,
      horizontalM,
      attachmentHeightM: top,
      sagM: 0.8 * sagM,
    });
  }
  return {
    kind: 'overhead',
    lengthKm: 40,
    earthResistivityOhmM: 10 * 10 ** (2.5 * d.resistivity),
    groundWireBonding: d.segmented ? 'segmented' : 'continuous',
    positions,
  };
}

/** Dice from a generator. */
export function rollDice(random: () => number): LineDice {
  const whole = (n: number): number => Math.floor(random() * n);
  return {
    circuits: random() < 0.7 ? 1 : 2,
    bundleCount: 1 + whole(4),
    groundWires: whole(4),
    tube: random() < 0.4,
    segmented: random() < 0.3,
    spacing: random(),
    height: random(),
    sag: random(),
    diameter: random(),
    resistivity: random(),
    skew: random(),
  };
}
