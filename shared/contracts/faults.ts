/** A fault of something that was sent: where it sits, what is there, what is wanted, and one sentence. */

/** A fault at a JSON Pointer. */
export interface PointerFault {
  pointer: string;
  /** What is there, cut to a readable length. null where nothing is there. */
  value: unknown;
  /** What is wanted. */
  expected: string;
  /** The fault as a sentence. */
  message: string;
}

/** A fault in a cell of a table; the header is row 1. */
export interface CellFault {
  row: number;
  /** Name of the column; empty when the whole row is meant. */
  column: string;
  value: unknown;
  expected: string;
  message: string;
}

export type Fault = PointerFault | CellFault;
