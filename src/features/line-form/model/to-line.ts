import type {
  AsTyped,
  ConductorForm,
  DeclaredForm,
  DeclaredTyped,
  LineForm,
  PositionForm,
  SectionForm,
  Typed,
} from './form-types';
import { MUTUAL_KEYS, SEQUENCE_KEYS } from './form-types';
import { numberOf } from './leaf';
import type { Gathered, TextFault } from './leaf';
import { needsBase } from './unit-choices';

/** The form turned into a line of the filing format, perhaps incomplete, with what it cannot hold. */
export interface FormReading {
  line: Record<string, unknown>;
  asTyped: AsTyped;
  faults: TextFault[];
}

type Json = Record<string, unknown>;

/** Leaves out what was not entered: an absent member is "not given", never null. */
function given(members: Json): Json {
  return Object.fromEntries(Object.entries(members).filter(([, v]) => v !== undefined && v !== ''));
}

const orNothing = (members: Json): Json | undefined =>
  Object.keys(members).length > 0 ? members : undefined;

const token = (name: string): string => name.replace(/~/g, '~0').replace(/\//g, '~1');

function declaredValue(field: DeclaredTyped, pointer: string, g: Gathered): Json | undefined {
  const plain: Typed = { text: field.text, unit: '' };
  const value = numberOf(plain, '', `${pointer}/value`, g);
  if (value === undefined && field.text.trim() === '') return undefined;
  const base = needsBase(field.unit)
    ? {
        baseMva: numberOf({ text: field.baseMva, unit: '' }, '', `${pointer}/baseMva`, g),
        baseKv: numberOf({ text: field.baseKv, unit: '' }, '', `${pointer}/baseKv`, g),
      }
    : {};
  return given({ value, unit: field.unit, ...base });
}

function values<K extends string>(
  keys: readonly K[],
  form: Record<K, DeclaredTyped>,
  pointer: string,
  g: Gathered,
): Json {
  return Object.fromEntries(keys.map((k) => [k, declaredValue(form[k], `${pointer}/${k}`, g)]));
}

function conductor(form: ConductorForm, pointer: string, g: Gathered): Json {
  const at = (name: keyof ConductorForm, field: Typed, unit: string) =>
    numberOf(field, unit, `${pointer}/${name}`, g);
  const temperatureC = at('temperatureC', form.temperatureC, 'degC');
  if (form.aluminiumArea.text.trim() !== '')
    g.asTyped[`${pointer}/aluminiumArea`] = { ...form.aluminiumArea };
  // A library conductor that nobody has chosen yet keeps its member, so that its fault is said at the choice.
  if (form.source === 'library') return { library: form.library, ...given({ temperatureC }) };
  return given({
    name: form.name.trim(),
    model: form.model,
    diameterMm: at('diameterMm', form.diameterMm, 'mm'),
    coreDiameterMm: at('coreDiameterMm', form.coreDiameterMm, 'mm'),
    gmrMm: at('gmrMm', form.gmrMm, 'mm'),
    acResistanceOhmPerKm: at('acResistanceOhmPerKm', form.acResistanceOhmPerKm, 'ohm/km'),
    dcResistance20OhmPerKm: at('dcResistance20OhmPerKm', form.dcResistance20OhmPerKm, 'ohm/km'),
    temperatureC,
    temperatureCoefficientPerK: at('temperatureCoefficientPerK', form.temperatureCoefficientPerK, '1/K'),
  });
}

function position(form: PositionForm, pointer: string, g: Gathered): Json {
  const at = (name: string, field: Typed) => numberOf(field, 'm', `${pointer}/${name}`, g);
  const hanging = {
    conductor: form.conductor,
    horizontalM: at('horizontalM', form.horizontalM),
    attachmentHeightM: at('attachmentHeightM', form.attachmentHeightM),
    sagM: at('sagM', form.sagM),
  };
  if (form.kind === 'ground-wire') return given({ groundWire: true, ...hanging });
  const bundleCount = numberOf({ text: form.bundleCount, unit: '' }, '', `${pointer}/bundleCount`, g);
  return given({
    circuit: form.circuit,
    phase: form.phase,
    ...hanging,
    bundleCount,
    bundleSpacingM: bundleCount === 1 ? undefined : at('bundleSpacingM', form.bundleSpacingM),
  });
}

function geometry(form: SectionForm, pointer: string, g: Gathered): Json {
  if (!form.hasGeometry) return {};
  const used = new Set(form.positions.map((p) => p.conductor));
  const conductors = Object.entries(form.conductors).filter(([name]) => used.has(name));
  return {
    conductors: Object.fromEntries(
      conductors.map(([name, c]) => [name, conductor(c, `${pointer}/conductors/${token(name)}`, g)]),
    ),
    positions: form.positions.map((p, i) => position(p, `${pointer}/positions/${i}`, g)),
  };
}

function section(form: SectionForm, pointer: string, g: Gathered): Json {
  const lengthKm = numberOf(form.lengthKm, 'km', `${pointer}/lengthKm`, g);
  if (form.kind === 'cable') {
    const perLength = form.perLength.map((p, i) => ({
      circuit: i + 1,
      ...given(values(SEQUENCE_KEYS, p, `${pointer}/perLength/${i}`, g)),
    }));
    return given({ kind: 'cable', lengthKm, perLength });
  }
  return given({
    kind: 'overhead',
    lengthKm,
    earthResistivityOhmM: numberOf(form.earthResistivityOhmM, 'ohm m', `${pointer}/earthResistivityOhmM`, g),
    groundWireBonding: form.groundWireBonding,
    ...geometry(form, pointer, g),
  });
}

function declared(form: DeclaredForm, pointer: string, g: Gathered): Json {
  const ratings = form.ratings.map((r, i) =>
    given({
      season: r.season.trim(),
      continuousA: numberOf(r.continuousA, 'A', `${pointer}/ratings/${i}/continuousA`, g),
      emergencyA: numberOf(r.emergencyA, 'A', `${pointer}/ratings/${i}/emergencyA`, g),
    }),
  );
  return given({
    circuit: form.circuit,
    circuitId: form.circuitId.trim(),
    ...values(SEQUENCE_KEYS, form, pointer, g),
    ratingA: numberOf(form.ratingA, 'A', `${pointer}/ratingA`, g),
    maxTemperatureC: numberOf(form.maxTemperatureC, 'degC', `${pointer}/maxTemperatureC`, g),
    ratings: ratings.length > 0 ? ratings : undefined,
    basis: orNothing(given({ ...form.basis, engineer: form.basis.engineer.trim() })),
  });
}

function mutual(form: LineForm, g: Gathered): Json[] | undefined {
  if (form.circuits === 1) return undefined;
  const found = given(values(MUTUAL_KEYS, form.declaredMutual, '/declaredMutual/0', g));
  return Object.keys(found).length > 0 ? [{ circuits: [1, 2], ...found }] : undefined;
}

/** Reads the form into a line of the filing format; incomplete entries are left out, never invented. */
export function readForm(form: LineForm): FormReading {
  const g: Gathered = { asTyped: {}, faults: [] };
  const line = given({
    name: form.name.trim(),
    from: form.from.trim(),
    to: form.to.trim(),
    nominalVoltageKv: numberOf(form.nominalVoltageKv, 'kV', '/nominalVoltageKv', g),
    frequencyHz: form.frequencyHz === '' ? undefined : Number(form.frequencyHz),
    transposed: form.transposed ? undefined : false,
    sections: form.sections.map((s, i) => section(s, `/sections/${i}`, g)),
    declared: form.declared.map((d, i) => declared(d, `/declared/${i}`, g)),
    declaredMutual: mutual(form, g),
  });
  return { line, ...g };
}
