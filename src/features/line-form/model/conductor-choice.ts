import type { ConductorForm } from './form-types';
import { fieldOf } from './leaf';
import { readNumber, writeNumber } from './number-text';

/** A conductor of the library as far as the form needs it. */
interface Offered {
  name: string;
  family: string;
  data: Record<string, unknown> | null;
}

/** Families that are offered first where a ground wire is asked for. */
export const isForGroundWires = (family: string): boolean => /shield|ground/i.test(family);

const temperatureOf = (offered: Offered | undefined): string => {
  const given = offered?.data?.['temperatureC'];
  return typeof given === 'number' ? writeNumber(given) : '';
};

/** A library conductor chosen by its name; the temperature of its data stands in where none was entered. */
export function chooseFromLibrary(
  form: ConductorForm,
  library: readonly Offered[],
  name: string,
): ConductorForm {
  const found = library.find((c) => c.name === name);
  const temperature = form.temperatureC.text.trim() === '' ? temperatureOf(found) : form.temperatureC.text;
  return { ...form, source: 'library', library: name, temperatureC: { text: temperature, unit: 'degC' } };
}

/** The applicant's own data, begun with those of the library conductor that was chosen before. */
export function ownData(form: ConductorForm, before: Offered | undefined): ConductorForm {
  const data = before?.data;
  if (!data || form.diameterMm.text.trim() !== '') return { ...form, source: 'own' };
  const from = (key: string, unit: string) => fieldOf(data[key], unit, [unit], undefined);
  return {
    ...form,
    source: 'own',
    model: 'handbook',
    name: form.name || (before?.name ?? ''),
    diameterMm: from('diameterMm', 'mm'),
    coreDiameterMm: from('coreDiameterMm', 'mm'),
    gmrMm: from('gmrMm', 'mm'),
    acResistanceOhmPerKm: from('acResistanceOhmPerKm', 'ohm/km'),
    dcResistance20OhmPerKm: from('dcResistance20OhmPerKm', 'ohm/km'),
    temperatureC: from('temperatureC', 'degC'),
    temperatureCoefficientPerK: from('temperatureCoefficientPerK', '1/K'),
  };
}

/** What a chosen library conductor stands for: "28.14 mm, GMR 11.37 mm, 0.0798 Ω/km at 50 °C". */
export function conductorWords(form: ConductorForm, offered: Offered | undefined): string | undefined {
  if (form.source === 'own') return undefined;
  if (!offered?.data) return undefined;
  const number = (key: string) => {
    const value = offered.data?.[key];
    return typeof value === 'number' ? writeNumber(value) : '?';
  };
  const words = `${number('diameterMm')} mm, GMR ${number('gmrMm')} mm, ${number('acResistanceOhmPerKm')} Ω/km at ${number('temperatureC')} °C`;
  const entered = readNumber(form.temperatureC.text);
  const own = entered.kind === 'number' && entered.value !== offered.data['temperatureC'];
  return own ? `${words}; the resistance is taken at your temperature` : words;
}
