import type { DraftLine } from '../entities/case.entities';
import type * as Api from '../../shared/contracts/api.generated';
import type { PointerFault } from '../../shared/contracts/faults';
import type { NormalisedLine } from '../../shared/filing/types';

/** A line of the draft as it was read: whole, or with what is missing or wrong. */
export interface DraftLineReading {
  row: DraftLine;
  line: NormalisedLine | null;
  /** Pointers count from the line. */
  faults: readonly PointerFault[];
}

const LISTED_FAULTS = 500;

export function presentDraftLine({ row, line, faults }: DraftLineReading): Api.DraftLine {
  const body = row.body as Record<string, unknown>;
  return {
    lineKey: row.lineKey,
    ordinal: row.ordinal,
    version: row.version,
    line: body,
    asTyped: row.asTyped,
    name: textOrNull(body['name']),
    nominalVoltageKv: line?.nominalVoltageKv ?? numberOrNull(body['nominalVoltageKv'], 10_000),
    lengthKm: line?.lengthKm ?? lengthOf(body['sections']),
    circuitCount: line?.circuitCount ?? declaredCircuits(body['declared']),
    complete: line !== null && faults.length === 0,
    faults: faults.slice(0, LISTED_FAULTS).map(presentFault),
    updatedAt: row.updatedAt.toISOString(),
  };
}

/** What a draft holds in all, incomplete lines with what they say so far. */
export function draftTotals(rows: readonly Pick<DraftLine, 'body'>[]): {
  voltagesKv: number[];
  totalKm: number;
} {
  const bodies = rows.map((row) => row.body as Record<string, unknown>);
  const voltages = bodies.flatMap((body) => numberOrNull(body['nominalVoltageKv'], 10_000) ?? []);
  return {
    voltagesKv: [...new Set(voltages)].sort((a, b) => b - a),
    totalKm: bodies.reduce((sum, body) => sum + (lengthOf(body['sections']) ?? 0), 0),
  };
}

export function presentFault(fault: PointerFault): Api.Fault {
  const { pointer, value, expected, message } = fault;
  return { pointer, value, expected, message };
}

/** Of a draft whose lines may hold anything: a text that can be shown as a name. */
function textOrNull(value: unknown): string | null {
  return typeof value === 'string' && value.trim() !== '' ? value.slice(0, 160) : null;
}

function numberOrNull(value: unknown, atMost: number): number | null {
  return typeof value === 'number' && value >= 0 && value <= atMost ? value : null;
}

function lengthOf(sections: unknown): number | null {
  if (!Array.isArray(sections)) return null;
  const lengths = sections.map((s: unknown) =>
    numberOrNull((s as { lengthKm?: unknown } | null)?.lengthKm, 1e5),
  );
  const known = lengths.filter((length) => length !== null);
  const sum = known.reduce((total, length) => total + length, 0);
  return known.length === 0 || sum > 1e6 ? null : sum;
}

function declaredCircuits(declared: unknown): number {
  return Array.isArray(declared) ? Math.min(2, declared.length) : 0;
}
