import { matchClass } from '#shared/checks/bands/match-class';
import type { Band } from '#shared/checks/rule-set';
import { quantity, rangeTexts, THIN_SPACE } from '#shared/format/numbers';
import { isOnBase, toSi } from '#shared/units/declared-units';
import type { QuantityKind } from '#shared/units/declared-units';
import { convert } from './convert';
import { getAt } from './edit';
import type { DeclaredTyped, LineForm, Typed } from './form-types';
import { digitsTyped, readNumber } from './number-text';

const numberIn = (text: string): number | null => {
  const reading = readNumber(text);
  return reading.kind === 'number' ? reading.value : null;
};

const SI_OF: Readonly<Record<string, string>> = {
  lengthKm: 'km',
  horizontalM: 'm',
  attachmentHeightM: 'm',
  sagM: 'm',
  bundleSpacingM: 'm',
  diameterMm: 'mm',
  coreDiameterMm: 'mm',
  gmrMm: 'mm',
  acResistanceOhmPerKm: 'ohm/km',
  dcResistance20OhmPerKm: 'ohm/km',
};

/** The length of the whole line in km, or null while a section lacks its own. */
function totalLengthKm(form: LineForm): number | null {
  const lengths = form.sections.map(({ lengthKm }) => {
    const value = numberIn(lengthKm.text);
    return value === null ? null : convert(value, lengthKm.unit, 'km');
  });
  return lengths.reduce<number | null>((sum, l) => (sum === null || l === null ? null : sum + l), 0);
}

const kindOf = (key: string): QuantityKind =>
  key.startsWith('r') ? 'resistance' : key.startsWith('x') ? 'reactance' : 'susceptance';

/** A declared value in Ω/km or µS/km, where its unit is another and all that it stands on is entered. */
function declaredInSi(
  form: LineForm,
  key: string,
  field: DeclaredTyped,
  ownersBaseMva: number,
): string | undefined {
  const kind = kindOf(key);
  const value = numberIn(field.text);
  const nominalVoltageKv = numberIn(form.nominalVoltageKv.text);
  if (value === null || field.unit === 'ohm/km' || field.unit === 'uS/km') return undefined;
  const needsVoltage = isOnBase(kind, field.unit) || field.unit === 'Mvar';
  if (needsVoltage && nominalVoltageKv === null) return undefined;
  const kv = nominalVoltageKv ?? 1;
  const converted = toSi(kind, value, field.unit, {
    frequencyHz: Number(form.frequencyHz),
    nominalVoltageKv: kv,
    baseMva: numberIn(field.baseMva) ?? ownersBaseMva,
    baseKv: numberIn(field.baseKv) ?? kv,
  });
  if (!converted) return undefined;
  const lengthKm = converted.form === 'whole-line' ? totalLengthKm(form) : 1;
  if (lengthKm === null || lengthKm === 0) return undefined;
  return `is ${quantity(converted.si / lengthKm, kind === 'susceptance' ? 'µS/km' : 'Ω/km', 4)}`;
}

const LEAST_DIGITS = 3;
const MOST_DIGITS = 6;

/** A length or a wire's resistance, in no more digits than were typed, in the filing's unit, where another was chosen. */
function lengthInSi(key: string, field: Typed): string | undefined {
  const unit = SI_OF[key];
  const value = numberIn(field.text);
  if (!unit || value === null || field.unit === unit) return undefined;
  const digits = Math.min(MOST_DIGITS, Math.max(LEAST_DIGITS, digitsTyped(field.text)));
  return `is ${quantity(convert(value, field.unit, unit), unit.replace('ohm', 'Ω'), digits)}`;
}

const isTyped = (node: unknown): node is Typed =>
  typeof node === 'object' && node !== null && 'text' in node && 'unit' in node;

/** The value of a field in the filing's unit, where the writer chose another: "is 0.3812 Ω/km". */
export function siHint(form: LineForm, pointer: string, ownersBaseMva: number): string | undefined {
  const path = pointer.split('/').slice(1);
  const key = path.at(-1) ?? '';
  const field = getAt(form, path);
  if (!isTyped(field)) return undefined;
  if ('baseMva' in field) return declaredInSi(form, key, field as DeclaredTyped, ownersBaseMva);
  return lengthInSi(key, field);
}

/** The typical band of a declared value for the line's voltage: "typical 0.32 to 0.54 Ω/km". */
export function typicalHint(form: LineForm, key: string, bands: readonly Band[]): string | undefined {
  const kv = numberIn(form.nominalVoltageKv.text);
  if (kv === null || kv <= 0) return undefined;
  const match = matchClass(bands, kv, Number(form.frequencyHz));
  if (!match) return undefined;
  const own = match.bands.get(key as Band['parameter']);
  const unit = `${THIN_SPACE}${key.startsWith('b') ? 'µS/km' : 'Ω/km'}`;
  if (own) return `typical ${rangeTexts(...own.typical).join(' to ')}${unit}`;
  const excess = key === 'r0' ? match.bands.get('r0MinusR1') : undefined;
  return excess ? `typical R1 + ${rangeTexts(...excess.typical).join(' to ')}${unit}` : undefined;
}
