import type { Conductor } from '#shared/contracts/api.generated';
import { quantity } from '#shared/format/numbers';
import { handbookData } from '#shared/library/handbook-data';
import type { LibraryConductor } from '#shared/library/types';
import { plainNumber, plainQuantity } from '../../../lib/plain-number';
import type { ConductorForm } from './form-types';
import { fieldOf } from './leaf';
import { digitsTyped, readNumber, writeNumber } from './number-text';

/** The library's row of a conductor: the API sends it as the library has it. */
export const rowOf = ({ row }: Conductor): LibraryConductor => row as unknown as LibraryConductor;

export const familyOf = (conductor: Conductor): string => rowOf(conductor).family;

/** What a conductor is meant at while nobody says otherwise, °C: where most tables have a value. */
const USUAL_C = 50;

/** A temperature to begin with: the usual one where the row has it, else the row's first. */
function startingTemperature(conductor: Conductor): string {
  const tabled = rowOf(conductor).acResistances ?? [];
  const usual = tabled.find((t) => t.temperatureC === USUAL_C) ?? tabled[0];
  return usual ? writeNumber(usual.temperatureC) : '';
}

/** A library conductor chosen by its name; a temperature is put in where none was entered. */
export function chooseFromLibrary(
  form: ConductorForm,
  library: readonly Conductor[],
  name: string,
): ConductorForm {
  const found = library.find((c) => c.name === name);
  const empty = form.temperatureC.text.trim() === '';
  const text = empty && found ? startingTemperature(found) : form.temperatureC.text;
  return { ...form, source: 'library', library: name, temperatureC: { text, unit: 'degC' } };
}

function dataOf(form: ConductorForm, conductor: Conductor | undefined) {
  const temperature = readNumber(form.temperatureC.text);
  if (!conductor || temperature.kind !== 'number') return null;
  return handbookData(rowOf(conductor), temperature.value);
}

/** The applicant's own data, begun with those of the library conductor that was chosen before. */
export function ownData(form: ConductorForm, before: Conductor | undefined): ConductorForm {
  const data = dataOf(form, before);
  if (!data || form.diameterMm.text.trim() !== '') return { ...form, source: 'own' };
  const from = (value: number | undefined, unit: string) => fieldOf(value, unit, [unit], undefined);
  return {
    ...form,
    source: 'own',
    model: 'handbook',
    name: form.name || data.name,
    diameterMm: from(data.diameterMm, 'mm'),
    coreDiameterMm: from(data.coreDiameterMm, 'mm'),
    gmrMm: from(data.gmrMm, 'mm'),
    acResistanceOhmPerKm: from(data.acResistanceOhmPerKm, 'ohm/km'),
    dcResistance20OhmPerKm: from(data.dcResistance20OhmPerKm, 'ohm/km'),
    temperatureC: from(data.temperatureC, 'degC'),
    temperatureCoefficientPerK: from(data.temperatureCoefficientPerK, '1/K'),
  };
}

/** What a chosen library conductor stands for: "28.14 mm, GMR 11.37 mm, 0.0798 Ω/km at 50 °C". */
export function conductorWords(form: ConductorForm, conductor: Conductor | undefined): string | undefined {
  const data = form.source === 'library' ? dataOf(form, conductor) : null;
  if (!data) return undefined;
  // As the list has it, but in three digits at least: 28.14 mm, 1.00 mm.
  const shown = (value: number, unit: string) =>
    digitsTyped(plainNumber(value, 4)) < 3 ? quantity(value, unit) : plainQuantity(value, unit, 4);
  const geometry = `${shown(data.diameterMm, 'mm')}, GMR ${shown(data.gmrMm, 'mm')}`;
  return `${geometry}, ${quantity(data.acResistanceOhmPerKm, 'Ω/km')} at ${plainQuantity(data.temperatureC, '°C')}`;
}
