/** Declared values in SI, beside the words in which they were declared. */
import { shown } from '../contracts/faults';
import type { PointerFault } from '../contracts/faults';
import { toSi } from '../units/declared-units';
import { halfLastDigit } from '../units/number-text';
import { DECLARED_KINDS } from './defaults';
import type { DeclaredValue, WrittenDigits } from './types';

/** What the values of one line are converted with. */
export interface DeclaredContext {
  frequencyHz: number;
  nominalVoltageKv: number;
  /** Length that a whole-line value is of, in km. */
  lengthKm: number;
  /** JSON Pointer of the line in the filing. */
  linePointer: string;
  /** Digits as written, by the pointer of the number from the line. */
  written: WrittenDigits;
}

/** A declared value in whatever unit. */
interface Quantity {
  value: number;
  unit: string;
  baseMva?: number;
  baseKv?: number;
}

/** Largest value in SI that is reckoned with; beyond it sums of squares would overflow. */
const MAX_SI = 1e100;

/** One value in SI; null when it is beyond reckoning. */
function convert(key: string, q: Quantity, pointer: string, c: DeclaredContext): DeclaredValue | null {
  const kind = DECLARED_KINDS[key];
  // pu and % carry their base once the defaults are filled in.
  const base = { baseMva: q.baseMva ?? 100, baseKv: q.baseKv ?? c.nominalVoltageKv };
  const si = kind && toSi(kind, q.value, q.unit, { ...c, ...base });
  if (!si || !(Math.abs(si.si) <= MAX_SI)) return null;
  const written = c.written[`${pointer.slice(c.linePointer.length)}/value`] ?? String(q.value);
  const whole = si.form === 'whole-line';
  const perKm = whole ? si.si / c.lengthKm : si.si;
  const half = halfLastDigit(written) * si.factor;
  return {
    value: q.value,
    unit: q.unit,
    form: si.form,
    perKm,
    total: whole ? si.si : si.si * c.lengthKm,
    halfDigitPerKm: whole ? half / c.lengthKm : half,
    written,
    pointer,
    ...(si.onBase ? base : {}),
  };
}

/**
 * The declared values of a circuit, a coupling or a cable in SI.
 * @param entry the entry with its defaults filled in
 * @param keys the fields that hold values
 * @param pointer JSON Pointer of the entry
 * @param context frequency (Hz), voltage (kV), length (km) and digits as written
 * @param faults where a value that is too large to reckon with is named
 */
export function declaredValues<K extends string>(
  entry: Readonly<Partial<Record<K, Quantity | undefined>>>,
  keys: readonly K[],
  pointer: string,
  context: DeclaredContext,
  faults: PointerFault[],
): Partial<Record<K, DeclaredValue>> {
  const out: Partial<Record<K, DeclaredValue>> = {};
  for (const key of keys) {
    const q = entry[key];
    if (!q) continue;
    const at = `${pointer}/${key}`;
    const value = convert(key, q, at, context);
    if (value) out[key] = value;
    else
      faults.push({
        pointer: `${at}/value`,
        value: shown(q.value),
        expected: 'a value that can be reckoned with',
        message: `This value is beyond any that can be reckoned with in ${q.unit}.`,
      });
  }
  return out;
}
