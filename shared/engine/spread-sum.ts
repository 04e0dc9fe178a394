import { sameConductor } from './conductor-slopes';
import { fail } from './failures';
import { DEFAULT_INPUT_UNCERTAINTIES } from './sensitivity-types';
import type { InputUncertainties, Spread, UncertainInput } from './sensitivity-types';
import type { ConductorData, Failure, Where } from './types';

/**
 * Step of an input within its uncertainty, in the unit of its slope (m, K, or a unit of its logarithm).
 *
 * @param input which input
 * @param u the administrator's uncertainties
 */
export function stepOf(input: UncertainInput, u: InputUncertainties): number {
  switch (input) {
    case 'height':
      return u.heightM;
    case 'sag':
      return u.sagM;
    case 'offset':
      return u.offsetM;
    case 'diameter':
      return u.diameterRelative;
    case 'gmr':
      return u.gmrRelative;
    case 'ac-resistance':
      return u.acResistanceRelative;
    case 'temperature':
      return u.temperatureK;
    case 'ground-wire-resistance':
      return u.groundWireResistanceRelative;
    case 'earth-resistivity':
      return Math.log(u.earthResistivityFactor);
  }
}

/**
 * Checks the administrator's uncertainties: finite, not negative, the factor of ρ at least 1.
 *
 * @returns the failure with the field's name, or null
 */
export function checkUncertainties(u: InputUncertainties): Failure | null {
  for (const field of Object.keys(DEFAULT_INPUT_UNCERTAINTIES) as (keyof InputUncertainties)[]) {
    const value = u[field];
    const low = field === 'earthResistivityFactor' ? 1 : 0;
    if (typeof value === 'number' && value >= low && value < Infinity) continue;
    return fail(
      'out-of-range',
      { field },
      `${field} is ${String(value)}, wanted is a finite value from ${low} up`,
    );
  }
  return null;
}

/** Moves of one conductor input, summed over all sections of the line that use the same conductor. */
interface SharedInput {
  input: UncertainInput;
  conductor: ConductorData;
  section: number;
  position: number;
  moves: Float64Array;
}

/** Sum in quadrature of what each input moves, entry by entry, with the largest mover of each. */
export class SpreadSum {
  /** Sum of squared moves, the largest move, and whose it is. */
  private readonly squares: Float64Array;
  private readonly most: Float64Array;
  private readonly topInput: (UncertainInput | null)[];
  private readonly topSection: Int32Array;
  private readonly topPosition: Int32Array;
  private readonly shared: SharedInput[] = [];

  /** @param length entries of the slope vectors */
  constructor(
    private readonly length: number,
    private readonly u: InputUncertainties,
  ) {
    this.squares = new Float64Array(length);
    this.most = new Float64Array(length);
    this.topInput = new Array<UncertainInput | null>(length).fill(null);
    this.topSection = new Int32Array(length);
    this.topPosition = new Int32Array(length);
  }

  /** Adds an input that moves by itself; `factor` holds the section's share of the length. */
  add(
    input: UncertainInput,
    values: Float64Array,
    start: number,
    factor: number,
    section: number,
    position: number,
  ): void {
    // A slope times the full step: the step is a bound and not a deviation, and bounds are combined as if deviations.
    const step = factor * stepOf(input, this.u);
    for (let e = 0; e < this.length; e++) {
      const move = Math.abs(step * (values[start + e] as number));
      this.squares[e] = (this.squares[e] as number) + move * move;
      if (move <= (this.most[e] as number)) continue;
      this.most[e] = move;
      this.topInput[e] = input;
      this.topSection[e] = section;
      this.topPosition[e] = position;
    }
  }

  /** Adds a conductor's input to what the same conductor moves elsewhere in the line; `finish` squares the sums. */
  addShared(
    input: UncertainInput,
    values: Float64Array,
    factor: number,
    section: number,
    position: number,
    conductor: ConductorData,
  ): void {
    let entry = this.shared.find((k) => k.input === input && sameConductor(k.conductor, conductor));
    if (!entry) {
      entry = { input, conductor, section, position, moves: new Float64Array(this.length) };
      this.shared.push(entry);
    }
    const { moves } = entry;
    for (let e = 0; e < this.length; e++) moves[e] = (moves[e] as number) + factor * (values[e] as number);
  }

  /** Takes the shared inputs into the sum; call once, before `spread`. */
  finish(): void {
    for (const k of this.shared) this.add(k.input, k.moves, 0, 1, k.section, k.position);
  }

  /** Range of entry e around a value. */
  spread(value: number, e: number): Spread {
    const halfRange = Math.sqrt(this.squares[e] ?? 0);
    const dominant = this.topInput[e] ?? null;
    return {
      value,
      halfRange,
      low: value - halfRange,
      high: value + halfRange,
      dominant,
      where: dominant ? this.whereOf(e) : {},
    };
  }

  /** Place of the input that moves entry e most. */
  private whereOf(e: number): Where {
    const section = this.topSection[e] as number;
    const position = this.topPosition[e] as number;
    return position < 0 ? { section } : { section, position };
  }
}
