import { rowStart } from '../numerics/packed';
import type { Workspace } from './workspace';

/**
 * How currents and charges share out over the wires when one circuit carries a pattern: (2, −1, −1)/√6 and
 * (0, 1, −1)/√2, which together span the positive sequence, and (1, 1, 1), the zero sequence. Because the matrices
 * are symmetric, these distributions are all that first-order sensitivities need: d(vᵀZv) = mᵀ·dZ·m with m the wire
 * currents that belong to v, so one back-substitution a pattern serves every input.
 */
export const PATTERNS: readonly (readonly [number, number, number])[] = [
  [2 / Math.sqrt(6), -1 / Math.sqrt(6), -1 / Math.sqrt(6)],
  [0, Math.SQRT1_2, -Math.SQRT1_2],
  [1, 1, 1],
];

/** Wire currents (complex) and wire charges (real, in 2πε₀ per volt) by wire, one column a pattern: 3 a circuit. */
export class Distribution {
  columns = 0;
  currentR = new Float64Array(0);
  currentI = new Float64Array(0);
  charge = new Float64Array(0);

  /** Fills all columns from a workspace that `solvePhases` left behind. */
  fill(w: Workspace): void {
    const { seriesWires } = w;
    this.columns = w.phases;
    const size = w.wires * this.columns;
    if (this.currentR.length < size) {
      this.currentR = new Float64Array(size);
      this.currentI = new Float64Array(size);
      this.charge = new Float64Array(size);
    }
    this.startCurrents(w.phases);
    this.startCharges(w);
    this.substituteCurrents(w, seriesWires);
    this.substituteCharges(w);
    this.splitLeaders(w, seriesWires);
  }

  /**
   * Phase currents are the pattern itself: the impedance form is mᵀZm for currents imposed on the phases, whatever
   * voltages they need.
   */
  private startCurrents(phases: number): void {
    this.currentR.fill(0, 0, phases * this.columns);
    this.currentI.fill(0, 0, phases * this.columns);
    for (let c = 0; c < phases; c += 3) {
      for (let k = 0; k < 3; k++) {
        for (let i = 0; i < 3; i++) this.currentR[(c + i) * this.columns + c + k] = PATTERNS[k]?.[i] ?? 0;
      }
    }
  }

  /**
   * Phase charges are C times the pattern of voltages: the susceptance form is for voltages imposed on the phases, and
   * dC = −C·dP·C makes the charges the weights, with a minus sign that `Slopes` adds.
   */
  private startCharges(w: Workspace): void {
    for (let i = 0; i < w.phases; i++) {
      for (let c = 0; c < w.phases; c += 3) {
        for (let k = 0; k < 3; k++) {
          let sum = 0;
          for (let j = 0; j < 3; j++) {
            const at = i >= c + j ? rowStart(i) + c + j : rowStart(c + j) + i;
            sum += (w.p[at] as number) * (PATTERNS[k]?.[j] ?? 0);
          }
          this.charge[i * this.columns + c + k] = sum;
        }
      }
    }
  }

  /**
   * Currents of the eliminated wires. Elimination went from the last row up and left each row as it was at its step, so
   * rows are taken in the order of their indices: pivot·I_k = −Σ_(j<k) a_kj·I_j.
   */
  private substituteCurrents(w: Workspace, seriesWires: number): void {
    const { zr, zi, phases } = w;
    const { columns, currentR, currentI } = this;
    for (let k = phases; k < seriesWires; k++) {
      const row = rowStart(k);
      const pr = zr[row + k] as number;
      const pi = zi[row + k] as number;
      const size = -1 / (pr * pr + pi * pi);
      const at = k * columns;
      for (let c = 0; c < columns; c++) {
        currentR[at + c] = 0;
        currentI[at + c] = 0;
      }
      for (let j = 0; j < k; j++) {
        const ar = zr[row + j] as number;
        const ai = zi[row + j] as number;
        const fr = (ar * pr + ai * pi) * size;
        const fi = (ai * pr - ar * pi) * size;
        const from = j * columns;
        for (let c = 0; c < columns; c++) {
          const ir = currentR[from + c] as number;
          const ii = currentI[from + c] as number;
          currentR[at + c] = (currentR[at + c] as number) + fr * ir - fi * ii;
          currentI[at + c] = (currentI[at + c] as number) + fr * ii + fi * ir;
        }
      }
    }
    // Segmented ground wires carry nothing.
    currentR.fill(0, seriesWires * columns, w.wires * columns);
    currentI.fill(0, seriesWires * columns, w.wires * columns);
  }

  /** The same for charges; segmented ground wires carry charge although they carry no current. */
  private substituteCharges(w: Workspace): void {
    const { columns, charge } = this;
    for (let k = w.phases; k < w.wires; k++) {
      const row = rowStart(k);
      const inverse = -1 / (w.p[row + k] as number);
      const at = k * columns;
      for (let c = 0; c < columns; c++) charge[at + c] = 0;
      for (let j = 0; j < k; j++) {
        const f = (w.p[row + j] as number) * inverse;
        const from = j * columns;
        for (let c = 0; c < columns; c++)
          charge[at + c] = (charge[at + c] as number) + f * (charge[from + c] as number);
      }
    }
  }

  /** A first subconductor's unknown was the bundle's sum: what the others take is not its own. */
  private splitLeaders(w: Workspace, seriesWires: number): void {
    const { columns, currentR, currentI, charge } = this;
    const members = w.wires - w.groundWires;
    for (let k = w.phases; k < Math.min(members, seriesWires); k++) {
      const from = k * columns;
      const to = (w.leader[k] as number) * columns;
      for (let c = 0; c < columns; c++) {
        currentR[to + c] = (currentR[to + c] as number) - (currentR[from + c] as number);
        currentI[to + c] = (currentI[to + c] as number) - (currentI[from + c] as number);
        charge[to + c] = (charge[to + c] as number) - (charge[from + c] as number);
      }
    }
  }
}
