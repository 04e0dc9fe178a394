import { MU_0 } from './constants';
import { Distribution } from './distribution';
import { earthGradient } from './earth-gradient';
import { earthScale } from './earth-return';
import { susceptanceFactor } from './section';
import type { OverheadSection } from './types';
import type { Workspace } from './workspace';

const gradient = new Float64Array(4);

/**
 * First-order slopes of every sequence value of a solved section with respect to its geometry and earth, by one pass
 * over the wire pairs weighted with the current and charge distributions.
 *
 * Quantities are numbered 2c (positive sequence of circuit c), 2c + 1 (zero sequence), and after all circuits the
 * zero-sequence mutuals (0,1), (0,2) …; each owns the three entries r, x (Ω/km) and b (µS/km) of a slope vector.
 */
export class Slopes {
  quantities = 0;
  /** Per metre by which all wires are raised. */
  height = new Float64Array(0);
  /** Per unit of ln ρ. */
  logResistivity = new Float64Array(0);
  /** Per metre by which one position moves to the right, position by position. */
  offset = new Float64Array(0);
  /** Per wire: the weights of its diagonal element, [Re, Im] for Z and one for P, quantity by quantity. */
  self = new Float64Array(0);

  private readonly distribution = new Distribution();
  private weightR = new Float64Array(0);
  private weightI = new Float64Array(0);
  private weightB = new Float64Array(0);

  /** Entries of a slope vector: r, x, b a quantity. */
  get length(): number {
    return 3 * this.quantities;
  }

  /** Fills all slopes for a section whose solution stands in the workspace. */
  fill(s: OverheadSection, w: Workspace, frequencyHz: number): void {
    const omega = 2 * Math.PI * frequencyHz;
    const seriesWires = s.groundWireBonding === 'segmented' ? w.wires - w.groundWires : w.wires;
    this.reserve(w, s.positions.length);
    this.distribution.fill(w, seriesWires);
    this.passPairs(w, earthScale(omega, s.earthResistivityOhmM), seriesWires);
    const series = (1000 * omega * MU_0) / (2 * Math.PI);
    const shunt = -susceptanceFactor(omega);
    toValues(this.height, 0, this.length, series, shunt);
    toValues(this.logResistivity, 0, this.length, series, shunt);
    toValues(this.offset, 0, this.length * s.positions.length, series, shunt);
  }

  private reserve(w: Workspace, positions: number): void {
    const circuits = w.phases / 3;
    this.quantities = 2 * circuits + (circuits * (circuits - 1)) / 2;
    const length = this.length;
    if (this.height.length < length) {
      this.height = new Float64Array(length);
      this.logResistivity = new Float64Array(length);
      this.weightR = new Float64Array(this.quantities);
      this.weightI = new Float64Array(this.quantities);
      this.weightB = new Float64Array(this.quantities);
    }
    if (this.offset.length < length * positions) this.offset = new Float64Array(length * positions);
    if (this.self.length < length * w.wires) this.self = new Float64Array(length * w.wires);
    this.height.fill(0);
    this.logResistivity.fill(0);
    this.offset.fill(0);
  }

  /** ½(m_α m_α + m_β m_β) for the positive, ⅓ m_s m_s for the zero sequence, and the mixed product for mutuals. */
  private weigh(i: number, j: number): void {
    const { columns, currentR, currentI, charge } = this.distribution;
    const { weightR, weightI, weightB } = this;
    const at = i * columns;
    const to = j * columns;
    let q = 0;
    for (let c = 0; c < columns; c += 3) {
      let re = 0;
      let im = 0;
      let b = 0;
      for (let k = 0; k < 2; k++) {
        const ar = currentR[at + c + k] as number;
        const ai = currentI[at + c + k] as number;
        const br = currentR[to + c + k] as number;
        const bi = currentI[to + c + k] as number;
        re += ar * br - ai * bi;
        im += ar * bi + ai * br;
        b += (charge[at + c + k] as number) * (charge[to + c + k] as number);
      }
      weightR[q] = re / 2;
      weightI[q] = im / 2;
      weightB[q] = b / 2;
      q += 1;
      this.product(at + c + 2, to + c + 2, q, 1 / 3);
      q += 1;
    }
    for (let c = 2; c < columns; c += 3) {
      for (let d = c + 3; d < columns; d += 3) {
        weightR[q] = 0;
        weightI[q] = 0;
        weightB[q] = 0;
        this.product(at + c, to + d, q, 1 / 6, true);
        this.product(at + d, to + c, q, 1 / 6, true);
        q += 1;
      }
    }
  }

  /** One product of two distribution entries into (or onto) weight q. */
  private product(p: number, r: number, q: number, share: number, onto = false): void {
    const { currentR, currentI, charge } = this.distribution;
    const ar = currentR[p] as number;
    const ai = currentI[p] as number;
    const br = currentR[r] as number;
    const bi = currentI[r] as number;
    const keep = onto ? 1 : 0;
    this.weightR[q] = keep * (this.weightR[q] as number) + share * (ar * br - ai * bi);
    this.weightI[q] = keep * (this.weightI[q] as number) + share * (ar * bi + ai * br);
    this.weightB[q] =
      keep * (this.weightB[q] as number) + share * (charge[p] as number) * (charge[r] as number);
  }

  private passPairs(w: Workspace, scale: number, seriesWires: number): void {
    for (let i = 0; i < w.wires; i++) {
      for (let j = 0; j <= i; j++) {
        const sum = (w.height[i] as number) + (w.height[j] as number);
        const dx = (w.x[i] as number) - (w.x[j] as number);
        this.weigh(i, j);
        if (i < seriesWires) earthGradient(scale * sum, scale * dx, gradient);
        else gradient.fill(0);
        this.passPair(w, i, j, sum, dx, scale);
        if (i === j) this.keepSelf(i);
      }
    }
  }

  /** Adds one pair's share to every slope; pairs off the diagonal count twice. */
  private passPair(w: Workspace, i: number, j: number, sum: number, dx: number, scale: number): void {
    const { weightR, weightI, weightB, height, logResistivity, offset } = this;
    const dh = (w.height[i] as number) - (w.height[j] as number);
    const far2 = sum * sum + dx * dx;
    const near2 = dx * dx + dh * dh;
    const twice = i === j ? 1 : 2;
    const nearX = i === j ? 0 : dx / near2;
    // ∂/∂(height sum), ∂/∂x and ∂/∂ln ρ of ln(D/d) + F₊ + F₋; every height sum grows by two metres a metre raised.
    const hr = 2 * twice * scale * (gradient[0] as number);
    const hi = 2 * twice * scale * (gradient[1] as number);
    const xr = twice * (scale * (gradient[2] as number) - nearX);
    const xi = twice * scale * (gradient[3] as number);
    const er = -0.5 * twice * (scale * (sum * (gradient[0] as number) + dx * (gradient[2] as number)) - 1);
    const ei = -0.5 * twice * scale * (sum * (gradient[1] as number) + dx * (gradient[3] as number));
    const hp = (2 * twice * sum) / far2;
    const xp = twice * (dx / far2 - nearX);
    const from = (w.position[i] as number) * this.length;
    const to = (w.position[j] as number) * this.length;
    const moves = from !== to;
    for (let q = 0, at = 0; q < this.quantities; q++, at += 3) {
      const wr = weightR[q] as number;
      const wi = weightI[q] as number;
      const wb = weightB[q] as number;
      height[at] = (height[at] as number) + wr * hr - wi * hi;
      height[at + 1] = (height[at + 1] as number) + wr * hi + wi * hr;
      height[at + 2] = (height[at + 2] as number) + wb * hp;
      logResistivity[at] = (logResistivity[at] as number) + wr * er - wi * ei;
      logResistivity[at + 1] = (logResistivity[at + 1] as number) + wr * ei + wi * er;
      if (!moves) continue;
      const re = wr * xr - wi * xi;
      const im = wr * xi + wi * xr;
      offset[from + at] = (offset[from + at] as number) + re;
      offset[from + at + 1] = (offset[from + at + 1] as number) + im;
      offset[from + at + 2] = (offset[from + at + 2] as number) + wb * xp;
      offset[to + at] = (offset[to + at] as number) - re;
      offset[to + at + 1] = (offset[to + at + 1] as number) - im;
      offset[to + at + 2] = (offset[to + at + 2] as number) - wb * xp;
    }
  }

  /** Weights of a wire's own element, for what its conductor's data move. */
  private keepSelf(i: number): void {
    const base = i * this.length;
    for (let q = 0; q < this.quantities; q++) {
      this.self[base + 3 * q] = this.weightR[q] as number;
      this.self[base + 3 * q + 1] = this.weightI[q] as number;
      this.self[base + 3 * q + 2] = this.weightB[q] as number;
    }
  }
}

/** Turns sums of weight × derivative of the bracket into Ω/km (times jωμ₀/2π) and µS/km. */
function toValues(sums: Float64Array, start: number, end: number, series: number, shunt: number): void {
  for (let at = start; at < end; at += 3) {
    const re = sums[at] as number;
    sums[at] = -series * (sums[at + 1] as number);
    sums[at + 1] = series * re;
    sums[at + 2] = shunt * (sums[at + 2] as number);
  }
}
