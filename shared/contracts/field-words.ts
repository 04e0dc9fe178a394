/** How the fields of the formats are called in a sentence, and the unit that a number of theirs is in. */

/** Words for one field. */
export interface FieldWords {
  /** Name of the field at the head of a sentence. */
  label: string;
  /** Unit as people write it. */
  unit?: string;
}

/** Fields of the filing format. Other fields are named from their spelling. */
const FIELDS: Readonly<Record<string, FieldWords>> = {
  format: { label: 'Format' },
  lines: { label: 'Lines' },
  name: { label: 'Name' },
  from: { label: 'From' },
  to: { label: 'To' },
  nominalVoltageKv: { label: 'Nominal voltage', unit: 'kV' },
  frequencyHz: { label: 'Frequency', unit: 'Hz' },
  transposed: { label: 'Transposed' },
  sections: { label: 'Sections' },
  declared: { label: 'Declared values' },
  declaredMutual: { label: 'Declared coupling' },
  kind: { label: 'Kind' },
  lengthKm: { label: 'Length', unit: 'km' },
  earthResistivityOhmM: { label: 'Earth resistivity', unit: 'Ω·m' },
  groundWireBonding: { label: 'Ground wire bonding' },
  conductors: { label: 'Conductors' },
  positions: { label: 'Positions' },
  perLength: { label: 'Cable values' },
  groundWire: { label: 'Ground wire' },
  circuit: { label: 'Circuit' },
  phase: { label: 'Phase' },
  conductor: { label: 'Conductor' },
  horizontalM: { label: 'Offset', unit: 'm' },
  attachmentHeightM: { label: 'Attachment height', unit: 'm' },
  sagM: { label: 'Sag', unit: 'm' },
  bundleCount: { label: 'Bundle count' },
  bundleSpacingM: { label: 'Bundle spacing', unit: 'm' },
  library: { label: 'Library conductor' },
  model: { label: 'Conductor model' },
  diameterMm: { label: 'Diameter', unit: 'mm' },
  coreDiameterMm: { label: 'Core diameter', unit: 'mm' },
  gmrMm: { label: 'GMR', unit: 'mm' },
  acResistanceOhmPerKm: { label: 'A.c. resistance', unit: 'Ω/km' },
  dcResistance20OhmPerKm: { label: 'D.c. resistance at 20 °C', unit: 'Ω/km' },
  temperatureC: { label: 'Temperature', unit: '°C' },
  temperatureCoefficientPerK: { label: 'Temperature coefficient', unit: '1/K' },
  value: { label: 'Value' },
  unit: { label: 'Unit' },
  baseMva: { label: 'Power base', unit: 'MVA' },
  baseKv: { label: 'Voltage base', unit: 'kV' },
  r1: { label: 'R1' },
  x1: { label: 'X1' },
  b1: { label: 'B1' },
  r0: { label: 'R0' },
  x0: { label: 'X0' },
  b0: { label: 'B0' },
  r0m: { label: 'Mutual R0' },
  x0m: { label: 'Mutual X0' },
  b0m: { label: 'Mutual B0' },
  circuits: { label: 'Circuits' },
  circuitId: { label: 'Circuit name' },
  ratingA: { label: 'Rating', unit: 'A' },
  maxTemperatureC: { label: 'Maximum temperature', unit: '°C' },
  ratings: { label: 'Ratings' },
  season: { label: 'Season' },
  continuousA: { label: 'Continuous rating', unit: 'A' },
  emergencyA: { label: 'Emergency rating', unit: 'A' },
  basis: { label: 'Basis' },
  status: { label: 'Status' },
  engineer: { label: 'Engineer' },
  date: { label: 'Date' },
};

/** Names of the filing format's fields, for "did you mean". */
export const FIELD_NAMES: readonly string[] = Object.keys(FIELDS);

/**
 * Words for the last token of a JSON Pointer.
 * @param token field name, or the index of a list
 * @param parent the token before it, which names a list's entries
 * @returns label and unit; a name that is not in the table is spelled out (`pointOfConnection` → "Point of connection")
 */
export function fieldWords(token: string, parent = ''): FieldWords {
  if (/^\d+$/.test(token)) return { label: `Entry ${Number(token) + 1} of ${parent || 'the list'}` };
  const known = Object.hasOwn(FIELDS, token) ? FIELDS[token] : undefined;
  if (known) return known;
  if (parent === 'conductors') return { label: `Conductor “${token}”` };
  const spaced = token.replace(/([a-z0-9])([A-Z])/g, (_, a: string, b: string) => `${a} ${b.toLowerCase()}`);
  return { label: spaced.charAt(0).toUpperCase() + spaced.slice(1) };
}
