import { conductorResistanceOhmPerKm } from './conductor';
import { fail, succeed } from './failures';
import { checkFrequency, checkSection } from './validate';
import { solarHeat, type SolarPosition } from './solar';
import type { WeatherAssumptions } from './weather';
import type { ConductorData, Failure, OverheadSection, Result } from './types';

/** Steady-state rating of one conductor with the terms of its heat balance. */
export interface Ampacity {
  /** Rating of one conductor, A. */
  currentA: number;
  conductorTemperatureC: number;
  /** Resistance at that temperature, Ω/m. */
  resistanceOhmPerM: number;
  /** Film: mean temperature °C, viscosity kg/(m·s), density kg/m³, conductivity W/(m·K), Reynolds number. */
  film: { temperatureC: number; viscosity: number; density: number; conductivity: number; reynolds: number };
  /** Heat lost by convection, W/m: natural, the two forced formulas, and the largest, which counts. */
  convection: { natural: number; lowWind: number; highWind: number; used: number };
  radiationWPerM: number;
  solar: SolarPosition;
}

/** What the rating of one bare conductor hangs on. */
export interface AmpacityInput {
  diameterMm: number;
  /** Resistance at the conductor's temperature, Ω/km. */
  resistanceOhmPerKm: number;
  conductorTemperatureC: number;
  weather: WeatherAssumptions;
}

/** 0 °C in kelvin as the standard rounds it. */
const KELVIN = 273;

/** Ranges that the standard's formulas are meant for, wide enough for any real line. */
const WEATHER_RANGES: Record<Exclude<keyof WeatherAssumptions, 'atmosphere'>, readonly [number, number]> = {
  airTemperatureC: [-60, 60],
  windSpeedMPerS: [0, 50],
  windAngleDeg: [-360, 360],
  emissivity: [0, 1],
  absorptivity: [0, 1],
  elevationM: [-500, 6000],
  latitudeDeg: [-90, 90],
  lineAzimuthDeg: [-360, 360],
  dayOfYear: [1, 366],
  solarHour: [0, 24],
};

/** Numbers of the input against the ranges; the first that is out is told. */
function checkInput(input: AmpacityInput): Failure | null {
  if (!input.weather) return fail('non-finite', { field: 'weather' }, 'the weather assumptions are missing');
  const numbers: [string, number, number, number][] = [
    ['diameterMm', input.diameterMm, 0.1, 200],
    ['resistanceOhmPerKm', input.resistanceOhmPerKm, 1e-6, 1e4],
    ['conductorTemperatureC', input.conductorTemperatureC, -60, 400],
  ];
  for (const [field, range] of Object.entries(WEATHER_RANGES)) {
    numbers.push([field, input.weather[field as keyof typeof WEATHER_RANGES], range[0], range[1]]);
  }
  for (const [field, value, low, high] of numbers) {
    if (!Number.isFinite(value))
      return fail('non-finite', { field }, `${field} is ${String(value)}, a finite number is wanted`);
    if (value < low || value > high) {
      return fail('out-of-range', { field }, `${field} is ${value}, wanted is ${low} to ${high}`);
    }
  }
  return null;
}

/** Properties of the air film between conductor and air, IEEE Std 738-2023 clause 4.5. */
function filmOf(input: AmpacityInput): Ampacity['film'] {
  const { weather } = input;
  const temperatureC = (input.conductorTemperatureC + weather.airTemperatureC) / 2;
  const h = weather.elevationM;
  const viscosity = (1.458e-6 * (temperatureC + KELVIN) ** 1.5) / (temperatureC + 383.4);
  const density = (1.293 - 1.525e-4 * h + 6.379e-9 * h * h) / (1 + 0.00367 * temperatureC);
  const conductivity = 2.424e-2 + 7.477e-5 * temperatureC - 4.407e-9 * temperatureC * temperatureC;
  const reynolds = ((input.diameterMm / 1000) * density * weather.windSpeedMPerS) / viscosity;
  return { temperatureC, viscosity, density, conductivity, reynolds };
}

/** Convection: the largest of natural, low-wind and high-wind cooling (clause 4.4.3). */
function convectionOf(input: AmpacityInput, film: Ampacity['film']): Ampacity['convection'] {
  const angle = (input.weather.windAngleDeg * Math.PI) / 180;
  // The wind's angle folded into the first quadrant: only its slant counts.
  const slant = Math.acos(Math.min(1, Math.abs(Math.cos(angle))));
  const direction = 1.194 - Math.cos(slant) + 0.194 * Math.cos(2 * slant) + 0.368 * Math.sin(2 * slant);
  // A conductor cooler than the air takes heat up, which the formulas are not made for: no cooling then.
  const rise = Math.max(0, input.conductorTemperatureC - input.weather.airTemperatureC);
  const d = input.diameterMm / 1000;
  const lowWind = direction * (1.01 + 1.35 * film.reynolds ** 0.52) * film.conductivity * rise;
  const highWind = direction * 0.754 * film.reynolds ** 0.6 * film.conductivity * rise;
  const natural = 3.645 * Math.sqrt(film.density) * d ** 0.75 * rise ** 1.25;
  return { natural, lowWind, highWind, used: Math.max(natural, lowWind, highWind) };
}

/**
 * Steady-state rating of a bare conductor after IEEE Std 738-2023: convection + radiation = solar heat + I²R.
 *
 * @param input diameter, resistance at temperature, weather
 * @returns current in A (0 where the sun alone heats beyond the temperature) and every term; or the typed failure
 */
export function ampacity(input: AmpacityInput): Result<Ampacity> {
  const fault = checkInput(input);
  if (fault) return fault;
  const { weather, conductorTemperatureC } = input;
  const film = filmOf(input);
  const convection = convectionOf(input, film);
  const fourth = (celsius: number): number => ((celsius + KELVIN) / 100) ** 4;
  const radiationWPerM =
    17.8 *
    (input.diameterMm / 1000) *
    weather.emissivity *
    (fourth(conductorTemperatureC) - fourth(weather.airTemperatureC));
  const solar = solarHeat(weather, input.diameterMm);
  const resistanceOhmPerM = input.resistanceOhmPerKm / 1000;
  const heat = convection.used + radiationWPerM - solar.heatWPerM;
  return succeed({
    currentA: heat > 0 ? Math.sqrt(heat / resistanceOhmPerM) : 0,
    conductorTemperatureC,
    resistanceOhmPerM,
    film,
    convection,
    radiationWPerM,
    solar,
  });
}

/** Rating of a circuit: that of its weakest phase, all subconductors together. */
export interface CircuitAmpacity {
  currentA: number;
  /** Position that sets it. */
  position: number;
  conductor: ConductorData;
  bundleCount: number;
  /** Heat balance of one of its subconductors. */
  detail: Ampacity;
}

/**
 * Rating of one circuit of a section at a maximum conductor temperature: subconductors × rating, least over the phases.
 *
 * @param s the section
 * @param circuit number from 1
 * @param maxTemperatureC maximum conductor temperature, °C
 * @param weather the owner's assumptions
 * @param frequencyHz for the skin effect of tube conductors, Hz
 */
export function circuitAmpacity(
  s: OverheadSection,
  circuit: number,
  maxTemperatureC: number,
  weather: WeatherAssumptions,
  frequencyHz: number,
): Result<CircuitAmpacity> {
  const fault = checkFrequency(frequencyHz) ?? checkSection(s);
  if (fault) return fault;
  let weakest: CircuitAmpacity | null = null;
  for (const [position, p] of s.positions.entries()) {
    if (p.kind !== 'phase' || p.circuit !== circuit) continue;
    const rating = ampacity({
      diameterMm: p.conductor.diameterMm,
      resistanceOhmPerKm: conductorResistanceOhmPerKm(p.conductor, maxTemperatureC, frequencyHz),
      conductorTemperatureC: maxTemperatureC,
      weather,
    });
    if (!rating.ok) return { ...rating, where: { position, ...rating.where } };
    const currentA = rating.value.currentA * p.bundleCount;
    if (weakest && weakest.currentA <= currentA) continue;
    weakest = {
      currentA,
      position,
      conductor: p.conductor,
      bundleCount: p.bundleCount,
      detail: rating.value,
    };
  }
  return weakest ? succeed(weakest) : fail('missing-phase', {}, `the section has no circuit ${circuit}`);
}
