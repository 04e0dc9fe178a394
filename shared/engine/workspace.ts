import { packedLength } from '../numerics/packed';

/** Largest number of wires: 4 circuits of 3 bundles of 8, and room for ground wires; more makes the arrays grow. */
const FIRST_SIZE = 40;

/**
 * Room for one section's wires and matrices, made once and used again, so that a solve allocates nothing but its
 * result. Wires stand in this order: the first subconductor of each phase (circuit 1 a b c, circuit 2 …), the other
 * subconductors, the ground wires. The engine is synchronous, so one workspace a thread is enough.
 */
export class Workspace {
  /** Wires in all, phases (kept rows) and ground wires. */
  wires = 0;
  phases = 0;
  groundWires = 0;
  x = new Float64Array(0);
  height = new Float64Array(0);
  radius = new Float64Array(0);
  /** Internal impedance, Ω/km. */
  internalR = new Float64Array(0);
  internalX = new Float64Array(0);
  /** First subconductor of the wire's bundle; the wire itself for first ones and ground wires. */
  leader = new Int32Array(0);
  /** Index of the wire's position in the section's list. */
  position = new Int32Array(0);
  /** By wire pair (packed): height sum and offset, m, ln of the distance to the image, ln(D/d). */
  sum = new Float64Array(0);
  offset = new Float64Array(0);
  logFar = new Float64Array(0);
  field = new Float64Array(0);
  /** First pair that hangs like this one, see `findTwins`. */
  twin = new Int32Array(0);
  /** Series impedance, Ω/km, and Maxwell coefficients (dimensionless), packed. */
  zr = new Float64Array(0);
  zi = new Float64Array(0);
  p = new Float64Array(0);

  constructor() {
    this.reserve(FIRST_SIZE);
  }

  /** Leading wires that carry current: all but segmented ground wires. */
  seriesWires = 0;

  /** Makes room for n wires. */
  reserve(n: number): void {
    if (this.x.length >= n) return;
    this.x = new Float64Array(n);
    this.height = new Float64Array(n);
    this.radius = new Float64Array(n);
    this.internalR = new Float64Array(n);
    this.internalX = new Float64Array(n);
    this.leader = new Int32Array(n);
    this.position = new Int32Array(n);
    this.sum = new Float64Array(packedLength(n));
    this.offset = new Float64Array(packedLength(n));
    this.logFar = new Float64Array(packedLength(n));
    this.field = new Float64Array(packedLength(n));
    this.twin = new Int32Array(packedLength(n));
    this.zr = new Float64Array(packedLength(n));
    this.zi = new Float64Array(packedLength(n));
    this.p = new Float64Array(packedLength(n));
  }
}
