import { MU_0 } from './constants';
import { Distribution } from './distribution';
import { earthGradient } from './earth-gradient';
import { earthScale } from './earth-return';
import { susceptanceFactor } from './section';
import type { OverheadSection } from './types';
import type { Workspace } from './workspace';

const gradient = new Float64Array(4);

/**
 * First-order slopes of every sequence value of a solved section with respect to its geometry and earth.
 *
 * A value is a sum of products vᵀZv over the patterns of `Distribution`, so its change is mᵀ·dZ·m with m the wire
 * currents. One pass over the wire pairs forms the products dZ·m (and dP·q with the charges) for three movements:
 * all wires raised, ln ρ grown, one wire moved sideways; the products with m follow wire by wire.
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
  /** Per position: sums of its wires' diagonal weights, [Re, Im] for Z and one for P, quantity by quantity. */
  self = new Float64Array(0);

  private readonly distribution = new Distribution();
  /** dZ·m and dP·q of the current wire, a column a pattern: raised (R, I, B) and ln ρ (R, I). */
  private raisedR = new Float64Array(0);
  private raisedI = new Float64Array(0);
  private raisedB = new Float64Array(0);
  private earthR = new Float64Array(0);
  private earthI = new Float64Array(0);
  private nothing = new Float64Array(0);
  /** The same for sideways moves, of all wires. */
  private asideR = new Float64Array(0);
  private asideI = new Float64Array(0);
  private asideB = new Float64Array(0);

  /** Entries of a slope vector: r, x, b a quantity. */
  get length(): number {
    return 3 * this.quantities;
  }

  /** Fills all slopes for a section whose solution stands in the workspace. */
  fill(s: OverheadSection, w: Workspace, frequencyHz: number): void {
    const omega = 2 * Math.PI * frequencyHz;
    const positions = s.positions.length;
    this.reserve(w, positions);
    this.distribution.fill(w);
    this.passPairs(w, earthScale(omega, s.earthResistivityOhmM));
    this.gatherOffsets(w);
    const series = (1000 * omega * MU_0) / (2 * Math.PI);
    const shunt = -susceptanceFactor(omega);
    toValues(this.height, this.length, series, shunt);
    toValues(this.logResistivity, this.length, series, shunt);
    toValues(this.offset, this.length * positions, series, shunt);
  }

  /**
   * Makes room for a section and clears the sums. Arrays only grow, so a run over many lines of like size allocates
   * once; all loops run to the section's own size, never to the arrays' length.
   */
  private reserve(w: Workspace, positions: number): void {
    const circuits = w.phases / 3;
    this.quantities = 2 * circuits + (circuits * (circuits - 1)) / 2;
    const { length } = this;
    if (this.height.length < length) {
      this.height = new Float64Array(length);
      this.logResistivity = new Float64Array(length);
      this.raisedR = new Float64Array(w.phases);
      this.raisedI = new Float64Array(w.phases);
      this.raisedB = new Float64Array(w.phases);
      this.earthR = new Float64Array(w.phases);
      this.earthI = new Float64Array(w.phases);
      this.nothing = new Float64Array(w.phases);
    }
    if (this.offset.length < length * positions) {
      this.offset = new Float64Array(length * positions);
      this.self = new Float64Array(length * positions);
    }
    if (this.asideR.length < w.wires * w.phases) {
      this.asideR = new Float64Array(w.wires * w.phases);
      this.asideI = new Float64Array(w.wires * w.phases);
      this.asideB = new Float64Array(w.wires * w.phases);
    }
    this.height.fill(0);
    this.logResistivity.fill(0);
    this.offset.fill(0, 0, length * positions);
    this.self.fill(0, 0, length * positions);
    this.asideR.fill(0, 0, w.wires * w.phases);
    this.asideI.fill(0, 0, w.wires * w.phases);
    this.asideB.fill(0, 0, w.wires * w.phases);
  }

  /**
   * The pass itself. Row i holds the pairs with all wires before it and the wire's own element last, as the triangles
   * do, so e runs through the packed pairs in order.
   */
  private passPairs(w: Workspace, scale: number): void {
    const { currentR, currentI, charge } = this.distribution;
    const { sum, offset, logFar } = w;
    const logScale = Math.log(scale);
    for (let i = 0, e = 0; i < w.wires; i++) {
      const carries = i < w.seriesWires;
      this.clearColumns();
      for (let j = 0; j < i; j++, e++) {
        if (carries) {
          const logD = (logFar[e] as number) + logScale;
          earthGradient(scale * (sum[e] as number), scale * (offset[e] as number), logD, gradient);
          this.passSeries(w, i, j, e, scale);
        }
        this.passShunt(w, i, j, e);
      }
      if (carries) {
        earthGradient(scale * (sum[e] as number), 0, (logFar[e] as number) + logScale, gradient);
        this.passSelf(i, scale, sum[e] as number);
      }
      this.passSelfShunt(i, sum[e] as number);
      e += 1;
      // Off-diagonal pairs count twice; the diagonal was halved for it.
      this.combine(i, 2, this.raisedR, this.raisedI, this.raisedB, this.height, 0);
      this.combine(i, 2, this.earthR, this.earthI, this.nothing, this.logResistivity, 0);
      const own = (w.position[i] as number) * this.length;
      this.combine(i, 1, currentR, currentI, charge, this.self, own, i * w.phases);
    }
  }

  /** Starts the row sums of the next wire; a loop, since `fill` costs more than it saves on three or six columns. */
  private clearColumns(): void {
    for (let k = 0; k < this.distribution.columns; k++) {
      this.raisedR[k] = 0;
      this.raisedI[k] = 0;
      this.raisedB[k] = 0;
      this.earthR[k] = 0;
      this.earthI[k] = 0;
    }
  }

  /** One pair's dZ times the other wire's currents, for all three movements. */
  private passSeries(w: Workspace, i: number, j: number, e: number, scale: number): void {
    const { columns, currentR, currentI } = this.distribution;
    const { raisedR, raisedI, earthR, earthI, asideR, asideI } = this;
    const h = w.sum[e] as number;
    const x = w.offset[e] as number;
    const dh = (w.height[i] as number) - (w.height[j] as number);
    // Every height sum grows by two metres a metre raised; ln ρ moves u by −½ a unit.
    // The gradient is in scaled coordinates: one factor √(ωμ₀/ρ) brings it back to metres.
    const ghr = 2 * scale * (gradient[0] as number);
    const ghi = 2 * scale * (gradient[1] as number);
    const gxr = scale * (gradient[2] as number);
    const gxi = scale * (gradient[3] as number);
    const ger = -0.5 * (0.5 * h * ghr + x * gxr - 1);
    const gei = -0.5 * (0.5 * h * ghi + x * gxi);
    // Moving sideways also changes the distance between the wires themselves, −ln d; raising both does not.
    const gar = gxr - x / (x * x + dh * dh);
    let at = i * columns;
    let to = j * columns;
    for (let k = 0; k < columns; k++, at++, to++) {
      const mr = currentR[to] as number;
      const mi = currentI[to] as number;
      const or = currentR[at] as number;
      const oi = currentI[at] as number;
      raisedR[k] = (raisedR[k] as number) + ghr * mr - ghi * mi;
      raisedI[k] = (raisedI[k] as number) + ghr * mi + ghi * mr;
      earthR[k] = (earthR[k] as number) + ger * mr - gei * mi;
      earthI[k] = (earthI[k] as number) + ger * mi + gei * mr;
      asideR[at] = (asideR[at] as number) + gar * mr - gxi * mi;
      asideI[at] = (asideI[at] as number) + gar * mi + gxi * mr;
      // Seen from wire j the same move goes the other way.
      asideR[to] = (asideR[to] as number) - gar * or + gxi * oi;
      asideI[to] = (asideI[to] as number) - gar * oi - gxi * or;
    }
  }

  /** One pair's dP times the other wire's charges. */
  private passShunt(w: Workspace, i: number, j: number, e: number): void {
    const { columns, charge } = this.distribution;
    const { raisedB, asideB } = this;
    const h = w.sum[e] as number;
    const x = w.offset[e] as number;
    const dh = (w.height[i] as number) - (w.height[j] as number);
    // P = ln(D/d): the image's distance D grows with height, both D and d change with a sideways move.
    const far = 1 / (h * h + x * x);
    const raised = 2 * h * far;
    const aside = x * far - x / (x * x + dh * dh);
    let at = i * columns;
    let to = j * columns;
    for (let k = 0; k < columns; k++, at++, to++) {
      const q = charge[to] as number;
      raisedB[k] = (raisedB[k] as number) + raised * q;
      asideB[at] = (asideB[at] as number) + aside * q;
      asideB[to] = (asideB[to] as number) - aside * (charge[at] as number);
    }
  }

  /** Half of the diagonal's share of Z. */
  private passSelf(i: number, scale: number, h: number): void {
    const { columns, currentR, currentI } = this.distribution;
    const ghr = scale * (gradient[0] as number);
    const ghi = scale * (gradient[1] as number);
    // A wire's height sum is 2h: its slope per metre raised is two gradients, of which half is taken here.
    const ger = -0.25 * (h * ghr - 1);
    const gei = -0.25 * h * ghi;
    for (let k = 0, at = i * columns; k < columns; k++, at++) {
      const mr = currentR[at] as number;
      const mi = currentI[at] as number;
      this.raisedR[k] = (this.raisedR[k] as number) + ghr * mr - ghi * mi;
      this.raisedI[k] = (this.raisedI[k] as number) + ghr * mi + ghi * mr;
      this.earthR[k] = (this.earthR[k] as number) + ger * mr - gei * mi;
      this.earthI[k] = (this.earthI[k] as number) + ger * mi + gei * mr;
    }
  }

  /** Half of the diagonal's share of P. */
  private passSelfShunt(i: number, h: number): void {
    const { columns, charge } = this.distribution;
    for (let k = 0; k < columns; k++) {
      this.raisedB[k] = (this.raisedB[k] as number) + (charge[i * columns + k] as number) / h;
    }
  }

  /**
   * Adds `times` × the product of wire i's distribution with the columns given to every quantity: ½(αα + ββ) for the
   * positive, ⅓ss for the zero sequence, ⅙(ss′ + s′s) for mutuals.
   */
  private combine(
    i: number,
    times: number,
    re: Float64Array,
    im: Float64Array,
    b: Float64Array,
    into: Float64Array,
    start: number,
    from = 0,
  ): void {
    const { columns } = this.distribution;
    const at = i * columns;
    let e = start;
    for (let c = 0; c < columns; c += 3) {
      this.add(at + c, from + c, times / 2, re, im, b, into, e);
      this.add(at + c + 1, from + c + 1, times / 2, re, im, b, into, e);
      this.add(at + c + 2, from + c + 2, times / 3, re, im, b, into, e + 3);
      e += 6;
    }
    for (let c = 2; c < columns; c += 3) {
      for (let d = c + 3; d < columns; d += 3, e += 3) {
        this.add(at + c, from + d, times / 6, re, im, b, into, e);
        this.add(at + d, from + c, times / 6, re, im, b, into, e);
      }
    }
  }

  /** One product of a distribution entry k with an entry l of the columns, onto quantity entry e. */
  private add(
    k: number,
    l: number,
    share: number,
    re: Float64Array,
    im: Float64Array,
    b: Float64Array,
    into: Float64Array,
    e: number,
  ): void {
    const { currentR, currentI, charge } = this.distribution;
    const mr = share * (currentR[k] as number);
    const mi = share * (currentI[k] as number);
    const yr = re[l] as number;
    const yi = im[l] as number;
    into[e] = (into[e] as number) + mr * yr - mi * yi;
    into[e + 1] = (into[e + 1] as number) + mr * yi + mi * yr;
    into[e + 2] = (into[e + 2] as number) + share * (charge[k] as number) * (b[l] as number);
  }

  /**
   * Sums the sideways products by position. Within one position they cancel in pairs, since its wires move together:
   * nothing has to be left out for it.
   */
  private gatherOffsets(w: Workspace): void {
    for (let i = 0; i < w.wires; i++) {
      const start = (w.position[i] as number) * this.length;
      this.combine(i, 2, this.asideR, this.asideI, this.asideB, this.offset, start, i * w.phases);
    }
  }
}

/** Turns sums of weight × derivative of the bracket into Ω/km (times jωμ₀/2π) and µS/km. */
function toValues(sums: Float64Array, end: number, series: number, shunt: number): void {
  for (let at = 0; at < end; at += 3) {
    const re = sums[at] as number;
    sums[at] = -series * (sums[at + 1] as number);
    sums[at + 1] = series * re;
    sums[at + 2] = shunt * (sums[at + 2] as number);
  }
}
